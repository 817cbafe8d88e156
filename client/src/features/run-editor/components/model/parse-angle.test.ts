import { describe, expect, it } from 'vitest';
import { parseAngle } from './parse-angle';

describe('parseAngle', () => {
  it.each([
    ['45', 45],
    ['22.5', 22.5],
    ['22½', 22.5],
    ['22 ½°', 22.5],
    ['22 1/2', 22.5],
    ['22,5°', 22.5],
    ['.5', 0.5],
    ['½', 0.5],
    ['-10', -10],
    [' 90 deg ', 90],
    ['0', 0],
  ])('reads %j as %d', (text, degrees) => {
    expect(parseAngle(text)).toBe(degrees);
  });

  it.each(['', ' ', '°', '-', 'abc', '45 46', '1/0', '22 1/0', '1e3', '--5', '45″', '4 5/', 'NaN'])(
    'refuses %j',
    (text) => {
      expect(parseAngle(text)).toBeNull();
    },
  );
});
