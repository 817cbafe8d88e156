import type { Status, Verdict } from '@fairlead/shared';
import type { Say } from '../../../../hooks/use-words';

const WORST_FIRST: readonly Status[] = ['over', 'watch', 'no-answer', 'ok'];

export function worstVerdict(verdicts: readonly Verdict[]): Verdict | undefined {
  return WORST_FIRST.map((status) => verdicts.find((verdict) => verdict.status === status)).find(
    (verdict) => verdict !== undefined,
  );
}

/** "1 over limit" · "1 to watch" · "All OK" · "Nothing over limit, 2 without an answer". */
export function headline(verdicts: readonly Verdict[], say: Say): string {
  const count = (status: Status) => verdicts.filter((verdict) => verdict.status === status).length;
  if (count('over') > 0) return say('workbench.verdict.over', { count: count('over') });
  if (count('watch') > 0) return say('workbench.verdict.watch', { count: count('watch') });
  if (count('no-answer') > 0) {
    return say('workbench.verdict.noAnswer', { count: count('no-answer') });
  }
  return say('workbench.verdict.allOk');
}
