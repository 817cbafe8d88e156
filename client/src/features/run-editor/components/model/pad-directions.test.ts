import { directionVector } from '@fairlead/shared';
import { describe, expect, it } from 'vitest';
import { anglesOf, isAlongPipe, padWays } from './pad-directions';

const ways = (heading: Parameters<typeof directionVector>[0] | null) =>
  padWays(heading && directionVector(heading), undefined).map(({ key, direction }) => [
    key,
    direction,
  ]);

describe('padWays', () => {
  it('sees left and right along the pipe from the start', () => {
    expect(ways('east')).toEqual([
      ['left', 'north'],
      ['right', 'south'],
      ['up', 'up'],
      ['down', 'down'],
    ]);
    expect(ways('south')).toEqual([
      ['left', 'east'],
      ['right', 'west'],
      ['up', 'up'],
      ['down', 'down'],
    ]);
  });

  it('takes the plan while the pipe stands upright', () => {
    expect(ways('up').map(([key]) => key)).toEqual(['north', 'east', 'south', 'west']);
    expect(ways('down').map(([key]) => key)).toEqual(['north', 'east', 'south', 'west']);
  });

  it('offers plan and plumb where the pipe is not known', () => {
    expect(ways(null).map(([key]) => key)).toEqual([
      'north',
      'east',
      'south',
      'west',
      'up',
      'down',
    ]);
  });

  it('knows which way is chosen', () => {
    const chosen = padWays(directionVector('east'), 'south').find(({ isChosen }) => isChosen);
    expect(chosen?.key).toBe('right');
    const skew = padWays(directionVector('east'), { azimuth: 45, elevation: 0 });
    expect(skew.some(({ isChosen }) => isChosen)).toBe(false);
  });
});

describe('isAlongPipe', () => {
  it('closes the way the pipe runs, there and back', () => {
    expect(isAlongPipe(directionVector('east'), 'east')).toBe(true);
    expect(isAlongPipe(directionVector('east'), 'west')).toBe(true);
    expect(isAlongPipe(directionVector('east'), 'north')).toBe(false);
    expect(isAlongPipe(null, 'north')).toBe(false);
  });
});

describe('anglesOf', () => {
  it('gives azimuth from north clockwise and elevation', () => {
    expect(anglesOf('south')).toEqual({ azimuth: 180, elevation: 0 });
    expect(anglesOf('west')).toEqual({ azimuth: 270, elevation: 0 });
    expect(anglesOf('up').elevation).toBe(90);
    expect(anglesOf({ azimuth: 12, elevation: 3 })).toEqual({ azimuth: 12, elevation: 3 });
  });
});
