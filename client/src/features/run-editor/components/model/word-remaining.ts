import { formatAngle } from '@fairlead/shared';
import type { SectionAnalysis } from '@fairlead/shared';
import type { Say } from '../../../../hooks/use-words';

/** Degrees are compared to a tenth. */
const TENTH = 0.05;

/** "10° left", "none left", "20° over". */
export function wordRemaining(
  { remainingDegrees }: Pick<SectionAnalysis, 'remainingDegrees'>,
  say: Say,
): { isOver: boolean; words: string } {
  if (remainingDegrees < -TENTH) {
    const over = formatAngle(-remainingDegrees);
    return { isOver: true, words: say('workbench.list.sectionOver', { over }) };
  }
  if (remainingDegrees < TENTH) {
    return { isOver: false, words: say('workbench.list.sectionNoneLeft') };
  }
  const left = formatAngle(remainingDegrees);
  return { isOver: false, words: say('workbench.list.sectionLeft', { left }) };
}
