import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { formatLength } from './format-length';
import { parseLength } from './parse-length';

const runs = process.env.FAIRLEAD_LONG === '1' ? 10_000 : 1_000;
const inchesOf = (text: string) => {
  const parsed = parseLength(text);
  return parsed.ok ? parsed.inches : parsed.code;
};

describe('parseLength', () => {
  it.each([
    [`3' 4 5/8"`, 40.625],
    ['3′ 4⅝″', 40.625],
    ['3-4-5/8', 40.625],
    ['3-4 5/8', 40.625],
    ['3 4 5/8', 40.625],
    ['40 5/8', 40.625],
    ['40.625', 40.625],
    ['3ft 4in', 40],
    ['3 ft', 36],
    [`3'4`, 40],
    ['5/8', 0.625],
    ['.5', 0.5],
    [`3.5'`, 42],
    [`10'-6"`, 126],
    ['-2 1/2"', -2.5],
    ['1.5 m', 1500 / 25.4],
    ['120cm', 1200 / 25.4],
    ['12mm', 12 / 25.4],
    ['3’ 4”', 40],
    ['3‘ 4 5⁄8“', 40.625],
    [`4-5/8`, 4.625],
    [`0' 6"`, 6],
    ['9/8', 1.125],
    ['0', 0],
    ['10.', 10],
    ['3 feet 4 inches', 40],
  ])('%s', (text, expected) => {
    expect(inchesOf(text)).toBeCloseTo(expected, 12);
  });

  it.each([
    [`3' 13"`, 'inches-over-twelve'],
    [`3' 12"`, 'inches-over-twelve'],
    ['5/0', 'over-zero'],
    ['12 3', 'two-numbers'],
    [`1/2'`, 'feet-fraction'],
    ['', 'empty'],
    ['   ', 'empty'],
    ['abc', 'unreadable'],
    ['1e5', 'unreadable'],
    ['NaN', 'unreadable'],
    ['Infinity', 'unreadable'],
    ['3 km', 'unreadable'],
    ['1 9/8', 'unreadable'],
    [`3.5' 4"`, 'unreadable'],
    ['٣', 'unreadable'],
    ['--3', 'unreadable'],
    ['3" 4\'', 'unreadable'],
    ['1,5', 'unreadable'],
    ['9'.repeat(10_000), 'unreadable'],
  ])('refuses %s', (text, code) => {
    expect(inchesOf(text)).toBe(code);
  });

  it('answers any text with a finite length or a reason', () => {
    fc.assert(
      fc.property(
        fc.oneof(fc.string(), fc.string({ unit: fc.constantFrom(...`0123456789 .-/'"ftinmc⅝′″`) })),
        (text) => {
          const parsed = parseLength(text);
          expect(parsed.ok ? Number.isFinite(parsed.inches) : parsed.code.length > 0).toBe(true);
        },
      ),
      { numRuns: runs },
    );
  });
});

describe('formatLength', () => {
  it.each([
    [40.625, '3′ 4 5⁄8″'],
    [504, '42′ 0″'],
    [10, '10″'],
    [0, '0″'],
    [0.5, '1⁄2″'],
    [-2.5, '−2 1⁄2″'],
    [6.5, '6 1⁄2″'],
  ])('%d in', (inches, text) => expect(formatLength(inches)).toBe(text));

  it('carries when it rounds', () => {
    expect(formatLength(11 + 31 / 32, { to: 16 })).toBe('1′ 0″');
    expect(formatLength(23.6, { to: 1 })).toBe('2′ 0″');
  });

  it('writes plain characters for files', () => {
    expect(formatLength(40.625, { ascii: true })).toBe(`3' 4-5/8"`);
  });

  it('shows millimetres to whoever reads metric', () => {
    expect(formatLength(1500 / 25.4, { metric: true })).toBe('1500 mm');
    expect(formatLength(0.5, { metric: true })).toBe('12.7 mm');
  });

  it('never shows what is not a number', () => {
    expect(() => formatLength(Number.NaN)).toThrow(RangeError);
  });

  it('is read back as it was, to 1/64 in', () => {
    const sixtyFourths = fc.integer({ min: -64 * 12_000, max: 64 * 12_000 });
    fc.assert(
      fc.property(sixtyFourths, fc.boolean(), (parts, ascii) => {
        expect(parseLength(formatLength(parts / 64, { ascii }))).toEqual({
          ok: true,
          inches: parts / 64 + 0,
        });
      }),
      { numRuns: runs },
    );
  });

  it('metric entry comes back within 1/64 in', () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 300_000 }), (tenths) => {
        const parsed = parseLength(`${tenths / 10} mm`);
        if (!parsed.ok) throw new Error(parsed.code);
        const shown = parseLength(formatLength(parsed.inches));
        expect(shown.ok && Math.abs(shown.inches - parsed.inches) <= 1 / 64).toBe(true);
      }),
      { numRuns: runs },
    );
  });
});
