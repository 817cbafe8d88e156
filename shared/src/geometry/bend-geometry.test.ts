import { describe, expect, it } from 'vitest';
import { arcLength, bendGain, tangentLength } from './bend-geometry';

describe('one bend', () => {
  it('16 in radius, 60°: gain 1.720', () => {
    // A published electricians' web tutorial on stacked kicks (its own figures give 1.725; it also prints 1.732, a slip).
    expect(Math.abs(bendGain(16, 60) - 1.72)).toBeLessThan(0.01);
  });

  it('a published power-bender sample: 3 in EMT, radius 16, 60°: arc 16-3/4, gain 1.72', () => {
    // A power-bender maker's printed sample layout, maker not named here.
    expect(Math.abs(arcLength(16, 60) - 16.75)).toBeLessThan(0.01);
    expect(bendGain(16, 60)).toBeCloseTo(1.72, 3);
  });

  it('1/2 in hand shoe, radius 4.353, 90°: tangent 4.353, arc 6.83768, gain 1.86832', () => {
    // Exact circle geometry, T = R tan(θ/2), worked by hand: no outside source.
    expect(tangentLength(4.353, 90)).toBeCloseTo(4.353, 9);
    expect(arcLength(4.353, 90)).toBeCloseTo(6.83768, 5);
    expect(bendGain(4.353, 90)).toBeCloseTo(1.86832, 5);
  });

  it('a segment bend of 90° at radius 46: developed 72-1/4', () => {
    // A hydraulic segment-bender operator's manual (maker not named), "Laying out a segment bend": 72.22 by its table.
    expect(Math.abs(arcLength(46, 90) - 72.22)).toBeLessThan(0.05);
  });

  it.each([
    ['1/2 in EMT', 4.353, 0.706, 2.5],
    ['3/4 in EMT', 5.461, 0.922, 3.375],
    ['1-1/4 in EMT', 8.755, 1.51, 5.5],
  ])(
    '%s: the gain over the backs of a 90 is the charted one within bending practice',
    (_, radius, od, chart) => {
      // A bender maker's printed chart of bending dimensions (maker not named): chart values run 0.07 low to 0.26 high.
      const outsideGain = bendGain(radius, 90) + od;
      expect(Math.abs(outsideGain - chart)).toBeLessThan(0.3);
    },
  );

  it.each([
    ['1/2 in EMT', 4.353, 0.706, 2.625, 0.1],
    ['3/4 in EMT', 5.461, 0.922, 3.25, 0.1],
    ['1 in EMT', 6.5815, 1.163, 4, 0.1],
  ])(
    '%s: the gain many carry in their heads (from memory, no source)',
    (_, radius, od, gain, within) => {
      expect(Math.abs(bendGain(radius, 90) + od - gain)).toBeLessThan(within);
    },
  );

  it.each([
    [5, 0.043661, 0.087266, 0.000055],
    [10, 0.087489, 0.174533, 0.000444],
    [22.5, 0.198912, 0.392699, 0.005126],
    [30, 0.267949, 0.523599, 0.0123],
    [45, 0.414214, 0.785398, 0.043029],
    [60, 0.57735, 1.047198, 0.107503],
    [90, 1, 1.570796, 0.429204],
  ])('%d° at radius 1 agrees with tables of tangents and radians', (angle, tangent, arc, gain) => {
    // Tangents and radians of any printed trigonometric table.
    expect(tangentLength(1, angle)).toBeCloseTo(tangent, 6);
    expect(arcLength(1, angle)).toBeCloseTo(arc, 6);
    expect(bendGain(1, angle)).toBeCloseTo(gain, 6);
  });

  it('the series for small angles meets the closed form at 3°, and keeps its digits where that loses them', () => {
    const theta = (3 * Math.PI) / 180;
    const closed = 2 * Math.tan(theta / 2) - theta;
    expect(Math.abs(bendGain(1, 2.9999999) / closed - 1)).toBeLessThan(1e-6);
    expect(bendGain(1, 0.001) / ((0.001 * Math.PI) / 180) ** 3).toBeCloseTo(1 / 12, 9);
  });
});
