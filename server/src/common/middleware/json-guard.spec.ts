import { LIMITS } from '@fairlead/shared';
import { faultOf } from './json-guard';

/** An object inside an object, `levels` times. */
const nested = (levels: number): unknown => {
  let value: unknown = 1;
  for (let level = 0; level < levels; level += 1) value = { inner: value };
  return value;
};

it('lets a document at the limit through, with the wrapper around it', () => {
  expect(faultOf(nested(LIMITS.depth + 1))).toBeUndefined();
  expect(faultOf(nested(LIMITS.depth + 2))?.code).toBe('too-deep');
});

it('does not recurse', () => {
  expect(faultOf(nested(200_000))?.code).toBe('too-deep');
});

it.each(['__proto__', 'constructor', 'prototype'])('refuses a key %s anywhere', (key) => {
  const own = JSON.parse(`{"a":[{"b":{"${key}":1}}]}`) as unknown;
  expect(faultOf(own)?.code).toBe('bad-request');
});

it.each([undefined, null, 1, 'text', true, [], {}])('finds nothing wrong with %j', (body) => {
  expect(faultOf(body)).toBeUndefined();
});
