import { elementNumber } from '../../run/commands/element-number';
import type { Finding } from '../../contracts/run-analysis';
import type { Candidate, FixContext } from './candidate';

export function fixAccess(context: FixContext, { at }: Finding): Candidate[] {
  return at.elementId === undefined ? [] : makeAccessible(context, at.elementId);
}

/** Says that a box or body can be reached: an answer only where its cover really can. */
export function makeAccessible(
  { document }: FixContext,
  elementId: string,
): Candidate<'make-accessible'>[] {
  const element = document.path.find(({ id }) => id === elementId);
  if (element?.kind !== 'pull-point') return [];
  return [
    {
      kind: 'make-accessible',
      commands: [{ command: 'set-element', args: { elementId, patch: { accessible: true } } }],
      values: ({ analysis, sections }) => {
        const before = analysis.sections.find(({ to }) => to === elementId);
        const after = analysis.sections.find(({ from }) => from === elementId);
        // Where it ends no section even so, as under the telecom profile, its section stays whole.
        const whole = sections[0];
        return {
          elementId,
          number: elementNumber(document, elementId),
          name: element.label ?? null,
          degreesBefore: before?.degrees ?? whole?.degrees ?? 0,
          degreesAfter: after?.degrees ?? 0,
          limit: before?.limitDegrees ?? whole?.limitDegrees ?? 0,
          onlyIfReachable: true,
        };
      },
    },
  ];
}
