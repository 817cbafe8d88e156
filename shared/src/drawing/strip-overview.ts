import type { ExpandedRun } from '../run/expanded-run';
import type { DisplayList, Mark } from './display-list';
import { line } from './display-list';
import type { StripPlaces } from './strip-places';

/** The height of the overview of a strip that scrolls, px. */
const HEIGHT = 28;
/** What the two buttons beside it take, px. */
export const OVERVIEW_BUTTONS = 96;
const HALF_BOX = 3;
const HIGHEST = 8;

/** A wide strip in one line of `width` px: where the pull points and the bends stand. */
export function drawOverview(
  expanded: ExpandedRun,
  places: StripPlaces,
  width: number,
): DisplayList {
  const share = Math.max(width, 1) / places.width;
  const y = 18;
  const marks: Mark[] = [
    line(places.start * share, y, places.end * share, y, { stroke: 'ink', strokeWidth: 1.5 }),
    ...expanded.bends.map(({ angle }, index) => {
      const x = (places.bends[index] ?? 0) * share;
      const top = y - (Math.min(angle, 90) / 90) * HIGHEST;
      return line(x, top, x, y, { stroke: 'petrol', strokeWidth: 1 });
    }),
    ...expanded.elements.flatMap(({ element, index }): Mark[] => {
      const place = places.elements[index];
      if (element.kind !== 'pull-point' || !place) return [];
      const size = HALF_BOX * 2;
      const x = Math.min(Math.max(place.from * share - HALF_BOX, 0), width - size);
      return [{ kind: 'rect', x, y: y - HALF_BOX, width: size, height: size, fill: 'ink' }];
    }),
  ];
  return { width, height: HEIGHT, marks };
}
