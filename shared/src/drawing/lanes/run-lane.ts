import { isAccessible, isPullPoint } from '../../run/pull-points';
import type { ExpandedRun } from '../../run/expanded-run';
import type { RacewayType } from '../../run/run-document';
import type { Mark } from '../display-list';
import { line } from '../display-list';
import type { StripLook } from '../strip-look';
import type { StripPlaces } from '../strip-places';
import type { SteepStretch } from './steep-stretches';

type Wall = 'metal' | 'plastic' | 'flexible';
const WALLS: Record<RacewayType, Wall> = {
  EMT: 'metal',
  IMC: 'metal',
  RMC: 'metal',
  FMC: 'flexible',
  LFMC: 'flexible',
  'LFNC-A': 'flexible',
  'LFNC-B': 'flexible',
  'LFNC-C': 'flexible',
  ENT: 'plastic',
  'PVC-40': 'plastic',
  'PVC-80': 'plastic',
  'PVC-A': 'plastic',
  'PVC-EB': 'plastic',
  'HDPE-40': 'plastic',
};

const CHEVRON_STEP = 22;
const RUNG_STEP = 5;
/** Conduit comes in sticks of 10 ft (common practice, no source). */
const STICK = 120;
/** A coupling is shown only where a stick takes at least this much, px. */
const LEAST_STICK = 14;
const FULL_TICK = 90;

/** The conduit in a straight line: walls, couplings, chevrons, ticks by angle, pull points. `axis` is its middle, px. */
export function drawRunLane(
  expanded: ExpandedRun,
  places: StripPlaces,
  steep: readonly SteepStretch[],
  look: StripLook,
  axis: number,
  through: ReadonlySet<string>,
): Mark[] {
  return [
    ...wallMarks(expanded, places, look, axis),
    ...steep.flatMap((stretch) => chevrons(stretch, look, axis)),
    ...tickMarks(expanded, places, look, axis),
    ...expanded.elements.flatMap(({ element, index }) => {
      const place = places.elements[index];
      if (!place || !isPullPoint(element)) return [];
      if (through.has(element.id)) return throughMarks(place.from, axis, look);
      return boxMarks(place.from, axis, isAccessible(element), look);
    }),
  ];
}

/** The two walls by kind of raceway, a collar where one kind meets another, rungs across the flexible ones. */
function wallMarks(
  expanded: ExpandedRun,
  places: StripPlaces,
  look: StripLook,
  axis: number,
): Mark[] {
  const marks: Mark[] = [];
  const collars: Mark[] = [];
  const half = look.bore / 2;
  let from = places.start;
  for (const placed of expanded.elements) {
    const place = places.elements[placed.index];
    const before = expanded.elements[placed.index - 1];
    if (!place) continue;
    // What leads to a pull point or a transition is still the raceway before it.
    const leads = placed.element.kind === 'pull-point' || placed.element.kind === 'transition';
    const wall = WALLS[(leads && before ? before : placed).raceway.type];
    const to = Math.max(from, place.to);
    marks.push(...stretchOfWall(wall, from, to, look, axis));
    if (wall !== 'flexible') marks.push(...couplings(placed, from, to, look, axis));
    const collar = (x: number): Mark => ({
      kind: 'rect',
      x: x - 3,
      y: axis - half - 4,
      width: 6,
      height: look.bore + 8,
      fill: 'surface',
      stroke: 'ink',
      strokeWidth: look.pen * 0.75,
    });
    if (placed.element.kind === 'transition') collars.push(collar(place.from));
    if (placed.element.kind === 'flex') {
      if (before && !isPullPoint(before.element)) collars.push(collar(place.from));
      const after = expanded.elements[placed.index + 1];
      if (after && !isPullPoint(after.element)) collars.push(collar(place.to));
    }
    from = to;
  }
  return [...marks, ...collars];
}

function stretchOfWall(
  wall: Wall,
  from: number,
  to: number,
  look: StripLook,
  axis: number,
): Mark[] {
  if (to <= from) return [];
  const half = look.bore / 2;
  const dash = wall === 'plastic' ? { dash: [10, 4] as [number, number] } : {};
  const walls = [axis - half, axis + half].map((y) =>
    line(from, y, to, y, { stroke: 'ink', strokeWidth: look.pen, ...dash }),
  );
  if (wall !== 'flexible') return walls;
  const rungs = Math.floor((to - from) / RUNG_STEP);
  return [
    ...walls,
    ...Array.from({ length: rungs }, (_, rung) => {
      const x = from + (rung + 0.5) * RUNG_STEP;
      return line(x - 1.5, axis + half, x + 1.5, axis - half, { stroke: 'ink', strokeWidth: 1.25 });
    }),
  ];
}

function couplings(
  { element }: ExpandedRun['elements'][number],
  from: number,
  to: number,
  look: StripLook,
  axis: number,
): Mark[] {
  if (element.kind !== 'straight') return [];
  const sticks = element.length / STICK;
  const stick = (to - from) / sticks;
  if (sticks <= 1 || stick < LEAST_STICK) return [];
  const half = look.bore / 2 + 1;
  const clear = look.halfBox + 3;
  return Array.from({ length: Math.ceil(sticks) - 1 }, (_, index) => from + (index + 1) * stick)
    .filter((x) => x > from + clear && x < to - clear)
    .map((x) => line(x, axis - half, x, axis + half, { stroke: 'edge', strokeWidth: look.pen }));
}

/** ∧ where the run climbs, ∨ where it falls. */
function chevrons({ from, to, rise }: SteepStretch, look: StripLook, axis: number): Mark[] {
  const room = to - from;
  const count = Math.max(room >= LEAST_STICK ? 1 : 0, Math.floor((room - 8) / CHEVRON_STEP));
  const tip = rise > 0 ? -1.75 : 1.75;
  return Array.from({ length: count }, (_, index) => {
    const x = from + (room - (count - 1) * CHEVRON_STEP) / 2 + index * CHEVRON_STEP;
    return {
      kind: 'polyline',
      points: [
        { x: x - 3.5, y: axis - tip },
        { x, y: axis + tip },
        { x: x + 3.5, y: axis - tip },
      ],
      stroke: 'ink',
      strokeWidth: Math.min(look.pen, 2),
    };
  });
}

function tickMarks(
  expanded: ExpandedRun,
  places: StripPlaces,
  look: StripLook,
  axis: number,
): Mark[] {
  const wall = look.bore / 2;
  return expanded.bends.map((bend, index) => {
    const x = places.bends[index] ?? 0;
    const top = axis - wall - 1 - (Math.min(bend.angle, FULL_TICK) / FULL_TICK) * look.tick;
    const isFirm = bend.counts && !bend.planned;
    return line(x, top, x, axis + wall + 3, {
      stroke: 'petrol',
      strokeWidth: look.tickPen,
      ...(isFirm ? {} : { dash: [4, 3] as [number, number] }),
    });
  });
}

/** A box the cable is pulled straight through: the line of the conduit runs on in it. */
function throughMarks(x: number, axis: number, look: StripLook): Mark[] {
  const half = look.halfBox;
  const pen = { stroke: 'ink', strokeWidth: look.pen } as const;
  return [
    {
      kind: 'rect',
      x: x - half,
      y: axis - half,
      width: half * 2,
      height: half * 2,
      fill: 'surface',
      ...pen,
    },
    line(x - half, axis, x + half, axis, pen),
  ];
}

/** A pull point: a square with a plus. One nobody can reach: dashed, without a plus. */
function boxMarks(x: number, axis: number, accessible: boolean, look: StripLook): Mark[] {
  const half = look.halfBox;
  const arm = half * 0.42;
  const pen = { stroke: 'ink', strokeWidth: look.pen } as const;
  const square: Mark = {
    kind: 'rect',
    x: x - half,
    y: axis - half,
    width: half * 2,
    height: half * 2,
    fill: 'surface',
    ...pen,
  };
  if (!accessible) return [{ ...square, dash: [4, 3] }];
  return [square, line(x - arm, axis, x + arm, axis, pen), line(x, axis - arm, x, axis + arm, pen)];
}
