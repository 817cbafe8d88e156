import type { PullReason } from '../contracts/run-analysis';
import { conductorsInSection } from '../run/conductors-in-section';
import type { ExpandedRun } from '../run/expanded-run';
import { isAccessible, isPullPoint, turnOf } from '../run/pull-points';
import type { RunDocument } from '../run/run-document';
import type { PullSpan } from './planned-pulls';

export interface Refusal {
  reason: PullReason;
  /** The pull point at which to break the pull, or that nobody can reach. */
  at: string;
}

/**
 * Why a pull cannot be done as planned: past a box or body nobody can reach, through a box where the set changes, or round a
 * turn in a box without a sheave to take it.
 */
export function refusalOf(
  document: RunDocument,
  expanded: ExpandedRun,
  { pull, first, last }: PullSpan,
): Refusal | null {
  const { path, conductors = [] } = document;
  const placeOf = (id: string) => path.findIndex((element) => element.id === id);
  const [from, to] = [placeOf(pull.from), placeOf(pull.to)];
  const hidden = path
    .slice(from, to + 1)
    .find((element) => isPullPoint(element) && !isAccessible(element));
  if (hidden) return { reason: 'not-accessible', at: hidden.id };
  if (first < 0 || last < first) return { reason: 'not-accessible', at: pull.from };
  for (let index = first; index < last; index += 1) {
    const before = expanded.sections[index];
    const after = expanded.sections[index + 1];
    if (!before || !after) continue;
    const ids = [before, after].map((span) =>
      conductorsInSection(path, conductors, span)
        .map(({ id }) => id)
        .join('\n'),
    );
    if (ids[0] !== ids[1]) return { reason: 'set-changes', at: after.id };
  }
  const turning = path
    .slice(from + 1, to)
    .find(
      (element) =>
        isPullPoint(element) && turnOf(element) !== null && !turnOf(element)?.sheaveRadius,
    );
  return turning ? { reason: 'turns-without-sheave', at: turning.id } : null;
}
