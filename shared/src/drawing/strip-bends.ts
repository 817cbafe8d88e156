import type { ExpandedRun } from '../run/expanded-run';
import { formatAngle } from '../units/format-angle';
import type { BendLabelWish } from './bend-labels';
import type { Say } from '../words/create-words';
import type { StripPlaces } from './strip-places';
import type { SectionSteps } from './strip-steps';

/** The bends of one piece: "90°", "2×45°", "22½°, 45°, 22½°", "90° planned"; null for a piece without any. */
export function wordBends(
  expanded: Pick<ExpandedRun, 'bends'>,
  bends: readonly number[],
  say: Say,
): string | null {
  const parts = bends.flatMap((index) => expanded.bends[index] ?? []);
  const [first, second] = parts;
  if (!first) return null;
  const angle = formatAngle(first.angle);
  if (first.planned) return say('strip.planned', { angle });
  if (parts.length === 2) return say('strip.twice', { angle });
  if (parts.length === 4) return say('strip.four', { angle });
  if (!second) return angle;
  return say('strip.three', { angle, centre: formatAngle(second.angle) });
}

/** What the pieces of a run want written over their ticks. */
export function bendWishes(options: {
  expanded: ExpandedRun;
  places: StripPlaces;
  steps: readonly SectionSteps[];
  selectedId: string | null;
  say: Say;
}): BendLabelWish[] {
  const { expanded, places, steps, selectedId, say } = options;
  return expanded.elements.flatMap(({ element, bends }) => {
    const text = wordBends(expanded, bends, say);
    const [first] = bends;
    if (text === null || first === undefined) return [];
    const xs = bends.map((index) => places.bends[index] ?? places.start);
    const section = expanded.bends[first]?.section ?? 0;
    const crosses = steps[section]?.crossing === element.id;
    const priority = element.id === selectedId ? 'selected' : crosses ? 'crosses-limit' : 'rest';
    const x = xs.reduce((sum, each) => sum + each, 0) / xs.length;
    return [{ x, text, bends: bends.length, section, priority }];
  });
}
