import { describe, expect, it } from 'vitest';
import { analyzeRun } from '../src/analyze-run';
import type { CheckName, RunAnalysis, Verdict } from '../src/contracts/run-analysis';
import {
  bend,
  buildRun,
  offset,
  pullPoint,
  saddle3,
  saddle4,
  straight,
  wires,
} from '../src/run/build-run';
import type { PathElement, Raceway, WireGroup } from '../src/run/run-document';

const box = (id: string) => pullPoint({ id });
const ninety = () => bend({ angle: 90 });
const codesOf = ({ findings }: RunAnalysis) => findings.map(({ code }) => code);
const verdictOf = ({ verdicts }: RunAnalysis, check: CheckName): Verdict => {
  const verdict = verdicts.find((each) => each.check === check);
  if (!verdict) throw new Error(check);
  return verdict;
};

// NEC 358.24(B) (2023): not more than 360° of bends between pull points.
describe('degrees', () => {
  const withOffsetAt = (angle: number) =>
    analyzeRun(
      buildRun({
        path: [
          box('A'),
          ninety(),
          ninety(),
          ninety(),
          offset({ id: 'o', angle }),
          offset({ rise: 0.5, angle: 10 }),
          box('Z'),
        ],
      }),
    );

  it('90, 90, 90, offset 30, box offset 10: 350 of 360, 10 left, 450 in the strict reading', () => {
    const analysis = withOffsetAt(30);
    expect(analysis.sections).toHaveLength(1);
    expect(analysis.sections[0]).toMatchObject({
      degrees: 350,
      limitDegrees: 360,
      limitFrom: 'code',
      remainingDegrees: 10,
      strictDegrees: 450,
    });
    expect(analysis.sections[0]?.bends.map(({ angle, cumulative }) => [angle, cumulative])).toEqual(
      [
        [90, 90],
        [90, 180],
        [90, 270],
        [60, 330],
        [20, 350],
      ],
    );
    expect(verdictOf(analysis, 'degrees')).toMatchObject({
      status: 'ok',
      values: { degrees: 350, limit: 360, remaining: 10 },
    });
    expect(codesOf(analysis)).toEqual(['degrees-strict-over', 'degrees-past-270']);
  });

  it('the offset at 45: 380, 20 over', () => {
    const analysis = withOffsetAt(45);
    expect(analysis.sections[0]).toMatchObject({ degrees: 380, remainingDegrees: -20 });
    expect(analysis.status).toBe('over');
    expect(verdictOf(analysis, 'degrees')).toMatchObject({ status: 'over', sectionId: 'A' });
    const [finding] = analysis.findings;
    expect(finding).toMatchObject({
      code: 'degrees-over',
      severity: 'stop',
      at: { sectionId: 'A', elementId: expect.any(String) },
      values: { degrees: 380, limit: 360, over: 20 },
      rule: { cite: '358.24(B)', edition: 'NEC-2023' },
    });
  });

  it('the offset at 22½: 335', () => {
    expect(withOffsetAt(22.5).sections[0]).toMatchObject({ degrees: 335, remainingDegrees: 25 });
  });

  const withBody = (accessible: boolean) =>
    analyzeRun(
      buildRun({
        path: [
          box('A'),
          ninety(),
          ninety(),
          ninety(),
          pullPoint({ id: 'M', device: 'conduit-body', body: 'LB', accessible }),
          ninety(),
          ninety(),
          box('Z'),
        ],
      }),
    );

  it('90, 90, 90, an LB one can reach, 90, 90: 270 and 180', () => {
    const analysis = withBody(true);
    expect(analysis.sections.map(({ degrees }) => degrees)).toEqual([270, 180]);
    expect(verdictOf(analysis, 'degrees').status).toBe('ok');
    expect(verdictOf(analysis, 'access').status).toBe('ok');
    expect(analysis.totals).toMatchObject({ degrees: 450, sections: 2, pullPoints: 3 });
  });

  it('the same LB out of reach: one section of 540, and not allowed', () => {
    const analysis = withBody(false);
    expect(analysis.sections.map(({ degrees }) => degrees)).toEqual([540]);
    expect(analysis.sections[0]?.remainingDegrees).toBe(-180);
    expect(verdictOf(analysis, 'degrees').status).toBe('over');
    expect(verdictOf(analysis, 'access')).toMatchObject({ status: 'over', elementId: 'M' });
    expect(analysis.findings.find(({ code }) => code === 'access-not-allowed')).toMatchObject({
      severity: 'stop',
      at: { elementId: 'M', sectionId: 'A' },
      rule: { cite: '314.29' },
    });
  });

  it('a 3-bend saddle 22½/45/22½ is 90; a 4-bend saddle at 30 is 120', () => {
    const of = (element: PathElement) =>
      analyzeRun(buildRun({ path: [box('A'), element, box('Z')] })).sections[0]?.degrees;
    expect(of(saddle3({ angle: 22.5 }))).toBe(90);
    expect(of(saddle4({ angle: 30 }))).toBe(120);
  });
});

// NEC Chapter 9 Tables 1, 4 and 5; fills worked from the tables' own figures.
describe('fill', () => {
  const fillOf = (raceway: Raceway, conductors: WireGroup[], length = 120) =>
    analyzeRun(buildRun({ raceway, conductors, path: [box('A'), straight({ length }), box('Z')] }));
  const thhn = (count: number, size: WireGroup['size']) => wires({ count, size });
  const feeder = () => [thhn(4, '500'), thhn(1, '3')];

  it.each([
    ['EMT', '3', 33.1, 'ok'],
    ['PVC-40', '3', 40.3, 'over'],
    ['PVC-40', '3-1/2', 30.1, 'ok'],
  ] as const)('4 × 500 and 1 × 3 THHN in %s %s: %d %%, %s', (type, tradeSize, percent, status) => {
    const analysis = fillOf({ type, tradeSize }, feeder());
    const { fill } = analysis.sections[0] ?? {};
    expect(Number(fill?.percent.toFixed(1))).toBe(percent);
    expect(fill?.limitPercent).toBe(40);
    expect(verdictOf(analysis, 'fill').status).toBe(status);
    expect(codesOf(analysis).includes('fill-over')).toBe(status === 'over');
  });

  it.each([
    [16, 120, 'ok'],
    [17, 120, 'over'],
    [24, 24, 'ok'],
    [25, 24, 'over'],
    [16, 24.5, 'ok'],
    [17, 24.5, 'over'],
  ] as const)('%d × 12 THHN in 3/4 EMT over %d in: %s', (count, length, status) => {
    const analysis = fillOf({ type: 'EMT', tradeSize: '3/4' }, [thhn(count, '12')], length);
    expect(verdictOf(analysis, 'fill').status).toBe(status);
    expect(analysis.sections[0]?.fill?.nipple).toBe(length <= 24);
  });
});

// NEC Chapter 9 Table 1, informational note on three conductors: 2.8 to 3.2 times.
describe('jam', () => {
  const jamOf = (middle: PathElement[]) =>
    analyzeRun(
      buildRun({
        raceway: { type: 'EMT', tradeSize: '2' },
        conductors: [wires({ count: 3, size: '250' })],
        path: [box('A'), ...middle, box('Z')],
      }),
    );

  it('3 × 250 THHN in 2 EMT: fill 35.5 % passes, D/d 2.91 (3.05), to watch in a section with a bend', () => {
    const analysis = jamOf([straight(), ninety(), straight()]);
    const { fill, jam } = analysis.sections[0] ?? {};
    expect(Number(fill?.percent.toFixed(1))).toBe(35.5);
    expect(Number(jam?.ratio.toFixed(2))).toBe(2.91);
    expect(Number(jam?.ratioWithOvality.toFixed(2))).toBe(3.05);
    expect(jam?.risk).toBe('possible');
    expect(verdictOf(analysis, 'fill').status).toBe('ok');
    expect(verdictOf(analysis, 'jam')).toMatchObject({ status: 'watch', sectionId: 'A' });
  });

  it('does not apply to a section without a bend', () => {
    const analysis = jamOf([straight()]);
    expect(analysis.sections[0]?.jam).toBeNull();
    expect(verdictOf(analysis, 'jam').status).toBe('ok');
  });
});
