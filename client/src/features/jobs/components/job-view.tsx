import { Button } from '@mantine/core';
import { useQuery } from '@tanstack/react-query';
import { Link } from 'react-router-dom';
import { ListSkeleton } from '../../../components/list-skeleton';
import { LoadFailure } from '../../../components/load-failure';
import { usePageTitle } from '../../../hooks/use-page-title';
import { useWords } from '../../../hooks/use-words';
import { paths } from '../../../lib/paths';
import { apiErrorOf } from '../../../lib/request-error';
import { jobQuery } from '../api/job-queries';
import { JobHead } from './job-head';
import { JobPeople } from './job-people';
import { RunsPanel } from './runs-panel';
import classes from './jobs.module.css';

/** One job: what it is, its runs, its people. */
export function JobView({ jobId }: { jobId: string }) {
  const { say } = useWords();
  const { data: job, error, isPending, refetch } = useQuery(jobQuery(jobId));
  usePageTitle(job?.name);
  if (isPending) return <ListSkeleton rows={8} rowHeight="3.25rem" />;
  if (apiErrorOf(error)?.status === 404) return <JobMissing />;
  if (!job) {
    return (
      <LoadFailure
        message={say('jobs.failure.loadJob')}
        error={error}
        onRetry={() => void refetch()}
      />
    );
  }
  return (
    <div className={classes.page}>
      <JobHead job={job} />
      <RunsPanel job={job} />
      <JobPeople job={job} />
    </div>
  );
}

function JobMissing() {
  const { say } = useWords();
  return (
    <div className={classes.page}>
      <h1 className={classes.title}>{say('jobs.missing.title')}</h1>
      <p className={classes.sub}>{say('jobs.missing.text')}</p>
      <Button component={Link} to={paths.jobs}>
        {say('jobs.missing.back')}
      </Button>
    </div>
  );
}
