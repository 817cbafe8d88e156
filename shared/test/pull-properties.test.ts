import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { analyzeRun } from '../src/analyze-run';
import type { Band, PullAnalysis, PullDirection } from '../src/contracts/run-analysis';
import { degrees, radians } from '../src/geometry/angles';
import { bend, buildRun, cable, flex, pullPoint, straight, wires } from '../src/run/build-run';
import { isHarder } from '../src/pull/pull-method';
import { isPullPoint } from '../src/run/pull-points';
import type { Direction, PathElement, PullConditions, RunDocument } from '../src/run/run-document';
import { arbitraryRun } from './arbitrary-run';
import type { RunShape } from './arbitrary-run';
import { reverseRun } from './reverse-run';

const RUNS = process.env.FAIRLEAD_LONG === '1' ? 10_000 : 1_000;
const CLOSE = 1e-9;
/** What engine and document allow at most. */
const MOST_TENSION = 1e6;
const MOST_FRICTION = 1.2;
/** ms: what takes longer is timed again. */
const SLOW = 25;
/** Guards against hanging, ms; the bench tells the time. */
const LONGEST = 500;
const LONGEST_OF_500_PIECES = 3_000;

const WAYS = ['forward', 'reverse'] as const;
const LEVELS = ['low', 'likely', 'high'] as const;
/** Evenly over the range, now and then at its very ends: doubles alone are drawn by their bits, most of them next to nothing. */
const number = (min: number, max: number) =>
  fc.oneof(
    { weight: 9, arbitrary: fc.nat(2 ** 30).map((part) => min + (max - min) * (part / 2 ** 30)) },
    { weight: 1, arbitrary: fc.double({ min, max, noNaN: true }) },
  );
const pullsOf = (document: RunDocument): PullAnalysis[] => analyzeRun(document).pulls;
const only = (document: RunDocument): PullAnalysis => pullsOf(document)[0] as PullAnalysis;

// ---------------------------------------------------------------- runs in space

/** A unit vector: x east, y north, z up. */
type Unit = readonly [number, number, number];
/** A run in space: one heading more than corners, and the leg on each, in. */
interface Course {
  headings: Unit[];
  legs: number[];
}

const AXES: readonly Unit[] = [
  [1, 0, 0],
  [0, 1, 0],
  [0, 0, 1],
  [-1, 0, 0],
  [0, -1, 0],
  [0, 0, -1],
];
const dot = (a: Unit, b: Unit): number => a[0] * b[0] + a[1] * b[1] + a[2] * b[2];
const opposite = ([x, y, z]: Unit): Unit => [-x, -y, -z];

/** Any unit vector of azimuth and elevation, rad. */
const pointing = (azimuth: number, elevation: number): Unit => [
  Math.cos(elevation) * Math.sin(azimuth),
  Math.cos(elevation) * Math.cos(azimuth),
  Math.sin(elevation),
];

/** `heading` turned by an angle, toward the side that a roll about it picks. */
function turned(heading: Unit, angle: number, roll: number): Unit {
  const [x, y, z] = heading;
  // Two units across it: level, and the one square to both.
  const flat = Math.hypot(x, y);
  const level: Unit = flat < 1e-9 ? [1, 0, 0] : [-y / flat, x / flat, 0];
  const upright: Unit = [
    y * level[2] - z * level[1],
    z * level[0] - x * level[2],
    x * level[1] - y * level[0],
  ];
  const across = ([0, 1, 2] as const).map(
    (axis) => Math.cos(roll) * level[axis] + Math.sin(roll) * upright[axis],
  );
  const next = heading.map(
    (each, axis) => Math.cos(angle) * each + Math.sin(angle) * across[axis]!,
  );
  return [next[0]!, next[1]!, next[2]!];
}

const leg = number(40, 900);
/** Corners of 90° along the axes: upright and level bends, straight up and straight down. */
const squareCourse: fc.Arbitrary<Course> = fc
  .record({
    heading: fc.constantFrom(...AXES),
    turns: fc.array(fc.nat(3), { maxLength: 6 }),
    legs: fc.array(leg, { minLength: 7, maxLength: 7 }),
  })
  .map(({ heading, turns, legs }) => {
    const headings = [heading];
    for (const pick of turns) {
      const now = headings[headings.length - 1] as Unit;
      headings.push(AXES.filter((axis) => Math.abs(dot(axis, now)) < 0.5)[pick] as Unit);
    }
    return { headings, legs: legs.slice(0, headings.length) };
  });
/** Corners of any angle in any plane. */
const anyCourse: fc.Arbitrary<Course> = fc
  .record({
    azimuth: number(0, 2 * Math.PI),
    elevation: number(-1.5, 1.5),
    turns: fc.array(fc.record({ angle: number(5, 150), roll: number(0, 2 * Math.PI) }), {
      maxLength: 6,
    }),
    legs: fc.array(leg, { minLength: 7, maxLength: 7 }),
  })
  .map(({ azimuth, elevation, turns, legs }) => {
    const headings = [pointing(azimuth, elevation)];
    for (const { angle, roll } of turns) {
      headings.push(turned(headings[headings.length - 1] as Unit, radians(angle), roll));
    }
    return { headings, legs: legs.slice(0, headings.length) };
  });
/** Bends in any plane are integrated, and slow: one run in five has them. */
const course = fc.oneof(
  { weight: 4, arbitrary: squareCourse },
  { weight: 1, arbitrary: anyCourse },
);

/** The same pipe walked from its other end. */
const turnedBack = ({ headings, legs }: Course): Course => ({
  headings: headings.map(opposite).reverse(),
  legs: [...legs].reverse(),
});

const directionOf = ([x, y, z]: Unit, by = 0): Direction => ({
  azimuth: (((degrees(Math.atan2(x, y)) + by) % 360) + 360) % 360,
  elevation: degrees(Math.atan2(z, Math.hypot(x, y))),
});
/** In degrees, by the difference and the sum: exact at both ends of the scale. */
function angleBetween(a: Unit, b: Unit): number {
  const apart = Math.hypot(a[0] - b[0], a[1] - b[1], a[2] - b[2]);
  return degrees(2 * Math.atan2(apart, Math.hypot(a[0] + b[0], a[1] + b[1], a[2] + b[2])));
}

/** Three 2 AWG and an 8 in 2 EMT; `by` turns the whole run about the vertical, degrees. */
const runOf = ({ headings, legs }: Course, conditions: PullConditions = {}, by = 0): RunDocument =>
  buildRun({
    raceway: { type: 'EMT', tradeSize: '2' },
    start: { heading: directionOf(headings[0] as Unit, by) },
    path: [
      pullPoint(),
      ...legs.flatMap((length, index): PathElement[] => {
        const before = headings[index - 1];
        const now = headings[index] as Unit;
        if (!before) return [straight({ length })];
        const angle = Math.min(150, angleBetween(before, now));
        return [bend({ toward: directionOf(now, by), angle, radius: 9.5 }), straight({ length })];
      }),
      pullPoint(),
    ],
    conductors: [wires({ count: 3, size: '2' }), wires({ count: 1, size: '8', use: 'ground' })],
    conditions,
  });

// ---------------------------------------------------------------- any document with its pulls

const band: fc.Arbitrary<Band> = fc
  .tuple(number(0, MOST_FRICTION), number(0, MOST_FRICTION), number(0, MOST_FRICTION))
  .map((three) => {
    const [low, likely, high] = three.sort((a, b) => a - b) as [number, number, number];
    return { low, likely, high };
  });
const force = fc.oneof(number(0, 100), number(0, MOST_TENSION));
const limit = fc.oneof(fc.constant(null), number(1, 10_000));
const conditions: fc.Arbitrary<PullConditions> = fc.record(
  {
    friction: band,
    ropeFriction: number(0, MOST_FRICTION),
    crew: fc.record({ feeding: fc.nat(2), pulling: fc.nat(2) }),
    feedTension: fc.oneof(force, fc.record({ from: force, to: force })),
    attachment: fc.constantFrom('eye' as const, 'basket-grip' as const, 'tied-head' as const),
    limits: fc.record(
      {
        handOne: limit,
        handTwo: limit,
        puller: limit,
        rope: limit,
        sidewall: fc.record({ caution: limit, stop: limit }, { requiredKeys: [] }),
      },
      { requiredKeys: [] },
    ),
  },
  { requiredKeys: [] },
);
const plan = fc.array(
  fc.record({
    from: number(0, 1),
    to: number(0, 1),
    feedAt: fc.option(fc.constantFrom('from' as const, 'to' as const), { nil: undefined }),
  }),
  { maxLength: 3 },
);

/** Any valid document, with conditions, planned pulls and sheaves in its boxes; half of them with a set that goes in. */
function arbitraryPulls(shape?: RunShape): fc.Arbitrary<RunDocument> {
  const shapes = shape
    ? [shape]
    : (['none', 'all', 'some'] as const).map((directions) => ({ directions }));
  const wire = fc.record({
    count: fc.constantFrom(1, 2, 3, 4, 7),
    size: fc.constantFrom('14' as const, '12' as const, '10' as const),
  });
  return fc
    .record({
      document: fc.oneof(...shapes.map(arbitraryRun)),
      given: conditions,
      plan,
      small: fc.option(wire, { nil: undefined }),
      sheaves: fc.array(fc.option(number(1, 60), { nil: undefined }), {
        minLength: 4,
        maxLength: 4,
      }),
      isReached: fc.boolean(),
    })
    .map(({ document, given, plan: planned, small, sheaves, isReached }) => {
      const path = document.path.map((element, index): PathElement => {
        const sheaveRadius = sheaves[index % sheaves.length];
        if (!isPullPoint(element)) return element;
        const { turn } = element;
        return {
          ...element,
          ...(isReached && element.accessible === false && { accessible: true }),
          ...(turn && sheaveRadius !== undefined && { turn: { ...turn, sheaveRadius } }),
        };
      });
      const points = path.filter(isPullPoint).map(({ id }) => id);
      const pulls = planned.map(({ from, to, feedAt }, index) => {
        const first = Math.floor(Math.min(from, 0.999) * (points.length - 1));
        const last = first + 1 + Math.floor(Math.min(to, 0.999) * (points.length - 1 - first));
        const ends = { from: points[first] as string, to: points[last] as string };
        return { id: `pull${index}`, ...ends, ...(feedAt && { feedAt }) };
      });
      const conductors = small ? [wires({ id: 'w1', ...small })] : document.conductors;
      return { ...document, path, pulls, conditions: given, ...(conductors && { conductors }) };
    });
}

// ---------------------------------------------------------------- what is expected

/** Every number anywhere inside is finite. Written as JSON, one that is not would read null. */
function expectFinite(value: unknown, at = ''): void {
  if (typeof value === 'number' && !Number.isFinite(value)) throw new Error(`${at} is ${value}`);
  if (typeof value !== 'object' || value === null) return;
  for (const [key, inner] of Object.entries(value)) expectFinite(inner, `${at}/${key}`);
}

/** `a` is not above `b`, but for rounding. */
function expectNotAbove(a: number, b: number): void {
  expect(a).toBeLessThanOrEqual(b * (1 + CLOSE) + CLOSE);
}

function expectSame(one: PullDirection, other: PullDirection): void {
  expect(one.status).toBe(other.status);
  expect(one.reason).toBe(other.reason);
  for (const figure of ['tension', 'peak', 'holdBack', 'peakSidewall'] as const) {
    for (const level of LEVELS) {
      const [a, b] = [one[figure]?.[level] ?? 0, other[figure]?.[level] ?? 0];
      expect(Math.abs(a - b)).toBeLessThanOrEqual(CLOSE * Math.max(1, Math.abs(a)));
    }
  }
}

const REFUSED = ['does-not-fit', 'not-accessible', 'set-changes', 'turns-without-sheave'];

/** What holds of every answer, whatever was asked. */
function expectSound(pull: PullAnalysis): void {
  expectFinite(pull);
  for (const way of WAYS) {
    const { status, reason, tension, peak, holdBack, feed, profile, peakSidewall, governing } =
      pull[way];
    if (!tension || !peak || !holdBack || !peakSidewall) {
      expect(status).toBe(REFUSED.includes(reason ?? '') ? 'refused' : 'unknown');
      expect(reason).not.toBeNull();
      expect([tension, peak, holdBack, peakSidewall, governing]).toEqual(Array(5).fill(null));
      expect(profile).toEqual([]);
      continue;
    }
    expect([status, reason]).toEqual(['ok', null]);
    for (const level of LEVELS) {
      const along = profile.map((point) => point.tension[level]);
      expect(Math.min(...along)).toBeGreaterThanOrEqual(0);
      expect(Math.max(...along)).toBeLessThanOrEqual(MOST_TENSION);
      expect(along[0]).toBe(Math.max(feed, holdBack[level]));
      expect(along[along.length - 1]).toBe(tension[level]);
      expect(Math.max(...along)).toBe(peak[level]);
      const sidewalls = profile.map(({ sidewall }) => sidewall?.[level] ?? 0);
      expect(Math.max(...sidewalls)).toBe(peakSidewall[level]);
    }
    expectNotAbove(tension.low, tension.likely);
    expectNotAbove(tension.likely, tension.high);
    expectNotAbove(holdBack.likely, holdBack.low);
    expectNotAbove(holdBack.high, holdBack.likely);
    if (governing) expect(governing.ratio).toBe(governing.value / governing.allowed);
  }
  if (pull.recommended) expect(pull[pull.recommended].holdBack?.low).toBe(0);
  else expect(pull.noneBecause).not.toBeNull();
}

// ---------------------------------------------------------------- the properties

describe('the pull of any run', () => {
  it('is never less with more friction', () => {
    fc.assert(
      fc.property(arbitraryPulls(), (document) => {
        for (const pull of pullsOf(document)) {
          for (const way of WAYS) {
            const { tension } = pull[way];
            if (!tension) continue;
            expectNotAbove(tension.low, tension.likely);
            expectNotAbove(tension.likely, tension.high);
          }
        }
      }),
      { numRuns: RUNS / 2 },
    );
  });

  it('is never less with more friction, in space', () => {
    fc.assert(
      fc.property(course, band, (way, friction) => {
        const pull = only(runOf(way, { friction }));
        for (const name of WAYS) {
          const { tension } = pull[name];
          expectNotAbove(tension!.low, tension!.likely);
          expectNotAbove(tension!.likely, tension!.high);
        }
      }),
      { numRuns: RUNS },
    );
  });

  it('is never less with more feed tension', () => {
    const feeds = number(0, 400);
    fc.assert(
      fc.property(course, band, feeds, feeds, (way, friction, one, more) => {
        const at = (feedTension: number) => only(runOf(way, { feedTension, friction }));
        const [less, greater] = [at(one), at(one + more)];
        for (const name of WAYS) {
          for (const level of LEVELS) {
            expectNotAbove(less[name].tension![level], greater[name].tension![level]);
          }
        }
      }),
      { numRuns: RUNS / 2 },
    );
    fc.assert(
      fc.property(arbitraryPulls(), feeds, feeds, (document, one, more) => {
        const at = (feedTension: number) =>
          pullsOf({ ...document, conditions: { ...document.conditions, feedTension } });
        const greater = at(one + more);
        at(one).forEach((pull, index) => {
          for (const name of WAYS) {
            const [a, b] = [pull[name].tension, greater[index]?.[name].tension];
            expect(a === null).toBe(b === null);
            if (a && b) for (const level of LEVELS) expectNotAbove(a[level], b[level]);
          }
        });
      }),
      { numRuns: RUNS / 5 },
    );
  });

  it('is never less with more weight on a level run', () => {
    const weights = number(0.01, 5);
    fc.assert(
      fc.property(arbitraryPulls({ directions: 'none' }), weights, weights, (document, w, more) => {
        const at = (weight: number) =>
          pullsOf({
            ...document,
            start: { heading: 'east' },
            conductors: [cable({ id: 'w1', cable: { od: 0.2, weight } })],
          });
        const heavier = at(w + more);
        at(w).forEach((pull, index) => {
          for (const name of WAYS) {
            const [a, b] = [pull[name].tension, heavier[index]?.[name].tension];
            expect(a === null).toBe(b === null);
            if (a && b) for (const level of LEVELS) expectNotAbove(a[level], b[level]);
          }
        });
      }),
      { numRuns: RUNS / 2 },
    );
  });

  it('never recommends a direction that must be held back at low friction', () => {
    let held = 0;
    fc.assert(
      fc.property(course, band, (way, friction) => {
        const pull = only(runOf(way, { friction }));
        const holds = WAYS.filter((name) => pull[name].holdBack!.low > 0);
        held += holds.length;
        expect(holds).not.toContain(pull.recommended);
        if (holds.length === 2) expect(pull.noneBecause).toBe('hold-back');
        else expect(pull.recommended).not.toBeNull();
      }),
      { numRuns: RUNS },
    );
    expect(held).toBeGreaterThan(RUNS / 10);
  });

  it('reversed swaps its directions: in space', () => {
    fc.assert(
      fc.property(course, (way) => {
        const [there, andBack] = [only(runOf(way)), only(runOf(turnedBack(way)))];
        expectSame(there.forward, andBack.reverse);
        expectSame(there.reverse, andBack.forward);
      }),
      { numRuns: RUNS },
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
    fc.assert(
      fc.property(course, number(0, 360), (way, by) => {
        const [one, other] = [only(runOf(way)), only(runOf(way, {}, by))];
        for (const name of WAYS) expectSame(one[name], other[name]);
      }),
      { numRuns: RUNS },
    );
  });

  it('stays the same when a straight is cut in two', () => {
    fc.assert(
      fc.property(course, fc.nat(), number(0.01, 0.99), (way, pick, share) => {
        const whole = runOf(way);
        const straights = whole.path.filter(({ kind }) => kind === 'straight');
        const chosen = straights[pick % straights.length];
        const path = whole.path.flatMap((element): PathElement[] => {
          if (element !== chosen || element.kind !== 'straight') return [element];
          const first = element.length * share;
          return [
            { ...element, length: first },
            { ...element, id: 'rest', length: element.length - first },
          ];
        });
        const [one, other] = [only(whole), only({ ...whole, path })];
        for (const name of WAYS) expectSame(one[name], other[name]);
      }),
      { numRuns: RUNS },
    );
  });
});

describe('generated documents', () => {
  it('none crashes, hangs or is answered with something that is no number', () => {
    const numRuns = 2 * RUNS;
    let slowest = 0;
    let answered = 0;
    fc.assert(
      fc.property(arbitraryPulls(), (document) => {
        const timed = (): number => {
          const from = performance.now();
          analyzeRun(document);
          return performance.now() - from;
        };
        const analysis = analyzeRun(document);
        const first = timed();
        // A pause of the machine is no time of the document: whatever is slow is asked again.
        slowest = Math.max(slowest, first < SLOW ? first : Math.min(first, timed(), timed()));
        expectFinite(analysis);
        for (const pull of analysis.pulls) {
          expectSound(pull);
          if (pull.forward.status === 'ok') answered += 1;
        }
      }),
      { numRuns },
    );
    console.warn(`${numRuns} documents, the slowest ${slowest.toFixed(1)} ms`);
    expect(answered).toBeGreaterThan(numRuns / 4);
    expect(slowest).toBeLessThan(LONGEST);
  });

  it('a harder method if dry is reached at a friction that is named', () => {
    let named = 0;
    fc.assert(
      fc.property(course, band, (way, friction) => {
        const { method, planned, ...pull } = only(runOf(way, { friction }));
        if (!method || !isHarder(method.high, method.likely)) return;
        const { flipsAt } = method;
        named += 1;
        expect(flipsAt).not.toBeNull();
        if (flipsAt! >= friction.likely - 1e-3 && flipsAt! <= friction.high + 1e-3) return;
        // Where friction hardly matters it is told as well as the tension is: to a ten-thousandth.
        const there = only(runOf(way, { friction: { low: 0, likely: flipsAt!, high: 1.2 } }));
        const peak = there[planned].peak!.likely;
        expect(peak).toBeGreaterThanOrEqual(pull[planned].peak!.likely * (1 - 2e-4));
        expect(peak).toBeLessThanOrEqual(pull[planned].peak!.high * (1 + 2e-4));
      }),
      { numRuns: RUNS },
    );
    expect(named).toBeGreaterThan(RUNS / 20);
  });
});

describe('absurd documents', () => {
  const dry = { low: MOST_FRICTION, likely: MOST_FRICTION, high: MOST_FRICTION };
  /** 500 pieces: legs between bends that wind through space. */
  const winding = (overrides: Partial<RunDocument> = {}, angle = 150): RunDocument => {
    const headings = ['north', 'up', 'west', 'south', 'down', 'east'] as const;
    const middle = Array.from({ length: 249 }, (_, index): PathElement[] => [
      straight({ length: 30 }),
      bend({ angle, toward: headings[index % 6] as Direction }),
    ]).flat();
    return buildRun({
      path: [pullPoint(), ...middle, pullPoint()],
      conductors: [wires({ count: 3, size: '12' })],
      ...overrides,
    });
  };
  const oversized = { conductors: [wires({ count: 3, size: '2000', insulation: 'XHHW-2' })] };
  const halfInch = { raceway: { type: 'EMT', tradeSize: '1/2' } } as const;
  const lead = cable({ count: 1000, cable: { od: 0.001, weight: 1000, maxTension: 1e6 } });
  const mile = (...towards: Direction[]): PathElement[] => [
    pullPoint(),
    straight({ length: 1e6 }),
    ...towards.flatMap((toward): PathElement[] => [
      bend({ toward, radius: 10_000 }),
      straight({ length: 1e6 }),
    ]),
    pullPoint(),
  ];

  it.each<[string, RunDocument, string]>([
    ['500 pieces at friction 1.2', winding({ conditions: { friction: dry } }), 'ok'],
    ['500 pieces along the axes', winding({ conditions: { friction: dry } }, 90), 'ok'],
    ['500 pieces of nearly nothing', winding({ conditions: { friction: dry } }, 1e-3), 'ok'],
    ['2000 kcmil in 1/2 EMT', winding({ ...oversized, ...halfInch }), 'refused'],
    [
      'no friction at all',
      winding({ conditions: { friction: { low: 0, likely: 0, high: 0 } } }),
      'ok',
    ],
    ['a million lbf of feed', winding({ conditions: { feedTension: 1e6, friction: dry } }), 'ok'],
    [
      'a ton a foot, down 16 miles',
      buildRun({ path: mile('down', 'south', 'up'), conductors: [lead] }),
      'ok',
    ],
    [
      'a ton a foot, in any plane',
      winding({ conductors: [lead], conditions: { friction: dry } }),
      'ok',
    ],
    [
      'a ton a foot, bends of 833 ft in space',
      buildRun({
        path: mile({ azimuth: 20, elevation: 30 }, { azimuth: 300, elevation: -80 }, 'up'),
        conductors: [lead],
        start: { heading: { azimuth: 111, elevation: -44 } },
      }),
      'ok',
    ],
  ])('%s: a sound answer in time', (_name, document, status) => {
    const from = performance.now();
    const analysis = analyzeRun(document);
    expect(performance.now() - from).toBeLessThan(LONGEST_OF_500_PIECES);
    expectFinite(analysis);
    for (const pull of analysis.pulls) {
      expectSound(pull);
      expect(pull.forward.status).toBe(status);
    }
    expect(analysis.pulls).toHaveLength(1);
  });

  it('past a million lbf a million is told', () => {
    for (const way of WAYS) {
      const { tension, peak } = only(winding({ conditions: { friction: dry } }))[way];
      expect([tension, peak]).toEqual(
        Array(2).fill({ low: MOST_TENSION, likely: MOST_TENSION, high: MOST_TENSION }),
      );
    }
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

  it('occupied pipe beyond a box is no matter before it', () => {
    const conductors = [...set, wires({ count: 1, size: '12', use: 'existing', from: 'B' })];
    const pulls = pullsOf(buildRun({ path: path(), conductors }));
    expect(pulls.map(({ forward }) => forward.status)).toEqual(['ok', 'unknown']);
  });

  it('a set that does not go in is refused', () => {
    const conductors = [wires({ count: 3, size: '500' })];
    const raceway = { type: 'EMT', tradeSize: '1' } as const;
    const { forward, reverse, method, recommended, noneBecause } = only(
      buildRun({ path: path(), conductors, raceway }),
    );
    const refused = { status: 'refused', reason: 'does-not-fit', tension: null };
    expect([forward, reverse]).toMatchObject([refused, refused]);
    expect([method, recommended, noneBecause]).toEqual([null, null, 'no-answer']);
  });

  it('missing directions are named, and a finding stands at each', () => {
    const run = buildRun({
      path: [
        box('A'),
        straight(),
        bend({ toward: 'up' }),
        straight(),
        bend({ id: 'lost' }),
        straight(),
        box('C'),
      ],
      conductors: set,
    });
    expect(only(run).forward).toMatchObject({ status: 'unknown', reason: 'no-directions' });
    expect(analyzeRun(run).findings).toContainEqual(
      expect.objectContaining({
        code: 'direction-missing',
        at: expect.objectContaining({ elementId: 'lost' }) as unknown,
      }),
    );
  });

  it('a run without conductors, and one without lengths, say so', () => {
    expect(only(buildRun({ path: path() })).forward).toMatchObject({
      status: 'unknown',
      reason: 'no-conductors',
    });
    const bare = buildRun({ path: [box('A'), bend(), box('C')], conductors: set });
    expect(only(bare).forward).toMatchObject({ status: 'unknown', reason: 'no-lengths' });
  });

  it('a pull through a box where the set changes is refused, and the box is named', () => {
    const conductors = [...set, wires({ count: 1, size: '10', from: 'A', to: 'B' })];
    const analysis = analyzeRun(buildRun({ path: path(), conductors, ...through }));
    for (const way of WAYS) {
      expect(analysis.pulls[0]?.[way]).toMatchObject({
        status: 'refused',
        reason: 'set-changes',
        reasonAt: 'B',
      });
    }
    expect(analysis.findings).toContainEqual(
      expect.objectContaining({
        code: 'pull-set-changes',
        severity: 'stop',
        at: expect.objectContaining({ elementId: 'B' }) as unknown,
      }),
    );
    const apart = pullsOf(buildRun({ path: path(), conductors }));
    expect(apart.map(({ forward }) => forward.status)).toEqual(['ok', 'ok']);
  });

  it('a box that turns is no way through without a sheave', () => {
    const turn = { angle: 90, toward: 'north' as const };
    const turning = (more: object) =>
      only(buildRun({ path: path({ turn: { ...turn, ...more } }), conductors: set, ...through }));
    expect(turning({}).forward).toMatchObject({
      status: 'refused',
      reason: 'turns-without-sheave',
      reasonAt: 'B',
    });
    const round = turning({ sheaveRadius: 12 }).forward;
    expect(round.status).toBe('ok');
    const past = only(buildRun({ path: path(), conductors: set, ...through })).forward;
    expect(round.tension!.likely).toBeGreaterThan(past.tension!.likely * 1.3);
    // It bears on the sheave, not on a wall: no bore is taken from its radius.
    const at = round.profile.find(({ elementId }) => elementId === 'B');
    const { sidewall, tension } = at!;
    // Three 12 AWG in 3/4 EMT lie in a cradle, which shares by its weight correction w: (3w − 2)/3.
    const share = (3 * turning({ sheaveRadius: 12 }).weightCorrection! - 2) / 3;
    expect(sidewall!.likely).toBeCloseTo(share * tension.likely, 9);
  });

  it('a body that turns by itself is none either', () => {
    const body = { device: 'conduit-body' as const, body: 'LB' as const };
    const pull = only(buildRun({ path: path(body), conductors: set, ...through }));
    expect(pull.forward).toMatchObject({ reason: 'turns-without-sheave', reasonAt: 'B' });
  });

  it('nothing is pulled past a box nobody can reach', () => {
    const run = buildRun({ path: path({ accessible: false }), conductors: set });
    expect(only(run).forward).toMatchObject({
      status: 'refused',
      reason: 'not-accessible',
      reasonAt: 'B',
    });
  });

  it('ends where nobody can work are none to recommend', () => {
    const [first] = pullsOf(buildRun({ path: path({ reach: false }), conductors: set }));
    expect(first).toMatchObject({ recommended: null, noneBecause: 'no-reach' });
    expect(first?.forward.tension?.likely).toBeGreaterThan(0);
  });

  it('a flexible piece counts its planned turns and has no sidewall', () => {
    const raceway = { type: 'FMC', tradeSize: '3/4' } as const;
    const at = (planned: number) =>
      only(
        buildRun({
          path: [box('A'), straight(), flex({ id: 'F', raceway, degrees: planned }), box('C')],
          conductors: set,
        }),
      ).forward;
    const [straightOn, bent] = [at(0), at(180)];
    expect(bent.tension!.likely).toBeGreaterThan(straightOn.tension!.likely * 2);
    expect(bent.profile.find(({ elementId }) => elementId === 'F')?.sidewall).toBeNull();
  });
});
