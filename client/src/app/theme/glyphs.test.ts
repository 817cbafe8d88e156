import { readFileSync, readdirSync } from 'node:fs';
import { createRequire } from 'node:module';
import { dirname, join } from 'node:path';
import { en } from '@fairlead/shared';
import { formatAngle, formatLength } from '@fairlead/shared';
import { describe, expect, it } from 'vitest';
import { woff2Coverage } from '../../../scripts/woff2-coverage.mjs';
import css from './fonts.css?raw';

const here = join(process.cwd(), 'src/app/theme');
const inter = dirname(createRequire(join(here, 'x.js')).resolve('@fontsource/inter/package.json'));

const fileOf = (url: string): string =>
  url.startsWith('@fontsource/inter/')
    ? join(inter, url.slice('@fontsource/inter/'.length))
    : join(here, url);

/** The fonts of one weight, each with the characters it really has. */
function covered(weight: number): Set<number> {
  const characters = new Set<number>();
  for (const [rule] of css.matchAll(/@font-face \{[^}]*\}/g)) {
    if (!rule.includes(`font-weight: ${weight};`)) continue;
    const url = /url\('([^']+)'\)/.exec(rule)?.[1] ?? '';
    for (const character of woff2Coverage(readFileSync(fileOf(url)))) characters.add(character);
  }
  return characters;
}

const texts = (words: unknown): string[] =>
  typeof words === 'string' ? [words] : Object.values(words as object).flatMap(texts);

/** What the explanations write, comments aside. */
const explain = join(here, '../../../../shared/src/explain');
const formulas = readdirSync(explain)
  .map((name) => readFileSync(join(explain, name), 'utf8'))
  .map((source) => source.replace(/\/\*[\s\S]*?\*\/|\/\/.*/g, ''));

const shown = [
  ...formulas,
  ...texts(en),
  ...Array.from({ length: 64 }, (_, part) => formatLength(12 + part / 64)),
  formatLength(-1.5),
  ...[22.5, 67.25, 12.75, -20].map(formatAngle),
].join('');

describe.each([400, 600, 700])('no character of our words falls back at weight %d', (weight) => {
  it('has a glyph for each', () => {
    const glyphs = covered(weight);
    const missing = [...new Set(shown)].filter(
      (character) => character > ' ' && !glyphs.has(character.codePointAt(0) ?? 0),
    );
    expect(missing).toEqual([]);
    expect(glyphs.size).toBeGreaterThan(200);
  });
});
