import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { ENGINE_VERSION, analyzeRun } from '../src/analyze-run';
import { CHECKS } from '../src/contracts/run-analysis';
import type { RunAnalysis } from '../src/contracts/run-analysis';
import { DEFAULT_SETTINGS } from '../src/contracts/settings';
import { radians } from '../src/geometry/angles';
import { magnitude, subtract } from '../src/geometry/vector';
import type { Vector } from '../src/geometry/vector';
import { buildRun, bend, pullPoint, straight } from '../src/run/build-run';
import { expandRun } from '../src/run/expand-run';
import { InvalidRunError } from '../src/run/invalid-run-error';
import { parseRunDocument } from '../src/run/parse-run-document';
import type { Direction, PathElement, RunDocument } from '../src/run/run-document';
import { summarizeRun } from '../src/summarize-run';
import { arbitraryRun } from './arbitrary-run';
import { MALFORMED_RUNS } from './malformed-runs';
import { reverseRun } from './reverse-run';

const numRuns = process.env.FAIRLEAD_LONG === '1' ? 10_000 : 1_000;
const within = (a: number | null, b: number | null, relative = 1e-9): void => {
  expect(a === null).toBe(b === null);
  expect(Math.abs((a ?? 0) - (b ?? 0))).toBeLessThanOrEqual(
    relative * Math.max(1, Math.abs(a ?? 0)),
  );
};

/** Every number anywhere inside is finite; nothing is undefined where a number should stand. */
function expectFinite(value: unknown, at = ''): void {
  if (typeof value === 'number' && !Number.isFinite(value)) throw new Error(`${at} is ${value}`);
  if (typeof value !== 'object' || value === null) return;
  for (const [key, inner] of Object.entries(value)) expectFinite(inner, `${at}/${key}`);
}

/** What two descriptions of one run must agree on, whatever their pieces are called. */
function facts({ totals, sections, verdicts, findings, status }: RunAnalysis) {
  return {
    status,
    sections: totals.sections,
    verdicts: verdicts.map(({ check, status: own }) => `${check} ${own}`),
    findings: findings.map(({ code, severity }) => `${code} ${severity}`).sort(),
    limits: sections.map(({ limitDegrees, limitFrom }) => `${limitDegrees} ${limitFrom}`),
  };
}

describe('any valid run', () => {
  it('is accepted by the parser as it is', () => {
    fc.assert(
      fc.property(arbitraryRun(), (document) => {
        expect(parseRunDocument(document)).toEqual({ ok: true, document });
      }),
      { numRuns },
    );
  });

  it('is answered with finite numbers, all verdicts and its own bookkeeping in order', () => {
    fc.assert(
      fc.property(arbitraryRun(), (document) => {
        const before = JSON.stringify(document);
        const expanded = expandRun(document);
        const analysis = analyzeRun(document);
        expectFinite(expanded);
        expectFinite(analysis);
        expectFinite(summarizeRun(document, analysis, expanded));
        expect(JSON.stringify(document)).toBe(before);
        expect(analysis.engineVersion).toBe(ENGINE_VERSION);
        expect(analysis.verdicts.map(({ check }) => check)).toEqual([...CHECKS]);
        expect(analysis.sections).toHaveLength(expanded.sections.length);
        const ids = new Set(document.path.map(({ id }) => id));
        for (const { at } of analysis.findings) {
          if (at.elementId !== undefined) expect(ids.has(at.elementId)).toBe(true);
          if (at.sectionId !== undefined) expect(ids.has(at.sectionId)).toBe(true);
        }
        for (const section of analysis.sections) {
          within(section.bends[section.bends.length - 1]?.cumulative ?? 0, section.degrees);
          within(section.limitDegrees - section.degrees, section.remainingDegrees);
          expect(section.strictDegrees).toBeGreaterThanOrEqual(section.degrees - 1e-9);
        }
        const hasStop = analysis.findings.some(({ severity }) => severity === 'stop');
        expect(analysis.status === 'over').toBe(hasStop);
      }),
      { numRuns },
    );
  });

  it('has stations that only grow, and a centre line as long as it and joined end to end', () => {
    fc.assert(
      fc.property(arbitraryRun({ directions: 'all' }), (document) => {
        const { elements, length, end, centreLine } = expandRun(document);
        let station = elements[0]?.from ?? 0;
        for (const { from, to } of elements) {
          expect(from).toBeGreaterThanOrEqual(station - 1e-9);
          expect(to).toBeGreaterThanOrEqual(from);
          station = to;
        }
        expect(station).toBe(end);
        if (!centreLine || length === null) return;
        let point: Vector = { x: 0, y: 0, z: 0 };
        let sum = 0;
        for (const piece of centreLine) {
          expect(magnitude(subtract(piece.start, point))).toBeLessThanOrEqual(1e-9);
          const chord = magnitude(subtract(piece.end, piece.start));
          if (piece.kind === 'line') {
            sum += chord;
          } else {
            const turned = radians(piece.angle);
            within(chord, 2 * piece.radius * Math.sin(turned / 2), 1e-7);
            sum += piece.radius * turned;
          }
          point = piece.end;
        }
        within(sum, length);
      }),
      { numRuns },
    );
  });

  it('reversed has the same degrees and the same length, section by section', () => {
    fc.assert(
      fc.property(arbitraryRun({ directions: 'none' }), (document) => {
        const reversed = reverseRun(document);
        const forth = analyzeRun(document);
        const back = analyzeRun(reversed);
        within(forth.totals.length, back.totals.length);
        within(forth.totals.degrees, back.totals.degrees);
        const sections = [...back.sections].reverse();
        forth.sections.forEach((section, index) => {
          within(section.degrees, sections[index]?.degrees ?? null);
          within(section.strictDegrees, sections[index]?.strictDegrees ?? null);
          within(section.length, sections[index]?.length ?? null);
        });
        expect({ ...facts(back), limits: [] }).toEqual({ ...facts(forth), limits: [] });
      }),
      { numRuns },
    );
  });

  it('turned about the vertical says the same, and its line is turned with it', () => {
    fc.assert(
      fc.property(
        arbitraryRun({ directions: 'all' }),
        fc.double({ min: 1, max: 359, noNaN: true }),
        (document, by) => {
          const turned = turnRun(document, by);
          const first = expandRun(document);
          // Whether a direction is parallel may flip for directions a millionth off: such runs are left aside.
          fc.pre(first.directions === expandRun(turned).directions);
          const analysis = analyzeRun(turned);
          expect(facts(analysis)).toEqual(facts(analyzeRun(document)));
          const angle = radians(by);
          first.centreLine?.forEach((piece, index) => {
            const { x, y, z } = piece.end;
            const there = {
              x: x * Math.cos(angle) + y * Math.sin(angle),
              y: y * Math.cos(angle) - x * Math.sin(angle),
              z,
            };
            const end = expandRun(turned).centreLine?.[index]?.end ?? { x: NaN, y: NaN, z: NaN };
            const size = Math.max(1, first.length ?? 1);
            expect(magnitude(subtract(end, there)) / size).toBeLessThan(1e-7);
          });
        },
      ),
      { numRuns: numRuns / 10 },
    );
  });

  it('with one straight cut in two says the same', () => {
    fc.assert(
      fc.property(
        arbitraryRun(),
        fc.double({ min: 0.01, max: 0.99, noNaN: true }),
        (document, share) => {
          const cut = cutStraight(document, share);
          fc.pre(cut !== null);
          const whole = analyzeRun(document);
          const parts = analyzeRun(cut as RunDocument);
          expect(facts(parts)).toEqual(facts(whole));
          within(parts.totals.length, whole.totals.length);
          within(parts.totals.degrees, whole.totals.degrees);
          whole.sections.forEach((section, index) => {
            within(parts.sections[index]?.length ?? null, section.length);
            within(parts.sections[index]?.fill?.percent ?? null, section.fill?.percent ?? null);
          });
        },
      ),
      { numRuns },
    );
  });
});

describe('any invalid run', () => {
  it.each(MALFORMED_RUNS)('$title is never analysed', ({ input, problems }) => {
    let thrown: unknown;
    try {
      analyzeRun(input as RunDocument);
    } catch (error) {
      thrown = error;
    }
    expect(thrown).toBeInstanceOf(InvalidRunError);
    expect((thrown as InvalidRunError).problems).toHaveLength(Object.keys(problems).length);
  });
});

describe('the largest run', () => {
  it('of 500 pieces is analysed in well under a second', () => {
    const middle = Array.from({ length: 249 }, () => [
      straight({ length: 30 }),
      bend({ angle: 5 }),
    ]).flat();
    const document = buildRun({ path: [pullPoint(), ...middle, pullPoint()] });
    expect(document.path).toHaveLength(500);
    analyzeRun(document);
    const started = performance.now();
    const analysis = analyzeRun(document, DEFAULT_SETTINGS);
    expect(performance.now() - started).toBeLessThan(500);
    expect(analysis.totals.degrees).toBe(1_245);
  });
});

function turnRun(document: RunDocument, by: number): RunDocument {
  const turn = (direction: Direction | undefined): Direction | undefined => {
    if (direction === undefined || direction === 'up' || direction === 'down') return direction;
    const { azimuth, elevation } =
      typeof direction === 'string'
        ? { azimuth: { north: 0, east: 90, south: 180, west: 270 }[direction], elevation: 0 }
        : direction;
    return { azimuth: (azimuth + by) % 360, elevation };
  };
  const path = document.path.map((element): PathElement => {
    if (element.kind === 'pull-point') {
      return element.turn
        ? { ...element, turn: { ...element.turn, toward: turn(element.turn.toward) } }
        : element;
    }
    return 'toward' in element ? { ...element, toward: turn(element.toward) } : element;
  });
  return { ...document, start: { heading: turn(document.start?.heading ?? 'east') }, path };
}

function cutStraight(document: RunDocument, share: number): RunDocument | null {
  const index = document.path.findIndex(({ kind }) => kind === 'straight');
  const element = document.path[index];
  if (element?.kind !== 'straight') return null;
  const first = element.length * share;
  const halves: PathElement[] = [
    { ...element, length: first },
    { ...element, id: 'cut', length: element.length - first },
  ];
  return {
    ...document,
    path: [...document.path.slice(0, index), ...halves, ...document.path.slice(index + 1)],
  };
}
