/**
 * Which characters a WOFF2 file has glyphs for, read from the file itself: WOFF2 1.0 §4.1 (table directory) and the
 * OpenType `cmap` table, formats 4 and 12. Used by the subset script and by the test that no word falls back.
 */
import { brotliDecompressSync } from 'node:zlib';

const KNOWN_TAGS =
  'cmap head hhea hmtx maxp name OS/2 post cvt  fpgm glyf loca prep CFF  VORG EBDT EBLC gasp hdmx kern LTSH PCLT VDMX vhea vmtx BASE GDEF GPOS GSUB EBSC JSTF MATH CBDT CBLC COLR CPAL SVG  sbix acnt avar bdat bloc bsln cvar fdsc feat fmtx fvar gvar hsty just lcar mort morx opbd prop trak Zapf Silf Glat Gloc Feat Sill';
const TAGS = [];
for (let at = 0; at < KNOWN_TAGS.length; at += 5) TAGS.push(KNOWN_TAGS.slice(at, at + 4));

/** UIntBase128: seven bits a byte, most significant first. */
function base128(bytes, at) {
  let value = 0;
  for (let length = 1; length <= 5; length += 1) {
    const byte = bytes[at + length - 1];
    value = value * 128 + (byte & 0x7f);
    if ((byte & 0x80) === 0) return { value, next: at + length };
  }
  throw new Error('UIntBase128 longer than five bytes');
}

function cmapTable(file) {
  if (file.toString('latin1', 0, 4) !== 'wOF2') throw new Error('not a WOFF2 file');
  const count = file.readUInt16BE(12);
  const compressed = file.readUInt32BE(20);
  let at = 48;
  let offset = 0;
  let found = null;
  for (let index = 0; index < count; index += 1) {
    const flags = file[at];
    at += 1;
    let tag = TAGS[flags & 0x3f];
    if ((flags & 0x3f) === 63) {
      tag = file.toString('latin1', at, at + 4);
      at += 4;
    }
    const original = base128(file, at);
    at = original.next;
    let length = original.value;
    const version = flags >> 6;
    const transformed = tag === 'glyf' || tag === 'loca' ? version !== 3 : version !== 0;
    if (transformed) {
      const shorter = base128(file, at);
      at = shorter.next;
      length = shorter.value;
    }
    if (tag === 'cmap') found = { offset, length };
    offset += length;
  }
  if (!found) throw new Error('no cmap table');
  const tables = brotliDecompressSync(file.subarray(at, at + compressed));
  return tables.subarray(found.offset, found.offset + found.length);
}

function format4(table, characters) {
  const segments = table.readUInt16BE(6) / 2;
  const [ends, starts] = [14, 16 + segments * 2];
  const [deltas, ranges] = [16 + segments * 4, 16 + segments * 6];
  for (let segment = 0; segment < segments; segment += 1) {
    const end = table.readUInt16BE(ends + segment * 2);
    const start = table.readUInt16BE(starts + segment * 2);
    const delta = table.readUInt16BE(deltas + segment * 2);
    const range = table.readUInt16BE(ranges + segment * 2);
    for (let code = start; code <= end && code !== 0xffff; code += 1) {
      let glyph =
        range === 0 ? code : table.readUInt16BE(ranges + segment * 2 + range + (code - start) * 2);
      if (range === 0 || glyph !== 0) glyph = (glyph + delta) & 0xffff;
      if (glyph !== 0) characters.add(code);
    }
  }
}

function format12(table, characters) {
  const groups = table.readUInt32BE(12);
  for (let group = 0; group < groups; group += 1) {
    const at = 16 + group * 12;
    const end = table.readUInt32BE(at + 4);
    for (let code = table.readUInt32BE(at); code <= end; code += 1) characters.add(code);
  }
}

/** @param {Buffer} file a WOFF2 file @returns {Set<number>} code points it has a glyph for */
export function woff2Coverage(file) {
  const cmap = cmapTable(file);
  const characters = new Set();
  for (let index = 0; index < cmap.readUInt16BE(2); index += 1) {
    const table = cmap.subarray(cmap.readUInt32BE(4 + index * 8 + 4));
    const format = table.readUInt16BE(0);
    if (format === 4) format4(table, characters);
    if (format === 12) format12(table, characters);
  }
  return characters;
}

/** `U+2190-2193, U+2264` from code points: what `unicode-range` takes. */
export function unicodeRange(characters) {
  const sorted = [...characters].sort((a, b) => a - b);
  const hex = (code) => code.toString(16).toUpperCase();
  const ranges = [];
  for (let first = 0; first < sorted.length;) {
    let last = first;
    while (sorted[last + 1] === sorted[last] + 1) last += 1;
    ranges.push(
      first === last ? `U+${hex(sorted[first])}` : `U+${hex(sorted[first])}-${hex(sorted[last])}`,
    );
    first = last + 1;
  }
  return ranges.join(', ');
}
