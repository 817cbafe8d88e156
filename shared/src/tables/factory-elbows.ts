import type { TradeSize } from '../run/run-document';

/**
 * Title: centre-line radius of standard factory elbows.
 * Source: steel conduit makers’ lists of elbows (1-1/2 to 4); 1/2 to 1-1/4, 5 and 6 from memory.
 * Cross-checked: equal to the one-shot column of NEC Chapter 9 Table 2, size by size.
 * Units: in.
 * Confidence: high for 1-1/2 to 4, medium-high otherwise.
 */
// prettier-ignore
export const FACTORY_ELBOWS: readonly (readonly [TradeSize, number])[] = [
  ['1/2', 4], ['3/4', 4.5], ['1', 5.75], ['1-1/4', 7.25], ['1-1/2', 8.25], ['2', 9.5], ['2-1/2', 10.5], ['3', 13], ['3-1/2', 15], ['4', 16], ['5', 24], ['6', 30],
];
