import { Button } from '@mantine/core';
import { useWords } from '../hooks/use-words';
import { useBuild } from '../lib/build-watch';
import classes from './shell.module.css';

/** A newer version is offered, never forced: the reader may be in the middle of something. */
export function NewVersion() {
  const { say } = useWords();
  const newer = useBuild((state) => state.newer);
  if (!newer) return null;
  return (
    <div className={classes.newVersion} role="status">
      <span>{say('app.newVersion')}</span>
      <Button onClick={() => window.location.reload()}>{say('app.reload')}</Button>
    </div>
  );
}
