export interface LengthFormat {
  /** The finest part of an inch shown: 64 (default), 32, 16, 8, 4, 2 or 1 for whole inches. */
  to?: number;
  /** Plain characters for files and text messages: 3' 4-5/8". */
  ascii?: boolean;
  /** Millimetres instead, to 1 mm; 0.1 mm below 100. */
  metric?: boolean;
}

const MM_PER_INCH = 25.4;

/**
 * A length as every output shows it: feet and inches with primes, the inches as a fraction in lowest terms. Rounding
 * carries: 11 31/32 to 1/16 is 1′ 0″.
 *
 * @example formatLength(40.625) // "3′ 4 5⁄8″"
 * @example formatLength(40.625, { ascii: true }) // 3' 4-5/8"
 */
export function formatLength(inches: number, format: LengthFormat = {}): string {
  if (!Number.isFinite(inches)) throw new RangeError(`not a length: ${inches}`);
  if (format.metric) return formatMetric(inches, format.ascii === true);
  const { to = 64, ascii = false } = format;
  const parts = Math.round(Math.abs(inches) * to);
  const feet = Math.floor(parts / (12 * to));
  const inchParts = parts - feet * 12 * to;
  const shown = inchesText(Math.floor(inchParts / to), inchParts % to, to, ascii);
  const sign = inches < 0 && parts > 0 ? (ascii ? '-' : '−') : '';
  const [footMark, inchMark] = ascii ? ["'", '"'] : ['′', '″'];
  return feet > 0 ? `${sign}${feet}${footMark} ${shown}${inchMark}` : `${sign}${shown}${inchMark}`;
}

function inchesText(whole: number, top: number, bottom: number, ascii: boolean): string {
  if (top === 0) return String(whole);
  const divisor = greatestDivisor(top, bottom);
  const fraction = `${top / divisor}${ascii ? '/' : '⁄'}${bottom / divisor}`;
  return whole === 0 ? fraction : `${whole}${ascii ? '-' : ' '}${fraction}`;
}

const greatestDivisor = (a: number, b: number): number => (b === 0 ? a : greatestDivisor(b, a % b));

function formatMetric(inches: number, ascii: boolean): string {
  const mm = Math.abs(inches) * MM_PER_INCH;
  const rounded = mm < 100 ? Math.round(mm * 10) / 10 : Math.round(mm);
  const sign = inches < 0 && rounded > 0 ? (ascii ? '-' : '−') : '';
  return `${sign}${rounded} mm`;
}
