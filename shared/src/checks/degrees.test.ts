import { describe, expect, it } from 'vitest';
import type { Finding } from '../contracts/run-analysis';
import { DEFAULT_SETTINGS } from '../contracts/settings';
import type { CompanySettings } from '../contracts/settings';
import {
  bend,
  buildRun,
  fitting,
  flex,
  offset,
  pullPoint,
  saddle3,
  saddle4,
  straight,
  transition,
} from '../run/build-run';
import { expandRun } from '../run/expand-run';
import type { CodeEdition, PathElement, Rules } from '../run/run-document';
import { checkContext } from './check-context';
import { checkDegrees } from './degrees';

const PVC = { type: 'PVC-40', tradeSize: '3/4' } as const;
const ninety = () => bend({ angle: 90 });

function degreesOf(
  middle: PathElement[],
  { rules, settings = DEFAULT_SETTINGS }: { rules?: Rules; settings?: CompanySettings } = {},
) {
  const path = [pullPoint({ id: 'A' }), ...middle, pullPoint({ id: 'Z' })];
  const document = buildRun({ path, ...(rules && { rules }) });
  const expanded = expandRun(document, settings);
  const [span] = expanded.sections;
  if (!span) throw new Error('no section');
  return checkDegrees(checkContext(document, expanded, settings), span);
}

const code = (edition: CodeEdition): { rules: Rules } => ({ rules: { code: edition } });
const said = (findings: readonly Finding[]) =>
  findings.map(({ code: name, severity }) => [name, severity]);

describe('the count', () => {
  it('adds up every kind of piece', () => {
    const { section } = degreesOf([
      bend({ id: 'b', angle: 37.5 }),
      offset({ id: 'o', angle: 10 }),
      saddle3({ id: 's3', angle: 22.5 }),
      saddle4({ id: 's4', angle: 15 }),
      fitting({ id: 'f', fitting: 'offset-connector', angle: 20 }),
      fitting(),
      straight(),
    ]);
    expect(section.bends).toEqual([
      { elementId: 'b', angle: 37.5, cumulative: 37.5 },
      { elementId: 'o', angle: 20, cumulative: 57.5 },
      { elementId: 's3', angle: 90, cumulative: 147.5 },
      { elementId: 's4', angle: 60, cumulative: 207.5 },
      { elementId: 'f', angle: 20, cumulative: 227.5 },
    ]);
    expect(section.degrees).toBe(227.5);
  });

  it.each([
    ['offset', offset({ angle: 10 }), 20, 90],
    ['offset', offset({ angle: 45 }), 90, 90],
    ['offset', offset({ angle: 60 }), 120, 120],
    ['3-bend saddle', saddle3({ angle: 22.5 }), 90, 180],
    ['3-bend saddle', saddle3({ angle: 60 }), 240, 240],
    ['4-bend saddle', saddle4({ angle: 30 }), 120, 180],
    ['4-bend saddle', saddle4({ angle: 60 }), 240, 240],
    ['kick', bend({ angle: 15 }), 15, 15],
  ] as const)('strict, %s: never below what was bent', (_, element, degrees, strictDegrees) => {
    expect(degreesOf([element]).section).toMatchObject({ degrees, strictDegrees });
  });

  it('exactly 360 passes, and so does what a tenth hides: 360.04; 360.06 does not', () => {
    const of = (last: number) => degreesOf([ninety(), ninety(), ninety(), bend({ angle: last })]);
    expect(said(of(90).findings)).toEqual([['degrees-past-270', 'note']]);
    expect(said(of(90.04).findings)).toEqual([['degrees-past-270', 'note']]);
    expect(said(of(90.06).findings)).toEqual([['degrees-over', 'stop']]);
  });

  it('thirty 12s are exactly 360, whatever binary fractions say', () => {
    const { section, findings } = degreesOf(
      Array.from({ length: 30 }, () => bend({ angle: 12.1 - 0.1 })),
    );
    expect(section.degrees).toBeCloseTo(360, 9);
    expect(findings.some(({ severity }) => severity === 'stop')).toBe(false);
  });

  // NEC 2023 xxx.24(B) against 360; three quarters and a 3-bend saddle are 360, four quarters and a box offset 380.
  it.each([
    [[ninety(), ninety(), ninety(), saddle3({ angle: 22.5 })], 360, true],
    [[ninety(), ninety(), ninety(), ninety(), offset({ angle: 10 })], 380, false],
  ])('a worked total', (middle, degrees, isAllowed) => {
    const { section, findings } = degreesOf(middle);
    expect(section.degrees).toBe(degrees);
    expect(findings.every(({ severity }) => severity !== 'stop')).toBe(isAllowed);
  });
});

describe('the tightest limit wins and is named', () => {
  const three = [ninety(), ninety(), ninety(), bend({ angle: 30 })];

  it('the code alone: 300 of 360', () => {
    expect(degreesOf(three).section).toMatchObject({ limitDegrees: 360, limitFrom: 'code' });
  });

  it("a job's 270, with its source; the code's is met", () => {
    const overrides = { maxDegrees: 270, source: 'Spec 26 05 33' };
    const { section, findings } = degreesOf(three, { rules: { overrides } });
    expect(section).toMatchObject({ limitDegrees: 270, limitFrom: 'job', remainingDegrees: -30 });
    expect(findings[0]).toMatchObject({
      code: 'degrees-over-own-limit',
      severity: 'stop',
      values: {
        degrees: 300,
        limit: 270,
        over: 30,
        limitFrom: 'job',
        source: 'Spec 26 05 33',
        codeLimit: 360,
      },
      rule: null,
    });
  });

  it("a company's 270", () => {
    const { section } = degreesOf(three, { settings: { ...DEFAULT_SETTINGS, maxDegrees: 270 } });
    expect(section).toMatchObject({ limitDegrees: 270, limitFrom: 'company' });
  });

  it('telecom 180: ANSI/TIA-569 practice', () => {
    const { section, findings } = degreesOf(three, { rules: { profile: 'telecom' } });
    expect(section).toMatchObject({ limitDegrees: 180, limitFrom: 'telecom' });
    expect(said(findings)).toEqual([['degrees-over-own-limit', 'stop']]);
  });

  it('a looser limit changes nothing; between equals the code is named', () => {
    expect(degreesOf(three, { rules: { overrides: { maxDegrees: 540 } } }).section.limitFrom).toBe(
      'code',
    );
    expect(degreesOf(three, { rules: { overrides: { maxDegrees: 360 } } }).section.limitFrom).toBe(
      'code',
    );
  });

  it("past a tighter limit and the code's: the code is what is over", () => {
    const { findings } = degreesOf([...three, ninety()], {
      rules: { overrides: { maxDegrees: 270 } },
    });
    expect(findings[0]).toMatchObject({
      code: 'degrees-over',
      values: { degrees: 390, limit: 270 },
    });
  });
});

describe('where one thing decides', () => {
  const four = () => [ninety(), ninety(), ninety(), ninety()];

  it('360 and a flexible tail planned at 90: 450, to watch', () => {
    const { section, findings } = degreesOf([...four(), flex({ id: 'whip' })]);
    expect(section.degrees).toBe(450);
    expect(findings).toMatchObject([
      {
        code: 'degrees-flex-decides',
        severity: 'caution',
        at: { elementId: 'whip', sectionId: 'A' },
        values: { degrees: 450, without: 360, limit: 360 },
      },
    ]);
  });

  it('370 and a flexible tail is over without it', () => {
    expect(said(degreesOf([...four(), bend({ angle: 10 }), flex()]).findings)).toEqual([
      ['degrees-over', 'stop'],
    ]);
  });

  it('a sweep listed as not counting: 360 without, 372 with, to watch', () => {
    const sweep = bend({ id: 'sweep', angle: 12, counts: false, why: 'trench' });
    const { section, findings } = degreesOf([...four(), sweep]);
    expect(section).toMatchObject({ degrees: 360, strictDegrees: 360 });
    expect(section.bends[4]).toEqual({ elementId: 'sweep', angle: 0, cumulative: 360 });
    expect(findings[0]).toMatchObject({
      code: 'degrees-sweep-decides',
      severity: 'caution',
      at: { elementId: 'sweep' },
      values: { degrees: 360, with: 372 },
    });
  });

  it('a sweep that decides nothing is no finding', () => {
    expect(degreesOf([bend({ angle: 12, counts: false })]).findings).toEqual([]);
  });

  // 300.24, new in 2026, limits the total of all types; before, each article its own.
  describe('EMT 270 and PVC 110', () => {
    const mixed = () => [
      ninety(),
      ninety(),
      ninety(),
      transition({ raceway: PVC }),
      ninety(),
      bend({ angle: 20 }),
    ];

    it.each(['NEC-2017', 'NEC-2020', 'NEC-2023'] as const)('%s: to watch', (edition) => {
      const { section, findings } = degreesOf(mixed(), code(edition));
      expect(section.degrees).toBe(380);
      expect(said(findings)).toEqual([['degrees-mixed-raceways', 'caution']]);
    });

    it('NEC-2026: over, by 300.24', () => {
      const { findings } = degreesOf(mixed(), code('NEC-2026'));
      expect(findings[0]).toMatchObject({
        code: 'degrees-over',
        rule: { cite: '300.24', edition: 'NEC-2026' },
      });
    });

    it("a job's own limit counts them together in any edition", () => {
      const { findings } = degreesOf(mixed(), {
        rules: { code: 'NEC-2020', overrides: { maxDegrees: 270 } },
      });
      expect(said(findings)).toEqual([
        ['degrees-over-own-limit', 'stop'],
        ['degrees-mixed-raceways', 'caution'],
      ]);
    });
  });

  it('one article alone over 360 is over before 2026 too', () => {
    const middle = [...four(), bend({ angle: 5 }), transition({ raceway: PVC }), ninety()];
    expect(degreesOf(middle, code('NEC-2020')).findings[0]).toMatchObject({
      code: 'degrees-over',
      rule: { cite: '358.26', edition: 'NEC-2020' },
    });
  });

  it('a turn in a body nobody can open is of no raceway and counts with each', () => {
    // EMT 300 + 90 is over by itself; EMT 270 + 90 is 360, and only PVC's 20 more makes it 380.
    const body = pullPoint({ device: 'conduit-body', body: 'LB', accessible: false });
    const middle = (angle: number) => [
      ...[ninety(), ninety(), ninety(), bend({ angle })],
      body,
      transition({ raceway: PVC }),
      bend({ angle: 20 }),
    ];
    expect(said(degreesOf(middle(30)).findings)).toEqual([['degrees-over', 'stop']]);
    expect(said(degreesOf(middle(0.01)).findings)).toEqual([['degrees-mixed-raceways', 'caution']]);
  });

  it('Schedule 40 and 80 are one article', () => {
    const middle = [
      transition({ raceway: PVC }),
      ...four(),
      transition({ raceway: { type: 'PVC-80', tradeSize: '3/4' } }),
      ninety(),
    ];
    expect(degreesOf(middle).findings[0]).toMatchObject({
      code: 'degrees-over',
      rule: { cite: '352.24(B)' },
    });
  });
});

describe('the rule is cited as it was read', () => {
  const over = () => Array.from({ length: 5 }, ninety);

  it.each([
    ['NEC-2017', '358.26'],
    ['NEC-2020', '358.26'],
    ['NEC-2023', '358.24(B)'],
  ] as const)('%s: %s', (edition, cite) => {
    const { findings } = degreesOf(over(), code(edition));
    expect(findings).toMatchObject([{ code: 'degrees-over', rule: { cite, edition } }]);
  });

  it('2026, whose own text was not read: the last one read, and it says so', () => {
    const { findings } = degreesOf(over(), code('NEC-2026'));
    expect(findings[0]?.rule).toEqual({ cite: '358.24(B)', edition: 'NEC-2023', source: 'NEC' });
    expect(findings[1]).toMatchObject({
      code: 'degrees-edition-not-read',
      severity: 'note',
      values: { edition: 'NEC-2026', read: 'NEC-2023' },
    });
  });
});

describe('the strict reading', () => {
  // 270 + 20 + 20 = 310 as bent, 270 + 90 + 90 = 450 strict.
  const middle = [ninety(), ninety(), ninety(), offset({ angle: 10 }), offset({ angle: 10 })];
  const reading = (strictReading: CompanySettings['strictReading']) =>
    degreesOf(middle, { settings: { ...DEFAULT_SETTINGS, strictReading } });

  it('is a note, nothing, or to watch, as the company says', () => {
    expect(reading('mention').section).toMatchObject({ degrees: 310, strictDegrees: 450 });
    expect(said(reading('mention').findings)).toContainEqual(['degrees-strict-over', 'note']);
    expect(said(reading('never').findings)).toEqual([['degrees-past-270', 'note']]);
    expect(said(reading('warn').findings)).toContainEqual(['degrees-strict-over', 'caution']);
  });

  it('says nothing where the count as bent is already over', () => {
    const { findings } = degreesOf([...middle, ninety()], {
      settings: { ...DEFAULT_SETTINGS, strictReading: 'warn' },
    });
    expect(said(findings)).toEqual([['degrees-over', 'stop']]);
  });
});
