import type { CompanySettings, Run } from '@fairlead/shared';
import { useEffect, useState } from 'react';
import type { ReactNode } from 'react';
import { newId } from '../../../lib/ids';
import { apiTransport } from './api-transport';
import type { LocalScope } from './local-run';
import { openRunEditor } from './open-run-editor';
import { openLocalRuns } from './recovery';
import type { RunEditor } from './run-editor-state';
import { RunEditorProvider } from './use-run-editor';

interface Props {
  run: Run;
  settings: CompanySettings;
  scope: LocalScope;
  /** Shown for the moment it takes to look for unsent work. */
  opening: ReactNode;
  children: ReactNode;
}

/**
 * Opens a run for the components inside it and closes it with them. A newer answer for the same run does not open it
 * again: the open editor learns of it when it saves.
 */
export function RunEditorSession({ run, settings, scope, opening, children }: Props) {
  const [editor, setEditor] = useState<RunEditor | null>(null);
  const { companyId, userId } = scope;

  useEffect(() => {
    let isGone = false;
    const opened = openLocalRuns({ companyId, userId }).then((storage) =>
      openRunEditor({
        run,
        settings,
        scope: { companyId, userId },
        storage,
        transport: apiTransport,
        now: Date.now,
        newId,
      }),
    );
    void opened.then((made) => (isGone ? undefined : setEditor(made)));
    return () => {
      isGone = true;
      setEditor(null);
      void opened.then((made) => made.getState().dispose());
    };
    // eslint-disable-next-line react-hooks/exhaustive-deps -- only another run or person opens another editor
  }, [run.id, companyId, userId]);

  return editor ? <RunEditorProvider editor={editor}>{children}</RunEditorProvider> : opening;
}
