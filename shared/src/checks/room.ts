import type { WireSize } from '../run/run-document';
import type { RacewayDimensions } from '../tables/raceway-dimensions';
import { tightestFillLimit } from './fill-limit';
import { isNipple, maximumCount } from './maximum-count';
import { areaOf, countOf } from './section-conductors';
import type { SectionConductors, SizedGroup } from './section-conductors';

/**
 * How many more conductors of each size already in the section would still be allowed: the most that pass, counting Note 7's
 * rounding where all stay of one size. Never negative.
 *
 * @example 13 × 12 THHN in 3/4 EMT // { '12': 3 }
 */
export function roomLeft(
  context: SectionConductors,
  raceway: RacewayDimensions,
  sized: readonly SizedGroup[],
): Partial<Record<WireSize, number>> {
  const room: Partial<Record<WireSize, number>> = {};
  for (const { group, area } of sized) {
    if ('cable' in group) continue;
    const more = moreOf(context, raceway, sized, area);
    // Two insulations of one size: the thicker one answers for both.
    room[group.size] = Math.min(room[group.size] ?? Infinity, more);
  }
  return room;
}

function moreOf(
  context: SectionConductors,
  raceway: RacewayDimensions,
  sized: readonly SizedGroup[],
  area: number,
): number {
  const count = countOf(sized);
  const limit = tightestFillLimit(raceway, count + Math.max(1, 3 - count), context);
  const onlyOneSize = sized.every((other) => other.area === area);
  if (onlyOneSize && (limit.from === 'code' || limit.from === 'nipple')) {
    const nipple = isNipple(context.length, context.betweenEnclosures);
    return Math.max(0, maximumCount(raceway, area, nipple) - count);
  }
  const byArea = Math.floor((limit.area - areaOf(sized)) / area + 1e-9);
  if (byArea + count > 2) return Math.max(0, byArea);
  // So few that the limit of one or of two applies.
  const fits = (more: number) =>
    areaOf(sized) + more * area <= tightestFillLimit(raceway, count + more, context).area + 1e-9;
  return [2, 1].find((more) => count + more <= 2 && fits(more)) ?? 0;
}
