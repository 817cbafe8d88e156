import type { PlacedBend, PlacedLeg } from '../expanded-run';
import type { LayoutInput, PathItem, UnplacedBend } from './path-items';

type LengthItem = Extract<PathItem, { kind: 'length' }>;
type Stop = Exclude<PathItem, LengthItem>;
interface Extent {
  from: number;
  to: number;
}

/** A piece of the centre line in order: straight pipe, an arc, or the place where a box turns the conductors. */
export type Stretch =
  | { kind: 'line'; elementIndex: number; from: number; to: number }
  | { kind: 'arc'; elementIndex: number; from: number; to: number; bend: number; sense: 1 | -1 }
  | { kind: 'wall'; elementIndex: number };

export interface Layout {
  bends: PlacedBend[];
  legs: PlacedLeg[];
  /** null where there are no lengths to lay out. */
  stretches: Stretch[] | null;
  /** Stations where each element begins and ends. */
  extents: Extent[];
  /** Developed length, in. */
  length: number | null;
}

/**
 * Lays the items of a path one after another along the developed centre line.
 *
 * A leg of L inches corner to corner between tangents T₁ and T₂ leaves L − T₁ − T₂ of straight pipe; a corner adds its
 * arc Rθ. Together: Σ legs − Σ gains. Example: 60 in, 90° at R 4.5, 60 in develops 120 − 1.9314 = 118.0686. A leg
 * shorter than its tangents leaves no straight (never less than none: stations only grow); bend-fits-leg says how
 * short it is.
 */
export function layOut(
  inputs: readonly LayoutInput[],
  items: readonly PathItem[],
  unplaced: readonly UnplacedBend[],
): Layout {
  const bendExtents: Extent[] = unplaced.map(() => ({ from: 0, to: 0 }));
  const extents: (Extent | undefined)[] = inputs.map(() => undefined);
  const legs: PlacedLeg[] = [];
  const stretches: Stretch[] = [];
  let station = 0;

  const occupy = (item: PathItem, from: number, to: number): void => {
    extents[item.elementIndex] = { from: extents[item.elementIndex]?.from ?? from, to };
    if (item.bend !== null) bendExtents[item.bend] = { from, to };
  };

  for (const { before, members, after } of legsOf(items)) {
    const tangentBefore = tangentOf(before);
    const tangents = tangentBefore + tangentOf(after);
    const length = members.reduce((sum, member) => sum + member.length, 0);
    const pipe = Math.max(0, length - tangents);
    const start = station;
    let corner = 0;
    for (const member of members) {
      const from = start + clamp(corner - tangentBefore, pipe);
      corner += member.length;
      const to = start + clamp(corner - tangentBefore, pipe);
      occupy(member, from, to);
      if (to > from) stretches.push({ kind: 'line', elementIndex: member.elementIndex, from, to });
    }
    const leg = legBetween(inputs, before, members, after, length, tangents);
    if (leg) legs.push(leg);
    station = start + pipe;
    if (!after) continue;

    const from = station;
    if (after.kind === 'corner') station += after.arc;
    if (after.kind === 'flex') station += after.length;
    occupy(after, from, station);
    const { elementIndex } = after;
    if (after.kind === 'wall') stretches.push({ kind: 'wall', elementIndex });
    if (after.kind === 'flex') stretches.push({ kind: 'line', elementIndex, from, to: station });
    if (after.kind === 'corner') {
      const { bend, sense } = after;
      stretches.push({ kind: 'arc', elementIndex, from, to: station, bend, sense });
    }
  }

  return {
    bends: unplaced.map((bend, index) => placedBend(bend, bendExtents[index] as Extent)),
    legs,
    stretches,
    extents: extents.map((extent) => extent ?? { from: 0, to: 0 }),
    length: station,
  };
}

/** Field by field: spread objects are most of the time of laying out a run. */
function placedBend(bend: UnplacedBend, { from, to }: Extent): PlacedBend {
  const { elementId, elementIndex, section, angle, radius, raceway, counts, planned, part } = bend;
  return {
    elementId,
    elementIndex,
    section,
    angle,
    radius,
    from,
    to,
    raceway,
    counts,
    planned,
    part,
  };
}

interface Leg {
  before: Stop | null;
  members: LengthItem[];
  after: Stop | null;
}

/** Cuts the items into legs at every wall, flexible piece and corner. */
export function legsOf(items: readonly PathItem[]): Leg[] {
  const legs: Leg[] = [];
  let leg: Leg = { before: null, members: [], after: null };
  for (const item of items) {
    if (item.kind === 'length') {
      leg.members.push(item);
    } else {
      legs.push({ ...leg, after: item });
      leg = { before: item, members: [], after: null };
    }
  }
  return leg.members.length > 0 ? [...legs, leg] : legs;
}

/** A leg worth listing: one that a corner takes length from, or that has pipe in it. */
export function legBetween(
  inputs: readonly LayoutInput[],
  before: Stop | null,
  members: readonly LengthItem[],
  after: Stop | null,
  length: number | null,
  tangents: number,
): PlacedLeg | null {
  const elements = members.map(({ elementIndex }) => inputs[elementIndex]?.element);
  const elementIds = elements.flatMap((element) =>
    element?.kind === 'straight' ? [element.id] : [],
  );
  const corners = [before, after].filter((stop) => stop?.kind === 'corner');
  if (corners.length === 0 && elementIds.length === 0) return null;
  const section = inputs[(corners[0] ?? members[0])?.elementIndex ?? 0]?.section ?? 0;
  return {
    section,
    before: cornerBend(before),
    after: cornerBend(after),
    length,
    tangents,
    elementIds,
  };
}

function cornerBend(stop: Stop | null): number | null {
  return stop?.kind === 'corner' ? stop.bend : null;
}

export function tangentOf(stop: Stop | null): number {
  return stop?.kind === 'corner' ? stop.tangent : 0;
}

function clamp(value: number, most: number): number {
  return Math.min(Math.max(value, 0), most);
}
