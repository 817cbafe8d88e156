import type { Finding } from '../../contracts/run-analysis';
import { breakPull } from '../../pull/plan-pulls';
import type { Candidate, FixContext } from './candidate';

/** A pull straight through boxes, broken at each of them in turn. */
export function fixPull({ document, analysis }: FixContext, { at }: Finding): Candidate[] {
  const pull = analysis.pulls.find(({ id }) => id === at.pullId);
  if (!pull) return [];
  return pull.through.map((place): Candidate<'break-pull'> => ({
    kind: 'break-pull',
    commands: [
      {
        command: 'set-pulls',
        args: { pulls: breakPull(document.pulls ?? [], analysis.pulls, pull.id, place) },
      },
    ],
    values: (outcome) => {
      const parts = outcome.analysis.pulls.filter(({ from, to }) => from === place || to === place);
      const [first, second] = parts.map((part) => part[part.planned].peak?.likely ?? null);
      return { elementId: place, first: first ?? null, second: second ?? null };
    },
  }));
}
