import type { Mark, Point } from '../display-list';
import { line } from '../display-list';
import { hatchRect } from '../hatch';
import type { StripPull, TensionPoint } from '../strip-pulls';
import { tensionScale } from './tension-scale';

export interface TensionBox {
  top: number;
  height: number;
  pen: number;
  /** False on the phone and in the sun: an I-bar at the pulling end stands for the shade. */
  hasShade: boolean;
}

export interface TensionLane {
  marks: Mark[];
  /** Where the lowest limit of all pulls stands; null where it is above the drawing. */
  limit: { y: number; name: NonNullable<StripPull['limit']>['name']; lbf: number } | null;
  /** The limit that does not fit into the drawing. */
  above: { name: NonNullable<StripPull['limit']>['name']; lbf: number } | null;
  /** One person and two people, where they are in range and apart from the limit. */
  hands: { y: number; lbf: number }[];
}

const CAP = 5;
/** Lines closer than this are told by one label, px. */
const APART = 15;

type Level = 'low' | 'likely' | 'high';

/** The tension of every pull over the strip, one scale for all, its limit, and what is past it. */
export function drawTensionLane(pulls: readonly StripPull[], box: TensionBox): TensionLane {
  const answered = pulls.filter(({ points, limit }) => points.length > 0 && limit !== null);
  const most = (level: Level) =>
    Math.max(0, ...answered.flatMap(({ points }) => points.map((point) => point[level])));
  const [lowest] = answered.flatMap(({ limit }) => limit ?? []).sort((a, b) => a.lbf - b.lbf);
  if (!lowest) return { marks: [], limit: null, above: null, hands: [] };
  const scale = tensionScale({ limit: lowest.lbf, likely: most('likely'), high: most('high') });
  const bottom = box.top + box.height;
  const yAt = (lbf: number) =>
    bottom - (Math.min(lbf, scale.top) / scale.top) * (box.height - box.pen);
  const limitY = scale.isLimitAbove ? null : yAt(lowest.lbf);
  const hands = scaleHands(answered, scale.top, yAt, limitY);
  const [first, last] = [answered[0], answered[answered.length - 1]];
  return {
    limit: limitY === null ? null : { y: limitY, ...lowest },
    above: limitY === null ? lowest : null,
    hands,
    marks: [
      ...answered.flatMap((pull) => drawPull(pull, yAt, box, bottom)),
      ...hands.map(({ y }) =>
        line(first?.fromX ?? 0, y, last?.toX ?? 0, y, { stroke: 'edge', strokeWidth: 1 }),
      ),
      ...(limitY === null
        ? []
        : answered.map(({ fromX, toX }) =>
            line(fromX, limitY, toX, limitY, {
              stroke: 'ink',
              strokeWidth: Math.max(1.5, box.pen),
              dash: [7, 4],
            }),
          )),
    ],
  };
}

function scaleHands(
  pulls: readonly StripPull[],
  top: number,
  yAt: (lbf: number) => number,
  limitY: number | null,
): TensionLane['hands'] {
  const given = [...new Set(pulls.flatMap(({ handOne, handTwo }) => [handOne, handTwo]))];
  const taken = limitY === null ? [] : [limitY];
  return given
    .filter((lbf): lbf is number => lbf !== null && lbf < top)
    .sort((a, b) => b - a)
    .flatMap((lbf) => {
      const y = yAt(lbf);
      if (taken.some((each) => Math.abs(each - y) < APART)) return [];
      taken.push(y);
      return [{ y, lbf }];
    });
}

function drawPull(
  pull: StripPull,
  yAt: (lbf: number) => number,
  box: TensionBox,
  bottom: number,
): Mark[] {
  const { points, fromX, toX, limit } = pull;
  const curve = (level: Level): Point[] =>
    points.map((point) => ({ x: point.x, y: yAt(point[level]) }));
  const likely = curve('likely');
  const allowed = limit?.lbf ?? Infinity;
  const shade: Mark[] = box.hasShade
    ? [
        {
          kind: 'polyline',
          points: [...curve('high'), ...curve('low').reverse()],
          closed: true,
          fill: 'fill-ok',
        },
        ...pastLimit(points, 'high', allowed, yAt),
      ]
    : [];
  return [
    ...shade,
    ...pastLimit(points, 'likely', allowed, yAt),
    line(fromX, bottom, toX, bottom, { stroke: 'edge', strokeWidth: 1 }),
    { kind: 'polyline', points: likely, stroke: 'ink', strokeWidth: box.pen },
    ...(box.hasShade ? [] : bar(points[points.length - 1], yAt, box)),
  ];
}

/** From good lube to dry at the pulling end. */
function bar(
  end: TensionPoint | undefined,
  yAt: (lbf: number) => number,
  { pen, top }: TensionBox,
): Mark[] {
  if (!end) return [];
  const [low, high] = [yAt(end.low), Math.max(top, yAt(end.high))];
  const drawn = { stroke: 'ink', strokeWidth: pen } as const;
  return [
    line(end.x, low, end.x, high, drawn),
    line(end.x - CAP, low, end.x + CAP, low, drawn),
    line(end.x - CAP, high, end.x + CAP, high, drawn),
  ];
}

/** What lies between a curve and the limit it passes: hatched where dry does, solid where typical does. */
function pastLimit(
  points: readonly TensionPoint[],
  level: 'likely' | 'high',
  allowed: number,
  yAt: (lbf: number) => number,
): Mark[] {
  const limitY = yAt(allowed);
  return points.slice(1).flatMap((to, index): Mark[] => {
    const from = points[index];
    if (!from || Math.max(from[level], to[level]) <= allowed || from.x === to.x) return [];
    const enters = from[level] < allowed;
    const leaves = to[level] < allowed;
    const share = (allowed - from[level]) / (to[level] - from[level]);
    const crossing = { x: from.x + share * (to.x - from.x), y: limitY };
    const start = enters ? crossing : { x: from.x, y: yAt(from[level]) };
    const end = leaves ? crossing : { x: to.x, y: yAt(to[level]) };
    const shape: Point[] = [{ x: start.x, y: limitY }, start, end, { x: end.x, y: limitY }];
    if (level === 'likely')
      return [{ kind: 'polyline', points: shape, closed: true, fill: 'fill-over' }];
    const left = Math.min(start.x, end.x);
    const lowest = Math.max(start.y, end.y);
    return [
      { kind: 'polyline', points: shape, closed: true, fill: 'fill-watch' },
      // The pattern fills what is a full rectangle of it; the slope above keeps the colour alone.
      ...hatchRect(left, lowest, Math.abs(end.x - start.x), Math.max(0, limitY - lowest)),
    ];
  });
}
