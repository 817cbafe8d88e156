import { LIMITS } from '@fairlead/shared';
import { useWords } from '../../../../hooks/use-words';
import { useRunEditor } from '../../state/use-run-editor';
import { TextField } from '../fields/text-field';
import { useEdit } from '../hooks/use-edit';
import classes from './dialogs.module.css';

export function IdentityForm() {
  const { say } = useWords();
  const { tag, title } = useRunEditor((state) => state.document);
  const canEdit = useRunEditor((state) => state.canEdit);
  const edit = useEdit();
  return (
    <div className={classes.form}>
      <TextField
        label={say('workbench.rename.tag')}
        fieldKey="tag"
        value={tag}
        maxLength={LIMITS.tag}
        needed={say('workbench.text.needed')}
        disabled={!canEdit}
        onCommit={(next) => edit([{ command: 'set-identity', args: { tag: next } }])}
      />
      <TextField
        label={say('workbench.rename.runTitle')}
        fieldKey="title"
        value={title ?? ''}
        maxLength={LIMITS.title}
        disabled={!canEdit}
        onCommit={(next) => edit([{ command: 'set-identity', args: { title: next } }])}
      />
    </div>
  );
}
