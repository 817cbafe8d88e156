import type { Run } from '@fairlead/shared';
import type { StartingPoint } from './recover-run';
import type { Saving } from './run-editor-state';

/** What the saving line says of a run just opened. */
export function firstSaving(run: Run, start: StartingPoint, kept: boolean): Saving {
  const state = start.conflict ? 'needs-you' : start.restored ? 'local' : 'saved';
  return {
    state,
    savedAt: run.revision.savedAt,
    waiting: state === 'saved' ? 0 : 1,
    reason: start.conflict ? 'conflict' : null,
    problems: [],
    requestId: null,
    kept,
  };
}
