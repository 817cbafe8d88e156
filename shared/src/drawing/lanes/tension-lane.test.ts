import { describe, expect, it } from 'vitest';
import { PULL_RUNS } from '../../../test/pull-runs';
import { analyzeRun } from '../../analyze-run';
import { bend, buildRun, flex, offset, pullPoint, straight, wires } from '../../run/build-run';
import { expandRun } from '../../run/expand-run';
import type { RunDocument } from '../../run/run-document';
import { createWords } from '../../words/create-words';
import type { TextMark } from '../display-list';
import { drawStrip } from '../strip';
import type { StripVariant } from '../strip-look';
import { drawTensionLane } from './tension-lane';
import { tensionScale } from './tension-scale';

const { say } = createWords('en');
const draw = (document: RunDocument, width = 1000, variant: StripVariant = 'desk', sun = false) =>
  drawStrip({
    expanded: expandRun(document),
    analysis: analyzeRun(document),
    width,
    variant,
    sun,
    selectedId: null,
    say,
  });
const textsOf = (document: RunDocument, ...rest: [number?, StripVariant?, boolean?]) => {
  const { body, gutter } = draw(document, ...rest);
  return [...body.marks, ...(gutter?.marks ?? [])]
    .filter((mark): mark is TextMark => mark.kind === 'text')
    .map(({ text }) => text);
};
const fills = (document: RunDocument, ...rest: [number?, StripVariant?, boolean?]) =>
  new Set(draw(document, ...rest).body.marks.map((mark) => 'fill' in mark && mark.fill));

describe('tensionScale', () => {
  it.each([
    [{ limit: 249, likely: 11, high: 30 }, 25, true],
    [{ limit: 249, likely: 40, high: 90 }, 54, true],
    [{ limit: 157, likely: 116, high: 751 }, 243.35, false],
    [{ limit: 1000, likely: 900, high: 1100 }, 1120, false],
  ])('%o: %d at the top, limit above %s', (given, top, isLimitAbove) => {
    const scale = tensionScale(given);
    expect(scale.top).toBeCloseTo(top, 9);
    expect(scale.isLimitAbove).toBe(isLimitAbove);
  });
});

describe('the lane of tension', () => {
  const pull = {
    id: 'p',
    fromX: 0,
    toX: 400,
    feedAt: 'a',
    pullAt: 'b',
    feedX: 0,
    pullX: 400,
    through: [],
    reason: null,
    holdBack: 0,
    limit: { name: 'conductor' as const, lbf: 100 },
    handOne: 50,
    handTwo: 110,
    points: [
      { x: 0, low: 10, likely: 10, high: 10 },
      { x: 400, low: 40, likely: 90, high: 150 },
    ],
  };
  const box = { top: 20, height: 64, pen: 2, hasShade: true };

  it('rises from the feed to the puller, lower at good lube than dry', () => {
    const { marks, limit } = drawTensionLane([pull], box);
    const [curve] = marks.filter(
      (mark) =>
        mark.kind === 'polyline' &&
        mark.stroke === 'ink' &&
        mark.strokeWidth === 2 &&
        mark.points.length === 2 &&
        !mark.dash,
    );
    const [from, to] = curve?.kind === 'polyline' ? curve.points : [];
    expect(from!.y).toBeGreaterThan(to!.y);
    expect(limit?.y).toBeGreaterThan(box.top);
    expect(limit?.y).toBeLessThan(to!.y);
  });

  it('hatches where dry passes the limit, and fills where typical does', () => {
    const paints = (likely: number) =>
      drawTensionLane(
        [{ ...pull, points: [pull.points[0]!, { x: 400, low: 40, likely, high: 150 }] }],
        box,
      ).marks.map((mark) => ('fill' in mark ? mark.fill : undefined));
    expect(paints(90)).toContain('fill-watch');
    expect(paints(90)).not.toContain('fill-over');
    expect(paints(120)).toContain('fill-over');
  });

  it('keeps inside its box whatever is pulled', () => {
    const wild = { ...pull, points: [pull.points[0]!, { x: 400, low: 1, likely: 1e6, high: 1e6 }] };
    for (const mark of drawTensionLane([wild], box).marks) {
      if (mark.kind !== 'polyline') continue;
      for (const { y } of mark.points) {
        expect(y).toBeGreaterThanOrEqual(box.top - 0.01);
        expect(y).toBeLessThanOrEqual(box.top + box.height + 0.01);
      }
    }
  });

  it('is empty where no pull has an answer', () => {
    expect(drawTensionLane([{ ...pull, points: [] }], box).marks).toEqual([]);
  });
});

describe('the strip with its pulls', () => {
  const through = PULL_RUNS.branchThrough();

  it('names the ends, the typical pull and the limit', () => {
    const texts = textsOf(through);
    expect(texts).toContain('feed at LP-1, pull at JB-2 · typical 115 lb');
    expect(texts).toEqual(expect.arrayContaining(['157 lb', 'conductors', 'Tension', 'Pulls']));
    expect(textsOf(through, 390, 'phone')).toContain('limit 157 lb, conductors');
  });

  it('hatches the dry part at the desk; the phone and the sun show a bar instead of shade', () => {
    expect(fills(through)).toContain('fill-watch');
    expect(fills(through, 390, 'phone')).not.toContain('fill-watch');
    expect(fills(through, 1000, 'desk', true)).not.toContain('fill-watch');
    expect(fills(PULL_RUNS.branchAlone(), 390, 'phone')).toContain('fill-over');
  });

  it('says that a far limit is above the drawing', () => {
    expect(textsOf(PULL_RUNS.branch())).toContain(
      'limit 157 lb, conductors, is above the drawing ↑',
    );
  });

  it('says what is held back', () => {
    const pulls = [{ id: 'top', from: 'top', to: 'foot', feedAt: 'from' as const }];
    const texts = textsOf({ ...PULL_RUNS.drop(), pulls });
    expect(texts.some((text) => text.includes('hold back 245 lb'))).toBe(true);
  });

  it('without an answer draws what it drew before', () => {
    const bare = buildRun({ path: [pullPoint(), straight(), bend(), straight(), pullPoint()] });
    expect(textsOf(bare)).not.toContain('Pulls');
    expect(draw(bare).body.height).toBeLessThan(draw(through).body.height - 80);
  });

  const riser = buildRun({
    raceway: { type: 'EMT', tradeSize: '2' },
    path: [
      pullPoint({ label: 'MDP' }),
      straight({ length: 60 }),
      bend({ toward: 'up' }),
      straight({ length: 500 }),
      offset({ toward: 'east', rise: 6, angle: 45 }),
      straight({ length: 540 }),
      bend({ toward: 'north' }),
      straight({ length: 80 }),
      bend({ toward: 'east' }),
      straight({ length: 60 }),
      flex({ length: 48, degrees: 90, raceway: { type: 'FMC', tradeSize: '2' } }),
      pullPoint({ label: 'AHU-9' }),
    ],
    conductors: [wires({ count: 4, size: '1/0' })],
  });
  const short = buildRun({
    path: [pullPoint(), straight({ length: 36 }), bend(), straight({ length: 36 }), pullPoint()],
    conductors: [wires({ count: 3, size: '12' })],
  });
  const long = buildRun({
    raceway: { type: 'EMT', tradeSize: '1' },
    path: [
      pullPoint(),
      ...Array.from({ length: 44 }, (_, index) => [
        straight({ length: 153 }),
        index % 5 === 4 ? pullPoint({ label: `J-${index}` }) : bend({ angle: 45 }),
      ]).flat(),
      straight({ length: 24 }),
      pullPoint(),
    ],
    conductors: [wires({ count: 6, size: '10' })],
  });
  it.each([
    ['an 87 ft riser at 450° with a flexible tail', riser],
    ['3 pieces in 6 ft', short],
    ['90 pieces in 563 ft', long],
  ])('%s stays in its height at both sizes', (_name, document) => {
    expect(draw(document, 1000).body.height).toBeLessThanOrEqual(398);
    expect(draw(document, 390, 'phone').body.height).toBeLessThanOrEqual(330);
  });
});
