import type { Insulation, TradeSize, WireSize } from '../../src/run/run-document';

/**
 * Title: most conductors of one size in EMT, for tests.
 * Source: NEC Annex C Table C.1 (THHN from photographs of 2017; THW from a contractor’s reference page).
 * Edition: 2017.
 * Cross-checked: reproduced from Tables 1, 4 and 5 in every cell but one.
 * Units: conductors.
 * Confidence: high; THW 1 AWG in trade size 1 was hard to read.
 */
// prettier-ignore
export const ANNEX_C1_SIZES: readonly TradeSize[] = ['1/2', '3/4', '1', '1-1/4', '1-1/2', '2', '2-1/2', '3', '3-1/2', '4'];

// prettier-ignore
export const ANNEX_C1: readonly (readonly [Insulation, WireSize, readonly number[]])[] = [
  ['THHN', '14', [12, 22, 35, 61, 84, 138, 241, 364, 476, 608]],
  ['THHN', '12', [9, 16, 26, 45, 61, 101, 176, 266, 347, 443]],
  ['THHN', '10', [5, 10, 16, 28, 38, 63, 111, 167, 219, 279]],
  ['THHN', '8', [3, 6, 9, 16, 22, 36, 64, 96, 126, 161]],
  ['THHN', '6', [2, 4, 7, 12, 16, 26, 46, 69, 91, 116]],
  ['THHN', '4', [1, 2, 4, 7, 10, 16, 28, 43, 56, 71]],
  ['THHN', '3', [1, 1, 3, 6, 8, 13, 24, 36, 47, 60]],
  ['THHN', '2', [1, 1, 3, 5, 7, 11, 20, 30, 40, 51]],
  ['THHN', '1', [1, 1, 1, 4, 5, 8, 15, 22, 29, 37]],
  ['THHN', '1/0', [1, 1, 1, 3, 4, 7, 12, 19, 25, 32]],
  ['THHN', '2/0', [0, 1, 1, 2, 3, 6, 10, 16, 20, 26]],
  ['THHN', '3/0', [0, 1, 1, 1, 3, 5, 8, 13, 17, 22]],
  ['THHN', '4/0', [0, 1, 1, 1, 2, 4, 7, 11, 14, 18]],
  ['THHN', '250', [0, 0, 1, 1, 1, 3, 6, 9, 11, 15]],
  ['THHN', '300', [0, 0, 1, 1, 1, 3, 5, 7, 10, 13]],
  ['THHN', '350', [0, 0, 1, 1, 1, 2, 4, 6, 9, 11]],
  ['THHN', '400', [0, 0, 0, 1, 1, 1, 4, 6, 8, 10]],
  ['THHN', '500', [0, 0, 0, 1, 1, 1, 3, 5, 6, 8]],
  ['THHN', '600', [0, 0, 0, 1, 1, 1, 2, 4, 5, 7]],
  ['THHN', '700', [0, 0, 0, 1, 1, 1, 2, 3, 4, 6]],
  ['THHN', '750', [0, 0, 0, 0, 1, 1, 1, 3, 4, 5]],
  ['THHN', '800', [0, 0, 0, 0, 1, 1, 1, 3, 4, 5]],
  ['THHN', '900', [0, 0, 0, 0, 1, 1, 1, 3, 3, 4]],
  ['THHN', '1000', [0, 0, 0, 0, 1, 1, 1, 2, 3, 4]],
  ['THW', '14', [8, 15, 25, 43, 58, 96, 168, 254, 332, 424]],
  ['THW', '12', [6, 11, 19, 33, 45, 74, 129, 195, 255, 326]],
  ['THW', '10', [5, 8, 14, 24, 33, 55, 96, 145, 190, 243]],
  ['THW', '8', [2, 5, 8, 13, 18, 30, 53, 81, 105, 135]],
  ['THW', '6', [1, 3, 4, 8, 11, 18, 32, 48, 63, 81]],
  ['THW', '4', [1, 1, 3, 6, 8, 13, 24, 36, 47, 60]],
  ['THW', '3', [1, 1, 3, 5, 7, 12, 20, 31, 40, 52]],
  ['THW', '2', [1, 1, 2, 4, 6, 10, 17, 26, 34, 44]],
  ['THW', '1', [1, 1, 1, 3, 4, 7, 12, 18, 24, 31]],
  ['THW', '1/0', [0, 1, 1, 2, 3, 6, 10, 16, 20, 26]],
  ['THW', '2/0', [0, 1, 1, 1, 3, 5, 9, 13, 17, 22]],
  ['THW', '3/0', [0, 1, 1, 1, 2, 4, 7, 11, 15, 19]],
  ['THW', '4/0', [0, 0, 1, 1, 1, 3, 6, 9, 12, 16]],
];

/** 0.598 / 0.0507 = 11.795, just under 0.8: the calculation gives 11 where two prints of the annex have 12. */
export const ANNEX_C1_DIFFERENCE = {
  insulation: 'THHN',
  size: '6',
  tradeSize: '1-1/4',
  annex: 12,
  computed: 11,
} as const;
