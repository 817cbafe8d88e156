import type { Insulation, WireSize } from '../run/run-document';

/** Size, then the most conductors of XHHW or THW, then of THHN; fittings inside and outside the conduit. */
type Row = readonly [WireSize, number, number, number, number];

/**
 * Title: most insulated conductors in trade size 3/8 flexible metal conduit.
 * Source: NEC Table 348.22; 350.22(B) takes its outside-fitting columns for LFMC.
 * Edition: 2023 and 2020.
 * Cross-checked: two transcriptions equal.
 * Units: conductors; one equipment grounding conductor of the same size may be added.
 * Confidence: high.
 */
// prettier-ignore
export const THREE_EIGHTHS_TABLE: readonly Row[] = [
  ['18', 3, 5, 5, 8],
  ['16', 3, 4, 4, 6],
  ['14', 2, 3, 3, 4],
  ['12', 1, 2, 2, 3],
  ['10', 1, 1, 1, 1],
];

/**
 * The most conductors of one size in 3/8 FMC or LFMC; null where the table has no row for them. FMC is read with its
 * fittings inside, the smaller figure; LFMC takes the outside-fitting columns.
 *
 * @example threeEighthsCount('FMC', 'THHN', '12') // 2
 */
export function threeEighthsCount(
  type: 'FMC' | 'LFMC',
  insulation: Insulation,
  size: WireSize,
): number | null {
  const row = THREE_EIGHTHS_TABLE.find(([rowSize]) => rowSize === size);
  if (!row) return null;
  const outside = type === 'LFMC';
  if (insulation === 'THHN') return outside ? row[4] : row[3];
  if (insulation === 'XHHW-2' || insulation === 'THW') return outside ? row[2] : row[1];
  return null;
}
