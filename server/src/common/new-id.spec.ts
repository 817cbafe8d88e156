import { newId } from './new-id';
import { isId } from './pipes/id.pipe';

it('is a UUID of version 7 that carries the time', () => {
  const before = Date.now();
  const id = newId();
  expect(id).toMatch(/^[0-9a-f]{8}-[0-9a-f]{4}-7[0-9a-f]{3}-[89ab][0-9a-f]{3}-[0-9a-f]{12}$/);
  const time = Number.parseInt(id.replaceAll('-', '').slice(0, 12), 16);
  expect(time).toBeGreaterThanOrEqual(before);
  expect(time).toBeLessThanOrEqual(Date.now());
  expect(isId(id)).toBe(true);
});

it('repeats nothing', () => {
  expect(new Set(Array.from({ length: 10_000 }, newId)).size).toBe(10_000);
});

it.each([
  undefined,
  null,
  0,
  '',
  'x',
  newId().toUpperCase(),
  `${newId()}\n`,
  `{${newId()}}`,
  [newId()],
])('%j is no id', (value) => {
  expect(isId(value)).toBe(false);
});
