import type { ExpandedRun } from '../../run/expanded-run';
import type { Mark, Point } from '../display-list';
import { line } from '../display-list';
import type { StripPlaces } from '../strip-places';

/** Rise plus fall from which the drawing shows a lane of height, in: 10 ft. */
const LEAST_CLIMB = 120;

export interface Heights {
  points: Point[];
  lowest: number;
  highest: number;
}

/** Height over the strip (`x` px, `y` in, up), or null for a run that is close to level or has no directions. */
export function heightsOf(expanded: ExpandedRun, places: StripPlaces): Heights | null {
  const pieces = expanded.centreLine ?? [];
  const climb = pieces.reduce((sum, { start, end }) => sum + Math.abs(end.z - start.z), 0);
  if (climb < LEAST_CLIMB) return null;
  const points = pieces.map(({ from, start }) => ({ x: xAt(places, from), y: start.z }));
  const last = pieces[pieces.length - 1];
  if (last) points.push({ x: places.end, y: last.end.z });
  const heights = points.map(({ y }) => y);
  return { points, lowest: Math.min(...heights), highest: Math.max(...heights) };
}

const xAt = (places: StripPlaces, station: number) => places.start + places.scale.xAt(station);

/** The height of the run over its length, and the ground it is measured from. */
export function drawHeightLane(
  { points, lowest, highest }: Heights,
  box: { top: number; height: number; pen: number },
): Mark[] {
  const span = Math.max(highest - lowest, 1);
  const bottom = box.top + box.height - box.pen;
  const yAt = (height: number) => bottom - ((height - lowest) / span) * (box.height - 2 * box.pen);
  const drawn = points.map(({ x, y }) => ({ x, y: yAt(y) }));
  const [first] = drawn;
  const last = drawn[drawn.length - 1];
  if (!first || !last) return [];
  return [
    line(first.x, bottom + box.pen, last.x, bottom + box.pen, { stroke: 'edge', strokeWidth: 1 }),
    { kind: 'polyline', points: drawn, stroke: 'ink', strokeWidth: box.pen },
  ];
}
