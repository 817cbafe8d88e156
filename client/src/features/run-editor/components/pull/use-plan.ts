import { breakPull, feedPullAt, joinPulls } from '@fairlead/shared';
import type { PlannedPull } from '@fairlead/shared';
import { useState } from 'react';
import { useRunEditor } from '../../state/use-run-editor';
import { useEdit } from '../hooks/use-edit';

/** Changes which sections are pulled together, and from which end. */
export function usePlan() {
  const edit = useEdit();
  const plan = useRunEditor((state) => state.document.pulls) ?? [];
  const now = useRunEditor((state) => state.analysis.pulls);
  const [refusal, setRefusal] = useState<string | null>(null);
  const set = (pulls: PlannedPull[]) =>
    setRefusal(edit([{ command: 'set-pulls', args: { pulls } }]));
  return {
    refusal,
    join: (pullId: string) => set(joinPulls(plan, now, pullId)),
    breakAt: (pullId: string, place: string) => set(breakPull(plan, now, pullId, place)),
    feedAt: (pullId: string, end: 'from' | 'to' | null) => set(feedPullAt(plan, now, pullId, end)),
  };
}
