import { isPullPoint } from '../pull-points';
import type { ConductorGroup, PathElement, PlannedPull, RunDocument } from '../run-document';
import { withField } from './sparse';

interface Stretch {
  from: string;
  to: string;
}

/**
 * Keeps `from` and `to` of conductor groups and planned pulls true after the path changed.
 *
 * An end whose pull point is gone moves outward, to the nearest one that is left: the wires still have to come from
 * somewhere and the stretch they were drawn in stays covered. Two ends that changed places are swapped back into order.
 * Planned pulls that now overlap an earlier one are dropped: its stretch already covers them.
 */
export function repairReferences(before: RunDocument, path: PathElement[]): RunDocument {
  const document = { ...before, path };
  const points = before.path.filter(isPullPoint).map(({ id }) => id);
  const left = path.filter(isPullPoint).map(({ id }) => id);
  if (points.join() === left.join()) return document;
  const repair = (stretch: Stretch): Stretch => inOrder(outward(stretch, points, left), left);
  return {
    ...document,
    ...(before.conductors && {
      conductors: before.conductors.map((group) => repairGroup(group, repair, points, left)),
    }),
    ...(before.pulls && { pulls: repairPulls(before.pulls, repair, left) }),
  };
}

function outward({ from, to }: Stretch, points: string[], left: string[]): Stretch {
  const nearest = (id: string, step: -1 | 1): string => {
    let index = points.indexOf(id);
    while (index >= 0 && index < points.length && !left.includes(points[index] as string)) {
      index += step;
    }
    return points[index] ?? id;
  };
  return { from: nearest(from, -1), to: nearest(to, 1) };
}

function inOrder({ from, to }: Stretch, left: string[]): Stretch {
  return left.indexOf(from) <= left.indexOf(to) ? { from, to } : { from: to, to: from };
}

/** An end nobody gave is the run's own and stays unsaid; a given one that moved to the run's end becomes unsaid. */
function repairGroup(
  group: ConductorGroup,
  repair: (stretch: Stretch) => Stretch,
  points: string[],
  left: string[],
): ConductorGroup {
  if (group.from === undefined && group.to === undefined) return group;
  const { from, to } = repair({
    from: group.from ?? (points[0] as string),
    to: group.to ?? (points[points.length - 1] as string),
  });
  const said = (given: string | undefined, now: string, end: string | undefined) =>
    given === undefined || (now !== given && now === end) ? undefined : now;
  const repaired = withField(group, 'from', said(group.from, from, left[0]));
  return withField(repaired, 'to', said(group.to, to, left[left.length - 1]));
}

function repairPulls(
  pulls: readonly PlannedPull[],
  repair: (stretch: Stretch) => Stretch,
  left: string[],
): PlannedPull[] {
  const kept: PlannedPull[] = [];
  for (const pull of pulls) {
    const { from, to } = repair(pull);
    const overlaps = kept.some(
      (other) =>
        left.indexOf(from) < left.indexOf(other.to) && left.indexOf(other.from) < left.indexOf(to),
    );
    if (!overlaps) kept.push({ ...pull, from, to });
  }
  return kept;
}
