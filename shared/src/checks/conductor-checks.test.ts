import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { ANNEX_C1, ANNEX_C1_DIFFERENCE, ANNEX_C1_SIZES } from '../../test/data/annex-c1-emt-counts';
import { cable, wires } from '../run/build-run';
import { RACEWAY_TYPES } from '../run/run-document';
import type { ConductorGroup, Raceway } from '../run/run-document';
import { insulatedConductor } from '../tables/insulated-conductors';
import { racewayDimensions, tradeSizesOf } from '../tables/raceway-dimensions';
import { checkClearance, triangularClearance } from './clearance';
import { checkFill } from './fill';
import { checkJam } from './jam';
import { maximumCount } from './maximum-count';
import type { SectionConductors } from './section-conductors';

const runs = process.env.FAIRLEAD_LONG === '1' ? 10_000 : 1_000;

const section = (
  raceway: Raceway,
  groups: ConductorGroup[],
  overrides: Partial<SectionConductors> = {},
): SectionConductors => ({
  sectionId: 'A',
  groups,
  raceway,
  length: 1200,
  betweenEnclosures: true,
  hasBend: true,
  hasSeal: false,
  profile: 'power',
  edition: 'NEC-2023',
  maxFillPercent: null,
  maxFillSource: null,
  ...overrides,
});
const emt = (tradeSize: Raceway['tradeSize']): Raceway => ({ type: 'EMT', tradeSize });
const twelves = (count: number) => wires({ count, size: '12' });
const codes = ({ findings }: { findings: { code: string }[] }) => findings.map(({ code }) => code);

describe('counts of one size', () => {
  // NEC Annex C, Table C.1.
  it('are those of Annex C in every cell but the one that two prints round otherwise', () => {
    const different: unknown[] = [];
    let cells = 0;
    for (const [insulation, size, counts] of ANNEX_C1) {
      if (insulation === 'bare') continue;
      const area = insulatedConductor(insulation, size)?.area ?? NaN;
      ANNEX_C1_SIZES.forEach((tradeSize, index) => {
        const raceway = racewayDimensions('EMT', tradeSize);
        if (!raceway) throw new Error(tradeSize);
        cells += 1;
        const [annex, computed] = [counts[index], maximumCount(raceway, area, false)];
        if (annex !== computed) different.push({ insulation, size, tradeSize, annex, computed });
      });
    }
    expect(different).toEqual([ANNEX_C1_DIFFERENCE]);
    expect(cells).toBeGreaterThanOrEqual(370);
  });
});

describe('fill', () => {
  // NEC Chapter 9 Tables 1, 4 and 5.
  it('lets 16 × 12 THHN into 3/4 EMT, not 17', () => {
    expect(codes(checkFill(section(emt('3/4'), [twelves(16)])))).toEqual([]);
    expect(codes(checkFill(section(emt('3/4'), [twelves(17)])))).toEqual(['fill-over']);
  });

  // NEC Chapter 9 Note 4.
  it('lets 24 into a 24 in nipple, not 25, and 16 at 24.5 in', () => {
    const nipple = (count: number, length: number) =>
      checkFill(section(emt('3/4'), [twelves(count)], { length }));
    expect(codes(nipple(24, 24))).toEqual(['fill-nipple']);
    expect(codes(nipple(25, 24))).toEqual(['fill-over']);
    expect(codes(nipple(17, 24.5))).toEqual(['fill-over']);
    expect(codes(nipple(16, 24.5))).toEqual([]);
    expect(nipple(24, 24).answer).toMatchObject({ nipple: true, limitPercent: 60 });
  });

  it('is no nipple where an end is open', () => {
    const open = { length: 12, betweenEnclosures: false };
    expect(codes(checkFill(section(emt('3/4'), [twelves(17)], open)))).toEqual(['fill-over']);
  });

  // NEC Chapter 9 Note 7. 14 THHN in 3/4 EMT: 0.213 / 0.0097 = 21.96, so 22.
  it('rounds up from 0.8, for one size only', () => {
    const full = checkFill(section(emt('3/4'), [wires({ count: 22, size: '14' })]));
    expect(codes(full)).toEqual(['fill-by-rounding']);
    expect(full.answer?.percent).toBeGreaterThan(40);
    const mixed = [wires({ count: 21, size: '14' }), wires({ count: 1, size: '12' })];
    expect(codes(checkFill(section(emt('3/4'), mixed)))).toEqual(['fill-over']);
  });

  it('counts two by 31 and one by 53 percent', () => {
    const answer = (count: number) =>
      checkFill(section(emt('1/2'), [twelves(count)])).answer?.limitPercent;
    expect([answer(1), answer(2), answer(3)]).toEqual([53, 31, 40]);
  });

  it('takes the tightest limit and names it', () => {
    const job = { maxFillPercent: 30, maxFillSource: 'Spec 26 05 33' };
    const tight = checkFill(section(emt('3/4'), [twelves(13)], job));
    expect(tight.findings[0]).toMatchObject({
      code: 'fill-over',
      values: { limitPercent: 30, limitFrom: 'job', source: 'Spec 26 05 33' },
      rule: null,
    });
    expect(codes(checkFill(section(emt('3/4'), [twelves(13)], { hasSeal: true })))).toEqual([
      'fill-seal-over',
    ]);
  });

  it('says how many more fit', () => {
    expect(checkFill(section(emt('3/4'), [twelves(13)])).answer?.room).toEqual({ '12': 3 });
    expect(checkFill(section(emt('3/4'), [twelves(20)])).answer?.room).toEqual({ '12': 0 });
  });

  it('counts a cable as one conductor of its own diameter', () => {
    const group = cable({ count: 1, cable: { name: 'x', od: 0.5, weight: 0.3, maxTension: 200 } });
    const { answer } = checkFill(section(emt('3/4'), [group]));
    // π/4 × 0.5² / 0.533
    expect(answer?.percent).toBeCloseTo(36.84, 2);
    expect(answer?.limitPercent).toBe(53);
  });

  // NEC Table 348.22: two 12 THHN with fittings inside, and one ground of the same size.
  it('goes by count in 3/8 flex', () => {
    const flex: Raceway = { type: 'FMC', tradeSize: '3/8' };
    const ground = wires({ count: 1, size: '12', use: 'ground' });
    expect(codes(checkFill(section(flex, [twelves(2), ground])))).not.toContain('fill-over');
    expect(codes(checkFill(section(flex, [twelves(3), ground])))).toEqual(['fill-over']);
  });

  it('has no answer without wires', () => {
    expect(checkFill(section(emt('3/4'), []))).toEqual({
      answer: null,
      reason: 'no-conductors',
      findings: [],
    });
  });

  it('never turns a fill that passes into one that fails by taking a wire out', () => {
    const raceways = fc
      .constantFrom(...RACEWAY_TYPES)
      .chain((type) =>
        fc.constantFrom(...tradeSizesOf(type)).map((tradeSize): Raceway => ({ type, tradeSize })),
      );
    const passes = (raceway: Raceway, count: number) =>
      !codes(checkFill(section(raceway, [twelves(count)]))).includes('fill-over');
    fc.assert(
      // From 4 down to 3: the limit stays the same.
      fc.property(raceways, fc.integer({ min: 4, max: 400 }), (raceway, count) => {
        expect(!passes(raceway, count) || passes(raceway, count - 1)).toBe(true);
      }),
      { numRuns: runs },
    );
  });
});

describe('jam', () => {
  // NEC Chapter 9 Table 1, Informational Note 2: 2.8 to 3.2.
  const three = wires({ count: 3, size: '250' });

  it('is possible for 3 × 250 THHN in 2 EMT round a bend: 2.91, 3.05 with ovality', () => {
    const { answer, findings } = checkJam(section(emt('2'), [three]));
    expect(answer?.ratio).toBeCloseTo(2.91, 2);
    expect(answer?.ratioWithOvality).toBeCloseTo(3.05, 2);
    expect(findings[0]).toMatchObject({ code: 'jam-possible', severity: 'caution' });
  });

  it('does not arise without a bend, or with two or four', () => {
    expect(checkJam(section(emt('2'), [three], { hasBend: false })).answer).toBeNull();
    for (const count of [1, 2, 4]) {
      expect(checkJam(section(emt('2'), [{ ...three, count }])).answer).toBeNull();
    }
  });

  it('arises with a small ground beside the three, not with a large one', () => {
    const ground = (size: '6' | '4/0') => wires({ count: 1, size, use: 'ground' });
    expect(codes(checkJam(section(emt('2'), [three, ground('6')])))).toEqual(['jam-possible']);
    expect(checkJam(section(emt('2'), [three, ground('4/0')])).answer).toBeNull();
  });
});

describe('clearance', () => {
  it('is the bore less the diameter for one', () => {
    const { answer } = checkClearance(section(emt('1'), [wires({ count: 1, size: '500' })]));
    // 1.049 − 0.949
    expect(answer).toBeCloseTo(0.1, 9);
  });

  // Geometry of three touching cylinders; the constant 1.366 as in TES-P-104.05 clause 5.4.1.
  it('of three as a triangle is the published form', () => {
    expect(triangularClearance(4.026, 1.55)).toBeCloseTo(0.86107, 4);
    expect(triangularClearance(2.067, 0.8)).toBeCloseTo(0.43193, 4);
  });

  // Cradled, by geometry: 3.356/2 − 0.949/2 + 1.2035 × (1 − 2 × (0.949 / 2.407)²).
  it('is over two inches for 3 × 500 in 3 EMT', () => {
    const { answer, findings } = checkClearance(
      section(emt('3'), [wires({ count: 3, size: '500' })]),
    );
    expect(answer).toBeCloseTo(2.0328, 3);
    expect(findings).toEqual([]);
  });

  // By geometry. Two: centres 1.2035 from the axis and 0.949 apart, so 1.678 + √(1.2035² − 0.4745²) − 0.4745.
  it.each([
    { tradeSize: '3', count: 2, size: '500', inches: 2.30952 },
    // The circle round four is 2.41421 diameters across, round three 2.1547, round two 2.
    { tradeSize: '3', count: 4, size: '500', inches: 1.06491 },
    { tradeSize: '2', count: 3, size: '750', inches: -0.42383 },
    { tradeSize: '1-1/2', count: 2, size: '500', inches: -0.288 },
  ] as const)('of $count × $size in $tradeSize EMT is $inches in', (each) => {
    const { tradeSize, count, size, inches } = each;
    const { answer } = checkClearance(section(emt(tradeSize), [wires({ count, size })]));
    expect(answer).toBeCloseTo(inches, 4);
  });

  it('is tight below a quarter inch, and negative where they cannot go in', () => {
    expect(codes(checkClearance(section(emt('1'), [wires({ count: 1, size: '500' })])))).toEqual([
      'clearance-tight',
    ]);
    expect(
      codes(checkClearance(section(emt('1-1/2'), [wires({ count: 2, size: '500' })]))),
    ).toEqual(['clearance-negative']);
    expect(codes(checkClearance(section(emt('2'), [wires({ count: 3, size: '750' })])))).toEqual([
      'clearance-negative',
    ]);
  });

  it('is left to fill where many lie together', () => {
    expect(checkClearance(section(emt('3/4'), [twelves(16)]))).toEqual({
      answer: null,
      findings: [],
    });
  });
});
