import { numberElements, numberGroups } from './element-ids';
import { RUN_FORMAT, RUN_VERSION } from './run-document';
import type {
  Bend,
  Cable,
  CableGroup,
  Fitting,
  Flex,
  Offset,
  PullPoint,
  RunDocument,
  Saddle3,
  Saddle4,
  Straight,
  Transition,
  WireGroup,
} from './run-document';

/**
 * Builders of run documents and their parts, for tests, samples and the keys that add a piece. Each takes what differs
 * from a usual piece. A part built without an id carries `''`, which the parser refuses: `buildRun`, `numberElements`
 * and `numberGroups` give it the next free one.
 */
type Overrides<T> = Partial<Omit<T, 'kind'>>;

export function pullPoint(overrides: Overrides<PullPoint> = {}): PullPoint {
  return { kind: 'pull-point', id: '', device: 'box', ...overrides };
}

export function straight(overrides: Overrides<Straight> = {}): Straight {
  return { kind: 'straight', id: '', length: 120, ...overrides };
}

export function bend(overrides: Overrides<Bend> = {}): Bend {
  return { kind: 'bend', id: '', angle: 90, ...overrides };
}

export function offset(overrides: Overrides<Offset> = {}): Offset {
  return { kind: 'offset', id: '', rise: 6, angle: 30, ...overrides };
}

export function saddle3(overrides: Overrides<Saddle3> = {}): Saddle3 {
  return { kind: 'saddle-3', id: '', height: 4, angle: 22.5, ...overrides };
}

export function saddle4(overrides: Overrides<Saddle4> = {}): Saddle4 {
  return { kind: 'saddle-4', id: '', height: 4, width: 12, angle: 30, ...overrides };
}

export function flex(overrides: Overrides<Flex> = {}): Flex {
  const raceway = { type: 'FMC', tradeSize: '3/4' } as const;
  return { kind: 'flex', id: '', length: 36, raceway, ...overrides };
}

export function fitting(overrides: Overrides<Fitting> = {}): Fitting {
  return { kind: 'fitting', id: '', fitting: 'union', ...overrides };
}

export function transition(overrides: Overrides<Transition> = {}): Transition {
  return {
    kind: 'transition',
    id: '',
    raceway: { type: 'PVC-40', tradeSize: '3/4' },
    ...overrides,
  };
}

/** A group of single conductors: 3 × 12 THHN stranded copper unless told otherwise. */
export function wires(overrides: Partial<WireGroup> = {}): WireGroup {
  return {
    id: '',
    count: 3,
    use: 'phase',
    size: '12',
    insulation: 'THHN',
    material: 'Cu',
    stranding: 'stranded',
    ...overrides,
  };
}

/** A cable that is in no table: an invented 3-conductor 12 AWG one unless told otherwise. */
export function cable(
  overrides: Partial<Omit<CableGroup, 'cable'>> & { cable?: Partial<Cable> } = {},
): CableGroup {
  const { cable: fields, ...group } = overrides;
  return {
    id: '',
    count: 1,
    use: 'phase',
    ...group,
    cable: { name: 'Cable', od: 0.4, weight: 0.15, maxTension: 150, conductors: 3, ...fields },
  };
}

/** A whole run: a box, 10 ft, a 90, 10 ft, a box in 3/4 EMT without conductors, unless told otherwise. */
export function buildRun(overrides: Partial<RunDocument> = {}): RunDocument {
  const document: RunDocument = {
    format: RUN_FORMAT,
    version: RUN_VERSION,
    tag: 'F-1',
    raceway: { type: 'EMT', tradeSize: '3/4' },
    path: [pullPoint(), straight(), bend(), straight(), pullPoint()],
    ...overrides,
  };
  const nothing = { path: [] };
  const path = numberElements(nothing, document.path);
  const { conductors } = document;
  return {
    ...document,
    path,
    ...(conductors && { conductors: numberGroups({ path }, conductors) }),
  };
}
