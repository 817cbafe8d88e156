import { describe, expect, it } from 'vitest';
import { axisLabel, axisTicks } from './axis';

const ticks = (length: number, width: number, apart = 58) =>
  axisTicks({
    length,
    perUnit: width / length,
    xAt: (station) => (station / length) * width,
    apart,
    size: 12.5,
  });
const labels = (length: number, width: number) => ticks(length, width).map(({ label }) => label);

describe('axisTicks', () => {
  it('takes the smallest step that keeps the ticks apart', () => {
    // 6 ft on 600 px: 6 in take 50 px, 1 ft takes 100.
    expect(labels(72, 600)).toEqual(['0′', '1′', '2′', '3′', '4′', '5′', '6′']);
    // 80 ft on 600 px: 5 ft take 37 px, 10 ft take 75.
    expect(labels(960, 600)).toEqual([
      '0′',
      '10′',
      '20′',
      '30′',
      '40′',
      '50′',
      '60′',
      '70′',
      '80′',
    ]);
  });

  it('leaves out the last step where it crowds the end, which is always there', () => {
    const shown = labels(963, 600);
    expect(shown.at(-1)).toBe('80′ 3″');
    expect(shown).not.toContain('80′');
  });

  it.each([0.01, 3, 100, 6756, 63_360, 6_000_000])('labels %d in without crowding', (length) => {
    const shown = ticks(length, 360);
    expect(shown.length).toBeGreaterThan(0);
    expect(shown.length).toBeLessThan(9);
    shown.slice(1).forEach(({ x }, index) => expect(x).toBeGreaterThan(shown[index]!.x));
  });

  it('writes inches only where there are some', () => {
    expect([0, 6, 504, 510].map(axisLabel)).toEqual(['0′', '6″', '42′', '42′ 6″']);
  });
});
