import type { WireSize } from '../run/run-document';
import type { InsulatedType } from './insulated-conductors';

/** Size, bare diameter in, then diameter in and area in² of RHW-2 uncovered, THW, THHN, XHHW-2; null: not made. */
type Row = readonly [
  WireSize,
  number,
  ...[number | null, number | null, number | null, number | null],
  ...[number | null, number | null, number | null, number | null],
];

/**
 * Title: compact-stranded building wire, nominal dimensions.
 * Source: NEC Chapter 9 Table 5A.
 * Edition: 2026; equal to 2014.
 * Cross-checked: 75 of 75 areas equal in a transcription of 2014.
 * Units: in, in².
 * Confidence: high.
 */
// prettier-ignore
export const COMPACT_TABLE: readonly Row[] = [
  ['8', 0.134, 0.26, 0.0531, 0.255, 0.051, null, null, 0.224, 0.0394],
  ['6', 0.169, 0.295, 0.0683, 0.29, 0.066, 0.24, 0.0452, 0.26, 0.053],
  ['4', 0.213, 0.335, 0.0881, 0.335, 0.0881, 0.305, 0.073, 0.305, 0.073],
  ['2', 0.268, 0.39, 0.1194, 0.39, 0.1194, 0.36, 0.1017, 0.36, 0.1017],
  ['1', 0.299, 0.465, 0.1698, 0.465, 0.1698, 0.415, 0.1352, 0.415, 0.1352],
  ['1/0', 0.336, 0.5, 0.1963, 0.5, 0.1963, 0.45, 0.159, 0.45, 0.159],
  ['2/0', 0.376, 0.54, 0.229, 0.545, 0.2332, 0.495, 0.1924, 0.49, 0.1885],
  ['3/0', 0.423, 0.59, 0.2733, 0.59, 0.2733, 0.54, 0.229, 0.54, 0.229],
  ['4/0', 0.475, 0.64, 0.3217, 0.645, 0.3267, 0.595, 0.278, 0.59, 0.2733],
  ['250', 0.52, 0.715, 0.4015, 0.725, 0.4128, 0.67, 0.3525, 0.66, 0.3421],
  ['300', 0.57, 0.765, 0.4596, 0.775, 0.4717, 0.72, 0.4071, 0.715, 0.4015],
  ['350', 0.616, 0.81, 0.5153, 0.82, 0.5281, 0.77, 0.4656, 0.76, 0.4536],
  ['400', 0.659, 0.855, 0.5741, 0.865, 0.5876, 0.815, 0.5216, 0.8, 0.5026],
  ['500', 0.736, 0.93, 0.6793, 0.94, 0.6939, 0.885, 0.6151, 0.88, 0.6082],
  ['600', 0.813, 1.035, 0.8413, 1.05, 0.8659, 0.985, 0.762, 0.98, 0.7542],
  ['700', 0.877, 1.1, 0.9503, 1.11, 0.9676, 1.05, 0.8659, 1.05, 0.8659],
  ['750', 0.908, 1.135, 1.0118, 1.15, 1.0386, 1.075, 0.9076, 1.09, 0.9331],
  ['900', 0.999, 1.24, 1.2076, 1.224, 1.1766, 1.194, 1.1196, 1.169, 1.0733],
  ['1000', 1.06, 1.285, 1.2968, 1.285, 1.2968, 1.255, 1.237, 1.23, 1.1882],
];

const FIRST_COLUMN: Partial<Record<InsulatedType, 2 | 4 | 6 | 8>> = {
  'RHW-2': 2,
  THW: 4,
  THHN: 6,
  'XHHW-2': 8,
};

/**
 * Diameter (in) and area (in²) of a compact conductor; null where Table 5A has no figure for it.
 *
 * @example compactConductor('THHN', '500') // { diameter: 0.885, area: 0.6151 }
 */
export function compactConductor(
  insulation: InsulatedType,
  size: WireSize,
): { diameter: number; area: number } | null {
  const column = FIRST_COLUMN[insulation];
  const row = COMPACT_TABLE.find(([rowSize]) => rowSize === size);
  if (!row || !column) return null;
  const diameter = row[column];
  const area = row[column === 8 ? 9 : column === 6 ? 7 : column === 4 ? 5 : 3];
  return diameter === null || area === null ? null : { diameter, area };
}

/** Bare diameter of a compact conductor, in; null where Table 5A has no row. */
export function compactBareDiameter(size: WireSize): number | null {
  return COMPACT_TABLE.find(([rowSize]) => rowSize === size)?.[1] ?? null;
}
