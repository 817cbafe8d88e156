import type { Spacing } from './scale';

export type StripVariant = 'desk' | 'phone' | 'compact-height';

/** Sizes of one kind of strip, px. A row of height 0 is not drawn. */
export interface StripLook {
  /** Left of the drawing, for the names and limits of the lanes; 0: limits stand over their line instead. */
  gutter: number;
  /** Between the ends of the run and the sides. */
  side: number;
  /** Kept clear between a text and the sides. */
  edge: number;
  text: number;
  /** Of names and of the axis; what counts is always 600. */
  weight: 400 | 600;
  pen: number;
  tickPen: number;
  halfBox: number;
  /** Between the walls of the conduit. */
  bore: number;
  /** Height of the tick of a 90 over the upper wall. */
  tick: number;
  spacing: Spacing;
  /** The row of pulls with its words, the row of the limit over the tension, and the tension itself. */
  pulls: number;
  tensionNote: number;
  tension: number;
  labelRows: 0 | 1 | 2;
  labelRow: number;
  names: number;
  height: number;
  limitRow: number;
  degrees: number;
  leastOver: number;
  totals: number;
  axis: number;
  axisApart: number;
}

const DESK: StripLook = {
  gutter: 104,
  side: 20,
  edge: 4,
  text: 12.5,
  weight: 400,
  pen: 2,
  tickPen: 3,
  halfBox: 10,
  bore: 9,
  tick: 24,
  spacing: { inside: 6, between: 13, beside: 4 },
  pulls: 34,
  tensionNote: 16,
  tension: 64,
  labelRows: 2,
  labelRow: 16,
  names: 22,
  height: 36,
  limitRow: 0,
  degrees: 66,
  leastOver: 11,
  totals: 20,
  axis: 30,
  axisApart: 58,
};

const PHONE: StripLook = {
  ...DESK,
  gutter: 0,
  side: 18,
  text: 14,
  tickPen: 3.5,
  halfBox: 12,
  bore: 10,
  tick: 22,
  spacing: { inside: 7, between: 14, beside: 5 },
  pulls: 36,
  tensionNote: 18,
  tension: 40,
  labelRows: 1,
  labelRow: 18,
  names: 22,
  limitRow: 16,
  degrees: 47,
  leastOver: 14,
  totals: 22,
  axis: 28,
  axisApart: 64,
};

/** For a screen held sideways: the run and its degrees. */
const COMPACT_HEIGHT: StripLook = {
  ...PHONE,
  pulls: 0,
  tensionNote: 0,
  tension: 0,
  labelRows: 0,
  tick: 10,
  halfBox: 9,
  names: 20,
  height: 0,
  limitRow: 0,
  degrees: 22,
  leastOver: 6,
  totals: 20,
  axis: 0,
};

const LOOKS: Record<StripVariant, StripLook> = {
  desk: DESK,
  phone: PHONE,
  'compact-height': COMPACT_HEIGHT,
};
const SUN_PEN = 3;
const SUN_TEXT = 14;

/** Sizes by variant; in the sun every line is 3 px or more and every label 14 px or more and semi-bold. */
export function stripLook(variant: StripVariant, sun: boolean): StripLook {
  const look = LOOKS[variant];
  if (!sun) return look;
  const text = Math.max(look.text, SUN_TEXT);
  return { ...look, pen: SUN_PEN, tickPen: SUN_PEN + 1, text, weight: 600 };
}
