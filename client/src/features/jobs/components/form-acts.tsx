import { Button } from '@mantine/core';
import { useWords } from '../../../hooks/use-words';
import classes from './jobs.module.css';

interface FormActsProps {
  failure: string | null;
  submit: string;
  sending: boolean;
  onCancel: () => void;
}

/** The foot of a form in a dialog: what went wrong, then cancel and the act. */
export function FormActs({ failure, submit, sending, onCancel }: FormActsProps) {
  const { say } = useWords();
  return (
    <>
      {failure && (
        <p className={classes.problem} role="alert">
          {failure}
        </p>
      )}
      <div className={classes.formActs}>
        <Button variant="default" onClick={onCancel}>
          {say('jobs.form.cancel')}
        </Button>
        <Button type="submit" variant="filled" loading={sending}>
          {submit}
        </Button>
      </div>
    </>
  );
}
