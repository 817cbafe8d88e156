import { radians } from '../geometry/angles';
import { cross, subtract, unit } from '../geometry/vector';
import type { CentreLinePiece, ExpandedRun, PlacedBend } from '../run/expanded-run';
import { isPullPoint, turnOf } from '../run/pull-points';
import type { BendWay, StraightWay } from './physics/load';

/** What the cable bears on in a bend: the pipe's inner wall, a sheave, or something whose radius nobody knows. */
export type Bearing = 'wall' | 'sheave' | 'unknown';

interface Place {
  elementId: string;
  /** Index into the sections of the run. */
  section: number;
  /** Stations where the cable enters and leaves it, in. */
  from: number;
  to: number;
}

export interface StraightPiece extends Place {
  kind: 'straight';
  way: StraightWay;
}

export interface BendPiece extends Place {
  kind: 'bend';
  way: BendWay;
  bearsOn: Bearing;
}

/** One piece of the way of a pull, in the order the cable meets it. */
export type PullPiece = StraightPiece | BendPiece;

/** Why a way cannot be walked: pieces without a direction, no lengths, or a bend without a radius. */
export type NoWay = 'no-directions' | 'no-lengths' | 'no-radius';

const INCHES = 12;
/** A flexible piece planned to turn less than this, rad, is a straight one. */
const STRAIGHT = 1e-6;

/**
 * The way of a pull through the sections `first` to `last`, from the lower station to the higher. Without any directions
 * everything is level; a flexible piece, which has no direction of its own, bends level over its length.
 */
export function pullPath(expanded: ExpandedRun, first: number, last: number): PullPiece[] | NoWay {
  const { centreLine, directions, length, sections } = expanded;
  if (length === null) return 'no-lengths';
  if (directions === 'partial') return 'no-directions';
  const start = sections[first]?.fromStation ?? 0;
  const end = sections[last]?.toStation ?? length;
  const bends = expanded.bends.filter(({ section }) => section >= first && section <= last);
  if (bends.some(({ radius, planned }) => radius === null && !planned)) return 'no-radius';
  const flexes = new Set(bends.flatMap(({ planned, elementId }) => (planned ? [elementId] : [])));
  const straights = centreLine ? linesOf(centreLine) : levelLines(expanded, bends);
  const arcs = arcsOf(centreLine ?? []);
  const pieces: PullPiece[] = [];
  let section = first;
  for (const line of straights) {
    if (line.from < start || line.to > end || flexes.has(line.elementId)) continue;
    while (section < last && line.from >= (sections[section]?.toStation ?? end)) section += 1;
    pieces.push(straightPiece(line, section));
  }
  for (const bend of bends) pieces.push(bendPiece(bend, arcs));
  if (last > first) pieces.push(...sheaves(expanded, first, last));
  // Sorting keeps the order of equals: corners without an arc stay in the order of the path.
  return pieces.sort((a, b) => a.from - b.from || a.to - b.to);
}

/** The same way met from its other end. */
export function reversePath(pieces: readonly PullPiece[]): PullPiece[] {
  return pieces.map(turnedRound).reverse();
}

function turnedRound(piece: PullPiece): PullPiece {
  const { elementId, section, from, to } = piece;
  if (piece.kind === 'straight') {
    const { length, rise, run } = piece.way;
    const way = { length, rise: -rise, run };
    return { kind: 'straight', elementId, section, from: to, to: from, way };
  }
  const { angle, radius, headingUp, normalUp } = piece.way;
  const cos = Math.cos(angle);
  const sin = Math.sin(angle);
  const way = {
    angle,
    radius,
    headingUp: -(headingUp * cos + normalUp * sin),
    normalUp: normalUp * cos - headingUp * sin,
  };
  const { bearsOn } = piece;
  return { kind: 'bend', elementId, section, from: to, to: from, way, bearsOn };
}

interface Line {
  elementId: string;
  from: number;
  to: number;
  /** Sine and cosine of the slope. */
  rise: number;
  run: number;
}

function straightPiece({ elementId, from, to, rise, run }: Line, section: number): StraightPiece {
  const way = { length: (to - from) / INCHES, rise, run };
  return { kind: 'straight', elementId, section, from, to, way };
}

function linesOf(pieces: readonly CentreLinePiece[]): Line[] {
  return pieces.flatMap((piece): Line[] => {
    if (piece.kind !== 'line' || piece.to <= piece.from) return [];
    const { elementId, from, to, start, end } = piece;
    const along = unit(subtract(end, start));
    return [{ elementId, from, to, rise: along.z, run: Math.hypot(along.x, along.y) }];
  });
}

/** What lies between the bends of a run laid level: its straights, and the travel inside an offset or saddle. */
function levelLines({ elements }: ExpandedRun, bends: readonly PlacedBend[]): Line[] {
  const lines: Line[] = [];
  for (const { element, from, to } of elements) {
    if (element.kind === 'straight' && to > from) {
      lines.push({ elementId: element.id, from, to, rise: 0, run: 1 });
    }
  }
  bends.forEach(({ elementId, to }, index) => {
    const next = bends[index + 1];
    if (next?.elementId === elementId && next.from > to) {
      lines.push({ elementId, from: to, to: next.from, rise: 0, run: 1 });
    }
  });
  return lines.sort((a, b) => a.from - b.from);
}

type Arc = Extract<CentreLinePiece, { kind: 'arc' }>;

/** Arcs by element and station: an offset has two. */
function arcsOf(pieces: readonly CentreLinePiece[]): ReadonlyMap<string, Arc> {
  return new Map(
    pieces.flatMap((piece): [string, Arc][] =>
      piece.kind === 'arc' ? [[`${piece.elementId} ${piece.from}`, piece]] : [],
    ),
  );
}

function bendPiece(bend: PlacedBend, arcs: ReadonlyMap<string, Arc>): PullPiece {
  const { elementId, section, from, to, planned } = bend;
  const angle = radians(bend.angle);
  if (planned && angle < STRAIGHT)
    return straightPiece({ elementId, from, to, rise: 0, run: 1 }, section);
  const bearsOn = planned || bend.radius === 0 ? 'unknown' : 'wall';
  const radius = (planned ? (to - from) / angle : (bend.radius ?? 0)) / INCHES;
  const way: BendWay = { angle, radius, headingUp: 0, normalUp: 0 };
  const arc = planned ? undefined : arcs.get(`${elementId} ${from}`);
  if (arc) {
    const out = subtract(arc.start, arc.centre);
    way.normalUp = -unit(out).z;
    // The pipe enters along the axis turned onto the radius: axis × (start − centre).
    way.headingUp = unit(cross(arc.axis, out)).z;
  }
  return { kind: 'bend', elementId, section, from, to, way, bearsOn };
}

/** The turns a pull goes round on a sheave, inside the boxes it goes through. */
function sheaves(expanded: ExpandedRun, first: number, last: number): BendPiece[] {
  return expanded.elements.flatMap((placed): BendPiece[] => {
    const { element, section, from, heading, headingBefore } = placed;
    if (!isPullPoint(element) || section <= first || section > last) return [];
    const turn = turnOf(element);
    const isWithin = expanded.sections[section]?.from.id === element.id;
    if (!turn?.sheaveRadius || !isWithin) return [];
    const angle = radians(turn.angle);
    const way: BendWay = { angle, radius: turn.sheaveRadius / INCHES, headingUp: 0, normalUp: 0 };
    if (heading && headingBefore && angle > 0) {
      way.headingUp = headingBefore.z;
      way.normalUp = (heading.z - Math.cos(angle) * headingBefore.z) / Math.sin(angle);
    }
    return [
      { kind: 'bend', elementId: element.id, section, from, to: from, way, bearsOn: 'sheave' },
    ];
  });
}
