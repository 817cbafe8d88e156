import type { ExpandedRun } from '../../run/expanded-run';
import type { StripLook } from '../strip-look';
import type { StripPlaces } from '../strip-places';

/** Straight conduit steeper than 30°: where it stands, px, and how far it climbs (falls: negative), in. */
export interface SteepStretch {
  from: number;
  to: number;
  rise: number;
}

/** sin 30°: steeper than this the drawing shows chevrons. */
const STEEP = 0.5;

/** The steep stretches of a run; straights that follow each other are one. */
export function steepStretches(
  expanded: ExpandedRun,
  places: StripPlaces,
  look: StripLook,
): SteepStretch[] {
  const stretches: SteepStretch[] = [];
  let open: SteepStretch | null = null;
  for (const { element, index, headingBefore } of expanded.elements) {
    const place = places.elements[index];
    const slope = element.kind === 'straight' && headingBefore ? headingBefore.z : 0;
    if (element.kind !== 'straight' || !place || Math.abs(slope) <= STEEP) {
      open = null;
      continue;
    }
    const rise = slope * element.length;
    const isBox = (at: number) => expanded.elements[at]?.element.kind === 'pull-point';
    // The square of a pull point hides what is under it.
    const from = place.from + (isBox(index - 1) ? look.halfBox : 0);
    const to = place.to - (isBox(index + 1) ? look.halfBox : 0);
    if (open) {
      open.to = to;
      open.rise += rise;
    } else {
      open = { from, to, rise };
      stretches.push(open);
    }
  }
  return stretches;
}
