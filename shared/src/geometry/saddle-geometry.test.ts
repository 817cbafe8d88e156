import { describe, expect, it } from 'vitest';
import {
  saddle3Run,
  saddle3Straight,
  saddle3VertexHeight,
  saddle4Run,
  saddle4Top,
} from './saddle-geometry';

describe('saddles', () => {
  it.each([
    [2, 22.5, 4.353, 2.35865, 3.49452],
    [4, 30, 5.461, 4.84482, 5.07346],
  ])(
    '3 bends, %d in high, outer %d°, radius %d: corner at %d, %d in straight',
    (height, angle, radius, vertex, straight) => {
      // Exact circle geometry, h′ = h + R(sec θ − 1): no outside source; the next test holds it against a published rule.
      expect(saddle3VertexHeight(height, angle, radius)).toBeCloseTo(vertex, 4);
      expect(saddle3Straight(height, angle, radius)).toBeCloseTo(straight, 4);
    },
  );

  it('4 in high, 22.5/45: the outer marks lie 10 in from the centre mark', () => {
    // Construction Electrician Basic (NAVEDTRA), chapter 5, table 5-4: 2-1/2 in for each inch of height, both sides.
    // The mark stands where the outer arc begins on the centre's side, less the shoe's lead (0.294 in, from its deduct).
    const radius = 4.353;
    const halfCentreArc = radius * ((22.5 * Math.PI) / 180);
    const fromCentre = halfCentreArc + saddle3Straight(4, 22.5, radius) - 0.294;
    expect(Math.abs(fromCentre - 10)).toBeLessThan(0.25);
  });

  it('3 bends: the run is twice the corner height times the cotangent', () => {
    expect(saddle3Run(2, 22.5, 4.353)).toBeCloseTo((2 * 2.35865) / Math.tan(Math.PI / 8), 3);
  });

  it('4 bends, 4 in over 12 in at 30°: the flat top ends the curves at both faces', () => {
    // F = W + 2T, exact circle geometry: no outside source.
    expect(saddle4Top(12, 30, 4.353)).toBeCloseTo(12 + 2 * 4.353 * Math.tan(Math.PI / 12), 9);
    expect(saddle4Run(4, 12, 30, 0)).toBeCloseTo(25.8564, 4);
  });
});
