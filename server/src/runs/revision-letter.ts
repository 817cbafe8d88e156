/** 1 → A, 26 → Z, 27 → AA: what people call a revision. */
export function revisionLetter(number: number): string {
  const rest = Math.floor((number - 1) / 26);
  const last = String.fromCharCode(65 + ((number - 1) % 26));
  return rest === 0 ? last : revisionLetter(rest) + last;
}
