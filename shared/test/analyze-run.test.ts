import { describe, expect, it } from 'vitest';
import { analyzeRun } from '../src/analyze-run';
import { FINDING_CODES } from '../src/contracts/finding-codes';
import { CHECKS } from '../src/contracts/run-analysis';
import type { CheckName, RunAnalysis } from '../src/contracts/run-analysis';
import { DEFAULT_SETTINGS } from '../src/contracts/settings';
import { checkOf } from '../src/checks/verdicts';
import {
  bend,
  buildRun,
  cable,
  fitting,
  flex,
  offset,
  pullPoint,
  straight,
  transition,
  wires,
} from '../src/run/build-run';
import type { PathElement } from '../src/run/run-document';

const box = (id: string) => pullPoint({ id });
const verdict = ({ verdicts }: RunAnalysis, check: CheckName) =>
  verdicts.find((each) => each.check === check);
const statuses = ({ verdicts }: RunAnalysis) =>
  Object.fromEntries(verdicts.map(({ check, status }) => [check, status]));

describe('verdicts', () => {
  it('every finding belongs to a check of the row', () => {
    for (const code of FINDING_CODES) expect(CHECKS).toContain(checkOf(code));
  });

  it('a run without wires and lengths: no answer where they are needed, and the run is not OK', () => {
    const analysis = analyzeRun(buildRun({ path: [box('A'), bend(), box('Z')] }));
    expect(statuses(analysis)).toEqual({
      degrees: 'ok',
      access: 'ok',
      tension: 'no-answer',
      fill: 'no-answer',
      jam: 'no-answer',
      sidewall: 'no-answer',
      clearance: 'no-answer',
      radius: 'ok',
      'bend-fits-leg': 'no-answer',
      length: 'ok',
      directions: 'ok',
    });
    expect(analysis.status).toBe('no-answer');
    expect(analysis.sections[0]).toMatchObject({ fill: null, noFill: 'no-conductors', jam: null });
    expect(verdict(analysis, 'fill')?.values).toMatchObject({ reason: 'no-conductors' });
    expect(analysis.totals).toMatchObject({ length: null, degrees: 90 });
  });

  it('with both: all OK', () => {
    const analysis = analyzeRun(buildRun({ conductors: [wires()] }));
    expect(new Set(Object.values(statuses(analysis)))).toEqual(new Set(['ok']));
    expect(analysis.status).toBe('ok');
    expect(analysis.findings.map(({ code }) => code)).toEqual(['pull-level-assumed']);
  });

  it('name the worst place: the section with the least left, even where all pass', () => {
    const path = [box('A'), bend(), box('M'), bend(), bend({ angle: 30 }), box('Z')];
    expect(verdict(analyzeRun(buildRun({ path })), 'degrees')).toMatchObject({
      status: 'ok',
      sectionId: 'M',
      values: { degrees: 120, remaining: 240, finding: null },
    });
  });

  it('a stop outweighs a larger caution elsewhere', () => {
    const four = (): PathElement[] => Array.from({ length: 4 }, () => bend({ angle: 90 }));
    const path = [
      box('A'),
      ...four(),
      flex({ degrees: 300 }),
      box('M'),
      ...four(),
      bend({ angle: 5 }),
      box('Z'),
    ];
    expect(verdict(analyzeRun(buildRun({ path })), 'degrees')).toMatchObject({
      status: 'over',
      sectionId: 'M',
      values: { finding: 'degrees-over', degrees: 365 },
    });
  });

  it('an unknown radius is no answer, a missing direction too, a parallel one is over', () => {
    const hdpe = { type: 'HDPE-40', tradeSize: '6' } as const;
    const unknown = analyzeRun(
      buildRun({ raceway: hdpe, path: [box('A'), bend({ id: 'b' }), box('Z')] }),
    );
    expect(verdict(unknown, 'radius')).toMatchObject({ status: 'no-answer', elementId: 'b' });
    const of = (...middle: PathElement[]) =>
      verdict(analyzeRun(buildRun({ path: [box('A'), ...middle, box('Z')] })), 'directions');
    expect(of(bend({ toward: 'up' }), offset({ id: 'o' }))).toMatchObject({
      status: 'no-answer',
      elementId: 'o',
      values: { directions: 'partial', count: 1 },
    });
    expect(of(bend({ id: 'b', toward: 'west' }))).toMatchObject({ status: 'over', elementId: 'b' });
  });

  it('stops come first among the findings', () => {
    const hidden = pullPoint({ id: 'M', accessible: false });
    const path = [
      box('A'),
      bend(),
      bend(),
      bend(),
      offset({ angle: 10 }),
      offset({ angle: 10 }),
      hidden,
      box('Z'),
    ];
    const { findings } = analyzeRun(buildRun({ path }));
    expect(findings.map(({ severity }) => severity)).toEqual(['stop', 'note', 'note']);
  });
});

describe('each section has its own conductors', () => {
  // Areas of 12 THHN, 0.0133 in², and of 3/4 and 1/2 EMT: NEC Chapter 9 Tables 5 and 4.
  it('12 leave, 4 end at the box between, 8 go on in 1/2 EMT', () => {
    const half = { type: 'EMT', tradeSize: '1/2' } as const;
    const path = [
      box('A'),
      straight(),
      pullPoint({ id: 'B', raceway: half }),
      straight(),
      box('C'),
    ];
    const conductors = [wires({ count: 8 }), wires({ count: 4, from: 'A', to: 'B' })];
    const analysis = analyzeRun(buildRun({ path, conductors }));
    const [ab, bc] = analysis.sections;
    expect(ab?.fill).toMatchObject({ conductors: 12, raceway: { tradeSize: '3/4' } });
    expect(bc?.fill).toMatchObject({ conductors: 8, raceway: { tradeSize: '1/2' } });
    expect(bc?.fill?.conductorArea).toBeCloseTo(0.1064, 6);
    expect(verdict(analysis, 'fill')?.status).toBe('ok');
  });

  it('a section that got none has no answer, and says where', () => {
    const path = [box('A'), straight(), box('B'), straight(), box('C')];
    const analysis = analyzeRun(buildRun({ path, conductors: [wires({ from: 'B' })] }));
    expect(verdict(analysis, 'fill')).toMatchObject({ status: 'no-answer', sectionId: 'A' });
  });

  it('a group that ends at a box nobody can reach still fills the section round it', () => {
    const path = [
      box('A'),
      straight(),
      pullPoint({ id: 'B', accessible: false }),
      straight(),
      box('C'),
    ];
    const analysis = analyzeRun(
      buildRun({
        path,
        conductors: [wires({ count: 3, to: 'B' }), wires({ count: 2, from: 'B' })],
      }),
    );
    expect(analysis.sections.map(({ fill }) => fill?.conductors)).toEqual([5]);
  });

  it('the smallest bore of the section counts', () => {
    const pvc = { type: 'PVC-80', tradeSize: '3/4' } as const;
    const path = [box('A'), straight(), transition({ raceway: pvc }), straight(), box('Z')];
    const analysis = analyzeRun(buildRun({ path, conductors: [wires({ count: 16 })] }));
    expect(analysis.sections[0]?.fill?.raceway.type).toBe('PVC-80');
    expect(verdict(analysis, 'fill')?.status).toBe('over');
  });

  it('a nipple ends in enclosures at both ends', () => {
    const nipple = (device: 'cabinet' | 'conduit-body' | 'open-end') => {
      const path = [box('A'), straight({ length: 20 }), pullPoint({ id: 'Z', device })];
      return analyzeRun(buildRun({ path, conductors: [cable({ count: 1 })] })).sections[0]?.fill
        ?.nipple;
    };
    expect(nipple('cabinet')).toBe(true);
    expect(nipple('conduit-body')).toBe(false);
    expect(nipple('open-end')).toBe(false);
  });

  it("a seal holds a quarter: its own limit, and a job's own where tighter", () => {
    const path = [box('A'), straight(), fitting({ fitting: 'seal' }), straight(), box('Z')];
    const conductors = [wires({ count: 12 })];
    const sealed = analyzeRun(buildRun({ path, conductors }));
    expect(sealed.findings.map(({ code }) => code)).toContain('fill-seal-over');
    const rules = { overrides: { maxFillPercent: 20, source: 'Spec 26 05 33' } };
    expect(analyzeRun(buildRun({ path, conductors, rules })).sections[0]?.fill?.limitPercent).toBe(
      20,
    );
  });
});

describe('what was assumed', () => {
  const paths = (analysis: RunAnalysis) =>
    analysis.assumed.map(({ path, value, from }) => [path, value, from]);

  it('the edition, the table radius, planned degrees, the turn of a body, the way it starts', () => {
    const path = [
      box('A'),
      straight(),
      bend({ toward: 'up' }),
      straight(),
      pullPoint({ id: 'M', device: 'conduit-body', body: 'LB' }),
      flex(),
      box('Z'),
    ];
    expect(paths(analyzeRun(buildRun({ path })))).toEqual([
      ['/rules/code', 'NEC-2023', 'settings'],
      ['/raceway/bendRadius', 4.5, 'table'],
      ['/path/4/turn/angle', 90, 'default'],
      ['/path/5/degrees', 90, 'default'],
      ['/start/heading', 'east', 'default'],
    ]);
  });

  it("the company's bender, once, and the table for what it cannot bend", () => {
    const settings = {
      ...DEFAULT_SETTINGS,
      benders: [{ type: 'EMT', tradeSize: '3/4', radius: 5 } as const],
    };
    const path = [
      box('A'),
      bend(),
      bend(),
      bend({ made: 'factory' }),
      bend({ radius: 9 }),
      box('Z'),
    ];
    const document = buildRun({ path, rules: { code: 'NEC-2020' } });
    expect(paths(analyzeRun(document, settings))).toEqual([
      ['/raceway/bendRadius', 5, 'settings'],
      ['/raceway/bendRadius', 4.5, 'table'],
    ]);
  });

  it('a change of raceway is asked at its own place', () => {
    const path = [box('A'), transition(), bend(), box('Z')];
    expect(paths(analyzeRun(buildRun({ path })))[1]).toEqual([
      '/path/1/raceway/bendRadius',
      4.5,
      'table',
    ]);
  });
});

describe('the company', () => {
  it('sets the edition a run has not', () => {
    const path = [box('A'), ...Array.from({ length: 5 }, () => bend()), box('Z')];
    const settings = { ...DEFAULT_SETTINGS, code: 'NEC-2017' } as const;
    expect(analyzeRun(buildRun({ path }), settings).findings[0]?.rule?.cite).toBe('358.26');
    const own = buildRun({ path, rules: { code: 'NEC-2023' } });
    expect(analyzeRun(own, settings).findings[0]?.rule?.cite).toBe('358.24(B)');
  });
});
