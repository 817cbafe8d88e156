import { tangentLength } from '../../geometry/bend-geometry';
import { elementNumber } from '../../run/commands/element-number';
import { numberElements } from '../../run/element-ids';
import { pullPoint, straight } from '../../run/build-run';
import type { PlacedElement, PlacedLeg } from '../../run/expanded-run';
import type { RunCommand } from '../../run/run-command';
import type { Candidate, FixContext } from './candidate';

/** Where a new pull point would make both sides pass. Stations. */
export interface PassingRange {
  from: number;
  to: number;
}

/** A sixteenth of an inch, the finest a tape is read to. Common practice, no source. */
const TAPE = 1 / 16;

/**
 * A box in the section, inside the range in which both sides pass: in the middle of the straight nearest to the middle of
 * the range, clear of the arcs; where no straight lies in it, between the two pieces nearest to that.
 */
export function pullPointIn(
  context: FixContext,
  sectionId: string,
  range: PassingRange,
): Candidate<'add-pull-point'>[] {
  const place = inStraight(context, sectionId, range) ?? betweenPieces(context, sectionId, range);
  if (!place) return [];
  const { command, station, after } = place;
  return [
    {
      kind: 'add-pull-point',
      commands: [command],
      values: ({ sections }) => {
        const [first, second] = sections;
        if (!first || !second) return null;
        const { path } = context.document;
        const next = path.slice(after + 1).find(({ kind }) => kind !== 'straight');
        const previous = path
          .slice(0, after + 1)
          .reverse()
          .find(({ kind }) => kind !== 'straight');
        return {
          sectionId,
          ...range,
          station,
          lengths: context.expanded.length !== null,
          afterNumber: previous ? elementNumber(context.document, previous.id) : null,
          beforeNumber: next ? elementNumber(context.document, next.id) : null,
          degreesBefore: first.degrees,
          degreesAfter: second.degrees,
          limit: Math.min(first.limitDegrees, second.limitDegrees),
        };
      },
    },
  ];
}

interface Place {
  command: RunCommand;
  station: number;
  /** Index of the element the pull point comes after, or into. */
  after: number;
}

/** A stretch of a straight that no arc reaches into. */
interface Clear {
  placed: PlacedElement;
  from: number;
  to: number;
  /** Corner-to-corner inches from the start of the straight to `from`. */
  before: number;
}

function inStraight(context: FixContext, sectionId: string, range: PassingRange): Place | null {
  const { document, expanded } = context;
  const section = expanded.sections.findIndex(({ id }) => id === sectionId);
  const middle = (range.from + range.to) / 2;
  const distance = ({ from, to }: Clear) => Math.max(from - middle, middle - to, 0);
  const [best] = expanded.legs
    .filter((leg) => leg.section === section)
    .flatMap((leg) => clearStretches(context, leg))
    .map((clear) => within(clear, range))
    .filter((clear) => clear.to > clear.from)
    .sort((a, b) => distance(a) - distance(b) || b.to - b.from - (a.to - a.from));
  if (!best) return null;
  const { element, index } = best.placed;
  const at = Math.round((best.before + (best.to - best.from) / 2) / TAPE) * TAPE;
  const [box, rest] = numberElements(document, [pullPoint(), straight()]);
  if (!box || !rest) return null;
  const args = { elementId: element.id, at, element: box, restId: rest.id };
  const station = best.from + at - best.before;
  return { command: { command: 'split-straight', args }, station, after: index };
}

/** The part of a straight inside the range. */
function within(clear: Clear, range: PassingRange): Clear {
  const from = Math.max(clear.from, range.from);
  return {
    ...clear,
    from,
    to: Math.min(clear.to, range.to),
    before: clear.before + from - clear.from,
  };
}

/** A leg runs from corner to corner; its first tangent length lies inside the arc. */
function clearStretches({ expanded }: FixContext, leg: PlacedLeg): Clear[] {
  const bend = leg.before === null ? undefined : expanded.bends[leg.before];
  const tangent = bend ? tangentLength(bend.radius ?? 0, bend.angle) : 0;
  let corner = 0;
  return leg.elementIds.flatMap((id): Clear[] => {
    const placed = expanded.elements.find(({ element }) => element.id === id);
    if (placed?.element.kind !== 'straight') return [];
    const before = Math.max(tangent - corner, 0);
    corner += placed.element.length;
    return [{ placed, from: placed.from, to: placed.to, before }];
  });
}

function betweenPieces(context: FixContext, sectionId: string, range: PassingRange): Place | null {
  const { document, expanded } = context;
  const section = expanded.sections.find(({ id }) => id === sectionId);
  if (!section) return null;
  const middle = (range.from + range.to) / 2;
  const [best] = expanded.elements
    .slice(section.firstElement + 1, section.lastElement - 1)
    .filter(({ index }) => isInRange(expanded.elements, index, range))
    .sort((a, b) => Math.abs(a.to - middle) - Math.abs(b.to - middle));
  const next = best && expanded.elements[best.index + 1];
  if (!best || !next) return null;
  const elements = numberElements(document, [pullPoint()]);
  return {
    command: { command: 'insert-elements', args: { afterId: best.element.id, elements } },
    station: (best.to + next.from) / 2,
    after: best.index,
  };
}

/** Whether the place between a piece and the next lies in the range. */
function isInRange(
  elements: readonly PlacedElement[],
  index: number,
  range: PassingRange,
): boolean {
  const [here, next] = [elements[index], elements[index + 1]];
  return here !== undefined && next !== undefined && here.to >= range.from && next.from <= range.to;
}
