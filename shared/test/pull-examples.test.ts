import { describe, expect, it } from 'vitest';
import { SIDEWALL_SHARE, WEIGHT_CORRECTION } from '../src/pull/configuration';
import { bendTension } from '../src/pull/physics/bend-tension';
import { straightTension } from '../src/pull/physics/straight-tension';
import { conductorLimit } from '../src/pull/pulling-limits';
import { wires } from '../src/run/build-run';

const rad = (degrees: number) => (degrees * Math.PI) / 180;
/** A bend whose cable weighs nothing beside its tension: T·e^(µθ). */
const capstan = (tension: number, mu: number, degrees: number) =>
  bendTension(
    tension,
    { angle: rad(degrees), radius: 0, headingUp: 0, normalUp: 0 },
    { weight: 0, friction: mu },
  );
const level = (tension: number, length: number, weight: number, friction: number) =>
  straightTension(tension, { length, rise: 0, run: 1 }, { weight, friction });

/*
 * Published examples that are not about pulling, or that their source does not reproduce itself, and are left out:
 * lubricant quantity and film (M. Larson, 1996; a lubricant maker's newsletter): no lubricant here yet · ampacity of four
 * conductors (EC&M) · lead sheath (ICEA): not in the document · the rows of UFC 3-535-01 Table 12-4 that are not 0.008 × n ×
 * cmil · clearance of three (TES-P-104.05 clause 5.4.1): under checks/conductor-checks.
 */

describe('TES-P-104.05 (Saudi Electricity Co., 2007), p. 10, three cables in a duct', () => {
  // The source cuts every step to a whole newton and prints its multipliers with two decimals.
  const weight = 9.8 * 3.15 * 1.01 * 3;
  const multiplier = (degrees: number) => Math.floor(capstan(1, 0.5, degrees) * 100) / 100;

  it('occupancy 1.07', () => {
    const r = 41.3 / (154 - 41.3);
    expect(Math.abs(WEIGHT_CORRECTION.triangular(r) - 1.07)).toBeLessThanOrEqual(0.005);
  });

  it('A to F: 3002, 4442, 5442, 11917, 13418 N', () => {
    const b = Math.floor(level(0, 60, weight, 0.5 * 1.07));
    const c = Math.floor(b * multiplier(45));
    const d = Math.floor(level(c, 20, weight, 0.5 * 1.07));
    const e = Math.floor(d * multiplier(90));
    const f = Math.floor(level(e, 30, weight, 0.5 * 1.07));
    expect([b, c, d, e, f]).toEqual([3002, 4442, 5442, 11917, 13418]);
    expect((SIDEWALL_SHARE.single(1) * (c / 3)) / 1000).toBeCloseTo(1.48, 2);
    expect((SIDEWALL_SHARE.single(1) * (e / 3)) / 1000).toBeCloseTo(3.97, 2);
  });
});

describe('CommScope ConQuest conduit construction manual, p. 8.11 to 8.14', () => {
  it('A to H: 7, 10, 16, 35, 40, 59, 64 lb, every step to a whole pound', () => {
    const run = (from: number, feet: number) => Math.round(level(from, feet, 0.144, 0.5));
    const turn = (from: number, degrees: number) => Math.round(capstan(from, 0.5, degrees));
    const b = run(0, 100);
    const c = turn(b, 45);
    const d = run(c, 80);
    const e = turn(d, 90);
    const f = run(e, 75);
    const g = turn(f, 45);
    const h = run(g, 70);
    expect([b, c, d, e, f, g, h]).toEqual([7, 10, 16, 35, 40, 59, 64]);
    expect([c, e, g].map((tension) => tension / 10)).toEqual([1, 3.5, 5.9]);
  });

  it('longest straight at 340 lb: 4,722 ft', () => {
    expect(level(0, 4722, 0.144, 0.5)).toBeCloseTo(340, 0);
  });

  // µ down, degrees across: 15, 30, 45, 60, 75, 90.
  it.each([
    [0.7, [1.2, 1.44, 1.73, 2.08, 2.5, 3.0]],
    [0.6, [1.17, 1.37, 1.6, 1.87, 2.19, 2.57]],
    [0.5, [1.14, 1.3, 1.48, 1.68, 1.92, 2.19]],
    [0.4, [1.11, 1.23, 1.37, 1.52, 1.69, 1.87]],
    [0.3, [1.08, 1.17, 1.27, 1.37, 1.48, 1.6]],
    [0.15, [1.04, 1.08, 1.13, 1.17, 1.22, 1.27]],
  ])('multipliers at %d', (mu, printed) => {
    printed.forEach((multiplier, index) => {
      expect(Math.abs(capstan(1, mu, 15 * (index + 1)) - multiplier)).toBeLessThanOrEqual(0.01);
    });
  });
});

// Nexans Canada, CN-Installation-E: degrees 30, 45, 60, 90.
it.each([
  [0.25, [1.14, 1.22, 1.3, 1.48]],
  [0.3, [1.17, 1.27, 1.37, 1.6]],
  [0.4, [1.23, 1.37, 1.52, 1.88]],
])('Nexans multipliers at %d', (mu, printed) => {
  printed.forEach((multiplier, index) => {
    const degrees = [30, 45, 60, 90][index] as number;
    expect(Math.abs(capstan(1, mu, degrees) - multiplier)).toBeLessThanOrEqual(0.0075);
  });
});

describe('ropes round drums', () => {
  it('Beer and Johnston, Statics, 8.104: 80 to 5,000 lb in two turns is µ 0.329; 20,000 lb takes 2.67', () => {
    expect(Math.abs(capstan(80, 0.329, 720) / 5000 - 1)).toBeLessThan(0.0005 * 4 * Math.PI);
    expect(Math.abs(capstan(80, 0.329, 2.67 * 360) / 20_000 - 1)).toBeLessThan(0.02);
  });

  it('one and two wraps at µ 0.3: 6.6 and 43; two and a half at 0.25 hold 2,000 N with 39', () => {
    expect(Math.abs(capstan(1, 0.3, 360) - 6.6)).toBeLessThanOrEqual(0.05);
    expect(Math.abs(capstan(1, 0.3, 720) - 43)).toBeLessThanOrEqual(0.6);
    expect(Math.abs(2000 / capstan(1, 0.25, 900) - 39)).toBeLessThanOrEqual(0.6);
  });

  it('from memory: Beer and Johnston, a hawser of 150 and 7,500 N; Hibbeler, two drums; Meriam, a drum', () => {
    expect(Math.abs(capstan(150, 0.3113, 720) - 7500)).toBeLessThan(10);
    expect(Math.abs(capstan(150, 0.3113, 1080) / 1000 - 52.7)).toBeLessThan(0.5);
    expect(Math.abs(500 / capstan(1, 0.25, 135) - 277.4)).toBeLessThanOrEqual(0.05);
    expect(Math.abs(capstan(981, 0.3, 90) - 1572)).toBeLessThanOrEqual(1);
    expect(Math.abs(981 / capstan(1, 0.3, 90) - 612)).toBeLessThanOrEqual(0.5);
  });
});

// Reference vectors: closed forms checked against an integration of the balance of forces.
describe('level bends', () => {
  it.each([
    ['start tension 0', 0, 5, 4, 0.35, 11.5579],
    ['heavy', 100, 3, 3, 0.49, 216.2525],
    ['light', 20, 0.1, 0.5, 0.3, 32.0396],
  ])('%s', (_name, tension, weight, radius, friction, leaving) => {
    const way = { angle: Math.PI / 2, radius, headingUp: 0, normalUp: 0 };
    expect(bendTension(tension, way, { weight, friction })).toBeCloseTo(leaving, 3);
  });
});

describe('upright bends, 500 in, 5 lb/ft, R 4, f 0.3', () => {
  const sin45 = Math.SQRT1_2;
  it.each([
    // Over a crest the centre lies below, through a dip above.
    ['crest, 45 up to level', 45, sin45, -sin45, 644.4528],
    ['dip, 45 down to level', 45, -sin45, sin45, 621.2397],
    ['crest, level to straight down', 90, 0, -1, 785.2494],
    ['dip, level to straight up', 90, 0, 1, 816.7283],
  ])('%s', (_name, degrees, headingUp, normalUp, leaving) => {
    const way = { angle: rad(degrees), radius: 4, headingUp, normalUp };
    expect(bendTension(500, way, { weight: 5, friction: 0.3 })).toBeCloseTo(leaving, 3);
  });
});

it.each([
  ['30° up', 100, 0.5, 545.4923],
  ['straight up', 40, 1, 360],
  ['straight down', 40, -1, 40],
])('inclines: %s', (_name, length, rise, leaving) => {
  const load = { weight: 4, friction: 0.35 * 1.2 };
  expect(straightTension(200, { length, rise, run: Math.sqrt(1 - rise * rise) }, load)).toBeCloseTo(
    leaving,
    3,
  );
});

// Frictionless statics of cylinders in a cylinder: what the wall bears over the weight.
it.each([
  [4.026, 1.0, 1.059528, 1.145613, 0.478947, 1.21842],
  [2.067, 0.642, 1.120118, 1.270632, 0.603965, 1.405948],
  [1.049, 0.254, 1.055312, 1.136104, 0.469438, 1.204156],
])('weight corrections in %d of %d', (bore, d, two, cradled, cradledShare, diamond) => {
  const r = d / (bore - d);
  expect(WEIGHT_CORRECTION.two(r)).toBeCloseTo(two, 5);
  expect(WEIGHT_CORRECTION.triangular(r)).toBeCloseTo(two, 5);
  expect(WEIGHT_CORRECTION.cradled(r)).toBeCloseTo(cradled, 5);
  expect(SIDEWALL_SHARE.cradled(WEIGHT_CORRECTION.cradled(r))).toBeCloseTo(cradledShare, 5);
  expect(WEIGHT_CORRECTION.diamond(r)).toBeCloseTo(diamond, 5);
});

describe('sidewall pressure', () => {
  it('1,200 lb at R 2 ft, 1.3 in in 4.026: single, triangle, cradle, mixed', () => {
    const r = 1.3 / (4.026 - 1.3);
    const pressure = (configuration: keyof typeof SIDEWALL_SHARE) =>
      (SIDEWALL_SHARE[configuration](WEIGHT_CORRECTION[configuration](r)) * 1200) / 2;
    expect(pressure('single')).toBeCloseTo(600, 3);
    expect(pressure('triangular')).toBeCloseTo(341.31114, 3);
    expect(pressure('cradled')).toBeCloseTo(381.93866, 3);
    expect(pressure('complex')).toBeCloseTo(420, 3);
    // The bottom one of four bears 272.9; the two at the side a half each, which is more.
    expect(((WEIGHT_CORRECTION.diamond(r) - 1) * 1200) / 2).toBeCloseTo(272.90799, 3);
    expect(pressure('diamond')).toBeCloseTo(300, 3);
  });

  it('General Cable, January 2011: 300 lb/ft at 2 ft allows 600 lb; EC&M, November 2001: 3,600 lb at 1,200 needs 3 ft', () => {
    expect((SIDEWALL_SHARE.single(1) * 600) / 2).toBe(300);
    expect((SIDEWALL_SHARE.single(1) * 3600) / 3).toBe(1200);
  });
});

describe('limits of conductors', () => {
  it('UFC 3-535-01 Table 12-4: 2, 3 and 4 of 6 AWG 420, 630, 840 lb, 6 and 12 of 12 AWG 315 and 630', () => {
    // The table takes nothing off for more than three; this engine takes a fifth, which is put back here.
    const whole = (size: '6' | '12', count: number) =>
      conductorLimit([wires({ size, count })]) / (count > 3 ? 0.8 : 1);
    expect(Math.abs(whole('6', 2) - 420)).toBeLessThanOrEqual(5);
    expect(Math.abs(whole('6', 3) - 630)).toBeLessThanOrEqual(5);
    expect(Math.abs(whole('6', 4) - 840)).toBeLessThanOrEqual(5);
    expect(Math.abs(whole('12', 6) - 315)).toBeLessThanOrEqual(5);
    expect(Math.abs(whole('12', 12) - 630)).toBeLessThanOrEqual(5);
  });

  it('TES: 70.216 N/mm² on three of 240 mm² is 50,555 N, and 0.008 lb a circular mil is that stress', () => {
    const newtons = conductorLimit([wires({ size: '250', count: 1 })]) * 4.4482216;
    const squareMillimetres = (250_000 * Math.PI * 25.4 ** 2) / 4 / 1e6;
    expect(Math.abs(newtons / squareMillimetres - 70.216)).toBeLessThanOrEqual(0.05);
    expect(Math.abs((newtons / squareMillimetres) * 240 * 3 - 50_555)).toBeLessThan(30);
    expect(Math.abs(newtons / squareMillimetres / 9.80665 - 7.16)).toBeLessThanOrEqual(0.01);
  });
});

it('ADS Mexicana, March 2009: 300 m of 7.4 kg/m at µ 0.2 is 444 kgf', () => {
  expect(level(0, 300, 7.4, 0.2)).toBeCloseTo(444, 6);
});

it('nine 12 AWG, mixed set, 5 lb of feed, five legs of 20 ft and four 90s: 192.5 lb', () => {
  const load = { weight: 0.216, friction: 0.35 * 1.4 };
  const tensions: number[] = [];
  let tension = 5;
  for (let turn = 0; turn <= 4; turn += 1) {
    tension = straightTension(tension, { length: 20, rise: 0, run: 1 }, load);
    tensions.push(tension);
    if (turn < 4) tensions.push((tension = capstan(tension, load.friction, 90)));
  }
  const wanted = [7.1168, 15.3659, 17.4827, 37.7468, 39.8636, 86.0693, 88.1861, 190.4024, 192.5192];
  tensions.forEach((each, index) => expect(each).toBeCloseTo(wanted[index] as number, 3));
  expect(WEIGHT_CORRECTION.complex(0.2)).toBe(1.4);
  expect(Math.round(conductorLimit([wires({ size: '12', count: 9 })]))).toBe(376);
});
