import { elementNumber } from '../../run/commands/element-number';
import type { PathElement } from '../../run/run-document';
import type { Candidate, FixContext } from './candidate';

/** The angles a bender has marks for, in the order they are tried: none too flat to lay out, none steeper than needed. Common practice, no source. */
const STANDARD_ANGLES = [22.5, 30, 45, 10];
/** The outer bends of a saddle are never made at 10. Common practice, no source. */
const SADDLE_ANGLES = [22.5, 30, 45];

/** A flatter angle for one offset, saddle or kick: each standard one below what it has. */
export function smallerAngles(
  { document }: FixContext,
  element: PathElement,
  sectionId: string | undefined,
): Candidate<'change-angle'>[] {
  const angle = angleOf(element);
  const number = elementNumber(document, element.id);
  if (angle === null || number === null) return [];
  const isSaddle = element.kind === 'saddle-3' || element.kind === 'saddle-4';
  const flatter = (isSaddle ? SADDLE_ANGLES : STANDARD_ANGLES).filter((other) => other < angle);
  return flatter.map((other) => ({
    kind: 'change-angle',
    commands: [
      { command: 'set-element', args: { elementId: element.id, patch: { angle: other } } },
    ],
    values: ({ sections }) => {
      const section = sections.find(({ id }) => id === sectionId);
      return section
        ? {
            elementId: element.id,
            piece: element.kind,
            number,
            angle: other,
            degrees: section.degrees,
            limit: section.limitDegrees,
            remaining: section.remainingDegrees,
          }
        : null;
    },
  }));
}

/** The angle a person can choose; a full 90 turns the run and is no matter of choice. */
function angleOf(element: PathElement): number | null {
  switch (element.kind) {
    case 'bend':
      return element.angle < 90 && element.counts !== false ? element.angle : null;
    case 'offset':
    case 'saddle-3':
    case 'saddle-4':
      return element.angle;
    default:
      return null;
  }
}
