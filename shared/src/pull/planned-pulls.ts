import type { ExpandedRun } from '../run/expanded-run';
import type { PlannedPull, RunDocument } from '../run/run-document';

/** A pull and the sections it goes through, by index; −1 where an end of it ends no section. */
export interface PullSpan {
  pull: PlannedPull;
  first: number;
  last: number;
}

/** The pulls of a run in the order of its path: those planned, and one for each section no plan covers. */
export function plannedPulls({ pulls = [] }: RunDocument, { sections }: ExpandedRun): PullSpan[] {
  const planned = pulls.map((pull): PullSpan => ({
    pull,
    first: sections.findIndex(({ from }) => from.id === pull.from),
    last: sections.findIndex(({ to }) => to.id === pull.to),
  }));
  const covered = (index: number) =>
    planned.some(({ first, last }) => first >= 0 && index >= first && index <= last);
  const rest = sections.flatMap((section, index): PullSpan[] => {
    if (covered(index)) return [];
    const pull = { id: section.id, from: section.from.id, to: section.to.id };
    return [{ pull, first: index, last: index }];
  });
  return [...planned, ...rest].sort((a, b) => a.first - b.first);
}
