import type { PlacedLeg } from '../expanded-run';
import { legBetween, legsOf, tangentOf } from './lay-out';
import type { Layout } from './lay-out';
import type { LayoutInput, PathItem, UnplacedBend } from './path-items';

/** How much of its step a piece with several bends fills; the rest parts it from its neighbours. */
const FILLED = 0.5;

/**
 * A path without lengths: each element one step after the one before it, the bends of one element close together.
 * Legs are listed with their tangents and no length.
 */
export function equalSteps(
  inputs: readonly LayoutInput[],
  items: readonly PathItem[],
  unplaced: readonly UnplacedBend[],
): Layout {
  const parts = inputs.map(() => 0);
  for (const { elementIndex, part } of unplaced) parts[elementIndex] = part + 1;
  const extents = inputs.map((_, index) => {
    const half = (parts[index] ?? 0) > 1 ? FILLED / 2 : 0;
    return { from: index - half, to: index + half };
  });
  const bends = unplaced.map((bend) => {
    const last = (parts[bend.elementIndex] ?? 1) - 1;
    const station = bend.elementIndex + (last > 0 ? FILLED * (bend.part / last - 0.5) : 0);
    return { ...bend, from: station, to: station };
  });
  const legs = legsOf(items).flatMap(({ before, members, after }): PlacedLeg[] => {
    const leg = legBetween(
      inputs,
      before,
      members,
      after,
      null,
      tangentOf(before) + tangentOf(after),
    );
    return leg ? [leg] : [];
  });
  return { bends, legs, stretches: null, extents, length: null };
}
