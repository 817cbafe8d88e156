import type { LegEnd, LegEnds } from '../../geometry/leg-measures';
import { conduitOutsideDiameter } from '../../tables/conduit-outside-diameters';
import type { ExpandedRun, PlacedBend } from '../expanded-run';
import type { Raceway } from '../run-document';

/**
 * What the leg before a piece runs between, for measuring it to the back or to the centre of a bend. The bend it leads to
 * is the first one of the piece; turns inside boxes and planned flex are no bends of the pipe.
 */
export function legEndsBefore(expanded: ExpandedRun, elementId: string): LegEnds {
  const place = expanded.elements.findIndex(({ element }) => element.id === elementId);
  const placed = expanded.elements[place];
  const corner = expanded.elements
    .slice(0, Math.max(place, 0))
    .reverse()
    .find(
      ({ element, bends }) =>
        element.kind === 'pull-point' || element.kind === 'flex' || bends.length > 0,
    );
  const bendAt = (index: number | undefined): LegEnd | null => {
    const bend = index === undefined ? undefined : expanded.bends[index];
    return bend && isPipeBend(bend, expanded) ? { angle: bend.angle, radius: bend.radius } : null;
  };
  const raceway = racewayBefore(expanded, place);
  return {
    before: bendAt(corner?.bends[corner.bends.length - 1]),
    after: bendAt(placed?.bends[0]),
    outsideDiameter: raceway && conduitOutsideDiameter(raceway.type, raceway.tradeSize),
  };
}

function isPipeBend(bend: PlacedBend, expanded: ExpandedRun): boolean {
  const kind = expanded.elements[bend.elementIndex]?.element.kind;
  return kind === 'bend' || kind === 'offset' || kind === 'saddle-3' || kind === 'saddle-4';
}

/** The pipe a leg is made of is what leaves the piece before it; a flexible piece hands on what came into it. */
function racewayBefore(expanded: ExpandedRun, place: number): Raceway | null {
  const before = expanded.elements.slice(0, Math.max(place, 0)).reverse();
  const rigid = before.find(({ element }) => element.kind !== 'flex');
  return (rigid ?? expanded.elements[place])?.raceway ?? null;
}
