import type { NestExpressApplication } from '@nestjs/platform-express';
import {
  bend,
  buildRun,
  offset,
  pullPoint,
  saddle3,
  saddle4,
  straight,
  wires,
} from '@fairlead/shared';
import type {
  PathElement,
  RacewayType,
  RunAnalysis,
  RunDocument,
  TradeSize,
} from '@fairlead/shared';
import { api } from './api';
import { createTestApp } from './create-test-app';
import { factories } from './factories';

/** What the engine answers must arrive through the API as it is: saved, read back, analysed by the server. */
let app: NestExpressApplication;

beforeAll(async () => {
  app = await createTestApp();
});
afterAll(() => app.close());

async function analysisOf(document: RunDocument): Promise<RunAnalysis> {
  const run = await factories(app).buildStoredRun();
  const sent = { baseVersion: 1, document };
  const saved = await api(app)('put', `/runs/${run.id}/document`, run.by, sent);
  expect(saved.status).toBe(200);
  const read = await api(app)('get', `/runs/${run.id}`, run.by);
  expect(read.body.analysis).toEqual(saved.body.analysis);
  return saved.body.analysis as RunAnalysis;
}

const statusOf = (analysis: RunAnalysis, check: string) =>
  analysis.verdicts.find((verdict) => verdict.check === check)?.status;

/** With legs long enough that only what is asked about decides. */
const apart = (...pieces: PathElement[]) =>
  pieces.flatMap((piece) => [straight({ length: 120 }), piece]).concat(straight({ length: 120 }));

describe('degrees', () => {
  const withOffset = (angle: number) =>
    buildRun({
      path: [
        pullPoint(),
        ...apart(bend(), bend(), bend(), offset({ angle }), offset({ rise: 0.5, angle: 10 })),
        pullPoint(),
      ],
    });

  // NEC 358.26 and its sisters: at most four quarter bends, 360° in all, between pull points.
  it.each([
    [30, 350, 10],
    [45, 380, -20],
    [22.5, 335, 25],
  ])('three 90s, an offset at %s and a box offset at 10 make %s', async (angle, degrees, left) => {
    const { sections, verdicts } = await analysisOf(withOffset(angle));
    expect(sections).toMatchObject([{ degrees, limitDegrees: 360, remainingDegrees: left }]);
    expect(verdicts.find(({ check }) => check === 'degrees')?.status === 'over').toBe(left < 0);
  });

  it('an offset counts as a 90 in the strict reading', async () => {
    expect((await analysisOf(withOffset(30))).sections[0]?.strictDegrees).toBe(450);
  });

  it('saddles count what was bent', async () => {
    const path = (piece: PathElement) => [pullPoint(), ...apart(piece), pullPoint()];
    const three = await analysisOf(buildRun({ path: path(saddle3({ angle: 22.5 })) }));
    expect(three.totals.degrees).toBe(90);
    const four = await analysisOf(buildRun({ path: path(saddle4({ angle: 30 })) }));
    expect(four.totals.degrees).toBe(120);
  });

  it('an accessible LB starts again, one that cannot be reached does not', async () => {
    const withBody = (accessible: boolean) =>
      buildRun({
        path: [
          pullPoint(),
          ...apart(
            bend(),
            bend(),
            bend(),
            pullPoint({ device: 'conduit-body', body: 'LB', accessible }),
            bend(),
            bend(),
          ),
          pullPoint(),
        ],
      });
    const open = await analysisOf(withBody(true));
    expect(open.sections.map(({ degrees }) => degrees)).toEqual([270, 180]);
    expect(statusOf(open, 'access')).toBe('ok');
    const closed = await analysisOf(withBody(false));
    expect(closed.sections.map(({ degrees }) => degrees)).toEqual([540]);
    expect(statusOf(closed, 'access')).toBe('over');
  });
});

describe('fill', () => {
  const feeder = (type: RacewayType, tradeSize: TradeSize) =>
    buildRun({
      raceway: { type, tradeSize },
      path: [pullPoint(), straight({ length: 120 }), pullPoint()],
      conductors: [wires({ count: 4, size: '500' }), wires({ count: 1, size: '3', use: 'ground' })],
    });

  // NEC Chapter 9, Tables 1, 4 and 5.
  it.each([
    ['EMT', '3', 33.1, 'ok'],
    ['PVC-40', '3', 40.3, 'over'],
    ['PVC-40', '3-1/2', 30.1, 'ok'],
  ] as const)('4 × 500 and 1 × 3 THHN in %s %s', async (type, size, percent, status) => {
    const analysis = await analysisOf(feeder(type, size));
    expect(Number(analysis.sections[0]?.fill?.percent.toFixed(1))).toBe(percent);
    expect(statusOf(analysis, 'fill')).toBe(status);
  });

  // NEC Annex C, Table C.1 (16 in 3/4 EMT); Chapter 9 Note 4 (a nipple up to 24 in. may be filled to 60 %).
  it.each([
    [120, 16, 'ok'],
    [120, 17, 'over'],
    [24, 24, 'ok'],
    [24, 25, 'over'],
    [24.5, 16, 'ok'],
    [24.5, 17, 'over'],
  ])('in 3/4 EMT of %s in, %s × 12 THHN are %s', async (length, count, status) => {
    const document = buildRun({
      path: [pullPoint(), straight({ length }), pullPoint()],
      conductors: [wires({ count })],
    });
    expect(statusOf(await analysisOf(document), 'fill')).toBe(status);
  });
});

// Three 250 THHN of 0.711 in (Chapter 9 Table 5) in 2 EMT of 2.067 in (Table 4).
it('jam is possible at 2.91 in a section with a bend, and not asked in one without', async () => {
  const run = (middle: PathElement[]) =>
    buildRun({
      raceway: { type: 'EMT', tradeSize: '2' },
      path: [pullPoint(), ...middle, pullPoint()],
      conductors: [wires({ count: 3, size: '250' })],
    });
  const bent = await analysisOf(run(apart(bend())));
  const [section] = bent.sections;
  expect(section?.jam?.ratio).toBeCloseTo(2.91, 2);
  expect(section?.jam?.ratioWithOvality).toBeCloseTo(3.05, 2);
  expect(section?.fill?.percent).toBeCloseTo(35.5, 1);
  expect([statusOf(bent, 'jam'), statusOf(bent, 'fill'), bent.status]).toEqual([
    'watch',
    'ok',
    'watch',
  ]);
  const straightRun = await analysisOf(run([straight({ length: 240 })]));
  expect(straightRun.sections[0]?.jam).toBeNull();
});
