import { Button } from '@mantine/core';
import { useWords } from '../../../../hooks/use-words';
import { useRunEditor } from '../../state/use-run-editor';
import classes from './dialogs.module.css';

/** Why the run is not saved, what is kept and what to do. */
export function SavingProblem({ onClose }: { onClose: () => void }) {
  const { say } = useWords();
  const { reason, problems, requestId } = useRunEditor((state) => state.saving);
  const retry = useRunEditor((state) => state.retry);
  return (
    <div className={classes.form}>
      <p className={classes.words}>{reason && say(`workbench.saving.reason.${reason}`)}</p>
      {problems.length > 0 && (
        <ul className={classes.problems}>
          {problems.map(({ pointer, code }) => (
            <li key={`${pointer} ${code}`}>{say('workbench.saving.problem', { pointer, code })}</li>
          ))}
        </ul>
      )}
      {requestId && (
        <p className={classes.lead}>
          {say('workbench.saving.reference', { reference: requestId })}
        </p>
      )}
      <div className={classes.acts}>
        <Button
          variant="filled"
          onClick={() => {
            onClose();
            void retry();
          }}
        >
          {say('workbench.saving.retry')}
        </Button>
      </div>
    </div>
  );
}
