import { bend, buildRun, fitting, offset, pullPoint, straight, wires } from '@fairlead/shared';
import type { DemoRun } from './demo-run';

const legs = (length: number) => straight({ length });

/** A fit-out in EMT: feeders overhead, branch circuits down to the rooms. */
export const CLINIC_RUNS: readonly DemoRun[] = [
  {
    area: 'Level 1',
    system: 'Power',
    document: buildRun({
      tag: 'F-1',
      title: 'Feeder to panel LP-2',
      raceway: { type: 'EMT', tradeSize: '1-1/2' },
      start: { heading: 'up' },
      path: [
        pullPoint({ device: 'cabinet', label: 'MDP' }),
        legs(62),
        bend({ toward: 'east' }),
        legs(236),
        bend({ toward: 'north' }),
        legs(180),
        offset({ rise: 8, angle: 30, toward: 'down' }),
        legs(144),
        bend({ toward: 'down' }),
        legs(48),
        offset({ rise: 0.5, angle: 10, toward: 'south' }),
        legs(12),
        pullPoint({ device: 'cabinet', label: 'LP-2' }),
      ],
      conductors: [
        wires({ count: 3, size: '1/0', colour: 'BK' }),
        wires({ count: 1, size: '1/0', use: 'neutral', colour: 'WH', phase: 'N' }),
        wires({ count: 1, size: '6', use: 'ground', colour: 'GN', phase: 'G' }),
      ],
    }),
  },
  {
    area: 'Roof',
    system: 'Power',
    document: buildRun({
      tag: 'F-2',
      title: 'Feeder to roof unit 3',
      raceway: { type: 'EMT', tradeSize: '1' },
      start: { heading: 'up' },
      path: [
        pullPoint({ device: 'cabinet', label: 'LP-2' }),
        legs(54),
        bend({ toward: 'west' }),
        legs(198),
        bend({ toward: 'north' }),
        legs(96),
        bend({ toward: 'up' }),
        legs(72),
        offset({ rise: 10, angle: 45, toward: 'north' }),
        legs(40),
        offset({ rise: 0.5, angle: 10, toward: 'east' }),
        legs(10),
        pullPoint({ label: 'RTU-3' }),
      ],
      conductors: [
        wires({ count: 3, size: '8', colour: 'BK' }),
        wires({ count: 1, size: '10', use: 'ground', colour: 'GN' }),
      ],
    }),
  },
  {
    area: 'Level 1',
    system: 'Power',
    document: buildRun({
      tag: 'F-3',
      title: 'Feeder to imaging room',
      raceway: { type: 'EMT', tradeSize: '2' },
      start: { heading: 'east' },
      path: [
        pullPoint({ device: 'pull-box', label: 'PB-1' }),
        legs(310),
        bend({ toward: 'north' }),
        legs(154),
        pullPoint({ device: 'cabinet', label: 'IMG-1' }),
      ],
      conductors: [wires({ count: 3, size: '250', colour: 'BN' })],
    }),
  },
  {
    area: 'Level 1',
    system: 'Lighting',
    document: buildRun({
      tag: 'B-4',
      title: 'Corridor lighting',
      start: { heading: 'up' },
      path: [
        pullPoint({ device: 'cabinet', label: 'LP-2' }),
        legs(48),
        bend({ toward: 'south' }),
        legs(220),
        bend({ toward: 'west' }),
        legs(130),
        pullPoint({ label: 'J-4' }),
        legs(96),
        bend({ toward: 'down' }),
        legs(52),
        pullPoint({ label: 'S-4' }),
      ],
      conductors: [
        wires({ count: 3, size: '12', colour: 'BK' }),
        wires({ count: 3, size: '12', use: 'neutral', colour: 'WH' }),
        wires({ count: 1, size: '12', use: 'ground', colour: 'GN' }),
      ],
    }),
  },
  {
    area: 'Level 1',
    system: 'Power',
    document: buildRun({
      tag: 'B-7',
      title: 'Exam room receptacles',
      start: { heading: 'east' },
      path: [
        pullPoint({ label: 'J-7' }),
        legs(120),
        fitting({ fitting: 'union' }),
        legs(60),
        bend({ toward: 'down' }),
        legs(66),
        pullPoint({ label: 'R-7' }),
      ],
      conductors: [wires({ count: 17, size: '12', colour: 'BK' })],
    }),
  },
  {
    area: 'Electrical room',
    system: 'Power',
    document: buildRun({
      tag: 'N-1',
      title: 'Nipple between panels',
      start: { heading: 'east' },
      path: [
        pullPoint({ device: 'cabinet', label: 'LP-2' }),
        legs(18),
        pullPoint({ device: 'cabinet', label: 'LP-3' }),
      ],
      conductors: [wires({ count: 24, size: '12', colour: 'BK' })],
    }),
  },
];
