import { revisionLetter } from './revision-letter';

it.each([
  [1, 'A'],
  [2, 'B'],
  [26, 'Z'],
  [27, 'AA'],
  [52, 'AZ'],
  [53, 'BA'],
  [702, 'ZZ'],
  [703, 'AAA'],
])('revision %s is %s', (number, letter) => {
  expect(revisionLetter(number)).toBe(letter);
});

it('gives no letter twice', () => {
  const letters = Array.from({ length: 2000 }, (_, index) => revisionLetter(index + 1));
  expect(new Set(letters).size).toBe(2000);
});
