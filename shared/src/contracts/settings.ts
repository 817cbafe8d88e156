import type {
  CodeEdition,
  FrictionBand,
  PullConditions,
  RacewayType,
  TradeSize,
} from '../run/run-document';

/** How a company pulls: every run may say otherwise. lbf; lb/ft for sidewall; null: none set, or by what is pulled. */
export interface PullSettings {
  friction: FrictionBand;
  ropeFriction: number;
  crew: { feeding: number; pulling: number };
  /** null: by the size of the conductors and by who feeds. */
  feedTension: number | null;
  /** null: tied head up to 8 AWG, basket grip above. */
  attachment: NonNullable<PullConditions['attachment']> | null;
  limits: {
    handOne: number;
    handTwo: number;
    puller: number | null;
    /** Breaking strength of the rope. */
    rope: number | null;
    sidewall: { caution: number; stop: number };
  };
}

/** What a company sets once; a run may override it, a limit only by being tighter. */
export interface CompanySettings {
  code: CodeEdition;
  /** The strict reading (any offset as a 90) over the limit: silent, a note, or a caution. */
  strictReading: 'never' | 'mention' | 'warn';
  /** The shop's own limit between pull points, degrees; null: none. */
  maxDegrees: number | null;
  /** The benders a shop owns: centre-line radius, in. */
  benders: { type: RacewayType; tradeSize: TradeSize; radius: number }[];
  pull: PullSettings;
}

export const DEFAULT_SETTINGS: CompanySettings = {
  code: 'NEC-2023',
  strictReading: 'mention',
  maxDegrees: null,
  benders: [],
  pull: {
    friction: { low: 0.2, likely: 0.35, high: 0.5 },
    ropeFriction: 0.2,
    crew: { feeding: 1, pulling: 1 },
    feedTension: null,
    attachment: null,
    limits: {
      handOne: 50,
      handTwo: 110,
      puller: null,
      rope: null,
      sidewall: { caution: 500, stop: 1000 },
    },
  },
};
