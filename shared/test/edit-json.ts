/** Small edits of JSON for tests of refused documents: each returns a fresh copy. */
type Json = unknown;
type Holder = Record<string, Json>;

function steps(pointer: string): string[] {
  return pointer
    .split('/')
    .slice(1)
    .map((step) => step.replace(/~1/g, '/').replace(/~0/g, '~'));
}

/** A copy with the value at a pointer replaced or added. The value may be anything, JSON or not. A list's length is no place. */
export function withValue(json: Json, pointer: string, value: unknown): Json {
  const keys = steps(pointer);
  const last = keys.pop();
  if (last === undefined) return value;
  const copy: Json = structuredClone(json);
  const holder = keys.reduce<Json>((inner, key) => (inner as Holder)[key], copy) as Holder;
  if (Array.isArray(holder) && last === 'length') return copy;
  Object.defineProperty(holder, last, {
    value,
    enumerable: true,
    configurable: true,
    writable: true,
  });
  return copy;
}

/** A copy with several values set. */
export function withValues(json: Json, values: Record<string, unknown>): Json {
  return Object.entries(values).reduce(
    (copy, [pointer, value]) => withValue(copy, pointer, value),
    json,
  );
}

/** A copy without the value at a pointer. */
export function without(json: Json, pointer: string): Json {
  const keys = steps(pointer);
  const last = keys.pop() ?? '';
  const copy: Json = structuredClone(json);
  const holder = keys.reduce<Json>((inner, key) => (inner as Holder)[key], copy) as Holder;
  if (Array.isArray(holder)) holder.splice(Number(last), 1);
  else delete holder[last];
  return copy;
}

/** True where a pointer is well formed and every step but the last exists. */
export function reaches(json: Json, pointer: string): boolean {
  if (pointer === '') return true;
  if (!/^(\/([^~/]|~0|~1)*)+$/.test(pointer)) return false;
  const keys = steps(pointer).slice(0, -1);
  let inner = json;
  for (const key of keys) {
    if (typeof inner !== 'object' || inner === null || !Object.hasOwn(inner, key)) return false;
    inner = (inner as Holder)[key];
  }
  return typeof inner === 'object' && inner !== null;
}
