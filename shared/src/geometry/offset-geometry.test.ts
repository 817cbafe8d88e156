import { describe, expect, it } from 'vitest';
import { lowestOffset, offsetRun, offsetShrink, offsetTravel } from './offset-geometry';

describe('offset', () => {
  it.each([
    [2, 15, 7.75],
    [12, 15, 46.375],
    [20, 15, 77.25],
    [4, 30, 8],
    [8, 30, 16],
    [18, 30, 36],
    [20, 30, 40],
    [12, 45, 16.9375],
    [18, 45, 25.4375],
  ])('%d in at %d°: marks %d in apart', (rise, angle, spacing) => {
    // An electric shoe-bender operator's manual (maker not named), section 4.3, table A.
    expect(Math.abs(offsetTravel(rise, angle) - spacing)).toBeLessThan(0.0625);
  });

  it('6 in at 30°: 12 in apart, shrink 1-1/2', () => {
    // A hydraulic segment-bender operator's manual (maker not named), "Laying out offset bends".
    expect(offsetTravel(6, 30)).toBeCloseTo(12, 9);
    expect(Math.abs(offsetShrink(6, 30, 4.353) - 1.5)).toBeLessThan(0.0625);
  });

  it.each([
    [8, 30, 2],
    [8, 45, 3],
  ])('%d in at %d°: shrink %d in', (rise, angle, shrink) => {
    // Modern Residential Wiring (Goodheart-Willcox), 2021, chapter 10, printed pages 144–149.
    expect(Math.abs(offsetShrink(rise, angle, 4.353) - shrink)).toBeLessThan(0.0625);
  });

  it('5° bends 6 in apart rise a little over 1/2 in', () => {
    // Modern Residential Wiring (Goodheart-Willcox), 2021, chapter 10.
    const rise = 6 / offsetTravel(1, 5);
    expect(Math.abs(rise - 0.523)).toBeLessThan(0.005);
  });

  it('a kick of 30 in at 60° takes 34.641 in', () => {
    // A published electricians' web tutorial on stacked kicks.
    expect(offsetTravel(30, 60)).toBeCloseTo(34.641, 3);
  });

  it('a rolling offset of 8 and 12 is an offset of 14.42', () => {
    // A home-improvement article on rolling offsets in piping.
    expect(Math.abs(Math.hypot(8, 12) - 14.42)).toBeLessThan(0.005);
    expect(offsetTravel(Math.hypot(8, 12), 45)).toBeCloseTo(20.396, 3);
  });

  it.each([
    [4, 30, 4.353, 0.96472],
    [8, 60, 8.755, 2.73642],
    [6, 30, 4.353, 1.50061],
    [6, 45, 4.353, 2.11067],
  ])('%d in at %d°, radius %d: exact shrink %d', (rise, angle, radius, shrink) => {
    // Exact circle geometry, h tan(θ/2) − 2g: no outside source.
    expect(offsetShrink(rise, angle, radius)).toBeCloseTo(shrink, 4);
  });

  it('the lowest offset at 30°, radius 4.353, with 2 in between the bends is 2.16638 in', () => {
    // Exact circle geometry: no outside source.
    expect(lowestOffset(4.353, 30, 2)).toBeCloseTo(2.16638, 5);
  });

  it('run and travel are the legs of one right triangle', () => {
    for (const angle of [5, 10, 22.5, 30, 45, 60, 89]) {
      expect(Math.hypot(offsetRun(7, angle), 7)).toBeCloseTo(offsetTravel(7, angle), 9);
    }
  });
});
