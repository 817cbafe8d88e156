/** Why a text is not a length; the words stand under the same key. */
export type LengthRefusal =
  'empty' | 'unreadable' | 'inches-over-twelve' | 'over-zero' | 'two-numbers' | 'feet-fraction';

export type ParsedLength = { ok: true; inches: number } | { ok: false; code: LengthRefusal };

/** Nobody types a longer one; a text pasted by mistake is refused before anything reads it. */
const LONGEST = 64;
const SIXTY_FOURTHS = 64;
const MM_PER_INCH = 25.4;

const VULGAR: Record<string, string> = {
  '½': '1/2',
  '¼': '1/4',
  '¾': '3/4',
  '⅛': '1/8',
  '⅜': '3/8',
  '⅝': '5/8',
  '⅞': '7/8',
};

/** One spelling for quotes, primes, slashes, dashes, fractions and the words for feet and inches. */
function normalise(text: string): string {
  return text
    .toLowerCase()
    .replace(/[½¼¾⅛⅜⅝⅞]/g, (glyph) => ` ${VULGAR[glyph] ?? ''}`)
    .replace(/[\u2044\u2215]/g, '/')
    .replace(/[\u2010-\u2015\u2212]/g, '-')
    .replace(/''|[\u201c\u201d\u2033\u3003]/g, '"')
    .replace(/[\u2018\u2019\u2032\u00b4`]/g, "'")
    .replace(/\s*(feet|foot|ft)\.?/g, "'")
    .replace(/\s*(inches|inch|in)\.?/g, '"')
    .replace(/\s+/g, ' ')
    .trim();
}

const METRIC = /^(-?(?:\d+(?:\.\d*)?|\.\d+)) ?(mm|cm|m)$/;
const TO_MM: Record<string, number> = { mm: 1, cm: 10, m: 1000 };

/** Sign, feet, then whatever stands for inches. */
const WITH_FEET = /^(-?) ?(\d+(?:\.\d*)?|\.\d+) ?'(?:[ -]? ?(.+))?$/;
const FEET_FRACTION = /^-? ?(\d+[ -])?\d+ ?\/ ?\d+ ?'/;
/** Feet and inches without a mark need a fraction to be told apart: 3-4-5/8, 3-4 5/8, 3 4 5/8. */
const BARE_FEET = /^(-?) ?(\d+)[ -](\d+)[ -](\d+) ?\/ ?(\d+) ?"?$/;
/** Inches: 40 5/8, 4-5/8, 5/8, 40.625, .5, 40. */
const MIXED = /^(?:(\d+)[ -])?(\d+) ?\/ ?(\d+) ?"?$/;
const DECIMAL = /^(\d+(?:\.\d*)?|\.\d+) ?"?$/;
const TWO_NUMBERS = /^-? ?[\d.]+[ -][\d.]+ ?"?$/;

/**
 * Reads a length as it is typed in the trade: feet, inches and fractions in the usual forms, or metric with its unit. A
 * bare number is inches. US lengths snap to 1/64 in; metric ones keep mm / 25.4.
 * Returns decimal inches, or why the text is refused. Never throws.
 *
 * @example parseLength("3' 4 5/8\"") // { ok: true, inches: 40.625 }
 */
export function parseLength(text: string): ParsedLength {
  if (text.trim() === '') return refused('empty');
  if (text.length > LONGEST) return refused('unreadable');
  const typed = normalise(text);
  const metric = METRIC.exec(typed);
  if (metric)
    return { ok: true, inches: (Number(metric[1]) * (TO_MM[metric[2] ?? ''] ?? 0)) / MM_PER_INCH };
  if (FEET_FRACTION.test(typed)) return refused('feet-fraction');
  const feet = WITH_FEET.exec(typed);
  if (feet) return withFeet(feet[1], feet[2], feet[3]);
  const bare = BARE_FEET.exec(typed);
  if (bare) return withFeet(bare[1], bare[2], `${bare[3]} ${bare[4]}/${bare[5]}`);
  if (TWO_NUMBERS.test(typed)) return refused('two-numbers');
  const negative = typed.startsWith('-');
  const inches = readInches(negative ? typed.slice(1).trim() : typed);
  return inches.ok ? snapped(negative ? -inches.inches : inches.inches) : inches;
}

const refused = (code: LengthRefusal): ParsedLength => ({ ok: false, code });

function snapped(inches: number): ParsedLength {
  const snappedInches = Math.round(inches * SIXTY_FOURTHS) / SIXTY_FOURTHS;
  // Adding 0 turns −0 into 0.
  return Number.isFinite(snappedInches)
    ? { ok: true, inches: snappedInches + 0 }
    : refused('unreadable');
}

function withFeet(sign = '', feet = '', rest?: string): ParsedLength {
  const inches: ParsedLength = rest === undefined ? { ok: true, inches: 0 } : readInches(rest);
  if (!inches.ok) return inches;
  if (inches.inches >= 12) return refused('inches-over-twelve');
  // 3.5' 4" says feet twice.
  if (feet.includes('.') && inches.inches > 0) return refused('unreadable');
  const total = Number(feet) * 12 + inches.inches;
  return snapped(sign === '-' ? -total : total);
}

function readInches(typed: string): ParsedLength {
  const decimal = DECIMAL.exec(typed);
  if (decimal) return { ok: true, inches: Number(decimal[1]) };
  const mixed = MIXED.exec(typed);
  if (!mixed) return refused(TWO_NUMBERS.test(typed) ? 'two-numbers' : 'unreadable');
  const [, whole, top, bottom] = mixed;
  if (Number(bottom) === 0) return refused('over-zero');
  // 1 9/8 is a slip; 9/8 alone is not.
  if (whole !== undefined && Number(top) >= Number(bottom)) return refused('unreadable');
  return { ok: true, inches: Number(whole ?? 0) + Number(top) / Number(bottom) };
}
