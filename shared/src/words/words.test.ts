import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { analyzeRun } from '../analyze-run';
import { suggestFixes } from '../checks/suggest-fixes/suggest-fixes';
import { FINDING_CODES } from '../contracts/finding-codes';
import { DEFAULT_SETTINGS } from '../contracts/settings';
import { bend, buildRun, offset, pullPoint, wires } from '../run/build-run';
import { arbitraryRun } from '../../test/arbitrary-run';
import { createWords } from './create-words';
import { en } from './en';
import { wordFinding } from './word-finding';
import { wordFix } from './word-fix';
import { wordVerdict } from './word-verdict';

const { say } = createWords('en');
const context = { say, labelOf: (id: string) => `[${id}]` };
const runs = process.env.FAIRLEAD_LONG === '1' ? 1_000 : 100;

const sentences = (words: unknown, at = ''): [string, string][] =>
  typeof words === 'string'
    ? [[at, words]]
    : Object.entries(words as object).flatMap(([key, value]) => sentences(value, `${at}.${key}`));

const withOffsetAt = (angle: number) =>
  analyzeRun(
    buildRun({
      path: [
        pullPoint({ id: 'A' }),
        bend(),
        bend(),
        bend(),
        offset({ angle }),
        offset({ rise: 0.5, angle: 10 }),
        pullPoint({ id: 'Z' }),
      ],
    }),
  );

const said = (angle: number) => {
  const verdict = withOffsetAt(angle).verdicts.find(({ check }) => check === 'degrees');
  return verdict && wordVerdict(verdict, context);
};

describe('words', () => {
  it('are never empty', () => {
    expect(sentences(en).filter(([, text]) => text.trim() === '')).toEqual([]);
  });

  it.each(FINDING_CODES)('name and explain %s', (code) => {
    expect(Object.keys(en.findings.title)).toContain(code);
    expect(Object.keys(en.findings.body)).toContain(code);
  });

  it('say degrees against the limit', () => {
    expect(said(30)).toBe('350 of 360, 10 left');
    expect(said(45)).toBe('380 of 360, 20 over');
    expect(said(22.5)).toBe('335 of 360, 25 left');
    expect(said(35)).toBe('360 of 360, none left');
  });

  it('say why a run is over, by what rule, and in which other reading', () => {
    const [finding] = withOffsetAt(45).findings.filter(({ code }) => code === 'degrees-over');
    if (!finding) throw new Error('no finding');
    expect(wordFinding(finding, context)).toEqual({
      title: '380° since [A], 20° over',
      body: 'Limit 360° between pull points. Any offset as a 90: 450°.',
      rule: 'NEC 2023, 358.24(B)',
    });
  });

  it('say jamming with both ratios', () => {
    const analysis = analyzeRun(
      buildRun({
        raceway: { type: 'EMT', tradeSize: '2' },
        path: [pullPoint({ id: 'A' }), bend(), pullPoint({ id: 'Z' })],
        conductors: [wires({ count: 3, size: '250' })],
      }),
    );
    const finding = analysis.findings.find(({ code }) => code === 'jam-possible');
    expect(finding && wordFinding(finding, context).body).toBe(
      '2.91 (3.05 with bend ovality): three can wedge between 2.8 and 3.2.',
    );
  });

  it('say every finding, fix and verdict of any run in full', () => {
    fc.assert(
      fc.property(arbitraryRun(), (run) => {
        const analysis = analyzeRun(run);
        const findings = suggestFixes(run, analysis, DEFAULT_SETTINGS);
        const texts = [
          ...findings.flatMap((finding) => Object.values(wordFinding(finding, context))),
          ...findings.flatMap(({ fixes = [] }) =>
            fixes.flatMap((fix) => Object.values(wordFix(fix, context))),
          ),
          ...analysis.verdicts.map((verdict) => wordVerdict(verdict, context)),
        ];
        for (const text of texts) {
          expect(text).not.toMatch(/\{\{|undefined|null|NaN|findings\./);
        }
      }),
      { numRuns: runs },
    );
  });
});
