import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { conduitOutsideDiameter } from '../tables/conduit-outside-diameters';
import { LEG_MEASURES, fromCorner, toCorner } from './leg-measures';
import type { LegEnds } from './leg-measures';

const RUNS = process.env.FAIRLEAD_LONG === '1' ? 10_000 : 1_000;

/** 3 in EMT as a published power-bender sample gives it: R 16, OD 3.5; its 60° arc is 16-3/4 in, its gain 1.72 in. */
const BOX_TO_90: LegEnds = { before: null, after: { angle: 90, radius: 16 }, outsideDiameter: 3.5 };
const BOX_TO_60: LegEnds = { ...BOX_TO_90, after: { angle: 60, radius: 16 } };

describe('leg measures', () => {
  it('adds half the diameter to the back of a 90', () => {
    expect(fromCorner(100, 'back', BOX_TO_90)).toBeCloseTo(101.75, 12);
  });

  it('takes half the gain off to the centre of a bend', () => {
    expect(fromCorner(100, 'centre', BOX_TO_60)).toBeCloseTo(100 - 1.72 / 2, 3);
  });

  it('measures back to back between two 90s: out to out is corner to corner and one diameter', () => {
    const ends = { ...BOX_TO_90, before: { angle: 90, radius: 16 } };
    expect(fromCorner(48, 'back', ends)).toBeCloseTo(51.5, 12);
  });

  it('agrees with the points the bend is made of', () => {
    // A 90 from heading east to north with its corner at (100, 0): the outside face of the second leg stands at x = 100 + OD/2.
    expect(fromCorner(100, 'back', BOX_TO_90)).toBeCloseTo(100 + 3.5 / 2, 12);
    // Along the pipe: to the tangent point 100 − R, then half the arc.
    expect(fromCorner(100, 'centre', BOX_TO_90)).toBeCloseTo(100 - 16 + (Math.PI / 4) * 16, 12);
  });

  it('is the same in all three from box to box', () => {
    const ends: LegEnds = { before: null, after: null, outsideDiameter: null };
    for (const measure of LEG_MEASURES) expect(fromCorner(42, measure, ends)).toBe(42);
  });

  it('has no answer without the figure it needs', () => {
    expect(fromCorner(42, 'back', { ...BOX_TO_90, outsideDiameter: null })).toBeNull();
    expect(
      fromCorner(42, 'centre', { ...BOX_TO_90, after: { angle: 90, radius: null } }),
    ).toBeNull();
    expect(toCorner(42, 'back', { ...BOX_TO_90, outsideDiameter: null })).toBeNull();
  });

  it('converts there and back', () => {
    const end = fc.option(
      fc.record({
        angle: fc.double({ min: 0.5, max: 150, noNaN: true }),
        radius: fc.double({ min: 0.1, max: 100, noNaN: true }),
      }),
    );
    const ends = fc.record({
      before: end,
      after: end,
      outsideDiameter: fc.constantFrom(0.706, 6.625),
    });
    fc.assert(
      fc.property(
        fc.double({ min: 1, max: 1e5, noNaN: true }),
        fc.constantFrom(...LEG_MEASURES),
        ends,
        (corner, measure, given) => {
          const shown = fromCorner(corner, measure, given);
          expect(toCorner(shown ?? NaN, measure, given)).toBeCloseTo(corner, 6);
        },
      ),
      { numRuns: RUNS },
    );
  });
});

it('has no diameter for what was read in no list', () => {
  expect(conduitOutsideDiameter('FMC', '1')).toBeNull();
  expect(conduitOutsideDiameter('EMT', '5')).toBeNull();
});
