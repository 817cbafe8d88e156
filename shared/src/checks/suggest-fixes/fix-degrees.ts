import type { Finding, SectionAnalysis } from '../../contracts/run-analysis';
import { isAccessible, isPullPoint } from '../../run/pull-points';
import { isOver } from '../degree-limit';
import type { Candidate, FixContext } from './candidate';
import { makeAccessible } from './fix-access';
import { pullPointIn } from './pull-point-in-leg';
import type { PassingRange } from './pull-point-in-leg';
import { smallerAngles } from './smaller-angle';

/**
 * Too many degrees between two pull points: a flatter angle, a box where both sides pass, or the body in between that only
 * has to be reachable. Offsets and saddles come before kicks, whose angle also decides where the run goes on to.
 */
export function fixDegrees(context: FixContext, { at }: Finding): Candidate[] {
  const section = context.analysis.sections.find(({ id }) => id === at.sectionId);
  const index = context.expanded.sections.findIndex(({ id }) => id === at.sectionId);
  if (!section) return [];
  const elements = context.expanded.elements
    .filter((placed) => placed.section === index)
    .map(({ element }) => element);
  const angles = elements.flatMap((element) => smallerAngles(context, element, section.id));
  const isKick = (candidate: Candidate) =>
    elements.some(({ id, kind }) => kind === 'bend' && changes(candidate, id));
  const range = passingRange(context, section);
  return [
    ...angles.filter((candidate) => !isKick(candidate)),
    ...angles.filter(isKick),
    ...(range ? pullPointIn(context, section.id, range) : []),
    ...elements
      .filter((element) => isPullPoint(element) && !isAccessible(element))
      .flatMap((element) => makeAccessible(context, element.id)),
  ];
}

function changes({ commands }: Candidate, elementId: string): boolean {
  return commands.some(
    (command) => command.command === 'set-element' && command.args.elementId === elementId,
  );
}

/**
 * The stations between which a pull point leaves at most the limit on either side; null where none does.
 * Example: 90, 90, 90, 2×45, 2×10 of 360: from the end of the first piece to the start of the last.
 */
function passingRange({ expanded }: FixContext, section: SectionAnalysis): PassingRange | null {
  const { bends, degrees, limitDegrees: limit } = section;
  const passing = bends.slice(0, -1).flatMap(({ cumulative }, index) => {
    const isPassing = !isOver(cumulative, limit) && !isOver(degrees - cumulative, limit);
    return isPassing ? [index] : [];
  });
  const placed = (index: number | undefined) =>
    expanded.elements.find(({ element }) => element.id === bends[index ?? -1]?.elementId);
  const first = placed(passing[0]);
  const last = placed(passing.length > 0 ? (passing[passing.length - 1] as number) + 1 : undefined);
  return first && last ? { from: first.to, to: last.from } : null;
}
