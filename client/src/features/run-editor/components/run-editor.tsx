import { useQuery } from '@tanstack/react-query';
import { useMemo } from 'react';
import { useAfter } from '../../../hooks/use-after';
import { usePageTitle } from '../../../hooks/use-page-title';
import { useWords } from '../../../hooks/use-words';
import { useSession } from '../../../lib/session';
import { runQuery } from '../api/run-query';
import { RunEditorSession } from '../state/run-editor-session';
import { useRunEditor } from '../state/use-run-editor';
import { usePlace } from './hooks/use-place';
import { useSelectionInUrl } from './hooks/use-selection-in-url';
import { SettingsContext } from './hooks/use-settings';
import { OpeningRun, RunFailure } from './run-states';
import { Workbench } from './workbench';

/** ms after which waiting is told in words. */
const LONG = 2000;

/** Opens a run of a job for editing. */
export function RunEditor({ jobId, runId }: { jobId: string; runId: string }) {
  const { data: run, error, refetch } = useQuery(runQuery(runId));
  const me = useSession((session) => session.me);
  const scope = useMemo(() => (me ? { companyId: me.company.id, userId: me.user.id } : null), [me]);
  if (error && !run) {
    return <RunFailure error={error} jobId={jobId} onRetry={() => void refetch()} />;
  }
  if (!run || !scope) return <Opening />;
  return (
    <SettingsContext.Provider value={run.settings}>
      <RunEditorSession run={run} settings={run.settings} scope={scope} opening={<Opening />}>
        <OpenRun />
      </RunEditorSession>
    </SettingsContext.Provider>
  );
}

function Opening() {
  return <OpeningRun isSlow={useAfter(LONG)} />;
}

function OpenRun() {
  const { say } = useWords();
  const tag = useRunEditor((state) => state.document.tag);
  const job = useRunEditor((state) => state.server.job.name);
  usePageTitle(say('workbench.title', { tag, job }));
  const [place, goTo] = usePlace();
  useSelectionInUrl();
  return <Workbench place={place} goTo={goTo} />;
}
