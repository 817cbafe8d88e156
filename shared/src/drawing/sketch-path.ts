import { add, magnitude, ORIGIN, scale, subtract } from '../geometry/vector';
import type { Vector } from '../geometry/vector';
import type { CentreLinePiece, ExpandedRun } from '../run/expanded-run';
import type { Point } from './display-list';

/** One stretch of the sketch with what it belongs to, px. */
export interface SketchStretch {
  from: Point;
  to: Point;
  elementId: string;
  /** Station of its middle. */
  station: number;
}

export interface SketchPath {
  stretches: SketchStretch[];
  pointAt: (station: number) => Point;
}

const COS_30 = Math.cos(Math.PI / 6);
const SIN_30 = 0.5;

/** Isometric: east to the right and down, north to the right and up, up straight up. y down. */
export function isometric({ x, y, z }: Vector): Point {
  return { x: (x + y) * COS_30, y: (x - y) * SIN_30 - z };
}

/**
 * The run in space as a flat path in a box. Directions are true; every stretch is drawn with the square root of its
 * length, so that an offset of 10 in can still be seen beside a leg of 100 ft.
 */
export function sketchPath(
  expanded: ExpandedRun,
  box: { left: number; top: number; width: number; height: number },
): SketchPath | null {
  const pieces = (expanded.centreLine ?? []).filter(({ start, end }) => lengthOf(start, end) > 0);
  if (pieces.length === 0) return null;
  let at = ORIGIN;
  const corners = [isometric(at)];
  for (const piece of pieces) {
    at = add(at, drawnDelta(piece));
    corners.push(isometric(at));
  }
  const fit = fitInto(corners, box);
  const points = corners.map(fit);
  const stretches = pieces.map((piece, index): SketchStretch => {
    const from = points[index] ?? fit({ x: 0, y: 0 });
    const { elementId } = piece;
    return { from, to: points[index + 1] ?? from, elementId, station: (piece.from + piece.to) / 2 };
  });
  const pointAt = (station: number): Point => {
    const found = pieces.findIndex(({ to }) => to >= station);
    const index = found < 0 ? pieces.length - 1 : found;
    const [piece, stretch] = [pieces[index], stretches[index]];
    if (!piece || !stretch) return fit({ x: 0, y: 0 });
    const span = piece.to - piece.from;
    const share = span > 0 ? Math.min(1, Math.max(0, (station - piece.from) / span)) : 0;
    const { from, to } = stretch;
    return { x: from.x + (to.x - from.x) * share, y: from.y + (to.y - from.y) * share };
  };
  return { stretches, pointAt };
}

const lengthOf = (start: Vector, end: Vector) => magnitude(subtract(end, start));

function drawnDelta({ start, end }: CentreLinePiece): Vector {
  return scale(subtract(end, start), 1 / Math.sqrt(lengthOf(start, end)));
}

/** Scales and centres points into a box; a straight line in one direction is centred in the other. */
function fitInto(
  points: readonly Point[],
  box: { left: number; top: number; width: number; height: number },
): (point: Point) => Point {
  const xs = points.map(({ x }) => x);
  const ys = points.map(({ y }) => y);
  const [left, right] = [Math.min(...xs), Math.max(...xs)];
  const [top, bottom] = [Math.min(...ys), Math.max(...ys)];
  const factor = Math.min(
    box.width / Math.max(right - left, 1e-6),
    box.height / Math.max(bottom - top, 1e-6),
  );
  const middleX = box.left + box.width / 2;
  const middleY = box.top + box.height / 2;
  return ({ x, y }) => ({
    x: middleX + (x - (left + right) / 2) * factor,
    y: middleY + (y - (top + bottom) / 2) * factor,
  });
}
