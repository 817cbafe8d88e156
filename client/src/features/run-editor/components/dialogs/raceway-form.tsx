import { BOUNDS } from '@fairlead/shared';
import { useWords } from '../../../../hooks/use-words';
import { useRunEditor } from '../../state/use-run-editor';
import { NumberField } from '../fields/number-field';
import { RacewayFields } from '../fields/raceway-fields';
import { useEdit } from '../hooks/use-edit';
import classes from './dialogs.module.css';

export function RacewayForm() {
  const { say } = useWords();
  const { raceway, sets } = useRunEditor((state) => state.document);
  const canEdit = useRunEditor((state) => state.canEdit);
  const edit = useEdit();
  return (
    <div className={classes.form}>
      <RacewayFields
        fieldKey="raceway"
        raceway={raceway}
        disabled={!canEdit}
        onCommit={(next) => edit([{ command: 'set-raceway', args: { raceway: next } }])}
      />
      <NumberField
        label={say('workbench.raceway.sets')}
        fieldKey="sets"
        value={sets ?? 1}
        unit=""
        min={1}
        max={BOUNDS.sets}
        isWhole
        disabled={!canEdit}
        onCommit={(next) => edit([{ command: 'set-sets', args: { sets: next ?? 1 } }])}
      />
    </div>
  );
}
