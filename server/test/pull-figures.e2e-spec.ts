import type { NestExpressApplication } from '@nestjs/platform-express';
import type { PullAnalysis, RunAnalysis } from '@fairlead/shared';
import { PULL_RUNS } from '../../shared/test/pull-runs';
import { api } from './api';
import { createTestApp } from './create-test-app';
import { factories } from './factories';

/** The figures of a pull as they come back from a save and from a reading. Worked out in shared/test/pull-must-hold.test.ts. */
let app: NestExpressApplication;

beforeAll(async () => {
  app = await createTestApp();
});
afterAll(() => app.close());

async function analysisOf(name: keyof typeof PULL_RUNS): Promise<RunAnalysis> {
  const run = await factories(app).buildStoredRun();
  const sent = { baseVersion: 1, document: PULL_RUNS[name]() };
  const saved = await api(app)('put', `/runs/${run.id}/document`, run.by, sent);
  expect(saved.status).toBe(200);
  const read = await api(app)('get', `/runs/${run.id}`, run.by);
  expect(read.body.analysis).toEqual(saved.body.analysis);
  return read.body.analysis as RunAnalysis;
}

const within = (given: number | undefined, wanted: number) =>
  expect(Math.abs((given ?? 0) / wanted - 1)).toBeLessThan(5e-4);
const codes = ({ findings }: RunAnalysis) => findings.map(({ code }) => code);
const first = ({ pulls }: RunAnalysis) => pulls[0] as PullAnalysis;

it('3×500 and a 3 in 3 EMT: 601.3 / 1,866.4 / 4,790.4 fed at A, 442.4 / 1,110.4 / 2,381.0 at B', async () => {
  const analysis = await analysisOf('feeder');
  const { forward, reverse, recommended } = first(analysis);
  within(forward.tension?.low, 601.3);
  within(forward.tension?.likely, 1866.4);
  within(forward.tension?.high, 4790.4);
  within(reverse.tension?.low, 442.4);
  within(reverse.tension?.likely, 1110.4);
  within(reverse.tension?.high, 2381.0);
  expect(recommended).toBe('reverse');
  expect(reverse.governing).toMatchObject({ limit: 'attachment', allowed: 1000 });
  expect(Math.abs((reverse.peakSidewall?.likely ?? 0) - 624)).toBeLessThan(5);
  expect(codes(analysis)).toContain('sidewall-past-caution');
});

it('50 lbf of feed makes 2,231; a pull point at 112′ 2″ makes 260.3 and 884.7', async () => {
  within(first(await analysisOf('feeder50')).forward.tension?.likely, 2231.4);
  const { pulls } = await analysisOf('feederInTwo');
  within(pulls[0]?.forward.tension?.likely, 260.3);
  within(pulls[1]?.forward.tension?.likely, 884.7);
});

it('a drop of 100 ft is held back with 343 / 245 / 169 and is not recommended', async () => {
  const { forward, recommended } = first(await analysisOf('drop'));
  const { low, likely, high } = forward.holdBack ?? { low: 0, likely: 0, high: 0 };
  expect([low, likely, high].map(Math.round)).toEqual([343, 245, 169]);
  expect(recommended).toBe('reverse');
});

// Common practice, no source.
it('three 12 AWG: 5 / 14 / 38 and 5 / 12 / 32 apart, 18 / 116 / 751 through, 403 with nobody feeding', async () => {
  const bands = (await analysisOf('branch')).pulls.map(({ forward: { tension } }) =>
    [tension?.low, tension?.likely, tension?.high].map((lbf) => Math.round(lbf ?? 0)),
  );
  expect(bands).toEqual([
    [5, 14, 38],
    [5, 12, 32],
  ]);
  const through = await analysisOf('branchThrough');
  const { low, likely, high } = first(through).forward.tension ?? { low: 0, likely: 0, high: 0 };
  expect([low, likely, high].map(Math.round)).toEqual([18, 116, 751]);
  expect(first(through).method?.likely).toBe('puller');
  expect(codes(through)).toEqual(expect.arrayContaining(['pull-in-two', 'tension-over-if-dry']));
  const alone = first(await analysisOf('branchAlone'));
  expect(Math.abs((alone.forward.tension?.likely ?? 0) - 403)).toBeLessThan(3);
  expect(alone.method?.likely).toBe('not-as-drawn');
});
