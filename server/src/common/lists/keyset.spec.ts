import fc from 'fast-check';
import { newId } from '../new-id';
import { keysetClause, readCursor, readSort, writeCursor } from './keyset';
import { containing } from './like';

const columns = {
  tag: { sql: 'v.tag', kind: 'text', index: 'an_index' },
  savedAt: { sql: 'v.saved_at', kind: 'time', index: 'an_index' },
  fill: { sql: 'v.fill_sort', kind: 'number', index: 'an_index' },
} as const;

const RUNS = process.env.FAIRLEAD_LONG === '1' ? 10_000 : 1_000;

it('a cursor comes back as it was written', () => {
  const sort = readSort('-tag', columns);
  fc.assert(
    fc.property(fc.string({ maxLength: 160 }), (value) => {
      const id = newId();
      expect(readCursor(writeCursor(sort, value, id), sort)).toEqual({ value, id });
    }),
    { numRuns: RUNS },
  );
});

it('continues no other list', () => {
  const cursor = writeCursor(readSort('tag', columns), 'F-1', newId());
  for (const other of ['-tag', 'savedAt', 'fill']) {
    expect(() => readCursor(cursor, readSort(other, columns))).toThrow('validation-failed');
  }
});

it('nothing but a cursor is read as one', () => {
  const sort = readSort('fill', columns);
  fc.assert(
    fc.property(
      fc.oneof(
        fc.string(),
        fc.json().map((text) => Buffer.from(text).toString('base64url')),
      ),
      (text) => {
        expect(() => readCursor(text, sort)).toThrow('validation-failed');
      },
    ),
    { numRuns: RUNS },
  );
});

it('asks for what lies beyond the last row, never puts its value into the statement', () => {
  const sort = readSort('-savedAt', columns);
  const id = newId();
  const clause = keysetClause(sort, 'v.run_id', { value: '2027-01-02T03:04:05.006Z', id });
  expect(clause).toEqual({
    where: 'v.saved_at <= :afterValue AND (v.saved_at < :afterValue OR v.run_id < :afterId)',
    orderBy: 'v.saved_at DESC, v.run_id DESC',
    replacements: { afterValue: new Date('2027-01-02T03:04:05.006Z'), afterId: id },
  });
  expect(keysetClause(readSort('tag', columns), 'v.run_id', null)).toEqual({
    where: 'TRUE',
    orderBy: 'v.tag ASC, v.run_id ASC',
    replacements: {},
  });
});

it.each([
  ['', '%%'],
  ['5%', '%5!%%'],
  ['a_b', '%a!_b%'],
  ['wow!', '%wow!!%'],
])('"%s" is searched as %s', (text, pattern) => {
  expect(containing(text)).toBe(pattern);
});
