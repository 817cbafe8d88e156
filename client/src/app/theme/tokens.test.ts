import { describe, expect, it } from 'vitest';
import { contrast, difference, difference2000, EYES } from '../../test/colour';
import source from './tokens.css?raw';

const THEMES = {
  light: /data-mantine-color-scheme='light'\] \{([^}]*)\}/,
  dark: /data-mantine-color-scheme='dark'\] \{([^}]*)\}/,
  sun: /data-sun\] \{([^}]*)\}/,
};
type Theme = keyof typeof THEMES;
const NAMES = Object.keys(THEMES) as Theme[];

function tokensOf(theme: Theme): (name: string) => string {
  const block = THEMES[theme].exec(source)?.[1] ?? '';
  const tokens = new Map(
    [...block.matchAll(/--([\w-]+): ([^;]+);/g)].map(([, name, value]) => [
      name ?? '',
      value ?? '',
    ]),
  );
  return (name) => {
    const value = tokens.get(name);
    if (value === undefined) throw new Error(`${theme} has no --${name}`);
    return value;
  };
}

const SURFACES = ['paper', 'surface', 'sunken'];
const TINTS = ['petrol-tint', 'violet-tint', 'watch-tint', 'over-tint'];

// WCAG 2.2: 1.4.3 (text 4.5), 1.4.6 (enhanced 7), 1.4.11 (parts that carry meaning 3).
describe.each(NAMES)('the tokens of the %s theme', (theme) => {
  const token = tokensOf(theme);
  const onAll = (names: string[], grounds: string[]) =>
    names.flatMap((name) => grounds.map((ground) => [name, ground] as const));

  it.each(onAll(['ink', 'ink2'], SURFACES))('%s reads as body text on %s', (name, ground) => {
    // Secondary text is kept a step under the enhanced ratio on the sunken ground alone.
    const wanted = theme === 'sun' ? 10 : name === 'ink2' && ground === 'sunken' ? 6.5 : 7;
    expect(contrast(token(name), token(ground))).toBeGreaterThanOrEqual(wanted);
  });

  it.each(onAll(['petrol', 'petrol-hover', 'violet', 'watch-text', 'over-text'], SURFACES))(
    '%s reads as text on %s',
    (name, ground) => {
      const wanted = theme === 'sun' ? 10 : 4.5;
      expect(contrast(token(name), token(ground))).toBeGreaterThanOrEqual(wanted);
    },
  );

  it.each(onAll(['ink'], TINTS))('%s reads on %s', (name, tint) => {
    expect(contrast(token(name), token(tint))).toBeGreaterThanOrEqual(theme === 'sun' ? 10 : 7);
  });

  it.each([
    ['on-petrol', 'petrol'],
    ['on-petrol', 'petrol-hover'],
    ['on-over', 'fill-over'],
    ['on-watch', 'fill-watch'],
    ['ink', 'fill-ok'],
  ])('%s reads on %s', (name, ground) => {
    expect(contrast(token(name), token(ground))).toBeGreaterThanOrEqual(4.5);
  });

  it.each(onAll(['edge', 'petrol', 'violet', 'ink'], SURFACES))(
    '%s stands out on %s as a border, a tick or a cursor',
    (name, ground) => {
      expect(contrast(token(name), token(ground))).toBeGreaterThanOrEqual(3);
    },
  );

  it.each(EYES)('neighbouring status fills stay apart for a %s eye', (eye) => {
    // In the dark theme hatch, glyph and word carry what these two hues cannot.
    const wanted = theme === 'dark' || eye === 'grey' ? 10 : 30;
    const apart = (one: string, other: string) => difference(token(one), token(other), eye);
    expect(apart('fill-ok', 'fill-watch')).toBeGreaterThanOrEqual(wanted);
    expect(apart('fill-watch', 'fill-over')).toBeGreaterThanOrEqual(wanted);
  });
});

describe('strokes in the sun', () => {
  it('are three pixels wide', () => {
    expect(tokensOf('sun')('stroke')).toBe('3px');
  });
});

// Sharma, Wu and Dalal 2005, "The CIEDE2000 color-difference formula", table 1, pairs 1, 4, 17 and 25.
describe('the colour difference of the tests', () => {
  it.each([
    [[50, 2.6772, -79.7751], [50, 0, -82.7485], 2.0425],
    [[50, -1.3802, -84.2814], [50, 0, -82.7485], 1],
    [[50, 2.5, 0], [73, 25, -18], 27.1492],
    [[60.2574, -34.0099, 36.2677], [60.4626, -34.1751, 39.4387], 1.2644],
  ] as const)('%j and %j', (one, other, wanted) => {
    expect(difference2000([...one], [...other])).toBeCloseTo(wanted, 4);
  });
});
