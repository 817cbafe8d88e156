import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { reaches, withValue } from '../../test/edit-json';
import { fullRun } from '../../test/full-run';
import { MALFORMED_RUNS } from '../../test/malformed-runs';
import { LIMITS } from '../contracts/limits';
import { buildRun, pullPoint, straight } from './build-run';
import { parseRunDocument } from './parse-run-document';

const numRuns = process.env.FAIRLEAD_LONG === '1' ? 10_000 : 1_000;

describe('a valid document', () => {
  it('with every field comes back equal, as a fresh copy', () => {
    const document = fullRun();
    const before = JSON.stringify(document);
    const parsed = parseRunDocument(document);
    expect(parsed).toEqual({ ok: true, document });
    if (!parsed.ok) return;
    expect(parsed.document).not.toBe(document);
    expect(parsed.document.path[4]).not.toBe(document.path[4]);
    expect(parsed.document.conductors?.[0]).not.toBe(document.conductors?.[0]);
    expect(JSON.stringify(document)).toBe(before);
  });

  it('with the least there can be gets no default added', () => {
    const document = buildRun({ path: [pullPoint(), pullPoint()] });
    expect(parseRunDocument(document)).toEqual({ ok: true, document });
    expect(Object.keys(document).sort()).toEqual(['format', 'path', 'raceway', 'tag', 'version']);
  });

  it('a field set to undefined is a field not given', () => {
    const parsed = parseRunDocument({ ...buildRun(), title: undefined });
    expect(parsed.ok && 'title' in parsed.document).toBe(false);
    expect(parsed.ok).toBe(true);
  });

  it('may hold 500 elements and 40 groups', () => {
    const path = [
      pullPoint({ id: 'A' }),
      ...Array.from({ length: LIMITS.elements - 2 }, (_, index) => straight({ id: `s${index}` })),
      pullPoint({ id: 'Z' }),
    ];
    const conductors = Array.from({ length: LIMITS.conductorGroups }, (_, index) => ({
      ...fullRun().conductors?.[1],
      from: 'A',
      id: `g${index}`,
    }));
    expect(parseRunDocument({ ...buildRun(), path, conductors }).ok).toBe(true);
  });

  it('made without a prototype, or in another realm, is read like any other', () => {
    const document = Object.assign(Object.create(null), buildRun());
    expect(parseRunDocument(document)).toEqual({ ok: true, document: buildRun() });
  });
});

describe('a malformed document', () => {
  it('there are at least sixty', () => {
    expect(MALFORMED_RUNS.length).toBeGreaterThanOrEqual(60);
    expect(new Set(MALFORMED_RUNS.map(({ title }) => title)).size).toBe(MALFORMED_RUNS.length);
  });

  it.each(MALFORMED_RUNS)('$title is refused with every pointer', ({ input, problems }) => {
    const parsed = parseRunDocument(input);
    const found = parsed.ok ? [] : parsed.problems;
    expect(Object.fromEntries(found.map(({ pointer, code }) => [pointer, code]))).toEqual(problems);
    expect(found).toHaveLength(Object.keys(problems).length);
    // What was found is fit to be sent and shown.
    expect(() => JSON.stringify(found)).not.toThrow();
    for (const problem of found) {
      expect(problem.code).toMatch(/^[a-z]+(-[a-z]+)*$/);
      expect(String(problem.found).length).toBeLessThanOrEqual(60);
      expect(problem).toHaveProperty('allowed');
    }
  });

  it('says what was found and what is allowed', () => {
    const parsed = parseRunDocument(withValue(buildRun(), '/path/2/angle', 151));
    expect(parsed).toEqual({
      ok: false,
      problems: [
        { pointer: '/path/2/angle', code: 'too-large', found: 151, allowed: { atMost: 150 } },
      ],
    });
  });

  it('lists the first two thousand problems of more', () => {
    const keys = Array.from({ length: 5_000 }, (_, index) => [`k${index}`, 0]);
    const parsed = parseRunDocument({ ...buildRun(), ...Object.fromEntries(keys) });
    const problems = parsed.ok ? [] : parsed.problems;
    expect(problems).toHaveLength(2_001);
    expect(problems[2_000]).toMatchObject({ code: 'more-problems', found: 3_000 });
  });
});

describe('any input at all', () => {
  it('never throws, and a refused one has a problem with a pointer', () => {
    fc.assert(
      fc.property(
        fc.anything({
          withBigInt: true,
          withDate: true,
          withMap: true,
          withSparseArray: true,
          withNullPrototype: true,
          withTypedArray: true,
          withObjectString: true,
        }),
        (input) => {
          const parsed = parseRunDocument(input);
          expect(parsed.ok).toBe(false);
          if (!parsed.ok) expect(parsed.problems.length).toBeGreaterThan(0);
        },
      ),
      { numRuns },
    );
  });

  it('a valid document with any value anywhere is accepted or refused with pointers that reach', () => {
    const full = JSON.parse(JSON.stringify(fullRun())) as unknown;
    const pointers = pointersOf(full);
    const change = fc.tuple(
      fc.constantFrom(...pointers),
      fc.oneof(fc.jsonValue(), fc.constantFrom(-1, 0, 1e308, NaN, '', 'A', null, [], {}, true)),
    );
    fc.assert(
      fc.property(fc.array(change, { minLength: 1, maxLength: 4 }), (changes) => {
        const mutated = changes.reduce<unknown>(
          (json, [pointer, value]) =>
            reaches(json, pointer) ? withValue(json, pointer, value) : json,
          full,
        );
        const parsed = parseRunDocument(mutated);
        if (parsed.ok) {
          expect(parsed.document).toEqual(JSON.parse(JSON.stringify(mutated)));
          return;
        }
        expect(parsed.problems.length).toBeGreaterThan(0);
        for (const { pointer } of parsed.problems) expect(reaches(mutated, pointer)).toBe(true);
      }),
      { numRuns },
    );
  });
});

function pointersOf(value: unknown, base = ''): string[] {
  if (typeof value !== 'object' || value === null) return [];
  return Object.entries(value).flatMap(([key, inner]) => [
    `${base}/${key}`,
    `${base}/new`,
    ...pointersOf(inner, `${base}/${key}`),
  ]);
}
