import { wordEdit } from '@fairlead/shared';
import { useWords } from '../../../../hooks/use-words';
import { useRunEditor } from '../../state/use-run-editor';
import { useCommands, useIsEnabled } from '../commands/commands-context';
import classes from './phone.module.css';
import type { PhoneView } from './phone-view';

interface Props {
  view: PhoneView;
  onView: (view: PhoneView) => void;
}

/** Undo and Add, under the thumb; while pieces are being added, Done. */
export function PhoneActs({ view, onView }: Props) {
  const { say } = useWords();
  const { doCommand } = useCommands();
  const undoLabel = useRunEditor((state) => state.undoLabel);
  const canEdit = useRunEditor((state) => state.canEdit);
  const canUndo = useIsEnabled('undo');
  return (
    <div className={classes.acts}>
      <button
        type="button"
        className={classes.act}
        disabled={!canUndo}
        onClick={() => doCommand('undo')}
      >
        {undoLabel
          ? say('workbench.undoNamed', { edit: wordEdit(undoLabel, say) })
          : say('workbench.undo')}
      </button>
      <button
        type="button"
        className={`${classes.act} ${classes.primary}`}
        disabled={!canEdit}
        onClick={() => onView(view === 'add' ? 'list' : 'add')}
      >
        {say(view === 'add' ? 'workbench.add.done' : 'workbench.add.plus')}
      </button>
    </div>
  );
}
