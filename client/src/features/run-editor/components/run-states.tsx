import { Button } from '@mantine/core';
import { Link } from 'react-router-dom';
import { useWords } from '../../../hooks/use-words';
import { paths } from '../../../lib/paths';
import { failureOf } from '../../../lib/request-error';
import classes from './workbench.module.css';

/** px of every row, as it will be: nothing moves when the run arrives. */
export function OpeningRun({ isSlow }: { isSlow: boolean }) {
  const { say } = useWords();
  return (
    <div className={classes.desk} aria-busy="true">
      <div className={classes.skeletonHead} />
      <div className={classes.skeletonTabs} />
      <p className={classes.skeletonBody} role="status">
        {isSlow ? say('workbench.states.loadingLong') : ''}
        <span className={classes.visuallyHidden}>{say('workbench.states.loading')}</span>
      </p>
    </div>
  );
}

interface FailureProps {
  error: unknown;
  jobId: string;
  onRetry: () => void;
}

/** The run did not open: what happened, what is kept, what to do. */
export function RunFailure({ error, jobId, onRetry }: FailureProps) {
  const { say } = useWords();
  const failure = failureOf(error);
  const isMissing = failure?.kind === 'api' && failure.error.status === 404;
  const isSilent = failure?.kind === 'network';
  const kind = isMissing ? 'missing' : isSilent ? 'noSignal' : 'failed';
  const reference = failure?.kind === 'api' ? failure.error.requestId : '';
  return (
    <main className={classes.message}>
      <div role="alert">
        <h1>{say(`workbench.states.${kind}Title`)}</h1>
        <p>{say(`workbench.states.${kind}Text`, { reference })}</p>
      </div>
      <div className={classes.messageActs}>
        {!isMissing && (
          <Button variant="filled" onClick={onRetry}>
            {say('workbench.states.retry')}
          </Button>
        )}
        <Button component={Link} to={isMissing ? paths.jobs : paths.job(jobId)}>
          {say(isMissing ? 'workbench.states.toJobs' : 'workbench.states.toJob')}
        </Button>
      </div>
    </main>
  );
}
