import { COMPASS } from '@fairlead/shared';
import type { Direction } from '@fairlead/shared';
import { useState } from 'react';
import { useWords } from '../../../../hooks/use-words';
import { useRunEditor } from '../../state/use-run-editor';
import fieldClasses from '../fields/fields.module.css';
import { useEdit } from '../hooks/use-edit';

const DEFAULT_HEADING: Direction = 'east';

/** The way the pipe leaves the first pull point; everything else is seen from it. */
export function StartHeading() {
  const { say } = useWords();
  const heading = useRunEditor((state) => state.document.start?.heading);
  const canEdit = useRunEditor((state) => state.canEdit);
  const edit = useEdit();
  const [refusal, setRefusal] = useState<string | null>(null);
  const shown = heading ?? DEFAULT_HEADING;
  return (
    <fieldset className={fieldClasses.fieldset}>
      <legend className={fieldClasses.legend}>{say('workbench.direction.heading')}</legend>
      <div className={fieldClasses.padKeys}>
        {COMPASS.map((way) => (
          <button
            key={way}
            type="button"
            className={fieldClasses.choice}
            aria-pressed={shown === way}
            disabled={!canEdit}
            onClick={() =>
              setRefusal(edit([{ command: 'set-start', args: { start: { heading: way } } }]))
            }
          >
            {say(`workbench.direction.${way}`)}
          </button>
        ))}
      </div>
      <p className={fieldClasses.help} data-error={refusal !== null || undefined}>
        {refusal}
      </p>
    </fieldset>
  );
}
