/**
 * Makes the small extra files of Inter: the signs of lengths, angles and results that the Latin files lack, from the
 * full family (inter-ui, OFL), and writes the @font-face rules with the ranges the files really cover.
 * Run after changing SIGNS: node client/scripts/subset-font.mjs
 */
import { readFileSync, writeFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import path from 'node:path';
import subsetFont from 'subset-font';
import { unicodeRange, woff2Coverage } from './woff2-coverage.mjs';

const SIGNS = '≤≥≠≈±−×·µμαθπψΔΣ√∞←↑→↓↔✓′″½¼¾⅛⅜⅝⅞⁄⁰¹²³⁴⁵⁶⁷⁸⁹₀₁₂₃₄₅₆₇₈₉°Ø‹›…–';
const WEIGHTS = [
  [400, 'Regular'],
  [600, 'SemiBold'],
  [700, 'Bold'],
];

const require = createRequire(import.meta.url);
const folder = path.join(import.meta.dirname, '../src/app/theme/fonts');
const latinFile = (weight) => `@fontsource/inter/files/inter-latin-${weight}-normal.woff2`;

const face = (weight, url, range) =>
  `@font-face {
  font-family: 'Inter';
  font-style: normal;
  font-weight: ${weight};
  font-display: swap;
  src: url('${url}') format('woff2');
  unicode-range: ${range};
}
`;

let css = '/* Made by client/scripts/subset-font.mjs; the ranges are what the files cover. */\n';
for (const [weight, name] of WEIGHTS) {
  const latin = woff2Coverage(readFileSync(require.resolve(latinFile(weight))));
  const missing = [...SIGNS].filter((sign) => !latin.has(sign.codePointAt(0))).join('');
  const full = path.join(
    path.dirname(require.resolve('inter-ui/package.json')),
    `web/Inter-${name}.woff2`,
  );
  const file = await subsetFont(readFileSync(full), missing, { targetFormat: 'woff2' });
  const made = woff2Coverage(file);
  const absent = [...missing].filter((sign) => !made.has(sign.codePointAt(0)));
  if (absent.length > 0) throw new Error(`Inter ${name} has no glyph for ${absent.join(' ')}`);
  writeFileSync(path.join(folder, `inter-signs-${weight}.woff2`), file);
  css += face(weight, latinFile(weight), unicodeRange(latin));
  css += face(weight, `./fonts/inter-signs-${weight}.woff2`, unicodeRange(made));
  console.log(`${weight}: ${file.length} bytes for ${missing}`);
}
writeFileSync(path.join(folder, '../fonts.css'), css);
