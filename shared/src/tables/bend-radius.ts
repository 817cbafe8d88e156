import type { RacewayType, TradeSize } from '../run/run-document';

/** Trade size, one-shot and full-shoe benders in, other bends in, the two in mm. */
type Row = readonly [TradeSize, number, number, number, number];

/**
 * Title: minimum radius of bends, to the centre line.
 * Source: NEC Chapter 9 Table 2.
 * Edition: 2026, identical to 2011.
 * Cross-checked: every cell equal in a 2011 handbook; the one-shot column equals the standard radii of factory elbows in steel
 * makers’ lists.
 * Units: in; mm.
 * Confidence: high.
 */
// prettier-ignore
export const BEND_RADIUS_TABLE: readonly Row[] = [
  ['1/2', 4.0, 4.0, 101.6, 101.6],
  ['3/4', 4.5, 5.0, 114.3, 127],
  ['1', 5.75, 6.0, 146.05, 152.4],
  ['1-1/4', 7.25, 8.0, 184.15, 203.2],
  ['1-1/2', 8.25, 10.0, 209.55, 254],
  ['2', 9.5, 12.0, 241.3, 304.8],
  ['2-1/2', 10.5, 15.0, 266.7, 381],
  ['3', 13.0, 18.0, 330.2, 457.2],
  ['3-1/2', 15.0, 21.0, 381, 533.4],
  ['4', 16.0, 24.0, 406.4, 609.6],
  ['5', 24.0, 30.0, 609.6, 762],
  ['6', 30.0, 36.0, 762, 914.4],
];

/**
 * Title: minimum radius of HDPE conduit bends.
 * Source: NEC Table 354.24 (2023: 354.24(A)), which 353.24 refers to.
 * Edition: 2023 and 2020.
 * Cross-checked: two transcriptions equal.
 * Units: in.
 * Confidence: high; sizes above 4 are left to the maker.
 */
// prettier-ignore
export const HDPE_RADIUS_TABLE: readonly (readonly [TradeSize, number])[] = [
  ['1/2', 10], ['3/4', 12], ['1', 14], ['1-1/4', 18], ['1-1/2', 20], ['2', 26], ['2-1/2', 36], ['3', 48], ['4', 60],
];

/** Which column each type takes (358.24, 342.24, 344.24, 352.24; 348.24, 350.24, 356.24, 362.24 as of 2023). */
const OTHER_BENDS: ReadonlySet<RacewayType> = new Set<RacewayType>([
  'FMC',
  'LFMC',
  'LFNC-A',
  'LFNC-B',
  'LFNC-C',
  'ENT',
]);

/**
 * The smallest centre-line radius of a raceway, in; null where no table gives one.
 * EMT, IMC, RMC and PVC: one-shot column; FMC, LFMC, LFNC and ENT: other bends; HDPE: Table 354.24.
 *
 * @example bendRadiusFor('EMT', '3/4') // 4.5
 */
export function bendRadiusFor(type: RacewayType, tradeSize: TradeSize): number | null {
  if (type === 'HDPE-40') {
    return HDPE_RADIUS_TABLE.find(([size]) => size === tradeSize)?.[1] ?? null;
  }
  const row = BEND_RADIUS_TABLE.find(([size]) => size === tradeSize);
  if (!row) return null;
  return OTHER_BENDS.has(type) ? row[2] : row[1];
}

/** Where the radius stands, for the citation: "Chapter 9 Table 2" or the HDPE table. */
export function bendRadiusSource(type: RacewayType): string {
  return type === 'HDPE-40' ? 'Table 354.24' : 'Chapter 9 Table 2';
}

/** The other-bends value, for the note beside RMC, IMC and PVC bends not made on a one-shot bender; null: no row. */
export function otherBendsRadius(tradeSize: TradeSize): number | null {
  return BEND_RADIUS_TABLE.find(([size]) => size === tradeSize)?.[2] ?? null;
}
