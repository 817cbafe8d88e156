import { Button } from '@mantine/core';
import { useWords } from '../hooks/use-words';
import { failureOf } from '../lib/request-error';
import classes from './panel.module.css';

interface LoadFailureProps {
  /** What could not be loaded and what is kept. */
  message: string;
  error: unknown;
  onRetry: () => void;
}

/** A list or panel that could not be loaded: what happened, what to do, and a code for whoever helps. */
export function LoadFailure({ message, error, onRetry }: LoadFailureProps) {
  const { say } = useWords();
  const failure = failureOf(error);
  return (
    <div className={classes.panel} role="alert">
      <p className={classes.words}>
        {message} {failure?.kind === 'network' && say('app.error.network')}
      </p>
      <Button onClick={onRetry}>{say('app.retry')}</Button>
      {failure?.kind === 'api' && failure.error.requestId && (
        <p className={classes.small}>
          {say('app.error.reference', { reference: failure.error.requestId })}
        </p>
      )}
    </div>
  );
}
