/** Whether dotted version `a` comes before `b`; parts compare as numbers, a missing part is 0. E.g. 1.9 before 1.10. */
export function isOlderVersion(a: string, b: string): boolean {
  const left = a.split('.').map(Number);
  const right = b.split('.').map(Number);
  for (let part = 0; part < Math.max(left.length, right.length); part += 1) {
    const difference = (left[part] ?? 0) - (right[part] ?? 0);
    if (difference !== 0) return difference < 0;
  }
  return false;
}
