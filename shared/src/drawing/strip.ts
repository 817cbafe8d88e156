import type { RunAnalysis } from '../contracts/run-analysis';
import type { ExpandedRun } from '../run/expanded-run';
import { formatAngle } from '../units/format-angle';
import { formatLimit } from '../units/format-force';
import { axisLabel, axisTicks } from './axis';
import { placeBendLabels } from './bend-labels';
import type { DisplayList, Mark, TextMark } from './display-list';
import { line } from './display-list';
import { drawDegreesLane } from './lanes/degrees-lane';
import { drawHeightLane, heightsOf } from './lanes/height-lane';
import { drawNamesRow } from './lanes/names-row';
import { drawRunLane } from './lanes/run-lane';
import { steepStretches } from './lanes/steep-stretches';
import { drawPullsRow } from './lanes/pulls-row';
import { drawTensionLane } from './lanes/tension-lane';
import { drawTotalsRow } from './lanes/totals-row';
import type { Say } from '../words/create-words';
import type { WordKey } from '../words/word-key';
import { bendWishes } from './strip-bends';
import { wordRaceways, wordScale } from './strip-caption';
import { cursorPlace } from './strip-cursor';
import type { CursorPlace } from './strip-cursor';
import { drawGutter } from './strip-gutter';
import { stripLook } from './strip-look';
import type { StripVariant } from './strip-look';
import { drawOverview, OVERVIEW_BUTTONS } from './strip-overview';
import { placeRun } from './strip-places';
import { placePulls } from './strip-pulls';
import type { Place } from './strip-places';
import { stripRows } from './strip-rows';
import { sectionSteps } from './strip-steps';
import { fitText, textWidth } from './text-width';

export interface StripOptions {
  expanded: ExpandedRun;
  analysis: RunAnalysis;
  /** What the drawing may take, px; a run with more in it becomes wider and scrolls. */
  width: number;
  variant: StripVariant;
  sun: boolean;
  selectedId: string | null;
  /** False leaves out the rows of the pulls, where there is no room for them. */
  hasPulls?: boolean;
  say: Say;
}

export interface StripDrawing {
  /** Names and limits of the lanes, left of the drawing; it stays while the body scrolls. */
  gutter: DisplayList | null;
  body: DisplayList;
  /** The whole run in one line, when the body is wider than what it may take. */
  overview: DisplayList | null;
  /** Where each element stands on the body, in the order of the path. */
  places: Place[];
  sections: { id: string; from: number; to: number }[];
  /** What a cursor's line crosses, px from the top: from under the words of the pulls to the axis; null without lengths. */
  lanes: { top: number; axis: number } | null;
  /** The place of the run under px along the body. */
  cursorAt: (x: number) => CursorPlace | null;
  /** How true the distances are. */
  caption: string;
  /** Which raceways follow each other; null for a run of one. */
  raceways: string | null;
}

/** The run unrolled over one distance axis: bends, conduit, names, height, degrees, totals, axis. */
export function drawStrip(options: StripOptions): StripDrawing {
  const { expanded, analysis, width, variant, sun, selectedId, say } = options;
  const look = stripLook(variant, sun);
  const view = Math.max(1, width - look.gutter);
  const places = placeRun(expanded, view, look);
  const pulls =
    options.hasPulls !== false && look.tension > 0 && expanded.length !== null
      ? placePulls(expanded, analysis.pulls, places)
      : [];
  const hasPulls = pulls.some(({ points }) => points.length > 0);
  // The phone has room for one of the two.
  const hasRoomForHeight = look.height > 0 && !(hasPulls && look.gutter === 0);
  const heights = hasRoomForHeight ? heightsOf(expanded, places) : null;
  const isWide = places.width > view + 1;
  const rows = stripRows(look, {
    pulls: hasPulls,
    height: heights !== null,
    lengths: expanded.length !== null,
  });
  const tension = drawTensionLane(hasPulls ? pulls : [], {
    top: rows.tension,
    height: look.tension,
    pen: look.pen,
    hasShade: variant === 'desk' && !sun,
  });
  const steps = sectionSteps(expanded, analysis, places);
  const steep = steepStretches(expanded, places, look);
  const labels = look.labelRows === 0 ? [] : bendLabels();
  const lane = drawDegreesLane(steps, {
    top: rows.degrees,
    height: look.degrees,
    pen: look.pen,
    leastOver: look.leastOver,
    dash: [7, 4],
  });
  const limit = steps[0]?.limit ?? 0;
  const limitText = say('strip.limit', { degrees: formatAngle(limit) });
  const throughIds = new Set(analysis.pulls.flatMap(({ through }) => through));
  const marks: Mark[] = [
    ...selection(places.elements, selectedId, rows.axis, look.halfBox + 4, sun),
    ...(hasPulls ? pullMarks() : []),
    ...(heights
      ? drawHeightLane(heights, { top: rows.height, height: look.height, pen: look.pen })
      : []),
    ...(heights && look.gutter === 0 ? [heightLabel(heights.highest - heights.lowest)] : []),
    ...lane.marks,
    ...drawRunLane(expanded, places, steep, look, rows.run, throughIds),
    ...labels,
    ...drawNamesRow(expanded, places, steep, look, rows.names, say),
    ...(look.limitRow > 0
      ? limitRow(steps, limitText, isWide, (x, text) => ({
          ...small(x, rows.limit, text),
          row: 'limit',
        }))
      : []),
    ...drawTotalsRow(
      steps.map(({ fromX, toX, ...total }) => ({ ...total, from: fromX, to: toX })),
      places.width,
      look,
      rows.totals,
      say,
    ),
    ...(expanded.length === null || look.axis === 0 ? [] : axisMarks(expanded.length)),
  ];
  const body = { width: places.width, height: rows.bottom, marks };
  return {
    gutter:
      look.gutter > 0
        ? drawGutter({ look, rows, lane, limit, heights, tension: hasPulls ? tension : null, say })
        : null,
    body,
    overview: isWide ? drawOverview(expanded, places, view - OVERVIEW_BUTTONS) : null,
    places: places.elements,
    sections: steps.map(({ id, fromX, toX }) => ({ id, from: fromX, to: toX })),
    lanes:
      expanded.length === null || look.axis === 0
        ? null
        : { top: hasPulls ? rows.pullsText + 4 : 0, axis: rows.axis },
    cursorAt: (x) => cursorPlace(expanded, places, x),
    caption: wordScale(expanded, places.scale.stretchedUnder, say),
    raceways: wordRaceways(expanded, say),
  };

  function pullMarks(): Mark[] {
    const labels = new Map(
      expanded.elements.map(({ element }) => [
        element.id,
        element.kind === 'pull-point' ? element.label : undefined,
      ]),
    );
    const labelOf = (id: string) => labels.get(id) ?? say('strip.kind.pull-point');
    const rowsOfPulls = { text: rows.pullsText, bar: rows.pullsBar };
    return [
      ...drawPullsRow(pulls, places.width, look, rowsOfPulls, { say, labelOf }),
      ...tension.marks,
      ...tensionNote(),
    ];
  }

  /** The limit over the left end of the lane: always where there is no gutter, else only where it is out of sight. */
  function tensionNote(): TextMark[] {
    const named = tension.above ?? (look.gutter === 0 ? tension.limit : null);
    if (!named) return [];
    const key = tension.above ? 'strip.limitAbove' : 'strip.limitPounds';
    const words = say(key, {
      pounds: formatLimit(named.lbf),
      name: say(`findings.pullLimit.${named.name}` as WordKey),
    });
    const room = places.width - places.start - look.edge;
    const text = fitText(words, room, look.text, look.weight);
    if (text === null) return [];
    return [
      { ...small(places.start, rows.tensionNote, text), weight: look.weight, row: 'tension' },
    ];
  }

  function small(x: number, y: number, text: string): Omit<TextMark, 'row'> {
    const { text: size } = look;
    return { kind: 'text', x, y, text, size, weight: 600, anchor: 'start', fill: 'ink' };
  }

  function heightLabel(climb: number): TextMark {
    const words = say('strip.heightOf', { height: axisLabel(climb) });
    return { ...small(places.start, rows.heightLabel, words), row: 'height' };
  }

  function bendLabels(): Mark[] {
    const placed = placeBendLabels(bendWishes({ expanded, places, steps, selectedId, say }), {
      rows: look.labelRows === 2 ? 2 : 1,
      size: look.text,
      gap: 6,
      left: look.edge,
      right: places.width - look.edge,
      countText: (count) => say('strip.bends', { count }),
    });
    return placed.flatMap(({ x, anchorX, text, row }): Mark[] => {
      const y = row === 0 ? rows.labels : rows.labels - look.labelRow;
      const label: TextMark = { ...small(x, y, text), anchor: 'middle', row: `bends-${row}` };
      if (row === 0) return [label];
      const foot = rows.labels + 4;
      return [line(anchorX, y + 3, anchorX, foot, { stroke: 'edge', strokeWidth: 1 }), label];
    });
  }

  function axisMarks(length: number): Mark[] {
    const { scale } = places;
    const xAt = (station: number) =>
      station >= length ? places.end : places.start + scale.xAt(station);
    const ticks = axisTicks({
      length,
      perUnit: scale.perUnit,
      xAt,
      apart: look.axisApart,
      size: look.text,
      weight: look.weight,
    });
    return [
      line(places.start, rows.axis, places.end, rows.axis, { stroke: 'edge', strokeWidth: 1 }),
      ...ticks.flatMap(({ x, label }): Mark[] => {
        const half = textWidth(label, look.text, look.weight) / 2;
        const middle = Math.min(Math.max(x, look.edge + half), places.width - look.edge - half);
        const text: TextMark = {
          ...small(middle, rows.axis + 9 + look.text, label),
          weight: look.weight,
          anchor: 'middle',
          fill: 'ink2',
          row: 'axis',
        };
        return [line(x, rows.axis, x, rows.axis + 5, { stroke: 'edge', strokeWidth: 1 }), text];
      }),
    ];
  }
}

/** The violet band behind the selected piece. */
function selection(
  places: readonly Place[],
  selectedId: string | null,
  height: number,
  room: number,
  sun: boolean,
): Mark[] {
  const place = places.find(({ elementId }) => elementId === selectedId);
  if (!place) return [];
  const x = Math.max(1, place.from - room);
  const band = { kind: 'rect', x, y: 1, width: place.to + room - x, height: height - 2 } as const;
  return [{ ...band, fill: 'violet-tint', stroke: 'violet', strokeWidth: sun ? 3 : 1 }];
}

/** The limit in words over the left end of its line; in a drawing that scrolls over the line of every section with room. */
function limitRow(
  steps: readonly { fromX: number; toX: number }[],
  text: string,
  isWide: boolean,
  textAt: (x: number, text: string) => TextMark,
): TextMark[] {
  return steps.flatMap(({ fromX, toX }, index) => {
    const mark = textAt(fromX, text);
    const hasRoom = toX - fromX > textWidth(text, mark.size, mark.weight) + 12;
    return index === 0 || (isWide && hasRoom) ? [mark] : [];
  });
}
