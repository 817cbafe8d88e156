import { bend, buildRun, pullPoint, straight, wires } from '../src/run/build-run';
import type { PathElement, PullConditions, RunDocument } from '../src/run/run-document';

const FEEDER_SET = [
  wires({ count: 3, size: '500' }),
  wires({ count: 1, size: '3', use: 'ground' }),
];
const FEEDER_BEND = { radius: 13 } as const;
const feet = (whole: number, inches: number): number => whole * 12 + inches;

function feeder(path: PathElement[], conditions: PullConditions): RunDocument {
  return buildRun({
    raceway: { type: 'EMT', tradeSize: '3' },
    path,
    conductors: FEEDER_SET,
    conditions: { attachment: 'basket-grip', feedTension: 0, ...conditions },
  });
}

/** Corner to corner 11′ 1″, 202′ 2″, 12′ 2″, 11′ 1″: 10, 200, 10 and 10 ft of straight pipe. */
const feederPath = (long: PathElement[]): PathElement[] => [
  pullPoint({ id: 'a', label: 'A' }),
  straight({ length: feet(11, 1) }),
  bend({ id: 'bend1', ...FEEDER_BEND }),
  ...long,
  bend({ id: 'bend2', ...FEEDER_BEND }),
  straight({ length: feet(12, 2) }),
  bend({ id: 'bend3', ...FEEDER_BEND }),
  straight({ length: feet(11, 1) }),
  pullPoint({ id: 'b', label: 'B' }),
];

const BRANCH_BEND = { radius: 4 } as const;
const leg = () => straight({ length: 120 });
const bends = (...angles: number[]): PathElement[] =>
  angles.flatMap((angle) => [leg(), bend({ angle, ...BRANCH_BEND })]);

/** 90-90-90-60, a box, 90-90-90-40. Common practice, no source. */
function branch(overrides: Partial<RunDocument> = {}): RunDocument {
  return buildRun({
    raceway: { type: 'EMT', tradeSize: '1/2' },
    path: [
      pullPoint({ id: 'from', label: 'LP-1' }),
      ...bends(90, 90, 90, 60),
      leg(),
      pullPoint({ id: 'box', label: 'JB-1' }),
      ...bends(90, 90, 90, 40),
      leg(),
      pullPoint({ id: 'to', label: 'JB-2' }),
    ],
    conductors: [wires({ count: 3, size: '12' })],
    ...overrides,
  });
}

const THROUGH = { pulls: [{ id: 'through', from: 'from', to: 'to' }] };

/** Runs whose pull is worked out by hand elsewhere; each call builds a new one. */
export const PULL_RUNS = {
  feeder: () => feeder(feederPath([straight({ length: feet(202, 2) })]), {}),
  feeder50: () =>
    feeder(feederPath([straight({ length: feet(202, 2) })]), { feedTension: { from: 50, to: 0 } }),
  feederInTwo: () =>
    feeder(
      feederPath([
        straight({ length: feet(112, 2) - feet(11, 1) }),
        pullPoint({ id: 'p', label: 'P' }),
        straight({ length: feet(202, 2) - feet(112, 2) + feet(11, 1) }),
      ]),
      {},
    ),
  /** 10 ft level, 90 down, 100 ft of drop, straights. */
  drop: () =>
    feeder(
      [
        pullPoint({ id: 'top', label: 'Top' }),
        straight({ length: feet(11, 1) }),
        bend({ id: 'bend1', toward: 'down', ...FEEDER_BEND }),
        straight({ length: feet(101, 1) }),
        pullPoint({ id: 'foot', label: 'Foot' }),
      ],
      {},
    ),
  branch: () => branch(),
  branchThrough: () => branch(THROUGH),
  branchAlone: () => branch({ ...THROUGH, conditions: { crew: { feeding: 0, pulling: 1 } } }),
};
