import type { Vector } from '../geometry/vector';
import type { PathElement, PullPoint, Raceway } from './run-document';

/**
 * A run laid out along its centre line: what the checks, the drawings and (later) the pull read.
 * Stations are developed lengths in inches from the face of the first pull point.
 */
export interface ExpandedRun {
  elements: PlacedElement[];
  /** Every physical bend in order; an offset gives two, a 3-bend saddle three. */
  bends: PlacedBend[];
  /** The straight stretches between bend corners, corner to corner. */
  legs: PlacedLeg[];
  sections: SectionSpan[];
  /** Developed length, in; null when no lengths were given (then stations are equal steps). */
  length: number | null;
  /** Largest station: the length, or the number of equal steps. */
  end: number;
  /** `given` everywhere, `assumed-level` (none given, heading level), or `partial`. */
  directions: 'given' | 'assumed-level' | 'partial';
  /** Elements whose direction is missing or parallel to the pipe. */
  directionProblems: { elementId: string; problem: 'missing' | 'parallel' }[];
  /** In 3-D, from the origin; null unless `directions` is `given` and lengths are known. */
  centreLine: CentreLinePiece[] | null;
}

export interface PlacedElement {
  element: PathElement;
  index: number;
  /** Stations where the element begins and ends. */
  from: number;
  to: number;
  /** Index into `sections`; a pull point that ends one carries the index of the section that starts there (the last one: the section that ends there). */
  section: number;
  /** Indices into `bends`. */
  bends: number[];
  /** The raceway in force on the element (for a pull point or transition: what leaves it). */
  raceway: Raceway;
  /** Unit heading leaving the element; null where unknown. */
  heading: Vector | null;
  /** Unit heading entering it. */
  headingBefore: Vector | null;
}

export interface PlacedBend {
  elementId: string;
  elementIndex: number;
  section: number;
  angle: number;
  /** Centre-line radius, in; 0 for a turn in a body, null when no table gives one. */
  radius: number | null;
  /** Stations of the arc. */
  from: number;
  to: number;
  raceway: Raceway;
  /** False for a listed, not counted sweep. */
  counts: boolean;
  /** True for the planned degrees of a flexible tail. */
  planned: boolean;
  /** Part of the element: 0 … n−1. */
  part: number;
}

export interface PlacedLeg {
  section: number;
  /** The bends at its ends, indices into `bends`; null at a pull point. */
  before: number | null;
  after: number | null;
  /** Corner to corner, in; null when no lengths were given. */
  length: number | null;
  /** The two tangent lengths it holds, in. */
  tangents: number;
  /** The straights it is made of. */
  elementIds: string[];
}

export interface SectionSpan {
  /** The first pull point's id. */
  id: string;
  from: PullPoint;
  to: PullPoint;
  fromStation: number;
  toStation: number;
  /** Indices into `elements`, the end points included. */
  firstElement: number;
  lastElement: number;
  /** Each raceway the section holds, in order, without repeats. */
  raceways: Raceway[];
}

export type CentreLinePiece =
  | { kind: 'line'; elementId: string; from: number; to: number; start: Vector; end: Vector }
  | {
      kind: 'arc';
      elementId: string;
      from: number;
      to: number;
      start: Vector;
      end: Vector;
      centre: Vector;
      /** Unit axis of rotation, right-handed. */
      axis: Vector;
      /** Degrees. */
      angle: number;
      radius: number;
    };
