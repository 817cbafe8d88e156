import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { analyzeRun } from '../src/analyze-run';
import type { PullAnalysis, PullDirection } from '../src/contracts/run-analysis';
import { bend, buildRun, pullPoint, straight, wires } from '../src/run/build-run';
import type { Direction, PathElement, PullConditions, RunDocument } from '../src/run/run-document';
import { arbitraryRun } from './arbitrary-run';
import { reverseRun } from './reverse-run';

const RUNS = process.env.FAIRLEAD_LONG === '1' ? 10_000 : 1_000;
const CLOSE = 1e-9;

const AXES = ['east', 'north', 'up', 'west', 'south', 'down'] as const;
type Axis = (typeof AXES)[number];
const back = (axis: Axis): Axis => AXES[(AXES.indexOf(axis) + 3) % 6] as Axis;

/** A run in space: the way it sets out, and corners of 90° with the leg after each. */
interface Course {
  heading: Axis;
  first: number;
  corners: { toward: Axis; leg: number }[];
}

const leg = fc.double({ min: 40, max: 900, noNaN: true });
const course: fc.Arbitrary<Course> = fc
  .record({
    heading: fc.constantFrom(...AXES),
    first: leg,
    turns: fc.array(fc.record({ pick: fc.nat(3), leg }), { maxLength: 6 }),
  })
  .map(({ heading, first, turns }) => {
    let now: Axis = heading;
    const corners = turns.map(({ pick, leg: after }) => {
      const across = AXES.filter((axis) => axis !== now && axis !== back(now));
      now = across[pick] as Axis;
      return { toward: now, leg: after };
    });
    return { heading, first, corners };
  });

const turnedBack = ({ heading, first, corners }: Course): Course => {
  const headings = [heading, ...corners.map(({ toward }) => toward)];
  const legs = [first, ...corners.map(({ leg: after }) => after)];
  return {
    heading: back(headings[headings.length - 1] as Axis),
    first: legs[legs.length - 1] as number,
    corners: corners
      .map((_, index) => ({ toward: back(headings[index] as Axis), leg: legs[index] as number }))
      .reverse(),
  };
};

const runOf = (
  { heading, first, corners }: Course,
  conditions: PullConditions = {},
  direction: (axis: Axis) => Direction = (axis) => axis,
): RunDocument =>
  buildRun({
    raceway: { type: 'EMT', tradeSize: '2' },
    start: { heading: direction(heading) },
    path: [
      pullPoint(),
      straight({ length: first }),
      ...corners.flatMap(({ toward, leg: after }): PathElement[] => [
        bend({ toward: direction(toward), radius: 9.5 }),
        straight({ length: after }),
      ]),
      pullPoint(),
    ],
    conductors: [wires({ count: 3, size: '2' }), wires({ count: 1, size: '8', use: 'ground' })],
    conditions,
  });

const pullsOf = (document: RunDocument): PullAnalysis[] => analyzeRun(document).pulls;
const only = (document: RunDocument): PullAnalysis => pullsOf(document)[0] as PullAnalysis;
const WAYS = ['forward', 'reverse'] as const;

function expectSame(one: PullDirection, other: PullDirection, share = CLOSE) {
  expect(one.status).toBe(other.status);
  for (const figure of ['tension', 'peak', 'holdBack', 'peakSidewall'] as const) {
    for (const level of ['low', 'likely', 'high'] as const) {
      const [a, b] = [one[figure]?.[level] ?? 0, other[figure]?.[level] ?? 0];
      expect(Math.abs(a - b)).toBeLessThanOrEqual(share * Math.max(1, Math.abs(a)));
    }
  }
}

describe('the pull of any run', () => {
  it('is never less with more friction', () => {
    fc.assert(
      fc.property(arbitraryRun(), (document) => {
        for (const pull of pullsOf(document)) {
          for (const way of WAYS) {
            const { tension } = pull[way];
            if (!tension) continue;
            expect(tension.likely).toBeGreaterThanOrEqual(tension.low * (1 - CLOSE) - CLOSE);
            expect(tension.high).toBeGreaterThanOrEqual(tension.likely * (1 - CLOSE) - CLOSE);
          }
        }
      }),
      { numRuns: RUNS / 2 },
    );
  });

  it('is never less with more feed tension, in space', () => {
    const feeds = fc.double({ min: 0, max: 400, noNaN: true });
    fc.assert(
      fc.property(course, feeds, feeds, (way, one, more) => {
        const at = (feedTension: number) => only(runOf(way, { feedTension }));
        const [less, greater] = [at(one), at(one + more)];
        for (const name of WAYS) {
          const [a, b] = [less[name].tension, greater[name].tension];
          expect(b!.likely).toBeGreaterThanOrEqual(a!.likely * (1 - CLOSE) - 1e-6);
        }
      }),
      { numRuns: RUNS / 2 },
    );
  });

  it('is never less with more weight on a level run', () => {
    const weights = fc.double({ min: 0.01, max: 5, noNaN: true });
    fc.assert(
      fc.property(course, weights, weights, (way, weight, more) => {
        const at = (each: number) => {
          const document = runOf(way);
          const level = document.path.map((element) =>
            element.kind === 'bend' ? { ...element, toward: undefined } : element,
          );
          const cable = { name: 'Cable', od: 0.5, weight: each, maxTension: 1000 };
          return only({
            ...(JSON.parse(JSON.stringify({ ...document, path: level })) as RunDocument),
            start: { heading: 'east' },
            conductors: [{ id: 'w1', count: 1, use: 'phase', cable }],
          });
        };
        for (const name of WAYS) {
          const [a, b] = [at(weight)[name].tension, at(weight + more)[name].tension];
          expect(b!.likely).toBeGreaterThanOrEqual(a!.likely * (1 - CLOSE));
        }
      }),
      { numRuns: RUNS / 2 },
    );
  });

  it('never recommends a direction that must be held back', () => {
    fc.assert(
      fc.property(course, (way) => {
        const pull = only(runOf(way));
        if (pull.recommended === null) expect(pull.noneBecause).toBe('hold-back');
        else expect(pull[pull.recommended].holdBack?.low).toBe(0);
      }),
      { numRuns: RUNS },
    );
  });

  it('reversed swaps its directions: in space', () => {
    fc.assert(
      fc.property(course, (way) => {
        const [there, andBack] = [only(runOf(way)), only(runOf(turnedBack(way)))];
        expectSame(there.forward, andBack.reverse);
        expectSame(there.reverse, andBack.forward);
      }),
      { numRuns: RUNS / 2 },
    );
  });

  it('reversed swaps its directions: any run without directions', () => {
    fc.assert(
      fc.property(arbitraryRun({ directions: 'none' }), (document) => {
        const there = pullsOf(document);
        const andBack = pullsOf(reverseRun(document)).reverse();
        there.forEach((pull, index) => {
          const other = andBack[index] as PullAnalysis;
          expectSame(pull.forward, other.reverse);
          expectSame(pull.reverse, other.forward);
        });
      }),
      { numRuns: RUNS / 2 },
    );
  });

  it('stays the same when the run is turned about the vertical', () => {
    const PLAN: Partial<Record<Axis, number>> = { north: 0, east: 90, south: 180, west: 270 };
    const turned =
      (by: number) =>
      (axis: Axis): Direction => {
        const azimuth = PLAN[axis];
        return azimuth === undefined ? axis : { azimuth: (azimuth + by) % 360, elevation: 0 };
      };
    fc.assert(
      fc.property(course, fc.double({ min: 0, max: 359, noNaN: true }), (way, by) => {
        const [one, other] = [only(runOf(way)), only(runOf(way, {}, turned(by)))];
        for (const name of WAYS) expectSame(one[name], other[name], 1e-8);
      }),
      { numRuns: RUNS / 2 },
    );
  });

  it('stays the same when a straight is cut in two', () => {
    fc.assert(
      fc.property(course, fc.double({ min: 0.1, max: 0.9, noNaN: true }), (way, share) => {
        const whole = runOf(way);
        const cut = { ...whole, path: [...whole.path] };
        const first = whole.path[1] as Extract<PathElement, { kind: 'straight' }>;
        cut.path.splice(
          1,
          1,
          { ...first, length: first.length * share },
          { ...first, id: 'rest', length: first.length * (1 - share) },
        );
        const [one, other] = [only(whole), only(cut)];
        for (const name of WAYS) expectSame(one[name], other[name], 1e-8);
      }),
      { numRuns: RUNS / 2 },
    );
  });
});

describe('generated documents', () => {
  it('none crashes, hangs or is answered with something that is no number', () => {
    let slowest = 0;
    fc.assert(
      fc.property(arbitraryRun(), (document) => {
        const from = performance.now();
        const analysis = analyzeRun(document);
        slowest = Math.max(slowest, performance.now() - from);
        expect(JSON.stringify(analysis.pulls)).not.toMatch(/NaN|Infinity/);
        for (const pull of analysis.pulls) {
          for (const way of WAYS) {
            const { status, tension, profile } = pull[way];
            expect(tension === null).toBe(status !== 'ok');
            for (const point of profile) expect(point.tension.high).toBeLessThanOrEqual(1e6);
          }
        }
      }),
      { numRuns: 2 * RUNS },
    );
    // A guard against hanging; the bench tells the time.
    expect(slowest).toBeLessThan(500);
  });
});

describe('what has no figure', () => {
  const box = (id: string, more = {}) => pullPoint({ id, label: id, ...more });
  const set = [wires({ count: 3, size: '12' })];
  const through = { pulls: [{ id: 'p', from: 'A', to: 'C' }] };
  const path = (middle = {}) => [
    box('A'),
    straight({ length: 120 }),
    box('B', middle),
    straight({ length: 120 }),
    box('C'),
  ];

  it('occupied pipe cannot be known', () => {
    const conductors = [...set, wires({ count: 1, size: '12', use: 'existing' })];
    expect(only(buildRun({ path: path(), conductors })).forward).toMatchObject({
      status: 'unknown',
      reason: 'existing-conductors',
      tension: null,
    });
  });

  it('a set that does not go in is refused', () => {
    const conductors = [wires({ count: 3, size: '500' })];
    const raceway = { type: 'EMT', tradeSize: '1' } as const;
    expect(only(buildRun({ path: path(), conductors, raceway })).forward).toMatchObject({
      status: 'refused',
      reason: 'does-not-fit',
    });
  });

  it('missing directions are named, and a finding stands at each', () => {
    const run = buildRun({
      path: [
        box('A'),
        straight(),
        bend({ toward: 'up' }),
        straight(),
        bend(),
        straight(),
        box('C'),
      ],
      conductors: set,
    });
    expect(only(run).forward).toMatchObject({ status: 'unknown', reason: 'no-directions' });
    expect(analyzeRun(run).findings.map(({ code }) => code)).toContain('direction-missing');
  });

  it('a pull through a box where the set changes is refused, and the box is named', () => {
    const conductors = [...set, wires({ count: 1, size: '10', from: 'A', to: 'B' })];
    const analysis = analyzeRun(buildRun({ path: path(), conductors, ...through }));
    expect(analysis.pulls[0]?.forward).toMatchObject({ reason: 'set-changes', reasonAt: 'B' });
    expect(analysis.findings).toContainEqual(
      expect.objectContaining({ code: 'pull-set-changes', severity: 'stop' }),
    );
  });

  it('a box that turns is no way through without a sheave', () => {
    const turn = { angle: 90, toward: 'north' as const };
    const turning = (more: object) =>
      only(buildRun({ path: path({ turn: { ...turn, ...more } }), conductors: set, ...through }));
    expect(turning({}).forward).toMatchObject({ reason: 'turns-without-sheave', reasonAt: 'B' });
    const round = turning({ sheaveRadius: 12 }).forward;
    expect(round.status).toBe('ok');
    const past = only(buildRun({ path: path(), conductors: set, ...through })).forward;
    expect(round.tension!.likely).toBeGreaterThan(past.tension!.likely * 1.3);
  });

  it('nothing is pulled past a box nobody can reach', () => {
    const run = buildRun({ path: path({ accessible: false }), conductors: set });
    expect(only(run).forward).toMatchObject({ reason: 'not-accessible', reasonAt: 'B' });
  });
});
