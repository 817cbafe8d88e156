import { describe, expect, it } from 'vitest';
import { analyzeRun } from '../src/analyze-run';
import type { PullAnalysis, PullDirection } from '../src/contracts/run-analysis';
import { PULL_RUNS } from './pull-runs';

const pullsOf = (name: keyof typeof PULL_RUNS): PullAnalysis[] =>
  analyzeRun(PULL_RUNS[name]()).pulls;
const only = (name: keyof typeof PULL_RUNS): PullAnalysis => pullsOf(name)[0] as PullAnalysis;
const findings = (name: keyof typeof PULL_RUNS): string[] =>
  analyzeRun(PULL_RUNS[name]()).findings.map(({ code }) => code);

/** Within 0.05 %. */
function expectBand({ tension }: PullDirection, low: number, likely: number, high: number) {
  expect(Math.abs((tension?.low ?? 0) / low - 1)).toBeLessThan(5e-4);
  expect(Math.abs((tension?.likely ?? 0) / likely - 1)).toBeLessThan(5e-4);
  expect(Math.abs((tension?.high ?? 0) / high - 1)).toBeLessThan(5e-4);
}

// Figures: the level bend and the straight as published forms (TES-P-104.05; handbook hyperbolic form), worked by hand.
describe('3×500 and a 3 in 3 EMT, three 90s', () => {
  it('weighs 5.149 lb/ft and cradles at 1.2073', () => {
    const { weight, configuration, weightCorrection } = only('feeder');
    expect(weight).toBeCloseTo(5.149, 9);
    expect(configuration).toBe('cradled');
    expect(weightCorrection).toBeCloseTo(1.2073, 4);
  });

  it('fed at A 601.3 / 1,866.4 / 4,790.4 lbf, fed at B 442.4 / 1,110.4 / 2,381.0', () => {
    const { forward, reverse } = only('feeder');
    expectBand(forward, 601.3, 1866.4, 4790.4);
    expectBand(reverse, 442.4, 1110.4, 2381.0);
  });

  it('is fed at B; the grip gives first; sidewall at the last bend about 624 lb/ft, a caution', () => {
    const { recommended, planned, reverse, limits } = only('feeder');
    expect([recommended, planned]).toEqual(['reverse', 'reverse']);
    expect(reverse.governing).toMatchObject({ limit: 'attachment', allowed: 1000 });
    expect(limits?.conductor).toBe(10_000);
    expect(reverse.peakSidewall?.likely).toBeGreaterThan(619);
    expect(reverse.peakSidewall?.likely).toBeLessThan(629);
    expect(reverse.peakSidewallAt).toBe('bend1');
    expect(findings('feeder')).toEqual(
      expect.arrayContaining(['tension-over', 'sidewall-past-caution']),
    );
  });

  it('fed at A the head carries 43, 478, 928 and 1,845 lbf on its way; a gauge reads the rope in the bends ahead with it', () => {
    const { forward } = only('feeder');
    const [, , bend1, straight2, bend2, , bend3] = forward.profile;
    const carried = [bend1, straight2, bend2, bend3].map((point) => point?.tension.likely ?? 0);
    expect(carried.map(Math.round)).toEqual([43, 478, 928, 1845]);
    // Past the first bend two of 90° are ahead of the head: e^(µπ).
    const document = { ...PULL_RUNS.feeder() };
    document.conditions = { ...document.conditions, ropeFriction: 0.2 };
    const [pull] = analyzeRun(document).pulls;
    expect(pull?.forward.profile[2]?.ropeFactor).toBeCloseTo(Math.exp(0.2 * Math.PI), 9);
    expect(pull?.forward.profile[7]?.ropeFactor).toBe(1);
  });

  it('50 lbf of feed at A adds about 365 at the puller: 2,231', () => {
    const [none, fifty] = [only('feeder'), only('feeder50')];
    expect(fifty.forward.tension?.likely).toBeCloseTo(2231.4, 0);
    const added = (fifty.forward.tension?.likely ?? 0) - (none.forward.tension?.likely ?? 0);
    expect(added).toBeGreaterThan(364);
    expect(added).toBeLessThan(366);
  });

  it('with a pull point 112′ 2″ from A: 260.3 and 884.7, both fed toward B', () => {
    const [first, second] = pullsOf('feederInTwo');
    expect(Math.abs((first?.forward.tension?.likely ?? 0) / 260.3 - 1)).toBeLessThan(5e-4);
    expect(Math.abs((second?.forward.tension?.likely ?? 0) / 884.7 - 1)).toBeLessThan(5e-4);
  });
});

describe('a drop of 100 ft', () => {
  it('is held back with 343 / 245 / 169 lbf; the top bend carries about 515; never recommended so', () => {
    const { forward, recommended } = only('drop');
    expect(Math.round(forward.holdBack?.low ?? 0)).toBe(343);
    expect(Math.round(forward.holdBack?.likely ?? 0)).toBe(245);
    expect(Math.round(forward.holdBack?.high ?? 0)).toBe(169);
    const top = forward.profile.find(({ elementId }) => elementId === 'bend1');
    expect(Math.round(top?.tension.likely ?? 0)).toBe(515);
    expect(recommended).toBe('reverse');
    expect(forward.tension?.likely).toBeCloseTo(0, 6);
  });
});

// Common practice, no source.
describe('three 12 AWG in 1/2 EMT, every leg 10 ft', () => {
  it('each section alone 5 / 14 / 38 and 5 / 12 / 32: easy by hand, one person if dry', () => {
    const pulls = pullsOf('branch');
    const rounded = pulls.map(({ forward: { tension } }) =>
      [tension?.low, tension?.likely, tension?.high].map((lbf) => Math.round(lbf ?? 0)),
    );
    expect(rounded).toEqual([
      [5, 14, 38],
      [5, 12, 32],
    ]);
    for (const { method } of pulls) expect(method).toMatchObject({ likely: 'easy', high: 'one' });
  });

  it('straight through the box 18 / 116 / 751: puller, over 157 if dry, pull it in two', () => {
    const { forward, method, limits, through } = only('branchThrough');
    const { low, likely, high } = forward.tension ?? { low: 0, likely: 0, high: 0 };
    expect([low, likely, high].map(Math.round)).toEqual([18, 116, 751]);
    expect(method?.likely).toBe('puller');
    expect(Math.round(limits?.conductor ?? 0)).toBe(157);
    expect(through).toEqual(['box']);
    expect(findings('branchThrough')).toEqual(
      expect.arrayContaining(['pull-in-two', 'tension-over-if-dry']),
    );
    const degrees = analyzeRun(PULL_RUNS.branchThrough()).sections.map(
      (section) => section.degrees,
    );
    expect(degrees).toEqual([330, 310]);
  });

  it('with nobody feeding the same pull is about 403: over the limit, it sticks', () => {
    const { forward, method } = only('branchAlone');
    expect(forward.feed).toBe(5);
    expect(forward.tension?.likely).toBeGreaterThan(400);
    expect(forward.tension?.likely).toBeLessThan(406);
    expect(method?.likely).toBe('not-as-drawn');
    expect(findings('branchAlone')).toContain('tension-over');
  });
});
