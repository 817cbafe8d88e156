import { describe, expect, it } from 'vitest';
import { stationScale } from './scale';
import type { Stop } from './scale';

const SPACING = { inside: 6, between: 13, beside: 4 };
const box = (station: number): Stop => ({
  station,
  halfWidth: 10,
  elementId: `box ${station}`,
  isPullPoint: true,
});
const tick = (station: number, elementId = `bend ${station}`): Stop => ({
  station,
  halfWidth: 1.5,
  elementId,
  isPullPoint: false,
});

describe('stationScale', () => {
  it('is to scale where every gap has room', () => {
    const scale = stationScale([box(0), tick(30), box(100)], 500, SPACING);
    expect(scale.stretchedUnder).toBeNull();
    expect(scale.perUnit).toBeCloseTo(5, 9);
    expect(scale.xAt(30)).toBeCloseTo(150, 6);
    expect(scale.xAt(65)).toBeCloseTo(325, 6);
  });

  it('draws a short gap longer and still fills the width', () => {
    const scale = stationScale([box(0), tick(500), tick(502), box(1000)], 600, SPACING);
    expect(scale.stops[2]! - scale.stops[1]!).toBeCloseTo(SPACING.between, 9);
    expect(scale.stretchedUnder).toBe(2);
    expect(scale.width).toBe(600);
    expect(scale.stops[3]).toBeCloseTo(600, 6);
  });

  it('keeps the bends of one piece closer than two pieces', () => {
    const scale = stationScale([box(0), tick(500, 'a'), tick(501, 'a'), box(1000)], 600, SPACING);
    expect(scale.stops[2]! - scale.stops[1]!).toBeCloseTo(SPACING.inside, 9);
  });

  it('becomes wider where the least gaps pass 78 % of the width', () => {
    const stops = Array.from({ length: 41 }, (_, index) => tick(index * 100));
    const scale = stationScale(stops, 500, SPACING);
    expect(scale.width).toBeCloseTo((40 * SPACING.between) / 0.78, 9);
    expect(scale.stops[40]).toBeCloseTo(scale.width, 6);
  });

  it('shares the width evenly where there is no distance at all', () => {
    const scale = stationScale([box(0), box(0)], 300, SPACING);
    expect(scale.stops).toEqual([0, 300]);
    expect(scale.xAt(0)).toBe(0);
  });

  it('holds still beyond both ends', () => {
    const scale = stationScale([box(0), box(100)], 300, SPACING);
    expect([scale.xAt(-5), scale.xAt(105)]).toEqual([0, scale.stops[1]]);
  });
});
