const FRACTIONS: Record<string, number> = { '½': 0.5, '¼': 0.25, '¾': 0.75 };
const ANGLE =
  /^(-)?(\d{0,4})(?:([.]\d{1,6})|\s*([½¼¾])|\s+(\d)\s*[/⁄]\s*(\d))?\s*(?:°|deg|degrees)?$/;

/**
 * An angle as it is typed, degrees; null where it is none.
 * Example: `22½`, `22.5`, `22 1/2` and `22,5°` are 22.5.
 */
export function parseAngle(text: string): number | null {
  const match = ANGLE.exec(text.trim().toLowerCase().replace(',', '.'));
  if (!match) return null;
  const [, minus, whole = '', decimals, sign, numerator, denominator] = match;
  if (whole === '' && !decimals && !sign) return null;
  if (denominator === '0') return null;
  const fraction = sign
    ? (FRACTIONS[sign] ?? 0)
    : denominator
      ? Number(numerator) / Number(denominator)
      : Number(decimals ?? 0);
  const size = Number(whole || 0) + fraction;
  return minus ? -size : size;
}
