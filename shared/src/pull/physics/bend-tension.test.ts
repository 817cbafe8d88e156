import fc from 'fast-check';
import { create, all } from 'mathjs';
import { describe, expect, it } from 'vitest';
import { bendFeed, bendTension } from './bend-tension';
import type { BendWay, Load } from './load';
import { straightFeed, straightTension } from './straight-tension';

const math = create(all!);
/** mathjs 15 has it; its types do not. */
type SolveODE = (
  slope: (turned: number, now: number[]) => number[],
  span: number[],
  start: number[],
  options: object,
) => { y: number[][] };
const { solveODE } = math as unknown as { solveODE: SolveODE };
const RUNS = process.env.FAIRLEAD_LONG === '1' ? 10_000 : 1_000;

/** A unit heading and a unit normal across it, from three angles: a bend in any plane. */
function plane(azimuth: number, elevation: number, roll: number) {
  const heading = [
    Math.cos(elevation) * Math.cos(azimuth),
    Math.cos(elevation) * Math.sin(azimuth),
    Math.sin(elevation),
  ];
  const level = [-Math.sin(azimuth), Math.cos(azimuth), 0];
  const upright = [
    -Math.sin(elevation) * Math.cos(azimuth),
    -Math.sin(elevation) * Math.sin(azimuth),
    Math.cos(elevation),
  ];
  const normal = level.map((each, axis) => Math.cos(roll) * each + Math.sin(roll) * upright[axis]!);
  return { heading, normal };
}

/** The balance of forces on the cable by mathjs alone: vectors, and its own Runge-Kutta. */
function byMathjs(
  tension: number,
  { heading, normal }: ReturnType<typeof plane>,
  { angle, radius }: Pick<BendWay, 'angle' | 'radius'>,
  { weight, friction }: Load,
): number {
  const up = [0, 0, 1];
  const slope = (turned: number, [now]: number[]): number[] => {
    const [cos, sin] = [Math.cos(turned), Math.sin(turned)];
    const t = math.add(math.multiply(cos, heading), math.multiply(sin, normal)) as number[];
    const n = math.subtract(math.multiply(cos, normal), math.multiply(sin, heading)) as number[];
    const along = math.dot(up, t);
    const across = math.subtract(up, math.multiply(along, t)) as number[];
    const heft = weight * radius;
    const bears = math.subtract(math.multiply(heft, across), math.multiply(now!, n)) as number[];
    return [heft * along + friction * (math.norm(bears) as number)];
  };
  const solution = solveODE(slope, [0, angle], [tension], {
    method: 'RK45',
    tol: 1e-9,
    maxStep: angle / 50,
    minStep: angle * 1e-7,
    maxIter: 1e6,
  });
  return solution.y[solution.y.length - 1]![0]!;
}

const bends = fc.record({
  azimuth: fc.double({ min: 0, max: 2 * Math.PI, noNaN: true }),
  elevation: fc.double({ min: -1.5, max: 1.5, noNaN: true }),
  roll: fc.double({ min: 0, max: 2 * Math.PI, noNaN: true }),
  angle: fc.double({ min: 0.1, max: 2.6, noNaN: true }),
  radius: fc.double({ min: 0.3, max: 3, noNaN: true }),
  weight: fc.double({ min: 0.05, max: 8, noNaN: true }),
  friction: fc.double({ min: 0.05, max: 1, noNaN: true }),
  tension: fc.double({ min: 1, max: 2000, noNaN: true }),
});
const wayOf = ({
  azimuth,
  elevation,
  roll,
  angle,
  radius,
}: typeof bends extends fc.Arbitrary<infer T> ? T : never) => {
  const { heading, normal } = plane(azimuth, elevation, roll);
  const way: BendWay = { angle, radius, headingUp: heading[2]!, normalUp: normal[2]! };
  return { way, heading, normal };
};

describe('a bend in any plane', () => {
  it('agrees with the equation solved by mathjs to a millionth', () => {
    fc.assert(
      fc.property(bends, (bend) => {
        const { way, heading, normal } = wayOf(bend);
        const reference = byMathjs(bend.tension, { heading, normal }, way, bend);
        expect(Math.abs(bendTension(bend.tension, way, bend) / reference - 1)).toBeLessThan(1e-6);
      }),
      { numRuns: Math.min(RUNS / 10, 300), seed: 1 },
    );
  });

  it.each([
    ['level', 0, 0, 0],
    ['upright, over a crest', 0, 0.6, -Math.PI / 2],
    ['upright, through a dip', 0, -0.4, Math.PI / 2],
  ])(
    '%s: closed form and equation agree, also at a low tension',
    (_name, azimuth, elevation, roll) => {
      for (const tension of [0.5, 3, 40, 900]) {
        const bend = {
          azimuth,
          elevation,
          roll,
          angle: Math.PI / 2,
          radius: 4,
          weight: 5,
          friction: 0.3,
          tension,
        };
        const { way, heading, normal } = wayOf(bend);
        const reference = byMathjs(tension, { heading, normal }, way, bend);
        expect(Math.abs(bendTension(tension, way, bend) / reference - 1)).toBeLessThan(1e-6);
      }
    },
  );

  it('grows with the tension entering and with friction', () => {
    fc.assert(
      fc.property(bends, fc.double({ min: 0, max: 1, noNaN: true }), (bend, more) => {
        const { way } = wayOf(bend);
        const leaving = bendTension(bend.tension, way, bend);
        expect(bendTension(bend.tension + more, way, bend)).toBeGreaterThanOrEqual(
          leaving - 1e-9 * (1 + Math.abs(leaving)),
        );
        const rougher = { ...bend, friction: bend.friction + more };
        expect(bendTension(bend.tension, way, rougher)).toBeGreaterThanOrEqual(
          leaving - 1e-9 * (1 + Math.abs(leaving)),
        );
      }),
      { numRuns: RUNS / 10 },
    );
  });
});

describe('the least feed of a bend', () => {
  it('leads to the tension asked for where the cable stays taut by itself', () => {
    fc.assert(
      fc.property(bends, (bend) => {
        const { way } = wayOf(bend);
        const leaving = bendTension(bend.tension, way, bend);
        // A cable this light beside its tension stays taut all along.
        fc.pre(bend.tension > 4 * bend.weight * bend.radius);
        expect(Math.abs(bendFeed(leaving, way, bend) / bend.tension - 1)).toBeLessThan(1e-5);
      }),
      { numRuns: RUNS / 10 },
    );
  });

  it('keeps the cable taut, and just so', () => {
    fc.assert(
      fc.property(bends, (bend) => {
        const { way } = wayOf(bend);
        const feed = bendFeed(0, way, bend);
        const parts = 40;
        let tension = feed;
        let lowest = feed;
        for (let part = 0; part < parts; part += 1) {
          const turned = (way.angle * part) / parts;
          const [cos, sin] = [Math.cos(turned), Math.sin(turned)];
          const step = {
            angle: way.angle / parts,
            radius: way.radius,
            headingUp: way.headingUp * cos + way.normalUp * sin,
            normalUp: way.normalUp * cos - way.headingUp * sin,
          };
          tension = bendTension(tension, step, bend);
          lowest = Math.min(lowest, tension);
        }
        const scale = bend.weight * bend.radius;
        expect(lowest).toBeGreaterThan(-0.002 * scale);
        if (feed > 0) expect(lowest).toBeLessThan(0.02 * scale);
      }),
      { numRuns: RUNS / 10 },
    );
  });
});

describe('straights', () => {
  it('in pounds and feet are the same pull as in newtons and metres, by mathjs', () => {
    const metres = (feet: number) => math.unit(feet, 'ft').toNumber('m');
    const newtons = (pounds: number) => math.unit(pounds, 'lbf').toNumber('N');
    const perMetre = newtons(4) / metres(1);
    const load = { weight: 4, friction: 0.42 };
    const pounds = straightTension(
      200,
      { length: 100, rise: 0.5, run: Math.cos(Math.PI / 6) },
      load,
    );
    const si =
      newtons(200) +
      perMetre * metres(100) * (0.5 + 0.42 * Math.cos(math.unit(30, 'deg').toNumber('rad')));
    expect(newtons(pounds)).toBeCloseTo(si, 8);
  });

  it('need no feed where they climb, and what they fall where they hang', () => {
    const load = { weight: 5.149, friction: 0.42 };
    expect(straightFeed(0, { length: 100, rise: 1, run: 0 }, load)).toBe(0);
    expect(straightFeed(0, { length: 100, rise: -1, run: 0 }, load)).toBeCloseTo(514.9, 9);
    expect(straightFeed(600, { length: 100, rise: 1, run: 0 }, load)).toBeCloseTo(85.1, 9);
  });
});
