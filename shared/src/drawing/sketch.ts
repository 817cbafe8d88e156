import { isOver } from '../checks/degree-limit';
import { degreesStatus } from '../checks/verdicts';
import type { RunAnalysis } from '../contracts/run-analysis';
import type { ExpandedRun } from '../run/expanded-run';
import { isAccessible, isPullPoint } from '../run/pull-points';
import type { Say } from '../words/create-words';
import type { DisplayList, Mark, Point } from './display-list';
import { line } from './display-list';
import { placeNames } from './sketch-labels';
import { isometric, sketchPath } from './sketch-path';
import type { SketchStretch } from './sketch-path';
import { pastLimit } from './strip-steps';

export interface SketchOptions {
  expanded: ExpandedRun;
  analysis: RunAnalysis;
  width: number;
  height: number;
  selectedId: string | null;
  /** A station to ring instead of the selected piece. */
  cursor?: number | null;
  /** Labels of 14 px, semi-bold. */
  sun?: boolean;
  say: Say;
}

const TEXT = 12.5;
const SUN_TEXT = 14;
const SIDE = 34;
const END = 24;
const HALF_BOX = 6;
const ARM = 22;
const COMPASS = 56;
/** Between the points of the run a name should not cover, px. */
const SAMPLE = 6;

/** The run in space, seen from the south-west above: an empty drawing where it has no directions or no lengths. */
export function drawSketch(options: SketchOptions): DisplayList {
  const { expanded, width, height, selectedId, say } = options;
  const text = options.sun ? SUN_TEXT : TEXT;
  const inner = { width: Math.max(1, width - 2 * SIDE), height: Math.max(1, height - 2 * END) };
  const path = sketchPath(expanded, { left: SIDE, top: END, ...inner });
  if (!path) return { width, height, marks: [] };
  const points = path.stretches.flatMap(samples);
  const boxes = expanded.elements.flatMap(({ element, from }) =>
    isPullPoint(element) ? [{ element, at: path.pointAt(from) }] : [],
  );
  const compass = freeCorner([...points, ...boxes.map(({ at }) => at)], width, height);
  const taken = boxes.map(({ at }) => around(at, HALF_BOX));
  const names = boxes.map(({ element, at }) => ({ at, text: element.label ?? '' }));
  const selected = expanded.elements.find(({ element }) => element.id === selectedId);
  const ringed = options.cursor ?? (selected ? (selected.from + selected.to) / 2 : null);
  return {
    width,
    height,
    marks: [
      ...compassMarks(compass, text, say),
      ...conduit(path.stretches, pastSections(options)),
      ...boxes.map(({ element, at }): Mark => ({
        kind: 'rect',
        x: at.x - HALF_BOX,
        y: at.y - HALF_BOX,
        width: HALF_BOX * 2,
        height: HALF_BOX * 2,
        fill: 'surface',
        stroke: 'ink',
        strokeWidth: 2,
        ...(isAccessible(element) ? {} : { dash: [3, 2] as [number, number] }),
      })),
      ...(ringed === null ? [] : [ring(path.pointAt(ringed))]),
      ...placeNames(
        names.filter((name) => name.text !== ''),
        points,
        { width, height },
        [...taken, around(compass, COMPASS / 2)],
        text,
      ),
    ],
  };
}

const around = ({ x, y }: Point, half: number) => ({
  left: x - half,
  right: x + half,
  top: y - half,
  bottom: y + half,
});

const ring = ({ x, y }: Point): Mark => ({
  kind: 'circle',
  x,
  y,
  radius: 10,
  stroke: 'violet',
  strokeWidth: 3,
});

function samples({ from, to }: SketchStretch): Point[] {
  const count = Math.ceil(Math.hypot(to.x - from.x, to.y - from.y) / SAMPLE);
  return Array.from({ length: count }, (_, index) => {
    const share = (index + 0.5) / count;
    return { x: from.x + (to.x - from.x) * share, y: from.y + (to.y - from.y) * share };
  });
}

interface PastSection {
  from: number;
  to: number;
  past: 'over' | 'watch' | null;
}

/** Where sections past their limit begin and end, and what that counts as. */
function pastSections({ expanded, analysis }: SketchOptions): PastSection[] {
  return expanded.sections.map(({ id, fromStation, toStation }, index) => {
    const { degrees = 0, limitDegrees = 0 } = analysis.sections[index] ?? {};
    const status = degreesStatus(analysis, id);
    const past = pastLimit(isOver(degrees, limitDegrees), status);
    return { from: fromStation, to: toStation, past };
  });
}

/** The core of the double line: plain, filled with light dashes where over, dashed in amber where watched. */
const CORES = {
  over: { outer: 'fill-over', inner: 'surface', width: 1.75, dash: [3, 4] },
  watch: { outer: 'ink', inner: 'fill-watch', width: 2.5, dash: [5, 3] },
} as const;

function conduit(stretches: readonly SketchStretch[], sections: readonly PastSection[]): Mark[] {
  const drawn = stretches.map(({ from, to, station }) => {
    const section = sections.find((each) => station >= each.from && station <= each.to);
    return { from, to, core: section?.past ? CORES[section.past] : null };
  });
  const outer = drawn.map(({ from, to, core }) =>
    line(from.x, from.y, to.x, to.y, { stroke: core?.outer ?? 'ink', strokeWidth: 6 }),
  );
  const inner = drawn.map(({ from, to, core }) =>
    line(from.x, from.y, to.x, to.y, {
      stroke: core?.inner ?? 'surface',
      strokeWidth: core?.width ?? 2.5,
      ...(core ? { dash: [...core.dash] as [number, number] } : {}),
    }),
  );
  return [...outer, ...inner];
}

/** The middle of the corner with the least of the run in it; the lower left one where several are free. */
function freeCorner(points: readonly Point[], width: number, height: number): Point {
  const half = COMPASS / 2 + 4;
  const corners = [
    { x: half, y: height - half },
    { x: width - half, y: height - half },
    { x: half, y: half },
    { x: width - half, y: half },
  ];
  const inside = (corner: Point) =>
    points.filter(({ x, y }) => Math.max(Math.abs(x - corner.x), Math.abs(y - corner.y)) < half)
      .length;
  const counts = corners.map(inside);
  return corners[counts.indexOf(Math.min(...counts))] ?? { x: half, y: half };
}

function compassMarks(middle: Point, size: number, say: Say): Mark[] {
  const foot = { x: middle.x - ARM / 2, y: middle.y + 6 };
  const arms = [
    { way: { x: 0, y: 0, z: 1 }, text: say('strip.upAxis') },
    { way: { x: 0, y: 1, z: 0 }, text: say('strip.north') },
    { way: { x: 1, y: 0, z: 0 }, text: say('strip.east') },
  ];
  return arms.flatMap(({ way, text }): Mark[] => {
    const tip = isometric(way);
    const end = { x: foot.x + tip.x * ARM, y: foot.y + tip.y * ARM };
    const isUp = way.z > 0;
    return [
      line(foot.x, foot.y, end.x, end.y, { stroke: 'ink2', strokeWidth: 1.5 }),
      {
        kind: 'text',
        x: isUp ? end.x : end.x + 4,
        y: isUp ? end.y - 4 : end.y + size * 0.36,
        text,
        size,
        weight: size === SUN_TEXT ? 600 : 400,
        anchor: isUp ? 'middle' : 'start',
        fill: 'ink2',
        row: 'sketch',
      },
    ];
  });
}
