import { lowestLimit } from '../checks/pulls';
import type { PullAnalysis, StopLimit } from '../contracts/run-analysis';
import type { ExpandedRun } from '../run/expanded-run';
import type { StripPlaces } from './strip-places';

/** A point of the tension over the strip: px along it, lbf up. */
export interface TensionPoint {
  x: number;
  low: number;
  likely: number;
  high: number;
}

/** One pull as the strip draws it. */
export interface StripPull {
  id: string;
  fromX: number;
  toX: number;
  feedAt: string;
  pullAt: string;
  feedX: number;
  pullX: number;
  /** Where it goes straight through a box. */
  through: { id: string; x: number }[];
  /** From the feed to the puller; empty where the pull has no answer. */
  points: TensionPoint[];
  reason: PullAnalysis['forward']['reason'];
  holdBack: number;
  /** The lowest stop limit, by name; null where there are no wires. */
  limit: { name: StopLimit; lbf: number } | null;
  handOne: number | null;
  handTwo: number | null;
}

/** The pulls of a run along its strip, each in its planned direction. */
export function placePulls(
  expanded: ExpandedRun,
  pulls: readonly PullAnalysis[],
  places: StripPlaces,
): StripPull[] {
  const placeOf = new Map(
    expanded.elements.map(({ element, index }) => [element.id, places.elements[index]?.from]),
  );
  const xOf = (id: string): number => placeOf.get(id) ?? places.start;
  const xAt = (station: number): number =>
    expanded.length !== null && station >= expanded.length
      ? places.end
      : places.start + places.scale.xAt(station);
  return pulls.map((pull): StripPull => {
    const { feedAt, pullAt, profile, reason, holdBack } = pull[pull.planned];
    const lowest = pull.limits && lowestLimit(pull.limits);
    return {
      id: pull.id,
      fromX: xOf(pull.from),
      toX: xOf(pull.to),
      feedAt,
      pullAt,
      feedX: xOf(feedAt),
      pullX: xOf(pullAt),
      through: pull.through.map((id) => ({ id, x: xOf(id) })),
      points: profile.map(({ station, tension }) => ({ x: xAt(station), ...tension })),
      reason,
      holdBack: holdBack && holdBack.low > 0 ? holdBack.likely : 0,
      limit: lowest && { name: lowest.limit, lbf: lowest.allowed },
      handOne: pull.limits?.handOne ?? null,
      handTwo: pull.limits?.handTwo ?? null,
    };
  });
}
