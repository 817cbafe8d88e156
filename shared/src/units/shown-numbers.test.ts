import { describe, expect, it } from 'vitest';
import { formatAngle } from './format-angle';
import { formatPercent, formatPercentBeside } from './format-percent';

describe('formatAngle', () => {
  it.each([
    [90, '90°'],
    [22.5, '22½°'],
    [0.5, '½°'],
    [67.25, '67¼°'],
    [12.3, '12.3°'],
    [0, '0°'],
    [-20, '−20°'],
    [359.999, '360°'],
  ])('%d', (degrees, text) => expect(formatAngle(degrees)).toBe(text));

  it('never shows what is not a number', () => {
    expect(() => formatAngle(Number.POSITIVE_INFINITY)).toThrow(RangeError);
  });
});

describe('formatPercent', () => {
  it.each([
    [33.13, '33.1 %'],
    [40, '40 %'],
    [60.04, '60 %'],
  ])('%d', (percent, text) => expect(formatPercent(percent)).toBe(text));

  it('shows as many decimals as it takes not to read as equal to the limit', () => {
    expect(formatPercentBeside(33.13, 40)).toBe('33.1 of 40 %');
    expect(formatPercentBeside(40.04, 40)).toBe('40.04 of 40 %');
    expect(formatPercentBeside(39.98, 40)).toBe('39.98 of 40 %');
    expect(formatPercentBeside(40, 40)).toBe('40 of 40 %');
  });
});
