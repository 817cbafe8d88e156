import { elementNumber } from '@fairlead/shared';
import { useWords } from '../../../../hooks/use-words';
import { useRunEditor } from '../../state/use-run-editor';
import { useCommands } from '../commands/commands-context';
import { useLabelOf } from '../hooks/use-labels';
import { insertionPoint } from '../model/insert-after';
import { ADD_GROUPS } from '../model/new-pieces';
import frame from '../workbench.module.css';
import classes from './list.module.css';

/** Groups whose keys do not say by themselves what they add. */
const NAMED: ReadonlySet<string> = new Set(['offset', 'saddle']);

/** The keys that add a piece after the selected one. */
export function AddRow() {
  const { say } = useWords();
  const { doCommand } = useCommands();
  const labelOf = useLabelOf();
  const canEdit = useRunEditor((state) => state.canEdit);
  const afterId = useRunEditor((state) => insertionPoint(state.document, state.selectedId).id);
  const number = useRunEditor((state) => elementNumber(state.document, afterId));
  const after = say('workbench.add.after', { piece: number ?? labelOf(afterId) });
  return (
    <div className={classes.addRow} role="group" aria-label={say('workbench.add.title')}>
      <span className={classes.addAfter} title={after}>
        {after}
      </span>
      {ADD_GROUPS.map(({ group, keys }) => (
        <span key={group} className={classes.addGroup}>
          <span className={NAMED.has(group) ? undefined : frame.visuallyHidden}>
            {say(`workbench.add.group.${group}`)}
          </span>
          {keys.map((key) => (
            <button
              key={key}
              type="button"
              className={classes.addKey}
              disabled={!canEdit}
              aria-label={say('workbench.add.named', { piece: say(`workbench.add.long.${key}`) })}
              title={say(`workbench.add.long.${key}`)}
              onClick={() => doCommand(`add-${key}`)}
            >
              {say(`workbench.add.key.${key}`)}
            </button>
          ))}
        </span>
      ))}
    </div>
  );
}
