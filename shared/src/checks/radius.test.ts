import { describe, expect, it } from 'vitest';
import { DEFAULT_SETTINGS } from '../contracts/settings';
import type { CompanySettings } from '../contracts/settings';
import { bend, buildRun, flex, offset, pullPoint, saddle3 } from '../run/build-run';
import { expandRun } from '../run/expand-run';
import type { PathElement, Raceway, Rules } from '../run/run-document';
import { checkContext } from './check-context';
import { checkRadius } from './radius';

interface Given {
  raceway?: Raceway;
  rules?: Rules;
  settings?: CompanySettings;
}

function radiiOf(
  middle: PathElement[],
  { raceway, rules, settings = DEFAULT_SETTINGS }: Given = {},
) {
  const path = [pullPoint({ id: 'A' }), ...middle, pullPoint({ id: 'Z' })];
  const document = buildRun({ path, ...(raceway && { raceway }), ...(rules && { rules }) });
  return checkRadius(checkContext(document, expandRun(document, settings), settings));
}

// NEC Chapter 9 Table 2: one-shot column for EMT, IMC, RMC and PVC, other bends for flexible types; 354.24 for HDPE.
describe('the radius of a bend', () => {
  it.each([
    ['EMT', '3/4', 4.5],
    ['EMT', '4', 16],
    ['RMC', '1', 5.75],
    ['PVC-40', '2', 9.5],
    ['ENT', '1', 6],
    ['HDPE-40', '2', 26],
  ] as const)('%s %s: %d in passes, a little less does not', (type, tradeSize, least) => {
    const raceway = { type, tradeSize };
    expect(radiiOf([bend({ radius: least })], { raceway })).toEqual([]);
    expect(radiiOf([bend({ id: 'b', radius: least - 0.01 })], { raceway })).toMatchObject([
      { code: 'radius-too-tight', severity: 'stop', at: { elementId: 'b', sectionId: 'A' } },
    ]);
  });

  it('says what was given, what is needed and where that stands', () => {
    expect(radiiOf([offset({ id: 'o', radius: 4 })])).toEqual([
      {
        code: 'radius-too-tight',
        severity: 'stop',
        at: { elementId: 'o', sectionId: 'A' },
        values: {
          type: 'EMT',
          tradeSize: '3/4',
          radius: 4,
          radiusFrom: 'element',
          minimum: 4.5,
          minimumFrom: 'table',
          source: null,
        },
        rule: { cite: 'Chapter 9 Table 2', edition: 'NEC-2023', source: 'NEC' },
      },
    ]);
  });

  it('nothing given: the table passes its own check', () => {
    expect(radiiOf([bend(), offset(), saddle3()])).toEqual([]);
  });

  it("a company's shoe that is too small, and a raceway's radius, are judged alike", () => {
    const settings: CompanySettings = {
      ...DEFAULT_SETTINGS,
      benders: [{ type: 'EMT', tradeSize: '3/4', radius: 4 }],
    };
    expect(radiiOf([bend()], { settings })[0]?.values).toMatchObject({
      radius: 4,
      radiusFrom: 'settings',
    });
    const raceway = { type: 'EMT', tradeSize: '3/4', bendRadius: 3 } as const;
    expect(radiiOf([bend()], { raceway })[0]?.values).toMatchObject({
      radius: 3,
      radiusFrom: 'raceway',
    });
  });

  it("a job's minimum is no rule of the code: 4 in with 24 in ells under 36 in for underground", () => {
    const raceway = { type: 'PVC-40', tradeSize: '4', bendRadius: 24 } as const;
    const rules = { overrides: { minBendRadius: 36, source: 'Spec 26 05 33' } };
    expect(radiiOf([bend()], { raceway })).toEqual([]);
    expect(radiiOf([bend()], { raceway, rules })).toMatchObject([
      {
        code: 'radius-too-tight',
        values: { radius: 24, minimum: 36, minimumFrom: 'job', source: 'Spec 26 05 33' },
        rule: null,
      },
    ]);
  });

  it('a job minimum below the table changes nothing', () => {
    const rules = { overrides: { minBendRadius: 1 } };
    expect(radiiOf([bend()], { rules })).toEqual([]);
    expect(radiiOf([bend({ radius: 4 })], { rules })[0]?.values).toMatchObject({ minimum: 4.5 });
  });

  it('no row and nothing given: unknown; given, it only has to keep the inside open', () => {
    const raceway = { type: 'HDPE-40', tradeSize: '6' } as const;
    expect(radiiOf([bend({ id: 'b' })], { raceway })).toMatchObject([
      { code: 'radius-unknown', severity: 'note', at: { elementId: 'b' } },
    ]);
    expect(radiiOf([bend({ radius: 120 })], { raceway })).toEqual([]);
    expect(radiiOf([bend({ radius: 2 })], { raceway })[0]?.values).toMatchObject({
      minimumFrom: 'bore',
    });
  });

  it('planned flexible degrees are judged only where a radius is given', () => {
    const whip = (bendRadius?: number) =>
      radiiOf([flex({ raceway: { type: 'FMC', tradeSize: '3/4', bendRadius } })], {
        rules: { overrides: { minBendRadius: 12 } },
      });
    expect(whip()).toEqual([]);
    expect(whip(6)).toHaveLength(1);
    expect(radiiOf([flex({ raceway: { type: 'FMC', tradeSize: '3/8' } })])).toEqual([]);
  });
});
