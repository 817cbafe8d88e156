import {
  bend,
  buildRun,
  cable,
  fitting,
  flex,
  offset,
  pullPoint,
  saddle3,
  saddle4,
  straight,
  transition,
  wires,
} from '../src/run/build-run';
import type { RunDocument } from '../src/run/run-document';

/**
 * A valid document with a value in every field there is. Its path: 0 A, 1 straight, 2 bend, 3 offset, 4 M, 5 3-bend saddle,
 * 6 4-bend saddle, 7 transition, 8 fitting, 9 flex, 10 Z.
 */
export function fullRun(): RunDocument {
  return buildRun({
    tag: 'F-12',
    title: 'Feeder to roof unit 3',
    rules: {
      code: 'NEC-2023',
      profile: 'power',
      overrides: {
        maxDegrees: 270,
        maxSectionLength: 1800,
        maxFillPercent: null,
        minBendRadius: null,
        source: 'Spec 26 05 33',
      },
    },
    raceway: { type: 'EMT', tradeSize: '3/4', bendRadius: null },
    environment: {
      ambient: 104,
      rooftopHeight: null,
      wet: false,
      buried: false,
      temperatureChange: -40,
    },
    start: { heading: { azimuth: 90, elevation: 0 } },
    path: [
      pullPoint({
        id: 'A',
        label: 'LP-2',
        device: 'cabinet',
        makeUp: 24,
        reach: true,
        place: 'P1',
      }),
      straight({ id: 's1', length: 120.5 }),
      bend({ id: 'b1', toward: 'up', radius: 5, made: 'field', counts: false, why: 'trench' }),
      offset({ id: 'o1', toward: { azimuth: 45, elevation: 0 }, radius: 5, made: 'factory' }),
      pullPoint({
        id: 'M',
        device: 'conduit-body',
        body: 'LB',
        accessible: true,
        turn: { angle: 90, toward: 'north', sheaveRadius: 6 },
        entries: [{ wall: 'left', row: 1, tradeSize: '3/4', runId: 'run-1' }],
        boxSize: { width: 4, height: 4, depth: 2.125 },
        raceway: { type: 'IMC', tradeSize: '1' },
      }),
      saddle3({ id: 'x3', toward: 'up', radius: 6 }),
      saddle4({ id: 'x4', toward: 'up', radius: 6 }),
      transition({ id: 't1' }),
      fitting({ id: 'f1', fitting: 'offset-connector', angle: 20 }),
      flex({ id: 'w1', degrees: 60 }),
      pullPoint({ id: 'Z', device: 'open-end' }),
    ],
    conductors: [
      wires({ id: 'g1', colour: 'BK', from: 'A', to: 'M', phase: 'A' }),
      cable({ id: 'g2', from: 'M', cable: { maxSidewall: 500, minBendRadius: 4 } }),
    ],
    sets: 2,
    circuit: { overcurrent: 20, terminations: 75, wyeFourWire: true, nonlinear: false },
    parallel: { group: 'F-12', set: 1, of: 3 },
    rack: { count: 4, spacing: 4 },
    pulls: [{ id: 'p1', from: 'A', to: 'Z', feedAt: 'from' }],
    conditions: {
      friction: { low: 0.2, likely: 0.35, high: 0.5 },
      ropeFriction: 0.2,
      crew: { feeding: 1, pulling: 2 },
      feedTension: { from: 10, to: 20 },
      attachment: 'basket-grip',
      lubricated: true,
      ambientTemperature: 40,
      limits: {
        handOne: 50,
        handTwo: null,
        puller: 2000,
        rope: 8000,
        sidewall: { caution: 500, stop: 1000 },
      },
    },
  });
}
