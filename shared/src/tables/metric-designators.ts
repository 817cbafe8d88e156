import type { TradeSize } from '../run/run-document';

/**
 * Title: metric designators of trade sizes.
 * Source: NEC Table 300.1(C).
 * Edition: 2023 and 2026.
 * Cross-checked: three transcriptions and the Steel Tube Institute.
 * Units: none.
 * Confidence: high.
 */
// prettier-ignore
export const METRIC_DESIGNATORS: Record<TradeSize, number> = {
  '3/8': 12, '1/2': 16, '3/4': 21, '1': 27, '1-1/4': 35, '1-1/2': 41, '2': 53, '2-1/2': 63, '3': 78, '3-1/2': 91, '4': 103, '5': 129, '6': 155,
};
