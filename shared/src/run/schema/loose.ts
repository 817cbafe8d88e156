/**
 * Reading a document that may still be wrong anywhere: the rules between fields speak about the parts that are right,
 * whatever else is not, so that every problem is reported at once.
 */
export type Loose = Record<string, unknown>;

export function asObject(value: unknown): Loose {
  return typeof value === 'object' && value !== null && !Array.isArray(value)
    ? (value as Loose)
    : {};
}

export function asList(value: unknown): Loose[] {
  return Array.isArray(value) ? value.map(asObject) : [];
}

export function asText(value: unknown): string | null {
  return typeof value === 'string' ? value : null;
}

export function asNumber(value: unknown): number | null {
  return typeof value === 'number' ? value : null;
}
