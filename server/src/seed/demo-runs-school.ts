import { bend, buildRun, offset, pullPoint, straight, wires } from '@fairlead/shared';
import type { DemoRun } from './demo-run';

const legs = (length: number) => straight({ length });

/** A bid that is still being counted: some runs have no lengths, some no directions. */
export const SCHOOL_RUNS: readonly DemoRun[] = [
  {
    area: 'Gym',
    system: 'Power',
    document: buildRun({
      tag: 'F-1',
      title: 'Gym panel, counted from the plan',
      raceway: { type: 'EMT', tradeSize: '1' },
      path: [
        pullPoint({ label: 'MDP' }),
        bend(),
        bend(),
        offset(),
        bend({ angle: 45 }),
        pullPoint({ label: 'GP' }),
      ],
      conductors: [wires({ count: 4, size: '8', colour: 'BK' })],
    }),
  },
  {
    area: 'Gym',
    system: 'Lighting',
    document: buildRun({
      tag: 'B-2',
      title: 'Scoreboard',
      start: { heading: 'up' },
      path: [
        pullPoint({ device: 'cabinet', label: 'GP' }),
        legs(60),
        bend({ toward: 'east' }),
        legs(300),
        bend(),
        legs(140),
        pullPoint({ label: 'SB' }),
      ],
      conductors: [wires({ count: 3, size: '12', colour: 'BK' })],
    }),
  },
  {
    area: 'Kitchen',
    system: 'Power',
    document: buildRun({
      tag: 'B-5',
      title: 'Ovens, with a box half way',
      raceway: { type: 'EMT', tradeSize: '1' },
      start: { heading: 'up' },
      path: [
        pullPoint({ device: 'cabinet', label: 'KP' }),
        legs(72),
        bend({ toward: 'north' }),
        legs(130),
        bend({ toward: 'east' }),
        legs(110),
        bend({ toward: 'north' }),
        legs(84),
        pullPoint({
          device: 'conduit-body',
          body: 'LB',
          label: 'LB-1',
          turn: { angle: 90, toward: 'down' },
        }),
        legs(60),
        bend({ toward: 'west' }),
        legs(48),
        bend({ toward: 'down' }),
        legs(36),
        pullPoint({ label: 'OV' }),
      ],
      conductors: [
        wires({ count: 3, size: '6', colour: 'BK' }),
        wires({ count: 1, size: '10', use: 'ground', colour: 'GN' }),
      ],
    }),
  },
  {
    area: 'Kitchen',
    system: 'Power',
    document: buildRun({
      tag: 'B-6',
      title: 'Dishwasher, no wire chosen yet',
      start: { heading: 'south' },
      path: [
        pullPoint({ label: 'J-6' }),
        legs(90),
        bend({ toward: 'down' }),
        legs(8),
        bend({ toward: 'east' }),
        legs(30),
        pullPoint({ label: 'DW' }),
      ],
    }),
  },
];
