import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Direction } from '../run/run-document';
import { directionVector, vectorDirection } from './directions';
import { across, angleBetween, rotateAbout, signedRoll, turn } from './turn';
import { cross, dot, magnitude, scale, subtract, unit } from './vector';
import type { Vector } from './vector';

const LONG = process.env.FAIRLEAD_LONG === '1';
const runs = { numRuns: LONG ? 10_000 : 1_000 };
const anyDirection = fc.record({
  azimuth: fc.double({ min: 0, max: 360, noNaN: true }),
  elevation: fc.double({ min: -89, max: 89, noNaN: true }),
});
const near = (a: Vector, b: Vector): number => magnitude(subtract(a, b));

describe('directions', () => {
  it.each<[Direction, Vector]>([
    ['up', { x: 0, y: 0, z: 1 }],
    ['north', { x: 0, y: 1, z: 0 }],
    ['east', { x: 1, y: 0, z: 0 }],
    [
      { azimuth: 90, elevation: 0 },
      { x: 1, y: 0, z: 0 },
    ],
    [
      { azimuth: 180, elevation: 0 },
      { x: 0, y: -1, z: 0 },
    ],
    [
      { azimuth: 0, elevation: 30 },
      { x: 0, y: Math.sqrt(3) / 2, z: 0.5 },
    ],
  ])('%j is %j', (direction, vector) => {
    expect(near(directionVector(direction), vector)).toBeLessThan(1e-12);
  });

  it('names a compass vector and measures the rest', () => {
    expect(vectorDirection({ x: 0, y: 0, z: 2 })).toBe('up');
    expect(vectorDirection({ x: -3, y: 0, z: 0 })).toBe('west');
    expect(vectorDirection({ x: 1, y: 1, z: 0 })).toEqual({ azimuth: 45, elevation: 0 });
    expect(vectorDirection({ x: 0, y: 0, z: 0 })).toBeNull();
  });

  it('there and back again', () => {
    fc.assert(
      fc.property(anyDirection, (direction) => {
        const vector = directionVector(direction);
        const back = vectorDirection(vector);
        expect(magnitude(vector)).toBeCloseTo(1, 12);
        expect(back && near(directionVector(back), vector)).toBeLessThan(1e-9);
      }),
      runs,
    );
  });
});

describe('turning', () => {
  it('east, 90° toward up, is up; 45° toward north is north-east', () => {
    const east = directionVector('east');
    expect(near(turn(east, directionVector('up'), 90), directionVector('up'))).toBeLessThan(1e-12);
    const half = turn(east, directionVector('north'), 45);
    expect(near(half, { x: Math.SQRT1_2, y: Math.SQRT1_2, z: 0 })).toBeLessThan(1e-12);
  });

  it('a direction along the pipe has no side', () => {
    const east = directionVector('east');
    expect(across(east, directionVector('east'))).toBeNull();
    expect(across(east, directionVector('west'))).toBeNull();
    expect(across(east, directionVector({ azimuth: 90, elevation: 1e-6 }))).toBeNull();
  });

  it('turns by exactly the angle of the bend, in the plane of heading and direction', () => {
    fc.assert(
      fc.property(
        anyDirection,
        anyDirection,
        fc.double({ min: 0.1, max: 150, noNaN: true }),
        (a, b, angle) => {
          const heading = directionVector(a);
          const sideways = across(heading, directionVector(b));
          fc.pre(sideways !== null);
          const after = turn(heading, sideways as Vector, angle);
          expect(Math.abs(angleBetween(heading, after) - angle)).toBeLessThan(1e-9);
          const axis = unit(cross(heading, sideways as Vector));
          expect(Math.abs(dot(axis, after))).toBeLessThan(1e-12);
          expect(near(rotateAbout(heading, axis, angle), after)).toBeLessThan(1e-12);
        },
      ),
      runs,
    );
  });

  it('measures angles near 0 and near 180 without losing digits', () => {
    const east = directionVector('east');
    const tiny = turn(east, directionVector('north'), 1e-6);
    expect(angleBetween(east, tiny) / 1e-6).toBeCloseTo(1, 6);
    expect(180 - angleBetween(east, scale(tiny, -1))).toBeCloseTo(1e-6, 9);
  });

  it('rolls: 0 the same way, 180 back, ±90 square', () => {
    const [east, up, north, west] = (['east', 'up', 'north', 'west'] as const).map(
      directionVector,
    ) as [Vector, Vector, Vector, Vector];
    expect(signedRoll(east, up, west)).toBeCloseTo(0, 12);
    expect(signedRoll(east, up, east)).toBeCloseTo(180, 12);
    expect(signedRoll(east, up, north)).toBeCloseTo(-90, 12);
  });

  it('a bent tube of four vertices: 90° and 90°, rolled 180°', () => {
    // Four vertices published in a mathematics forum question; the answer is worked by hand.
    const points = [
      { x: 38.5202, y: -14.0264, z: 0 },
      { x: 45.3142, y: -14.0264, z: 0 },
      { x: 45.3142, y: -17.5214, z: 0.9654 },
      { x: 48.6822, y: -17.5214, z: 0.9654 },
    ] as const;
    const legs = [
      subtract(points[1], points[0]),
      subtract(points[2], points[1]),
      subtract(points[3], points[2]),
    ] as const;
    expect(legs.map(magnitude).map((length) => Number(length.toFixed(3)))).toEqual([
      6.794, 3.626, 3.368,
    ]);
    const [a, b, c] = [unit(legs[0]), unit(legs[1]), unit(legs[2])];
    expect(angleBetween(a, b)).toBeCloseTo(90, 9);
    expect(angleBetween(b, c)).toBeCloseTo(90, 9);
    expect(signedRoll(a, b, c)).toBeCloseTo(180, 9);
  });
});
