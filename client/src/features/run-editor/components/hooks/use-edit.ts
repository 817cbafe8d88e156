import type { RunCommand } from '@fairlead/shared';
import { useCallback } from 'react';
import { useWords } from '../../../../hooks/use-words';
import type { EditOptions, EditResult } from '../../state/run-editor-state';
import { useRunEditor } from '../../state/use-run-editor';

export type Refusal = string | null;

/** Carries out an edit; answers null, or why nothing was changed, in words. */
export function useEdit(): (commands: readonly RunCommand[], options?: EditOptions) => Refusal {
  const run = useRunEditor((state) => state.run);
  const { say } = useWords();
  return useCallback(
    (commands, options) => {
      if (commands.length === 0) return null;
      return wordRefusal(run(commands, options), say);
    },
    [run, say],
  );
}

function wordRefusal(result: EditResult, say: ReturnType<typeof useWords>['say']): Refusal {
  if (result.ok) return null;
  switch (result.reason) {
    case 'refused':
      return say(`edits.refused.${result.code}`);
    case 'invalid':
      return say('workbench.selected.invalid');
    case 'read-only':
      return say('workbench.readOnly');
  }
}
