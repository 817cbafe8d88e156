/**
 * The run document: what is stored, exported, imported and analysed.
 *
 * Units: lengths in inches, angles in degrees, forces in pounds-force, weights in lb/ft, temperatures in °F.
 * The document is sparse: a field that was not given stays absent; the engine, not the parser, fills defaults.
 */
export const RUN_FORMAT = 'fairlead.run';
export const RUN_VERSION = 1;

export const CODE_EDITIONS = ['NEC-2017', 'NEC-2020', 'NEC-2023', 'NEC-2026'] as const;
export type CodeEdition = (typeof CODE_EDITIONS)[number];

export const RACEWAY_TYPES = [
  'EMT',
  'IMC',
  'RMC',
  'FMC',
  'LFMC',
  'LFNC-A',
  'LFNC-B',
  'LFNC-C',
  'ENT',
  'PVC-40',
  'PVC-80',
  'PVC-A',
  'PVC-EB',
  'HDPE-40',
] as const;
export type RacewayType = (typeof RACEWAY_TYPES)[number];

export const TRADE_SIZES = [
  '3/8',
  '1/2',
  '3/4',
  '1',
  '1-1/4',
  '1-1/2',
  '2',
  '2-1/2',
  '3',
  '3-1/2',
  '4',
  '5',
  '6',
] as const;
export type TradeSize = (typeof TRADE_SIZES)[number];

export const COMPASS = ['up', 'down', 'north', 'south', 'east', 'west'] as const;
/** A named direction, or degrees from north clockwise and degrees above level. */
export type Direction = (typeof COMPASS)[number] | { azimuth: number; elevation: number };

export const DEVICES = [
  'box',
  'pull-box',
  'conduit-body',
  'cabinet',
  'handhole',
  'manhole',
  'open-end',
] as const;
export type Device = (typeof DEVICES)[number];

export const CONDUIT_BODIES = ['LB', 'LL', 'LR', 'C', 'T', 'X', 'LU'] as const;
export type ConduitBody = (typeof CONDUIT_BODIES)[number];

export const FITTINGS = ['union', 'expansion', 'seal', 'offset-connector'] as const;
export type FittingKind = (typeof FITTINGS)[number];

export const WALLS = ['top', 'bottom', 'left', 'right', 'back', 'front'] as const;
export type Wall = (typeof WALLS)[number];

export interface Raceway {
  type: RacewayType;
  tradeSize: TradeSize;
  /** Centre-line bend radius in inches; null or absent takes the bender's or the table's. */
  bendRadius?: number | null;
}

export interface Turn {
  angle: number;
  toward?: Direction;
  sheaveRadius?: number;
}

export interface BoxEntry {
  wall: Wall;
  row: number;
  tradeSize: TradeSize;
  runId?: string;
}

export interface BoxSize {
  width: number;
  height: number;
  depth: number;
}

export interface PullPoint {
  kind: 'pull-point';
  id: string;
  device: Device;
  label?: string;
  /** Default true. */
  accessible?: boolean;
  body?: ConduitBody;
  turn?: Turn;
  /** Inches of free conductor; default 8. */
  makeUp?: number;
  /** Default true: people and the reel can work here. */
  reach?: boolean;
  place?: string;
  entries?: BoxEntry[];
  boxSize?: BoxSize;
  /** What leaves the pull point, when it changes here. */
  raceway?: Raceway;
}

export interface Straight {
  kind: 'straight';
  id: string;
  /** Inches along the centre line, corner to corner or from the box face. */
  length: number;
}

export type Made = 'field' | 'factory';

export interface Bend {
  kind: 'bend';
  id: string;
  angle: number;
  toward?: Direction;
  radius?: number;
  made?: Made;
  /** Default true; false lists a gentle sweep without counting it. */
  counts?: boolean;
  why?: string;
}

export interface Offset {
  kind: 'offset';
  id: string;
  rise: number;
  angle: number;
  toward?: Direction;
  radius?: number;
  made?: Made;
}

export interface Saddle3 {
  kind: 'saddle-3';
  id: string;
  height: number;
  /** The outer angle; the centre bend is twice it. */
  angle: number;
  toward?: Direction;
  radius?: number;
}

export interface Saddle4 {
  kind: 'saddle-4';
  id: string;
  height: number;
  /** Width of the object crossed. */
  width: number;
  angle: number;
  toward?: Direction;
  radius?: number;
}

export interface Flex {
  kind: 'flex';
  id: string;
  length: number;
  /** Planned total of its bends; default 90. */
  degrees?: number;
  raceway: Raceway;
}

export interface Fitting {
  kind: 'fitting';
  id: string;
  fitting: FittingKind;
  angle?: number;
}

export interface Transition {
  kind: 'transition';
  id: string;
  raceway: Raceway;
}

export type PathElement =
  PullPoint | Straight | Bend | Offset | Saddle3 | Saddle4 | Flex | Fitting | Transition;
export type ElementKind = PathElement['kind'];
export const ELEMENT_KINDS = [
  'pull-point',
  'straight',
  'bend',
  'offset',
  'saddle-3',
  'saddle-4',
  'flex',
  'fitting',
  'transition',
] as const satisfies readonly ElementKind[];

export const CONDUCTOR_USES = ['phase', 'neutral', 'ground', 'spare', 'existing'] as const;
export type ConductorUse = (typeof CONDUCTOR_USES)[number];
export const INSULATIONS = ['THHN', 'XHHW-2', 'THW', 'RHW-2', 'RHW-2-covered', 'bare'] as const;
export type Insulation = (typeof INSULATIONS)[number];
export const MATERIALS = ['Cu', 'Al'] as const;
export type Material = (typeof MATERIALS)[number];
export const STRANDINGS = ['solid', 'stranded', 'compact'] as const;
export type Stranding = (typeof STRANDINGS)[number];

export const WIRE_SIZES = [
  '18',
  '16',
  '14',
  '12',
  '10',
  '8',
  '6',
  '4',
  '3',
  '2',
  '1',
  '1/0',
  '2/0',
  '3/0',
  '4/0',
  '250',
  '300',
  '350',
  '400',
  '500',
  '600',
  '700',
  '750',
  '800',
  '900',
  '1000',
  '1250',
  '1500',
  '1750',
  '2000',
] as const;
export type WireSize = (typeof WIRE_SIZES)[number];

/** Reserved for conductor insulation: black, red, blue, white, green, brown, orange, yellow, grey, bare. */
export const WIRE_COLOURS = ['BK', 'RD', 'BL', 'WH', 'GN', 'BN', 'OR', 'YL', 'GY'] as const;
export type WireColour = (typeof WIRE_COLOURS)[number];
export const PHASES = ['A', 'B', 'C', 'N', 'G'] as const;
export type Phase = (typeof PHASES)[number];

interface ConductorGroupBase {
  id: string;
  count: number;
  use: ConductorUse;
  colour?: WireColour;
  /** Pull-point ids; absent: the whole run. */
  from?: string;
  to?: string;
  phase?: Phase;
}

export interface WireGroup extends ConductorGroupBase {
  size: WireSize;
  insulation: Insulation;
  material: Material;
  stranding: Stranding;
}

export interface Cable {
  name: string;
  /** Outside diameter, in. */
  od: number;
  /** lb/ft. */
  weight: number;
  /** lbf. */
  maxTension: number;
  conductors?: number;
  maxSidewall?: number;
  minBendRadius?: number;
}

export interface CableGroup extends ConductorGroupBase {
  cable: Cable;
}

export type ConductorGroup = WireGroup | CableGroup;

export interface RuleOverrides {
  maxDegrees?: number | null;
  maxSectionLength?: number | null;
  maxFillPercent?: number | null;
  minBendRadius?: number | null;
  /** What the limits come from, e.g. a specification section. */
  source?: string;
}

export interface Rules {
  code?: CodeEdition;
  profile?: 'power' | 'telecom';
  overrides?: RuleOverrides;
}

export interface Environment {
  ambient?: number | null;
  rooftopHeight?: number | null;
  wet?: boolean;
  buried?: boolean;
  temperatureChange?: number | null;
}

export interface Circuit {
  overcurrent?: number | null;
  terminations?: 60 | 75 | 90;
  wyeFourWire?: boolean;
  nonlinear?: boolean;
}

export interface PlannedPull {
  id: string;
  from: string;
  to: string;
  feedAt?: 'from' | 'to';
}

export interface FrictionBand {
  low: number;
  likely: number;
  high: number;
}

export interface PullConditions {
  friction?: FrictionBand;
  ropeFriction?: number;
  crew?: { feeding: number; pulling: number };
  feedTension?: number | { from: number; to: number };
  attachment?: 'eye' | 'basket-grip' | 'tied-head';
  lubricated?: boolean;
  ambientTemperature?: number | null;
  limits?: {
    handOne?: number | null;
    handTwo?: number | null;
    puller?: number | null;
    rope?: number | null;
    sidewall?: { caution?: number | null; stop?: number | null };
  };
}

export interface RunDocument {
  format: typeof RUN_FORMAT;
  version: typeof RUN_VERSION;
  tag: string;
  title?: string;
  rules?: Rules;
  raceway: Raceway;
  environment?: Environment;
  start?: { heading?: Direction };
  path: PathElement[];
  conductors?: ConductorGroup[];
  sets?: number;
  circuit?: Circuit;
  parallel?: { group: string; set: number; of: number } | null;
  rack?: { count: number; spacing: number } | null;
  pulls?: PlannedPull[];
  conditions?: PullConditions;
}
