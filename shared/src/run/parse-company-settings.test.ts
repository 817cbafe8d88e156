import { describe, expect, it } from 'vitest';
import { DEFAULT_SETTINGS } from '../contracts/settings';
import { parseCompanySettings } from './parse-company-settings';

const { pull } = DEFAULT_SETTINGS;
const withPull = (change: object) => ({ ...DEFAULT_SETTINGS, pull: { ...pull, ...change } });
const pointers = (input: unknown) => {
  const parsed = parseCompanySettings(input);
  return parsed.ok ? [] : parsed.problems.map(({ pointer, code }) => `${pointer} ${code}`);
};

describe('the settings of a company', () => {
  it('reads its own defaults, as a copy', () => {
    const parsed = parseCompanySettings(DEFAULT_SETTINGS);
    expect(parsed).toEqual({ ok: true, settings: DEFAULT_SETTINGS });
    expect(parsed.ok && parsed.settings).not.toBe(DEFAULT_SETTINGS);
  });

  it.each([
    [null, [' wrong-type']],
    [{ ...DEFAULT_SETTINGS, code: 'NEC-1999' }, ['/code not-one-of']],
    [{ ...DEFAULT_SETTINGS, extra: 1 }, ['/extra unknown-key']],
    [{ ...DEFAULT_SETTINGS, maxDegrees: -1 }, ['/maxDegrees too-small']],
    [
      withPull({ friction: { ...pull.friction, low: 0.9 } }),
      ['/pull/friction/likely not-in-order'],
    ],
    [withPull({ limits: { ...pull.limits, handTwo: 10 } }), ['/pull/limits/handTwo not-in-order']],
    [withPull({ crew: { feeding: 1.5, pulling: 1 } }), ['/pull/crew/feeding not-whole']],
  ])('refuses %#, and says where', (input, wanted) => {
    expect(pointers(input)).toEqual(wanted);
  });
});
