import { arcLength, tangentLength } from '../../geometry/bend-geometry';
import type { PlacedBend } from '../expanded-run';
import { turnOf } from '../pull-points';
import type { PathElement, Raceway } from '../run-document';
import { bendParts } from './element-parts';

/** Planned degrees of a flexible tail where none are given. Common practice, no source. */
export const FLEX_DEGREES = 90;

/** What the layout needs to know of each element. */
export interface LayoutInput {
  element: PathElement;
  section: number;
  raceway: Raceway;
  /** Centre-line radius of its bends, in; null where nothing gives one (its arcs then have no length). */
  radius: number | null;
  /** True for a pull point at which a section begins or ends. */
  endsSection: boolean;
}

export type UnplacedBend = Omit<PlacedBend, 'from' | 'to'>;

/** The path taken apart: walls and flexible pieces end a leg, corners join two, lengths fill it. */
export type PathItem =
  | { kind: 'wall'; elementIndex: number; bend: number | null }
  | { kind: 'flex'; elementIndex: number; bend: number | null; length: number }
  | {
      kind: 'corner';
      elementIndex: number;
      bend: number;
      tangent: number;
      arc: number;
      sense: 1 | -1;
    }
  | { kind: 'length'; elementIndex: number; bend: null; length: number };

/** Takes the path apart into items, and lists every bend in order. */
export function takeApart(inputs: readonly LayoutInput[]): {
  items: PathItem[];
  bends: UnplacedBend[];
} {
  const bends: UnplacedBend[] = [];
  const items = inputs.flatMap((input, elementIndex): PathItem[] => {
    const { element } = input;
    const add = (angle: number, fields: Partial<UnplacedBend> = {}): number =>
      bends.push({ ...bendOf(input, elementIndex, angle), ...fields }) - 1;
    switch (element.kind) {
      case 'straight':
        return [{ kind: 'length', elementIndex, bend: null, length: element.length }];
      case 'transition':
        return [{ kind: 'length', elementIndex, bend: null, length: 0 }];
      case 'fitting': {
        if (element.angle === undefined) {
          return [{ kind: 'length', elementIndex, bend: null, length: 0 }];
        }
        // A corner of its own size: it ends the leg, but has no arc, and no direction anybody gives.
        const bend = add(element.angle, { radius: 0 });
        return [{ kind: 'corner', elementIndex, bend, tangent: 0, arc: 0, sense: 1 }];
      }
      case 'flex': {
        const degrees = element.degrees ?? FLEX_DEGREES;
        const bend = degrees === 0 ? null : add(degrees, { planned: true });
        return [{ kind: 'flex', elementIndex, bend, length: element.length }];
      }
      case 'pull-point': {
        // The turn inside a box that ends a section is no bend of the pipe; inside one nobody can reach it is.
        const turn = input.endsSection ? null : turnOf(element);
        const bend = turn && add(turn.angle, { radius: 0 });
        return [{ kind: 'wall', elementIndex, bend }];
      }
      default:
        return cornersOf(input, elementIndex, add);
    }
  });
  return { items, bends };
}

function cornersOf(
  input: LayoutInput,
  elementIndex: number,
  add: (angle: number, fields: Partial<UnplacedBend>) => number,
): PathItem[] {
  const radius = input.radius ?? 0;
  return bendParts(input.element, radius).flatMap(
    ({ angle, lengthBefore, sense }, part): PathItem[] => {
      const corner: PathItem = {
        kind: 'corner',
        elementIndex,
        bend: add(angle, { part }),
        tangent: tangentLength(radius, angle),
        arc: arcLength(radius, angle),
        sense,
      };
      return part === 0
        ? [corner]
        : [{ kind: 'length', elementIndex, bend: null, length: lengthBefore }, corner];
    },
  );
}

function bendOf(
  { element, section, raceway, radius }: LayoutInput,
  elementIndex: number,
  angle: number,
): UnplacedBend {
  return {
    elementId: element.id,
    elementIndex,
    section,
    angle,
    radius,
    raceway,
    counts: !(element.kind === 'bend' && element.counts === false),
    planned: false,
    part: 0,
  };
}

/** True where the path gives lengths: at least one straight or flexible piece. */
export function hasLengths(path: readonly PathElement[]): boolean {
  return path.some(({ kind }) => kind === 'straight' || kind === 'flex');
}
