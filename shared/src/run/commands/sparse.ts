/**
 * A copy without the fields, at any depth, that were given as undefined; the value itself where there are none.
 * Documents are JSON, where an absent field is the only way to say "not given".
 * Example: { angle: 30, radius: undefined } gives { angle: 30 }.
 */
export function sparse<T>(value: T): T {
  if (typeof value !== 'object' || value === null) return value;
  if (Array.isArray(value)) {
    const items = value.map((item: unknown) => sparse(item));
    return items.every((item, index) => item === value[index]) ? value : (items as T);
  }
  const fields = Object.entries(value);
  const kept = fields
    .filter(([, field]) => field !== undefined)
    .map(([key, field]) => [key, sparse(field)] as const);
  const isSame =
    kept.length === fields.length && kept.every(([, field], i) => field === fields[i]?.[1]);
  return isSame ? value : (Object.fromEntries(kept) as T);
}

/** A copy of `value` with one field set, or taken out where `field` is undefined. */
export function withField<T extends object, K extends keyof T>(value: T, key: K, field: T[K]): T {
  return sparse({ ...value, [key]: field });
}

/** A copy of a list with one place changed. */
export function replacedAt<T>(list: readonly T[], index: number, item: T): T[] {
  return list.map((old, place) => (place === index ? item : old));
}
