import type { Finding } from '../../contracts/run-analysis';
import type { Candidate, FixContext } from './candidate';
import { pullPointIn } from './pull-point-in-leg';

/** A section longer than somebody's limit: a box from which both sides are short enough. */
export function fixLength(context: FixContext, { at, values }: Finding): Candidate[] {
  const section = context.expanded.sections.find(({ id }) => id === at.sectionId);
  const limit = Number(values.limit);
  if (!section || !(limit > 0)) return [];
  const range = { from: section.toStation - limit, to: section.fromStation + limit };
  return range.from <= range.to ? pullPointIn(context, section.id, range) : [];
}
