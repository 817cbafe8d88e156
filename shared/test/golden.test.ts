import { readFileSync, readdirSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { analyzeRun } from '../src/analyze-run';
import { expandRun } from '../src/run/expand-run';
import { parseRunDocument } from '../src/run/parse-run-document';
import { ELEMENT_KINDS } from '../src/run/run-document';
import { summarizeRun } from '../src/summarize-run';

const folder = new URL('./golden/', import.meta.url);
const read = (name: string): unknown => JSON.parse(readFileSync(new URL(name, folder), 'utf8'));
const names = readdirSync(folder).filter((name) => name.endsWith('.json'));

/** What a stage could say stays readable for ever: one document for each, written when the stage landed. */
describe('golden documents', () => {
  it('there is one', () => {
    expect(names).toContain('part-one.json');
  });

  it.each(names)('%s is read as it stands', (name) => {
    const stored = read(name);
    expect(parseRunDocument(stored)).toEqual({ ok: true, document: stored });
  });
});

describe('part one', () => {
  const parsed = parseRunDocument(read('part-one.json'));
  if (!parsed.ok) throw new Error(JSON.stringify(parsed.problems));
  const { document } = parsed;
  const analysis = analyzeRun(document);

  it('holds every kind of piece', () => {
    expect(new Set(document.path.map(({ kind }) => kind))).toEqual(new Set(ELEMENT_KINDS));
  });

  it('is answered section by section', () => {
    // A–M: a sweep of 90 that doesn't count and an offset at 30. M–Z: saddles of 90 and 120, a fitting of 20, flex of 60.
    expect(analysis.sections.map(({ id, degrees }) => [id, degrees])).toEqual([
      ['A', 60],
      ['M', 290],
    ]);
    expect(
      analysis.sections.map(({ limitDegrees, limitFrom }) => [limitDegrees, limitFrom]),
    ).toEqual([
      [270, 'job'],
      [270, 'job'],
    ]);
    // 290 with the planned 60, 230 without: the flexible tail decides.
    expect(analysis.findings.map(({ code }) => code)).toContain('degrees-flex-decides');
    // 3 × 12 THHN in 3/4 EMT: 3 × 0.0133 of 0.533 in². The cable of 0.4 in: 0.1257 in² in 3/4 FMC or PVC.
    expect(analysis.sections[0]?.fill?.percent).toBeCloseTo((3 * 0.0133 * 100) / 0.533, 9);
    expect(analysis.sections[1]?.fill?.conductors).toBe(1);
  });

  it('summarizes to the columns of a list', () => {
    const summary = summarizeRun(document, analysis, expandRun(document));
    expect(summary).toMatchObject({
      status: analysis.status,
      degrees: 350,
      worstSectionDegrees: 290,
      remainingDegrees: -20,
      sections: 2,
      pullPoints: 3,
      racewayType: 'EMT',
      tradeSize: '3/4',
      from: 'LP-2',
      to: '',
    });
    expect(summary.strip.pullPoints).toHaveLength(3);
    expect(summary.strip.sections.map(({ status }) => status)).toEqual(['ok', 'watch']);
    expect(summary.strip.bends).toHaveLength(1 + 2 + 3 + 4 + 1 + 1);
  });
});
