export function woff2Coverage(file: Uint8Array): Set<number>;
export function unicodeRange(characters: Iterable<number>): string;
