import type { FindingCode } from './finding-codes';
import type { RunCommand } from '../run/run-command';
import type { CodeEdition, Raceway, TradeSize, WireSize } from '../run/run-document';

/** What a check says about a place in the run. stop → Over limit, caution → Watch, note → OK with a line. */
export type Severity = 'stop' | 'caution' | 'note';
export type Status = 'ok' | 'watch' | 'over' | 'no-answer';

/** The rule behind a finding: where it stands and which edition was read. */
export interface RuleCitation {
  cite: string;
  edition: CodeEdition | null;
  source: string;
}

/** A change that would answer a finding, carried out by the editor's own commands. */
export interface Fix {
  /** Run in order as one undo step. */
  commands: RunCommand[];
  /** Which sentence names it; see `words/en/findings.json` under `fix`. */
  kind:
    | 'change-angle'
    | 'add-pull-point'
    | 'make-accessible'
    | 'break-pull'
    | 'larger-raceway'
    | 'longer-leg'
    | 'larger-radius';
  values: Record<string, number | string | boolean | null>;
  /** What it changes. */
  delta: { degrees: number | null; lbf: number | null; inches: number | null };
}

/** Data, never prose: `words` turns it into a sentence. Codes stand in `finding-codes.ts`. */
export interface Finding {
  code: FindingCode;
  severity: Severity;
  at: { elementId?: string; sectionId?: string; pullId?: string };
  values: Record<string, number | string | boolean | null>;
  rule: RuleCitation | null;
  /** Filled by `suggest-fixes`; at most four, best first. */
  fixes?: Fix[];
}

/** A value nobody gave, what was taken instead and on whose word. `path` is a JSON pointer into the document. */
export interface Assumed {
  path: string;
  value: unknown;
  from: 'settings' | 'default' | 'table';
  source: string;
}

export interface SectionBend {
  elementId: string;
  /** Degrees this element adds (0 when it is listed but not counted). */
  angle: number;
  /** Degrees since the pull point, with this element. */
  cumulative: number;
}

export type NoFillReason = 'no-conductors' | 'no-size';

export interface FillAnswer {
  /** Percent of the raceway's area, unrounded. */
  percent: number;
  limitPercent: number;
  /** in². */
  conductorArea: number;
  /** in², of the smallest bore in the section. */
  racewayArea: number;
  raceway: Raceway;
  nipple: boolean;
  conductors: number;
  /** True when only the 0.8 rounding of Chapter 9 Note 7 lets it pass. */
  byRounding: boolean;
  /** How many more of each size already in the section still fit. */
  room: Partial<Record<WireSize, number>>;
}

export interface JamAnswer {
  /** Bore over conductor diameter. */
  ratio: number;
  /** The same with a bore 5 % larger, as a bend leaves it. */
  ratioWithOvality: number;
  risk: 'clear' | 'possible';
}

export interface SectionAnalysis {
  /** The first pull point's id. */
  id: string;
  from: string;
  to: string;
  /** Developed length, in; null where lengths were not given. */
  length: number | null;
  degrees: number;
  strictDegrees: number;
  limitDegrees: number;
  /** Which limit is the tightest. */
  limitFrom: 'code' | 'job' | 'company' | 'telecom';
  /** May be negative. */
  remainingDegrees: number;
  bends: SectionBend[];
  fill: FillAnswer | null;
  noFill: NoFillReason | null;
  /** null where jamming does not apply (not three equal single conductors, or no bend). */
  jam: JamAnswer | null;
  /** Room over the conductors, in; null without conductors. */
  clearance: number | null;
}

/** A figure at low, likely and high friction. */
export interface Band {
  low: number;
  likely: number;
  high: number;
}

/** Why a direction has no figures. `refused`: it cannot be pulled so; `unknown`: the run does not say enough. */
export type PullReason =
  | 'no-conductors'
  | 'no-dimensions'
  | 'no-lengths'
  | 'no-directions'
  | 'no-radius'
  | 'existing-conductors'
  | 'does-not-fit'
  | 'not-accessible'
  | 'set-changes'
  | 'turns-without-sheave';

export const STOP_LIMITS = ['conductor', 'attachment', 'sidewall', 'puller', 'rope'] as const;
export type StopLimit = (typeof STOP_LIMITS)[number];

/** The limit that gives first at likely friction. */
export interface Governing {
  limit: StopLimit;
  /** lbf; lb/ft for sidewall. */
  value: number;
  allowed: number;
  /** value / allowed. */
  ratio: number;
  /** The friction at which it is reached, up to 1.2; null: not by then, or always. */
  reachedAt: number | null;
}

export interface ProfilePoint {
  elementId: string;
  /** Station, in, from the run's first pull point. */
  station: number;
  /** lbf in the cable when its head is here. */
  tension: Band;
  /** lb/ft on the worst conductor, leaving a bend. */
  sidewall: Band | null;
  /** What a gauge at the puller reads for each lbf at the head: the rope in the bends ahead, e^(μφ). */
  ropeFactor: number;
}

/** A pull in one direction: fed at one end, pulled at the other. lbf, lb/ft. */
export interface PullDirection {
  status: 'ok' | 'unknown' | 'refused';
  reason: PullReason | null;
  /** Where the reason lies. */
  reasonAt: string | null;
  feedAt: string;
  pullAt: string;
  /** lbf at the feed, as given or by default. */
  feed: number;
  /** At the puller when the head arrives. */
  tension: Band | null;
  /** The most the head feels anywhere on the way. */
  peak: Band | null;
  /** To be held at the feed; 0 where the feed tension holds it. */
  holdBack: Band | null;
  peakSidewall: Band | null;
  /** The bend of the largest sidewall pressure. */
  peakSidewallAt: string | null;
  governing: Governing | null;
  profile: ProfilePoint[];
}

export type PullMethod = 'easy' | 'one' | 'two' | 'puller' | 'not-as-drawn';

export interface MethodAnswer {
  likely: PullMethod;
  high: PullMethod;
  /** The friction above which a harder method is needed; null: none up to 1.2. */
  flipsAt: number | null;
  /** What it then is. */
  flipsTo: PullMethod | null;
}

export type Configuration = 'single' | 'two' | 'triangular' | 'cradled' | 'diamond' | 'complex';

export interface PullAnalysis {
  id: string;
  from: string;
  to: string;
  /** Pull points it goes straight through. */
  through: string[];
  /** Sections it goes through, by id. */
  sectionIds: string[];
  /** Of the section where it corrects the weight most; null without a set that fits. */
  configuration: Configuration | null;
  weightCorrection: number | null;
  /** lb/ft of the whole set. */
  weight: number | null;
  /** Fed at `from`, pulled at `to`. */
  forward: PullDirection;
  reverse: PullDirection;
  recommended: 'forward' | 'reverse' | null;
  /** Why none is recommended. */
  noneBecause: 'hold-back' | 'no-reach' | 'no-answer' | null;
  /** The direction the plan asks for, else the recommended one, else the easier of the two. */
  planned: 'forward' | 'reverse';
  method: MethodAnswer | null;
  limits: {
    conductor: number;
    attachment: number;
    sidewall: { caution: number; stop: number };
    handOne: number;
    handTwo: number;
    puller: number | null;
    rope: number | null;
  } | null;
  attachment: 'eye' | 'basket-grip' | 'tied-head';
  friction: Band;
  ropeFriction: number;
}

export const CHECKS = [
  'degrees',
  'access',
  'tension',
  'fill',
  'jam',
  'sidewall',
  'clearance',
  'radius',
  'bend-fits-leg',
  'length',
  'directions',
] as const;
export type CheckName = (typeof CHECKS)[number];

/** One line of the verdict row: the worst place of one check. */
export interface Verdict {
  check: CheckName;
  status: Status;
  /** Where the worst is. */
  sectionId: string | null;
  elementId: string | null;
  /** The figures the words need; see `words/word-verdict.ts`. */
  values: Record<string, number | string | boolean | null>;
}

export interface RunAnalysis {
  engineVersion: string;
  totals: {
    /** Developed length, in; null where lengths were not given. */
    length: number | null;
    degrees: number;
    sections: number;
    pullPoints: number;
  };
  sections: SectionAnalysis[];
  pulls: PullAnalysis[];
  verdicts: Verdict[];
  /** The worst status of all verdicts. */
  status: Status;
  findings: Finding[];
  assumed: Assumed[];
}

/** Where pull points and bends stand along a run: enough to draw the compact strip of a list row. */
export interface StripSummary {
  /** in; equal steps when null. */
  length: number | null;
  pullPoints: { station: number; accessible: boolean }[];
  bends: { station: number; angle: number }[];
  sections: { from: number; to: number; degrees: number; limit: number; status: Status }[];
}

/** The columns lists sort and filter by, made by the server on every save. */
export interface RunSummary {
  status: Status;
  lengthInches: number | null;
  degrees: number;
  worstSectionDegrees: number;
  remainingDegrees: number;
  fillPercent: number | null;
  sections: number;
  pullPoints: number;
  racewayType: string;
  tradeSize: TradeSize | null;
  from: string;
  to: string;
  strip: StripSummary;
}
