import { JobsPanel } from '../features/jobs/components/jobs-panel';
import { usePageTitle } from '../hooks/use-page-title';
import { useWords } from '../hooks/use-words';

export default function JobsPage() {
  const { say } = useWords();
  usePageTitle(say('jobs.title'));
  return <JobsPanel />;
}
