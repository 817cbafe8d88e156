import { cleanup } from '@testing-library/react';
import { afterEach, beforeEach, expect, vi } from 'vitest';

let errors: string[] = [];

/** What no test asked for fails it: an error on the console, or a request that nobody answers. */
beforeEach(() => {
  errors = [];
  vi.spyOn(console, 'error').mockImplementation((...words: unknown[]) => {
    errors.push(words.join(' '));
  });
  vi.stubGlobal('fetch', (input: unknown) => {
    throw new Error(`A request nobody answers: ${String(input)}`);
  });
});

afterEach(() => {
  cleanup();
  vi.restoreAllMocks();
  vi.unstubAllGlobals();
  localStorage.clear();
  expect(errors, 'errors on the console').toEqual([]);
});
