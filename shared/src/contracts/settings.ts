import type { CodeEdition, RacewayType, TradeSize } from '../run/run-document';

/** What a company sets once; a run may override it, a limit only by being tighter. */
export interface CompanySettings {
  code: CodeEdition;
  /** The strict reading (any offset as a 90) over the limit: silent, a note, or a caution. */
  strictReading: 'never' | 'mention' | 'warn';
  /** The shop's own limit between pull points, degrees; null: none. */
  maxDegrees: number | null;
  /** The benders a shop owns: centre-line radius, in. */
  benders: { type: RacewayType; tradeSize: TradeSize; radius: number }[];
}

export const DEFAULT_SETTINGS: CompanySettings = {
  code: 'NEC-2023',
  strictReading: 'mention',
  maxDegrees: null,
  benders: [],
};
