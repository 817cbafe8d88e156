import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { arbitraryRun } from '../../test/arbitrary-run';
import { analyzeRun } from '../analyze-run';
import type { RunDocument } from '../run/run-document';
import { bend, buildRun, flex, offset, pullPoint, straight, transition } from '../run/build-run';
import { expandRun } from '../run/expand-run';
import { summarizeRun } from '../summarize-run';
import { createWords } from '../words/create-words';
import { drawCompactStrip } from './compact-strip';
import type { DisplayList, Mark, TextMark } from './display-list';
import { drawSketch } from './sketch';
import { drawStrip } from './strip';
import type { StripVariant } from './strip-look';
import { textExtent } from './text-width';

const { say } = createWords('en');
const runs = process.env.FAIRLEAD_LONG === '1' ? 1_000 : 100;
const VARIANTS: StripVariant[] = ['desk', 'phone', 'compact-height'];

function strip(
  document: RunDocument,
  width: number,
  variant: StripVariant,
  selectedId = '',
  sun = false,
) {
  const expanded = expandRun(document);
  const analysis = analyzeRun(document);
  return drawStrip({ expanded, analysis, width, variant, sun, selectedId, say });
}

function allLists(document: RunDocument, width: number, variant: StripVariant): DisplayList[] {
  const expanded = expandRun(document);
  const analysis = analyzeRun(document);
  const middle = document.path[Math.floor(document.path.length / 2)]?.id ?? null;
  const drawing = strip(document, width, variant, middle ?? '');
  const summary = summarizeRun(document, analysis, expanded);
  const inSun = strip(document, width, variant, middle ?? '', true);
  return [
    drawing.body,
    inSun.body,
    ...[drawing.gutter, drawing.overview, inSun.gutter].filter((list) => list !== null),
    drawCompactStrip(summary.strip, { width: 200 }),
    drawSketch({ expanded, analysis, width: 320, height: 220, selectedId: middle, say }),
  ];
}

const textsOf = ({ marks }: DisplayList): TextMark[] =>
  marks.filter((mark) => mark.kind === 'text');

function numbersOf(mark: Mark): number[] {
  if (mark.kind === 'polyline') return mark.points.flatMap(({ x, y }) => [x, y]);
  if (mark.kind === 'rect') return [mark.x, mark.y, mark.width, mark.height];
  if (mark.kind === 'circle') return [mark.x, mark.y, mark.radius];
  return [mark.x, mark.y, mark.size];
}

function expectFinite(list: DisplayList) {
  const numbers = [list.width, list.height, ...list.marks.flatMap(numbersOf)];
  expect(numbers.filter((number) => !Number.isFinite(number))).toEqual([]);
}

function expectInside({ width, height, marks }: DisplayList) {
  for (const mark of marks) {
    const numbers = numbersOf(mark);
    const { left, right } =
      mark.kind === 'text'
        ? textExtent(mark)
        : { left: Math.min(...extentsOf(mark)), right: Math.max(...extentsOf(mark)) };
    expect({ numbers, isInside: left >= -0.01 && right <= width + 0.01 }).toMatchObject({
      isInside: true,
    });
    if (mark.kind === 'text') expect(mark.y).toBeLessThanOrEqual(height);
  }
}

function extentsOf(mark: Exclude<Mark, TextMark>): number[] {
  if (mark.kind === 'polyline') return mark.points.map(({ x }) => x);
  if (mark.kind === 'rect') return [mark.x, mark.x + mark.width];
  return [mark.x - mark.radius, mark.x + mark.radius];
}

/** Two texts of one row share no pixel. */
function expectApart(list: DisplayList) {
  const texts = textsOf(list).filter(({ row }) => row !== 'sketch');
  for (const name of new Set(texts.map(({ row }) => row))) {
    const row = texts.filter((mark) => mark.row === name);
    const extents = row.map((mark) => ({ ...textExtent(mark), text: mark.text }));
    extents.sort((a, b) => a.left - b.left);
    extents.slice(1).forEach((extent, index) => {
      const before = extents[index]!;
      expect({ before, extent, isApart: before.right <= extent.left }).toMatchObject({
        isApart: true,
      });
    });
  }
}

const tiny = buildRun({
  start: { heading: 'up' },
  path: [
    pullPoint({ label: 'LP-2' }),
    straight({ length: 24 }),
    bend({ toward: 'north' }),
    straight({ length: 36 }),
    offset({ rise: 1, angle: 10, toward: 'up' }),
    straight({ length: 15 }),
    pullPoint({ label: 'Box 1' }),
  ],
});
/** 11 sections of 8 pieces, 563 ft in straights. */
const long = buildRun({
  path: [
    pullPoint({ label: 'MDP' }),
    ...Array.from({ length: 11 }, (_, section) => [
      straight({ length: 80 }),
      bend(),
      straight({ length: 100 }),
      offset({ angle: [22.5, 30, 45][section % 3] }),
      straight({ length: 234 }),
      bend(),
      straight({ length: (563 * 12) / 11 - 414 }),
      pullPoint({ label: `JB-${section + 1}` }),
    ]).flat(),
  ],
});
const riser = buildRun({
  start: { heading: 'north' },
  path: [
    pullPoint({ label: 'SWBD' }),
    straight({ length: 72 }),
    bend({ toward: 'up' }),
    straight({ length: 720 }),
    bend({ toward: 'east' }),
    straight({ length: 96 }),
    bend({ toward: 'north' }),
    straight({ length: 80 }),
    bend({ toward: 'down' }),
    straight({ length: 30 }),
    transition({ raceway: { type: 'FMC', tradeSize: '3/4' } }),
    flex({ length: 36 }),
    pullPoint({ label: 'RTU-1' }),
  ],
});
const ends = buildRun({ path: [pullPoint({ label: 'A' }), pullPoint({ label: 'B' })] });
const many = buildRun({
  path: [
    pullPoint(),
    ...Array.from({ length: 249 }, () => [straight({ length: 30 }), bend({ angle: 30 })]).flat(),
    pullPoint(),
  ],
});
const names = buildRun({
  path: [
    pullPoint({ label: 'M'.repeat(40) }),
    straight(),
    pullPoint({ label: 'W'.repeat(40), accessible: false }),
    straight(),
    pullPoint({ label: 'Ж'.repeat(40) }),
  ],
});
const CASES = { tiny, long, riser, ends, many, names };

describe('the drawings of hard runs', () => {
  const each = Object.entries(CASES).flatMap(([name, document]) =>
    VARIANTS.flatMap((variant) => [390, 1440].map((width) => ({ name, document, variant, width }))),
  );

  it.each(each)('$name, $variant, $width px', ({ document, variant, width }) => {
    for (const list of allLists(document, width, variant)) {
      expectFinite(list);
      expectInside(list);
      expectApart(list);
    }
  });

  it('keeps to the heights the screens leave for it', () => {
    const heights = (variant: StripVariant, document: RunDocument) =>
      strip(document, variant === 'desk' ? 1440 : 390, variant).body.height;
    const caption = 22;
    expect(heights('desk', tiny) + caption).toBeLessThanOrEqual(260);
    expect(heights('phone', tiny) + caption).toBeLessThanOrEqual(220);
    expect(heights('compact-height', tiny)).toBeLessThanOrEqual(96);
  });

  it('becomes wider and gets an overview only where the pieces need it', () => {
    expect(strip(tiny, 390, 'phone').overview).toBeNull();
    const wide = strip(many, 390, 'phone');
    expect(wide.body.width).toBeGreaterThan(390);
    expect(wide.overview?.width).toBeLessThan(390);
  });
});

describe('what the strip says', () => {
  const words = (document: RunDocument, row: string, width = 1440) =>
    textsOf(strip(document, width, width < 600 ? 'phone' : 'desk').body)
      .filter((mark) => mark.row === row)
      .map(({ text }) => text);

  const fills = (marks: Mark[], fill: string) =>
    marks.filter((mark) => mark.kind !== 'text' && mark.fill === fill);
  const over = buildRun({
    path: [
      pullPoint(),
      ...Array.from({ length: 5 }, () => [straight(), bend()]).flat(),
      pullPoint(),
    ],
  });
  const compact = (document: RunDocument) =>
    drawCompactStrip(summarizeRun(document, analyzeRun(document), expandRun(document)).strip, {
      width: 200,
    });

  it('says by how much a section is over, and fills what is over', () => {
    expect(words(over, 'totals')).toEqual(['450°, 90° over']);
    // The octagon and the part of the lane.
    expect(fills(strip(over, 1440, 'desk').body.marks, 'fill-over')).toHaveLength(2);
    expect(fills(compact(over).marks, 'fill-over')).toHaveLength(1);
    expect(fills(strip(tiny, 1440, 'desk').body.marks, 'fill-over')).toHaveLength(0);
  });

  it('warns where only planned flex passes the limit, as the verdict does', () => {
    expect(analyzeRun(riser).status).toBe('watch');
    expect(words(riser, 'totals')).toEqual(['450°, 90° over']);
    const { marks } = strip(riser, 1440, 'desk').body;
    expect(fills(marks, 'fill-over')).toHaveLength(0);
    expect(fills(marks, 'fill-watch')).toHaveLength(2);
    expect(fills(compact(riser).marks, 'fill-watch')).toHaveLength(1);
  });

  it('draws two runs to one scale in a list', () => {
    const { strip: summary } = summarizeRun(tiny, analyzeRun(tiny), expandRun(tiny));
    const reach = (scaleTo?: number) =>
      Math.max(
        ...drawCompactStrip(summary, { width: 200, scaleTo }).marks.flatMap((mark) =>
          mark.kind === 'rect' ? [mark.x] : [],
        ),
      );
    expect(reach()).toBeGreaterThan(180);
    expect(reach((summary.length ?? 0) * 2)).toBeLessThan(110);
  });

  it('totals every section as the analysis does', () => {
    const degrees = analyzeRun(long).sections.map((section) => `${section.degrees}°`);
    expect(words(long, 'totals')).toEqual(degrees);
  });

  it('says how far a riser climbs, between the names', () => {
    expect(words(riser, 'names')).toEqual(expect.arrayContaining(['SWBD', 'up 60′', 'RTU-1']));
  });

  it('names the raceways of a mixed run and whether it is to scale', () => {
    const { caption, raceways } = strip(riser, 1440, 'desk');
    expect(raceways).toMatch(/^3\/4 EMT to \d+′.*, then 3\/4 FMC$/);
    expect(caption).toBe('To scale');
    expect(strip(tiny, 1440, 'desk').raceways).toBeNull();
    expect(strip(long, 390, 'phone').caption).toMatch(/^Legs under \d+′ are drawn longer$/);
    expect(strip(ends, 390, 'phone').caption).toBe('Equal steps: no lengths given');
  });

  it('has an axis only where lengths are known', () => {
    expect(words(ends, 'axis')).toEqual([]);
    expect(words(tiny, 'axis', 390).at(0)).toBe('0′');
  });
});

describe('the drawings of any run', () => {
  it('hold finite numbers only, and texts apart', () => {
    fc.assert(
      fc.property(
        arbitraryRun(),
        fc.constantFrom(...VARIANTS),
        fc.constantFrom(320, 390, 1440),
        (document, variant, width) => {
          for (const list of allLists(document, width, variant)) {
            expectFinite(list);
            expectApart(list);
          }
        },
      ),
      { numRuns: runs },
    );
  });
});
