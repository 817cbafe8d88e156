import { useWords } from '../../../../hooks/use-words';
import { formatMoment } from '../../../../lib/format-date';
import { useRunEditor } from '../../state/use-run-editor';
import classes from './header.module.css';

/** Always one of: Saved · Saving · On this phone, N to send · Needs you. */
export function SavingLine({ onNeedsYou }: { onNeedsYou: () => void }) {
  const { say } = useWords();
  const { state, savedAt, waiting } = useRunEditor((editor) => editor.saving);
  if (state === 'needs-you') {
    return (
      <button type="button" className={classes.savingButton} onClick={onNeedsYou}>
        {say('workbench.saving.needsYou')}
      </button>
    );
  }
  const words =
    state === 'saving'
      ? say('workbench.saving.saving')
      : state === 'local'
        ? say('workbench.saving.local', { count: waiting })
        : savedAt === null
          ? say('workbench.saving.savedUntimed')
          : say('workbench.saving.saved', { time: formatMoment(savedAt) });
  return (
    <span className={classes.saving} role="status">
      {words}
    </span>
  );
}
