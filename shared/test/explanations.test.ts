import fc from 'fast-check';
import { evaluate } from 'mathjs';
import { describe, expect, it } from 'vitest';
import { analyzeRun } from '../src/analyze-run';
import { DEFAULT_SETTINGS } from '../src/contracts/settings';
import { explainLimit } from '../src/explain/explain-limit';
import {
  explainGauge,
  explainHoldBack,
  explainMethod,
  explainSidewall,
  explainTension,
} from '../src/explain/explain-pull';
import {
  explainClearance,
  explainDegrees,
  explainFill,
  explainJam,
  explainRoom,
} from '../src/explain/explain-section';
import { explainCorrection, explainWeight } from '../src/explain/explain-set';
import { explainStation } from '../src/explain/explain-station';
import type { Explanation } from '../src/explain/explanation';
import { expandRun } from '../src/run/expand-run';
import type { RunDocument } from '../src/run/run-document';
import { arbitraryRun } from './arbitrary-run';
import { PULL_RUNS } from './pull-runs';

const RUNS = process.env.FAIRLEAD_LONG === '1' ? 2_000 : 200;
const WAYS = ['forward', 'reverse'] as const;
const LEVELS = ['low', 'likely', 'high'] as const;

/** What a screen shows as a figure, with what opens behind it. */
interface Opened {
  figure: number;
  explanation: Explanation | null;
}

function openedBy(document: RunDocument): Opened[] {
  const settings = DEFAULT_SETTINGS;
  const analysis = analyzeRun(document);
  const expanded = expandRun(document, settings);
  const ofSections = analysis.sections.flatMap((section): Opened[] => {
    const { fill, jam, clearance } = section;
    return [
      { figure: section.degrees, explanation: explainDegrees(section, 'NEC-2023') },
      ...section.bends.map(({ elementId, cumulative }) => ({
        figure: cumulative,
        explanation: explainDegrees(section, 'NEC-2023', { path: document.path, elementId }),
      })),
      ...(fill
        ? [{ figure: fill.percent, explanation: explainFill(document, expanded, section) }]
        : []),
      ...(jam ? [{ figure: jam.ratio, explanation: explainJam(section) }] : []),
      ...(clearance === null
        ? []
        : [{ figure: clearance, explanation: explainClearance(document, expanded, section) }]),
    ];
  });
  const ofPlaces =
    expanded.length === null
      ? []
      : expanded.elements.map(({ element, from }) => ({
          figure: from,
          explanation: explainStation(expanded, element.id),
        }));
  const ofPulls = analysis.pulls.flatMap((pull): Opened[] => {
    const { limits, weight, weightCorrection } = pull;
    const ofSet = [
      ...(weight === null
        ? []
        : [{ figure: weight, explanation: explainWeight(document, expanded, pull) }]),
      ...(weightCorrection === null
        ? []
        : [{ figure: weightCorrection, explanation: explainCorrection(document, expanded, pull) }]),
    ];
    const ofWays = WAYS.flatMap((way) =>
      LEVELS.flatMap((level): Opened[] => {
        const { tension, holdBack, profile, peakSidewall, peakSidewallAt, peak } = pull[way];
        if (!tension || !holdBack || !peak || !limits) return [];
        const question = { document, settings, pull, way, level };
        return [
          { figure: tension[level], explanation: explainTension(question) },
          { figure: holdBack[level], explanation: explainHoldBack(question) },
          ...profile.flatMap(({ elementId, tension: here, ropeFactor, sidewall }, index) => {
            const figure = here[level];
            // A piece of several parts answers for its last one.
            const isLast = index > 0 && profile[index + 1]?.elementId !== elementId;
            return [
              { figure, explanation: explainTension(question, index) },
              ...(isLast ? [{ figure, explanation: explainTension(question, elementId) }] : []),
              ...(sidewall
                ? [{ figure: sidewall[level], explanation: explainSidewall(question, index) }]
                : []),
              { figure: figure * ropeFactor, explanation: explainGauge(question, index) },
            ];
          }),
          ...(peakSidewall && peakSidewallAt !== null && level === 'likely'
            ? [{ figure: peakSidewall.likely, explanation: explainSidewall(question) }]
            : []),
          ...(way === pull.planned
            ? [{ figure: peak.likely, explanation: explainMethod(question) }]
            : []),
        ];
      }),
    );
    const ofLimits =
      limits && pull.forward.tension
        ? (['conductor', 'attachment'] as const).map((limit) => ({
            figure: limits[limit],
            explanation: explainLimit(document, expanded, pull, limit),
          }))
        : [];
    return [...ofSet, ...ofWays, ...ofLimits];
  });
  return [...ofSections, ...ofPlaces, ...ofPulls];
}

const numberOf = (text: string): number => Number(/−?[\d.]+/.exec(text)?.[0].replace('−', '-'));
/** "3 × 1.653 + 1 × 0.19 = 5.149 lb/ft", but not a line of words or of a bend integrated. */
const SUM = /^(?:[\d./]+: )?([\d.\s+×/()−π^e]+) = (−?[\d.]+)/;

/** Whether the numbers of a line give what stands behind its equals sign, to what the shown decimals leave open. */
function expectSum(line: string): boolean {
  const found = SUM.exec(line);
  if (!found) return false;
  const left = (found[1] ?? '').replaceAll('×', '*').replaceAll('−', '-').replaceAll('π', 'pi');
  const value = Number(evaluate(left));
  const shown = numberOf(found[2] ?? '');
  // Down a drop two large figures leave a small one.
  const largest = Math.max(...(line.match(/[\d.]+/g) ?? []).map(Number));
  const close = 0.011 + 1e-3 * Math.abs(shown) + 5e-4 * largest;
  expect(Math.abs(value - shown), line).toBeLessThanOrEqual(close);
  return true;
}

function expectOpened(document: RunDocument): number {
  let sums = 0;
  for (const { figure, explanation } of openedBy(document)) {
    expect(explanation).not.toBeNull();
    const { exact, worked, inputs, shownTo } = explanation!;
    expect(inputs.length).toBeGreaterThan(0);
    for (const { source } of inputs) expect(source).not.toBe('');
    const close = 0.0051 + 1e-9 * Math.abs(figure);
    expect(Math.abs(numberOf(exact) - figure), exact).toBeLessThanOrEqual(close);
    expect(shownTo === null || /^[\d.]+/.test(shownTo)).toBe(true);
    sums += worked.filter(expectSum).length;
  }
  return sums;
}

describe('what opens behind a figure', () => {
  it.each(Object.entries(PULL_RUNS))('is that figure, and its sums come out: %s', (_, make) => {
    expect(expectOpened(make())).toBeGreaterThan(20);
  });

  it('is that figure, and its sums come out: any run', () => {
    fc.assert(
      fc.property(arbitraryRun(), (document) => {
        expectOpened(document);
      }),
      { numRuns: RUNS },
    );
  });

  it('a sum that does not come out is seen', () => {
    expect(() => expectSum('3 × 1.653 + 1 × 0.19 = 5.249 lb/ft')).toThrow('5.249');
    expect(expectSum('3 × 1.653 + 1 × 0.19 = 5.149 lb/ft')).toBe(true);
    expect(expectSum('12: (0.0399 + 13 × 0.0133) / 0.533 × 100 = 39.92 %')).toBe(true);
  });

  it('the room left: the last that passes and the first that does not', () => {
    const document = PULL_RUNS.branch();
    const section = analyzeRun(document).sections[0]!;
    const expanded = expandRun(document, DEFAULT_SETTINGS);
    const { worked } = explainRoom(document, expanded, section)!;
    // Three 12 THHN in 1/2 EMT, 0.304 in²: nine pass 40 %, the tenth does not.
    expect(worked).toEqual([
      '12: (0.0399 + 6 × 0.0133) / 0.304 × 100 = 39.38 %',
      '12: (0.0399 + 7 × 0.0133) / 0.304 × 100 = 43.75 %',
    ]);
  });
});
