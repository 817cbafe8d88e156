const QUARTERS: Record<number, string> = { 25: '¼', 50: '½', 75: '¾' };

/**
 * Degrees as every output shows them: quarters as fractions, anything else to 0.01.
 *
 * @example formatAngle(22.5) // "22½°"
 */
export function formatAngle(degrees: number): string {
  if (!Number.isFinite(degrees)) throw new RangeError(`not an angle: ${degrees}`);
  const hundredths = Math.round(Math.abs(degrees) * 100);
  const whole = Math.floor(hundredths / 100);
  const fraction = QUARTERS[hundredths % 100];
  const sign = degrees < 0 && hundredths > 0 ? '−' : '';
  if (fraction) return `${sign}${whole > 0 ? whole : ''}${fraction}°`;
  return `${sign}${hundredths / 100}°`;
}
