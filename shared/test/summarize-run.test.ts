import { describe, expect, it } from 'vitest';
import { analyzeRun } from '../src/analyze-run';
import { bend, buildRun, offset, pullPoint, straight, wires } from '../src/run/build-run';
import { expandRun } from '../src/run/expand-run';
import type { RunDocument } from '../src/run/run-document';
import { summarizeRun } from '../src/summarize-run';

const summaryOf = (document: RunDocument) =>
  summarizeRun(document, analyzeRun(document), expandRun(document));

describe('the summary of a run', () => {
  it('takes the fill nearest its limit, not the largest percent', () => {
    // NEC Chapter 9 Tables 1, 4 and 5, 3/4 EMT. 1 × 2 THHN is 21.7 of 53 %, 21 × 12 in a nipple 52.4 of 60 %.
    const path = [
      pullPoint({ id: 'A' }),
      straight(),
      pullPoint({ id: 'B' }),
      straight(),
      pullPoint({ id: 'C' }),
      straight({ length: 20 }),
      pullPoint({ id: 'D' }),
    ];
    const conductors = [
      wires({ count: 1, size: '2', to: 'B' }),
      wires({ count: 15, from: 'B', to: 'C' }),
      wires({ count: 21, from: 'C' }),
    ];
    const summary = summaryOf(buildRun({ path, conductors }));
    // 15 × 12 THHN: 37.4 of 40 %, 0.936 of the limit; the nipple's 52.4 of 60 % is 0.873.
    expect(summary.fillPercent).toBeCloseTo((15 * 0.0133 * 100) / 0.533, 9);
  });

  it('has no fill where there are no conductors, and no length where there are no straights', () => {
    const path = [pullPoint(), bend(), offset(), pullPoint({ accessible: false }), pullPoint()];
    const summary = summaryOf(buildRun({ path }));
    expect(summary).toMatchObject({ fillPercent: null, lengthInches: null, status: 'over' });
    expect(summary.strip).toEqual({
      length: null,
      pullPoints: [
        { station: 0, accessible: true },
        { station: 3, accessible: false },
        { station: 4, accessible: true },
      ],
      bends: [
        { station: 1, angle: 90 },
        { station: 1.75, angle: 30 },
        { station: 2.25, angle: 30 },
      ],
      sections: [{ from: 0, to: 4, degrees: 150, limit: 360, status: 'ok' }],
    });
  });

  it('keeps the worst section, and each its own status of degrees', () => {
    const four = [bend(), bend(), bend(), bend()];
    const path = [pullPoint(), ...four, bend({ angle: 5 }), pullPoint(), bend(), pullPoint()];
    const summary = summaryOf(buildRun({ path }));
    expect(summary).toMatchObject({
      degrees: 455,
      worstSectionDegrees: 365,
      remainingDegrees: -5,
      sections: 2,
    });
    expect(summary.strip.sections.map(({ status }) => status)).toEqual(['over', 'ok']);
  });
});
