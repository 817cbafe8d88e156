import { suggestFixesInSteps } from '@fairlead/shared';
import type { CompanySettings } from '@fairlead/shared';
import type { RunEditor } from './run-editor-state';

/** A keystroke is drawn first; the fixes of its findings are worked out when the typing rests this long. */
export const FIXES_AFTER_MS = 150;

/** Then they are worked out this long at a time, ms, so that a key pressed meanwhile is drawn in its frame. */
const SLICE_MS = 8;

export interface FixSuggester {
  schedule(): void;
  stop(): void;
}

/** Fills in the fixes of the run that is shown, once for each document. */
export function createFixSuggester(editor: RunEditor, settings: CompanySettings): FixSuggester {
  let timer: ReturnType<typeof setTimeout> | null = null;
  const stop = () => {
    if (timer !== null) clearTimeout(timer);
    timer = null;
  };
  return {
    stop,
    schedule: () => {
      stop();
      timer = setTimeout(() => {
        const { document, analysis, fixesReady } = editor.getState();
        if (!fixesReady) work(suggestFixesInSteps(document, analysis, settings));
      }, FIXES_AFTER_MS);
    },
  };

  /** Another edit stops it: these findings are then no longer the ones on the screen. */
  function work(steps: ReturnType<typeof suggestFixesInSteps>): void {
    const until = performance.now() + SLICE_MS;
    do {
      const step = steps.next();
      if (step.done) {
        editor.setState({ findings: step.value, fixesReady: true });
        return;
      }
    } while (performance.now() < until);
    timer = setTimeout(() => work(steps));
  }
}
