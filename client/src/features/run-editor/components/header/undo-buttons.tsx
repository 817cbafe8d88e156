import { wordEdit } from '@fairlead/shared';
import { useWords } from '../../../../hooks/use-words';
import { useRunEditor } from '../../state/use-run-editor';
import { useCommands, useIsEnabled } from '../commands/commands-context';
import classes from './header.module.css';

/** "Undo offset 9 angle". */
export function UndoButton() {
  const { say } = useWords();
  const { doCommand } = useCommands();
  const label = useRunEditor((state) => state.undoLabel);
  const name = label
    ? say('workbench.undoNamed', { edit: wordEdit(label, say) })
    : say('workbench.undo');
  return (
    <button
      type="button"
      className={`${classes.act} ${classes.undo}`}
      title={name}
      disabled={!useIsEnabled('undo')}
      onClick={() => doCommand('undo')}
    >
      {name}
    </button>
  );
}

export function RedoButton() {
  const { say } = useWords();
  const { doCommand } = useCommands();
  const label = useRunEditor((state) => state.redoLabel);
  const name = label
    ? say('workbench.redoNamed', { edit: wordEdit(label, say) })
    : say('workbench.redo');
  return (
    <button
      type="button"
      className={`${classes.act} ${classes.redo}`}
      title={name}
      aria-label={name}
      disabled={!useIsEnabled('redo')}
      onClick={() => doCommand('redo')}
    >
      {say('workbench.redo')}
    </button>
  );
}
