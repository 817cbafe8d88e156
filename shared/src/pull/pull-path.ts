import { radians } from '../geometry/angles';
import { cross, subtract, unit } from '../geometry/vector';
import type { CentreLinePiece, ExpandedRun, PlacedBend } from '../run/expanded-run';
import { isPullPoint, turnOf } from '../run/pull-points';
import type { BendWay, StraightWay } from './physics/load';

/** One piece of the way of a pull, in the order the cable meets it. */
export type PullPiece = {
  elementId: string;
  /** Index into the sections of the run. */
  section: number;
  /** Stations where the cable enters and leaves it, in. */
  from: number;
  to: number;
} & ({ kind: 'straight'; way: StraightWay } | { kind: 'bend'; way: BendWay; bearsOn: Bearing });

/** What the cable bears on in a bend: the pipe's inner wall, a sheave, or something whose radius nobody knows. */
export type Bearing = 'wall' | 'sheave' | 'unknown';

/** Why a way cannot be walked: pieces without a direction, no lengths, or a bend without a radius. */
export type NoWay = 'no-directions' | 'no-lengths' | 'no-radius';

const INCHES = 12;
const feet = ({ from, to }: { from: number; to: number }): number => (to - from) / INCHES;

/**
 * The way of a pull through the sections `first` to `last`, from the lower station to the higher. Without any directions
 * everything is level; a flexible piece, which has no direction of its own, bends level over its length.
 */
export function pullPath(expanded: ExpandedRun, first: number, last: number): PullPiece[] | NoWay {
  const { centreLine, directions, length } = expanded;
  if (length === null) return 'no-lengths';
  if (directions === 'partial') return 'no-directions';
  const start = expanded.sections[first]?.fromStation ?? 0;
  const end = expanded.sections[last]?.toStation ?? length;
  const bends = expanded.bends.filter(({ section }) => section >= first && section <= last);
  if (bends.some(({ radius, planned }) => radius === null && !planned)) return 'no-radius';
  const straights = centreLine ? linesOf(centreLine) : levelLines(expanded, bends, end);
  const arcs = centreLine?.filter((piece) => piece.kind === 'arc') ?? [];
  const flexes = new Set(bends.flatMap(({ planned, elementId }) => (planned ? [elementId] : [])));
  const sectionAt = (from: number, to: number) =>
    Math.max(
      first,
      expanded.sections.findIndex(({ toStation }) => (from + to) / 2 <= toStation),
    );
  const pieces = [
    ...straights
      .filter((line) => line.from >= start && line.to <= end && !flexes.has(line.elementId))
      .map((line): PullPiece => ({ ...line, section: sectionAt(line.from, line.to) })),
    ...bends.map((bend): PullPiece => {
      const { elementId, from, to, section } = bend;
      const bearsOn = bend.planned || bend.radius === 0 ? 'unknown' : 'wall';
      return { kind: 'bend', elementId, section, from, to, way: bendWay(bend, arcs), bearsOn };
    }),
    ...sheaves(expanded, first, last),
  ];
  return pieces
    .map((piece, index) => ({ piece, index }))
    .sort((a, b) => a.piece.from - b.piece.from || a.piece.to - b.piece.to || a.index - b.index)
    .map(({ piece }) => piece);
}

/** The same way met from its other end. */
export function reversePath(pieces: readonly PullPiece[]): PullPiece[] {
  return pieces
    .map((piece): PullPiece => {
      const turned = { ...piece, from: piece.to, to: piece.from };
      if (turned.kind === 'straight') {
        return { ...turned, way: { ...turned.way, rise: -turned.way.rise } };
      }
      const { angle, headingUp, normalUp } = turned.way;
      const cos = Math.cos(angle);
      const sin = Math.sin(angle);
      const way = {
        ...turned.way,
        headingUp: -(headingUp * cos + normalUp * sin),
        normalUp: normalUp * cos - headingUp * sin,
      };
      return { ...turned, way };
    })
    .reverse();
}

type Line = Omit<Extract<PullPiece, { kind: 'straight' }>, 'section'>;

function linesOf(pieces: readonly CentreLinePiece[]): Line[] {
  return pieces.flatMap((piece): Line[] => {
    if (piece.kind !== 'line' || piece.to <= piece.from) return [];
    const { elementId, from, to, start, end } = piece;
    const rise = unit(subtract(end, start)).z;
    return [{ kind: 'straight', elementId, from, to, way: { length: feet(piece), rise } }];
  });
}

/** What lies between the bends of a run laid level: its straights, and the travel inside an offset or saddle. */
function levelLines(expanded: ExpandedRun, bends: readonly PlacedBend[], end: number): Line[] {
  const straights = expanded.elements.filter(
    ({ element, from, to }) => element.kind === 'straight' && to > from,
  );
  const travels = bends.flatMap((bend, index) => {
    const next = bends[index + 1];
    return next?.elementId === bend.elementId && next.from > bend.to
      ? [{ elementId: bend.elementId, from: bend.to, to: next.from }]
      : [];
  });
  return [
    ...straights.map(({ element, from, to }) => ({ elementId: element.id, from, to })),
    ...travels,
  ]
    .filter(({ to }) => to <= end)
    .map((line) => ({ ...line, kind: 'straight', way: { length: feet(line), rise: 0 } }));
}

/** The turns a pull goes round on a sheave, inside the boxes it goes through. */
function sheaves(expanded: ExpandedRun, first: number, last: number): PullPiece[] {
  return expanded.elements.flatMap(({ element, section, from, heading, headingBefore }) => {
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
    const piece = { kind: 'bend', elementId: element.id, section, from, to: from } as const;
    return [{ ...piece, way, bearsOn: 'sheave' }];
  });
}

type Arc = Extract<CentreLinePiece, { kind: 'arc' }>;

function bendWay(bend: PlacedBend, arcs: readonly Arc[]): BendWay {
  const angle = radians(bend.angle);
  const level = { angle, headingUp: 0, normalUp: 0 };
  if (bend.planned) return { ...level, radius: feet(bend) / angle };
  const arc = arcs.find(
    ({ elementId, from, to }) =>
      elementId === bend.elementId && from === bend.from && to === bend.to,
  );
  const radius = (bend.radius ?? 0) / INCHES;
  if (!arc) return { ...level, radius };
  const normal = unit(subtract(arc.centre, arc.start));
  // The pipe enters along centre-to-start turned a quarter about the axis: axis × (start − centre).
  const heading = cross(arc.axis, subtract(arc.start, arc.centre));
  return { angle, radius, headingUp: unit(heading).z, normalUp: normal.z };
}
