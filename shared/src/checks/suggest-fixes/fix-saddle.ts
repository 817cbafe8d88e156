import type { Finding } from '../../contracts/run-analysis';
import type { Candidate, FixContext } from './candidate';
import { smallerAngles } from './smaller-angle';

/** The bends on a saddle's slope overlap: a flatter angle makes the slope longer. */
export function fixSaddle(context: FixContext, { at }: Finding): Candidate[] {
  const element = context.document.path.find(({ id }) => id === at.elementId);
  return element ? smallerAngles(context, element, at.sectionId) : [];
}
