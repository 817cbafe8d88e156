import type { Mark, Point } from '../display-list';
import { line } from '../display-list';
import { hatchRect } from '../hatch';

/** Degrees of one section, step by step: at `x` the total becomes `total`. */
export interface DegreeSteps {
  fromX: number;
  toX: number;
  steps: { x: number; total: number }[];
  limit: number;
  /** What the degrees past the limit count as; null where none are. */
  past: 'over' | 'watch' | null;
}

/** How far the limit stands below the top, and how far the worst may pass it. */
const ABOVE_LIMIT = 1.14;
const ABOVE_WORST = 1.1;
const HIGHEST = 1.6;

/**
 * The degrees a lane shows at its top: max(1.14 × limit, min(1.1 × worst, 1.6 × limit)).
 *
 * @example degreesScale(360, 380) // 418
 */
export function degreesScale(limit: number, worst: number): number {
  return Math.max(ABOVE_LIMIT * limit, Math.min(ABOVE_WORST * worst, HIGHEST * limit), 1);
}

export interface DegreesLane {
  marks: Mark[];
  /** Height of the limit line of the first section. */
  limitY: number;
}

/** The rising degrees, their limit, and what is over it, drawn at least `leastOver` px high. */
export function drawDegreesLane(
  sections: readonly DegreeSteps[],
  box: { top: number; height: number; pen: number; leastOver: number; dash: [number, number] },
): DegreesLane {
  const limit = Math.max(0, ...sections.map((section) => section.limit));
  const worst = Math.max(0, ...sections.map(({ steps }) => steps[steps.length - 1]?.total ?? 0));
  const bottom = box.top + box.height;
  // Room for the least part over the limit comes first; the scale takes what remains.
  const scale = degreesScale(limit, worst);
  const yAt = (degrees: number) => {
    const y = bottom - (Math.min(degrees, scale) / scale) * (box.height - box.pen);
    const limitY = bottom - (limit / scale) * (box.height - box.pen);
    const headroom = limitY - box.top - box.leastOver;
    return headroom >= 0 ? y : y - headroom * (Math.min(degrees, limit) / Math.max(limit, 1));
  };
  const marks = sections.flatMap((section) => drawSection(section, yAt, box, bottom));
  return { marks, limitY: yAt(sections[0]?.limit ?? limit) };
}

function drawSection(
  section: DegreeSteps,
  yAt: (degrees: number) => number,
  box: { top: number; pen: number; leastOver: number; dash: [number, number] },
  bottom: number,
): Mark[] {
  const { fromX, toX, steps, limit, past } = section;
  const outline: Point[] = [{ x: fromX, y: bottom }];
  const over: Point[] = [];
  const limitY = yAt(limit);
  let y = bottom;
  for (const { x, total } of steps) {
    outline.push({ x, y });
    const isPast = past !== null && total > limit;
    y = isPast ? limitY : yAt(total);
    outline.push({ x, y });
    if (isPast) {
      const top = Math.max(box.top, Math.min(yAt(total), limitY - box.leastOver));
      const last = over[over.length - 1];
      over.push({ x, y: last ? last.y : limitY }, { x, y: top });
    }
  }
  outline.push({ x: toX, y }, { x: toX, y: bottom });
  const last = over[over.length - 1];
  const crossing = over[0];
  return [
    { kind: 'polyline', points: outline, closed: true, fill: 'fill-ok' },
    line(fromX, bottom, toX, bottom, { stroke: 'edge', strokeWidth: 1 }),
    { kind: 'polyline', points: outline, stroke: 'ink', strokeWidth: box.pen },
    line(fromX, limitY, toX, limitY, {
      stroke: 'ink',
      strokeWidth: Math.max(1.5, box.pen),
      dash: box.dash,
    }),
    ...(last && crossing
      ? [
          line(crossing.x, limitY, crossing.x, bottom, {
            stroke: 'ink',
            strokeWidth: 1.5,
            dash: [1.5, 3],
          }),
          ...pastLimit([...over, { x: toX, y: last.y }, { x: toX, y: limitY }], past),
        ]
      : []),
  ];
}

/** Over: solid. Watch: hatched. `points` go up at every step and end under the last one. */
function pastLimit(points: Point[], past: DegreeSteps['past']): Mark[] {
  const fill = past === 'over' ? 'fill-over' : 'fill-watch';
  const shape: Mark = { kind: 'polyline', points, closed: true, fill };
  const outline: Mark = { kind: 'polyline', points, closed: true, stroke: 'ink', strokeWidth: 1 };
  if (past === 'over') return [shape, outline];
  const foot = points[points.length - 1]?.y ?? 0;
  const hatch = points.slice(1).flatMap((point, index) => {
    const before = points[index] ?? point;
    return point.x > before.x
      ? hatchRect(before.x, point.y, point.x - before.x, foot - point.y)
      : [];
  });
  return [shape, ...hatch, outline];
}
