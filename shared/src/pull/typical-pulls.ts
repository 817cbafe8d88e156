import type { RunAnalysis } from '../contracts/run-analysis';
import type { ExpandedRun } from '../run/expanded-run';

/**
 * The typical pull where the head leaves each element, lbf by its id, in the direction each pull is planned in; at a box
 * between two pulls the one that ends there. Elements of a pull without an answer are left out.
 *
 * @example three 12 AWG in 1/2 EMT, 90-90-90-60 with legs of 10 ft, 1 lbf of feed: the far box stands at 14
 */
export function typicalPulls(
  { pulls }: Pick<RunAnalysis, 'pulls'>,
  { elements }: Pick<ExpandedRun, 'elements'>,
): Map<string, number> {
  const stations = new Map(elements.map(({ element, from }) => [element.id, from]));
  const typical = new Map<string, number>();
  for (const pull of pulls) {
    const { profile, feedAt, pullAt, tension } = pull[pull.planned];
    for (const point of profile) {
      if (point.elementId !== feedAt || !typical.has(feedAt)) {
        typical.set(point.elementId, point.tension.likely);
      }
    }
    if (tension) typical.set(pullAt, tension.likely);
    for (const id of pull.through) {
      const at = profile.find(({ station }) => station === stations.get(id));
      if (at) typical.set(id, at.tension.likely);
    }
  }
  return typical;
}
