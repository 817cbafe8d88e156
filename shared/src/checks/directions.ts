import type { Finding } from '../contracts/run-analysis';
import type { CheckContext } from './check-context';

/**
 * A direction parallel to the pipe is a stop at its piece; a missing one, where others are given, a note: degrees and
 * fill are answered all the same, the shape in space is not.
 */
export function checkDirections({ expanded }: CheckContext): Finding[] {
  const sectionOf = new Map(expanded.elements.map(({ element, section }) => [element.id, section]));
  return expanded.directionProblems.map(({ elementId, problem }): Finding => {
    const sectionId = expanded.sections[sectionOf.get(elementId) ?? 0]?.id;
    const isParallel = problem === 'parallel';
    return {
      code: isParallel ? 'direction-parallel' : 'direction-missing',
      severity: isParallel ? 'stop' : 'note',
      at: { elementId, sectionId },
      values: {},
      rule: null,
    };
  });
}
