const LONGEST = 60;

/** A value as a problem shows it: numbers and short text as they are, the rest by what it is. Always JSON-safe. */
export function shownFound(value: unknown): string | number | boolean | null {
  if (value === null || value === undefined) return null;
  if (typeof value === 'boolean') return value;
  if (typeof value === 'number') return Number.isFinite(value) ? value : String(value);
  if (typeof value === 'string') return shortened(value);
  if (Array.isArray(value)) return `list of ${value.length}`;
  return typeof value === 'object' ? 'object' : typeof value;
}

/** Text without control characters and half characters, cut to what a line can hold. */
export function shortened(text: string): string {
  const clean = text.slice(0, LONGEST + 1).replace(/[\p{Cc}\p{Cf}\p{Cs}\p{Zl}\p{Zp}]/gu, '\ufffd');
  return clean.length > LONGEST ? `${clean.slice(0, LONGEST - 1)}…` : clean;
}

/** One step of a JSON pointer (RFC 6901: `~` is `~0`, `/` is `~1`). */
export function pointerStep(key: PropertyKey): string {
  const text = String(key);
  // Nearly every key is plain, and every value of a document is met here.
  return /[~/]/.test(text) ? `/${text.replace(/~/g, '~0').replace(/\//g, '~1')}` : `/${text}`;
}

export function pointerOf(path: readonly PropertyKey[]): string {
  return path.map(pointerStep).join('');
}
