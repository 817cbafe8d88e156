import { isOlderVersion } from './engine-order';

it.each([
  ['1.0', '1.1', true],
  ['1.9', '1.10', true],
  ['1.10', '1.9', false],
  ['1', '1.0', false],
  ['1', '1.0.1', true],
  ['2.0', '1.99', false],
  ['1.0', '1.0', false],
])('%s before %s: %s', (a, b, older) => {
  expect(isOlderVersion(a, b)).toBe(older);
});
