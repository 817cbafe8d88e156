import { describe, expect, it } from 'vitest';
import { DEFAULT_SETTINGS } from '../contracts/settings';
import { bendGain } from '../geometry/bend-geometry';
import { angleBetween } from '../geometry/turn';
import { magnitude, subtract } from '../geometry/vector';
import type { Vector } from '../geometry/vector';
import {
  bend,
  buildRun,
  fitting,
  flex,
  offset,
  pullPoint,
  saddle3,
  saddle4,
  straight,
  transition,
} from './build-run';
import { expandRun } from './expand-run';
import type { CentreLinePiece } from './expanded-run';
import type { PathElement, RunDocument } from './run-document';

const R = 4.5;
const run = (path: PathElement[], overrides: Partial<RunDocument> = {}) =>
  expandRun(
    buildRun({ raceway: { type: 'EMT', tradeSize: '3/4', bendRadius: R }, path, ...overrides }),
  );
const box = (id: string) => pullPoint({ id });
const distance = (a: Vector, b: Vector): number => magnitude(subtract(a, b));
const lastOf = <T>(list: readonly T[] | null): T => {
  const last = list?.[list.length - 1];
  if (last === undefined) throw new Error('empty');
  return last;
};

function expectContinuous(pieces: readonly CentreLinePiece[] | null, length: number | null): void {
  if (!pieces || length === null) throw new Error('no centre line');
  let sum = 0;
  pieces.forEach((piece, index) => {
    const before = pieces[index - 1];
    expect(distance(piece.start, before?.end ?? { x: 0, y: 0, z: 0 })).toBeLessThan(1e-9);
    expect(piece.from).toBeCloseTo(before?.to ?? 0, 9);
    const own =
      piece.kind === 'line'
        ? distance(piece.start, piece.end)
        : (piece.radius * piece.angle * Math.PI) / 180;
    expect(own).toBeCloseTo(piece.to - piece.from, 7);
    if (piece.kind === 'arc') {
      expect(distance(piece.centre, piece.start)).toBeCloseTo(piece.radius, 9);
      expect(distance(piece.centre, piece.end)).toBeCloseTo(piece.radius, 9);
    }
    sum += own;
  });
  expect(Math.abs(sum - length)).toBeLessThanOrEqual(1e-9 * Math.max(1, length));
}

describe('stations', () => {
  it('two 5 ft legs and a 90 at radius 4.5 develop 120 less the gain', () => {
    // Σ legs − Σ gains with g = 2T − A: exact circle geometry.
    const expanded = run([
      box('A'),
      straight({ length: 60 }),
      bend(),
      straight({ length: 60 }),
      box('Z'),
    ]);
    expect(expanded.length).toBeCloseTo(120 - bendGain(R, 90), 9);
    expect(expanded.length).toBeCloseTo(118.0686, 4);
    const [, first, ninety, second, end] = expanded.elements;
    expect(first).toMatchObject({ from: 0, to: 55.5 });
    expect(ninety?.from).toBe(55.5);
    expect(ninety?.to).toBeCloseTo(55.5 + (R * Math.PI) / 2, 9);
    expect(second?.to).toBeCloseTo(118.0686, 4);
    expect(end?.from).toBe(expanded.length);
    expect(expanded.end).toBe(expanded.length);
  });

  it('pieces tile the run without gap or overlap', () => {
    const expanded = run([
      box('A'),
      straight({ length: 30 }),
      offset(),
      straight({ length: 10 }),
      fitting({ angle: 20 }),
      straight({ length: 10 }),
      saddle3(),
      straight({ length: 20 }),
      transition(),
      straight({ length: 20 }),
      saddle4(),
      straight({ length: 40 }),
      flex({ length: 36 }),
      box('Z'),
    ]);
    let station = 0;
    for (const { from, to } of expanded.elements) {
      expect(from).toBeCloseTo(station, 9);
      expect(to).toBeGreaterThanOrEqual(from);
      station = to;
    }
    expect(station).toBe(expanded.length);
  });

  it('an offset takes its travel less two gains of pipe, between its first corner and its second', () => {
    const expanded = run([
      box('A'),
      straight({ length: 60 }),
      offset({ rise: 6, angle: 30 }),
      straight({ length: 60 }),
      box('Z'),
    ]);
    expect(expanded.length).toBeCloseTo(60 + 12 + 60 - 2 * bendGain(R, 30), 9);
    expect(expanded.bends).toHaveLength(2);
    expect(expanded.legs.map(({ length }) => length)).toEqual([60, expect.closeTo(12, 9), 60]);
  });

  it('a leg too short leaves no pipe, never less than none', () => {
    const expanded = run([box('A'), bend(), straight({ length: 1 }), bend(), box('Z')]);
    expect(expanded.length).toBeCloseTo(R * Math.PI, 9);
    expect(
      expanded.legs.map(({ length, tangents }) => [length, Number(tangents.toFixed(9))]),
    ).toEqual([
      [0, 4.5],
      [1, 9],
      [0, 4.5],
    ]);
  });

  it('without any length: equal steps, legs without length, bends of one piece close together', () => {
    const expanded = run([box('A'), bend(), offset(), box('M'), saddle3(), box('Z')]);
    expect(expanded).toMatchObject({ length: null, end: 5, centreLine: null });
    expect(expanded.elements.map(({ from, to }) => [from, to])).toEqual([
      [0, 0],
      [1, 1],
      [1.75, 2.25],
      [3, 3],
      [3.75, 4.25],
      [5, 5],
    ]);
    expect(expanded.bends.map(({ from }) => from)).toEqual([1, 1.75, 2.25, 3.75, 4, 4.25]);
    expect(expanded.legs.every(({ length }) => length === null)).toBe(true);
  });
});

describe('the centre line', () => {
  const level = (toward: 'north' | 'up') => ({ toward });

  it('a 90 ends where its corner says: 60 in east, 60 in north', () => {
    const expanded = run([
      box('A'),
      straight({ length: 60 }),
      bend(level('north')),
      straight({ length: 60 }),
      box('Z'),
    ]);
    const end = lastOf(expanded.centreLine).end;
    expect(distance(end, { x: 60, y: 60, z: 0 })).toBeLessThan(1e-9);
    expectContinuous(expanded.centreLine, expanded.length);
  });

  it('an offset of 6 in at 30° moves 10.392 in along and 6 in up, and leaves the pipe parallel', () => {
    // Run h cot θ: right-triangle geometry.
    const expanded = run([
      box('A'),
      straight({ length: 60 }),
      offset({ toward: 'up' }),
      straight({ length: 60 }),
      box('Z'),
    ]);
    const end = lastOf(expanded.centreLine).end;
    expect(distance(end, { x: 120 + 6 * Math.sqrt(3), y: 0, z: 6 })).toBeLessThan(1e-9);
    expect(expanded.elements[2]?.heading).toEqual(expanded.elements[2]?.headingBefore);
  });

  it('a 3-bend saddle crowns at its height over the middle of its run, and comes back', () => {
    const expanded = run([
      box('A'),
      straight({ length: 60 }),
      saddle3({ height: 4, angle: 22.5, toward: 'up' }),
      straight({ length: 60 }),
      box('Z'),
    ]);
    const arcs = expanded.centreLine?.filter((piece) => piece.kind === 'arc') ?? [];
    const centre = arcs[1];
    if (centre?.kind !== 'arc') throw new Error('no centre arc');
    expect(centre.centre.z + centre.radius).toBeCloseTo(4, 9);
    const end = lastOf(expanded.centreLine).end;
    expect(end.z).toBeCloseTo(0, 9);
    expect(centre.centre.x).toBeCloseTo(end.x / 2, 9);
    expectContinuous(expanded.centreLine, expanded.length);
  });

  it('a 4-bend saddle is flat over the object, at its height', () => {
    const expanded = run([
      box('A'),
      straight({ length: 60 }),
      saddle4({ height: 4, width: 12, angle: 30, toward: 'up' }),
      straight({ length: 60 }),
      box('Z'),
    ]);
    const flat = expanded.centreLine?.find(
      (piece) => piece.kind === 'line' && piece.start.z > 3.9 && piece.end.z > 3.9,
    );
    expect(flat && distance(flat.start, flat.end)).toBeCloseTo(12, 9);
    expect(flat?.start.z).toBeCloseTo(4, 9);
    expect(lastOf(expanded.centreLine).end.z).toBeCloseTo(0, 9);
  });

  it('marks at 10, 30 and 50 in on 80 in of pipe: the corners worked by hand', () => {
    // Bends 90, 45, 45 rolled 90 and 180 at radius 4.353: corners worked by hand, exact geometry.
    const radius = 4.353;
    const t45 = radius * Math.tan(Math.PI / 8);
    const expanded = run([
      box('A'),
      straight({ length: 10 + radius }),
      bend({ angle: 90, toward: 'up', radius }),
      straight({ length: radius + (30 - 10 - (radius * Math.PI) / 2) + t45 }),
      bend({ angle: 45, toward: 'south', radius }),
      straight({ length: 2 * t45 + (20 - (radius * Math.PI) / 4) }),
      bend({ angle: 45, toward: 'up', radius }),
      straight({ length: t45 + (80 - 50 - (radius * Math.PI) / 4) }),
      box('Z'),
    ]);
    expect(expanded.bends.map(({ from }) => from)).toEqual(
      [10, 30, 50].map((mark) => expect.closeTo(mark, 9)),
    );
    expect(expanded.length).toBeCloseTo(80, 9);
    const end = lastOf(expanded.centreLine).end;
    expect(distance(end, { x: 14.353, y: -14.27458, z: 61.97721 })).toBeLessThan(1e-4);
  });

  it('the body of a pull point turns the line on the spot', () => {
    const body = pullPoint({
      id: 'M',
      device: 'conduit-body',
      body: 'LB',
      turn: { angle: 90, toward: 'down' },
    });
    const expanded = run([
      box('A'),
      straight({ length: 60 }),
      body,
      straight({ length: 24 }),
      box('Z'),
    ]);
    expect(distance(lastOf(expanded.centreLine).end, { x: 60, y: 0, z: -24 })).toBeLessThan(1e-9);
    expect(expanded.bends).toHaveLength(0);
    expectContinuous(expanded.centreLine, expanded.length);
  });

  it('each bend turns the heading by its own angle', () => {
    const expanded = run([
      box('A'),
      straight({ length: 60 }),
      bend({ angle: 2, toward: 'south' }),
      straight({ length: 60 }),
      bend({ angle: 37, toward: { azimuth: 10, elevation: 20 } }),
      straight({ length: 60 }),
      bend({ angle: 120, toward: 'down' }),
      straight({ length: 60 }),
      box('Z'),
    ]);
    for (const { element, heading, headingBefore } of expanded.elements) {
      if (element.kind !== 'bend' || !heading || !headingBefore) continue;
      expect(angleBetween(headingBefore, heading)).toBeCloseTo(element.angle, 9);
    }
    expectContinuous(expanded.centreLine, expanded.length);
  });
});

describe('directions', () => {
  it('none given and a level start: assumed level, no problem, no line', () => {
    const expanded = run([box('A'), straight(), bend(), straight(), box('Z')]);
    expect(expanded).toMatchObject({
      directions: 'assumed-level',
      directionProblems: [],
      centreLine: null,
    });
  });

  it('none given and an upright start: a problem at each', () => {
    const path = [box('A'), straight(), bend({ id: 'b' }), offset({ id: 'o' }), box('Z')];
    const expanded = run(path, { start: { heading: 'up' } });
    expect(expanded.directionProblems).toEqual([
      { elementId: 'b', problem: 'missing' },
      { elementId: 'o', problem: 'missing' },
    ]);
  });

  it('some missing: partial, a problem at each, headings known up to the first', () => {
    const expanded = run([
      box('A'),
      straight(),
      bend({ toward: 'up' }),
      straight(),
      bend({ id: 'b' }),
      straight(),
      bend({ toward: 'north' }),
      box('Z'),
    ]);
    expect(expanded.directions).toBe('partial');
    expect(expanded.directionProblems).toEqual([{ elementId: 'b', problem: 'missing' }]);
    expect(expanded.elements[3]?.heading).toEqual({ x: expect.closeTo(0, 12), y: 0, z: 1 });
    expect(expanded.elements[5]?.heading).toBeNull();
  });

  it.each(['east', 'west'] as const)('toward %s while running east is parallel', (toward) => {
    const expanded = run([box('A'), straight(), bend({ id: 'b', toward }), straight(), box('Z')]);
    expect(expanded.directions).toBe('partial');
    expect(expanded.directionProblems).toEqual([{ elementId: 'b', problem: 'parallel' }]);
    expect(expanded.centreLine).toBeNull();
  });

  it('a run of straights needs no direction', () => {
    const expanded = run([box('A'), straight({ length: 10 }), box('Z')]);
    expect(expanded.directions).toBe('given');
    expect(lastOf(expanded.centreLine).end).toEqual({ x: 10, y: 0, z: 0 });
  });
});

describe('sections', () => {
  const inaccessible = pullPoint({
    id: 'M',
    device: 'conduit-body',
    body: 'LB',
    accessible: false,
  });

  it('end at accessible pull points; an unreachable body turns as a bend of radius 0', () => {
    const open = run([
      box('A'),
      bend(),
      pullPoint({ ...inaccessible, accessible: true }),
      bend(),
      box('Z'),
    ]);
    expect(open.sections.map(({ id }) => id)).toEqual(['A', 'M']);
    expect(open.elements.map(({ section }) => section)).toEqual([0, 0, 1, 1, 1]);
    const closed = run([box('A'), bend(), inaccessible, bend(), box('Z')]);
    expect(closed.sections.map(({ id }) => id)).toEqual(['A']);
    expect(closed.bends.map(({ angle, radius }) => [angle, radius])).toEqual([
      [90, R],
      [90, 0],
      [90, R],
    ]);
  });

  it('under telecom a conduit body ends no section, a box does', () => {
    const telecom = { rules: { profile: 'telecom' } } as const;
    const body = pullPoint({ id: 'M', device: 'conduit-body', body: 'C' });
    expect(run([box('A'), body, box('Z')], telecom).sections).toHaveLength(1);
    expect(run([box('A'), box('M'), box('Z')], telecom).sections).toHaveLength(2);
    expect(run([body, box('Z')], telecom).sections).toHaveLength(1);
  });

  it('hold the raceways that are really in them', () => {
    const pvc = { type: 'PVC-40', tradeSize: '1' } as const;
    const types = (path: PathElement[]) =>
      run(path).sections.map(({ raceways }) => raceways.map(({ type }) => type));
    expect(
      types([box('A'), straight(), transition({ raceway: pvc }), straight(), box('Z')]),
    ).toEqual([['EMT', 'PVC-40']]);
    expect(types([box('A'), transition({ raceway: pvc }), straight(), box('Z')])).toEqual([
      ['PVC-40'],
    ]);
    expect(types([box('A'), flex(), box('Z')])).toEqual([['FMC']]);
    expect(types([box('A'), bend(), flex(), box('Z')])).toEqual([['EMT', 'FMC']]);
    expect(types([box('A'), box('Z')])).toEqual([['EMT']]);
    // Without lengths the pipe between the pieces goes without saying.
    expect(types([box('A'), bend(), transition({ raceway: pvc }), box('Z')])).toEqual([
      ['EMT', 'PVC-40'],
    ]);
    expect(
      types([
        box('A'),
        straight(),
        pullPoint({ raceway: pvc }),
        straight(),
        flex(),
        straight(),
        box('Z'),
      ]),
    ).toEqual([['EMT'], ['PVC-40', 'FMC']]);
  });
});

describe('the bend radius', () => {
  const settings = {
    ...DEFAULT_SETTINGS,
    benders: [{ type: 'EMT', tradeSize: '3/4', radius: 5.461 } as const],
  };
  const radii = (document: RunDocument) =>
    expandRun(document, settings).bends.map(({ radius }) => radius);

  it("is the element's, else the raceway's, else the company's bender, else the table's", () => {
    const path = [box('A'), bend({ radius: 12 }), bend(), bend({ made: 'factory' }), box('Z')];
    const raceway = { type: 'EMT', tradeSize: '3/4' } as const;
    expect(radii(buildRun({ path, raceway: { ...raceway, bendRadius: 9 } }))).toEqual([12, 9, 9]);
    // No shoe makes a factory elbow; NEC Chapter 9 Table 2, 3/4 in one-shot: 4-1/2 in.
    expect(radii(buildRun({ path, raceway }))).toEqual([12, 5.461, 4.5]);
    expect(radii(buildRun({ path, raceway: { ...raceway, bendRadius: null } }))).toEqual([
      12, 5.461, 4.5,
    ]);
  });
});
