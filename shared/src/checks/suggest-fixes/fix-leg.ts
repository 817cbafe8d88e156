import type { Finding } from '../../contracts/run-analysis';
import { elementNumber } from '../../run/commands/element-number';
import { straight } from '../../run/build-run';
import { numberElements } from '../../run/element-ids';
import type { RunCommand } from '../../run/run-command';
import type { RunDocument } from '../../run/run-document';
import type { Candidate, FixContext } from './candidate';
import { smallerAngles } from './smaller-angle';

/** Rounded up to a sixteenth, the finest a tape is read to. Example: short by 2.71 in gives 2.75. */
export function upToSixteenth(inches: number): number {
  return Math.ceil(inches * 16 - 1e-6) / 16;
}

/**
 * A leg too short for the bends at its ends is made longer by what it lacks. Where the two bends belong to one offset, its
 * own rise holds them too close: a flatter angle brings them apart.
 */
export function fixLeg(context: FixContext, { at, values }: Finding): Candidate[] {
  const element = context.document.path.find(({ id }) => id === at.elementId);
  if (!element) return [];
  if (values.inside === true) return smallerAngles(context, element, at.sectionId);
  const added = upToSixteenth(Number(values.short));
  const change = lengthen(context.document, values, added);
  if (!change || !(added > 0)) return [];
  const { command, leadsTo } = change;
  return [
    {
      kind: 'longer-leg',
      commands: [command],
      values: () => ({
        elementId: leadsTo,
        number: elementNumber(context.document, leadsTo),
        added,
        length: Number(values.leg ?? 0) + added,
      }),
    },
  ];
}

function lengthen(
  document: RunDocument,
  { straightId, beforeId, afterId }: Finding['values'],
  added: number,
): { command: RunCommand; leadsTo: string } | null {
  const { path } = document;
  const existing = path.findIndex(({ id }) => id === straightId);
  const leg = path[existing];
  if (leg?.kind === 'straight') {
    const next = path.slice(existing).find(({ kind }) => kind !== 'straight');
    const args = { elementId: leg.id, patch: { length: leg.length + added } };
    const leadsTo = typeof afterId === 'string' ? afterId : (next ?? leg).id;
    return { command: { command: 'set-element', args }, leadsTo };
  }
  const after = path.findIndex(({ id }) => id === afterId);
  const previous = after > 0 ? path[after - 1] : path.find(({ id }) => id === beforeId);
  const next = previous && path[path.indexOf(previous) + 1];
  if (!previous || !next) return null;
  const elements = numberElements(document, [straight({ length: added })]);
  const args = { afterId: previous.id, elements };
  return { command: { command: 'insert-elements', args }, leadsTo: next.id };
}
