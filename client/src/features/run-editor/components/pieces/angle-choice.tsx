import { formatAngle } from '@fairlead/shared';
import { useDeferredValue, useMemo, useState } from 'react';
import { useWords } from '../../../../hooks/use-words';
import { useRunEditor } from '../../state/use-run-editor';
import fieldClasses from '../fields/fields.module.css';
import { useSettings } from '../hooks/use-settings';
import { useEdit } from '../hooks/use-edit';
import { angleChoices } from '../model/angle-choices';
import type { Piece } from '../model/list-rows';

/** The usual angles, each with the section total it would give. */
export function AngleChoiceRow({ piece, sectionId }: { piece: Piece; sectionId: string | null }) {
  const { say } = useWords();
  // Five analyses of the sections: the strip is drawn first.
  const document = useDeferredValue(useRunEditor((state) => state.document));
  const canEdit = useRunEditor((state) => state.canEdit);
  const settings = useSettings();
  const edit = useEdit();
  const [refusal, setRefusal] = useState<string | null>(null);
  const choices = useMemo(
    () => angleChoices(document, piece, sectionId, settings),
    [document, piece, sectionId, settings],
  );
  return (
    <div>
      <div
        className={fieldClasses.choices}
        role="radiogroup"
        aria-label={say('workbench.selected.angles')}
      >
        {choices.map(({ angle, total, isOver, isChosen, commands }) => {
          const words = { angle: formatAngle(angle), total: formatAngle(total) };
          return (
            <button
              key={angle}
              type="button"
              role="radio"
              className={`${fieldClasses.choice} ${fieldClasses.choiceTall}`}
              aria-checked={isChosen}
              aria-label={say(`workbench.selected.${isOver ? 'choiceOver' : 'choice'}`, words)}
              disabled={!canEdit}
              onClick={() => setRefusal(edit(commands))}
            >
              <b>{words.angle}</b>
              <small>{isOver ? `${words.total} ✕` : words.total}</small>
            </button>
          );
        })}
      </div>
      {refusal && (
        <p className={fieldClasses.help} data-error role="alert">
          {refusal}
        </p>
      )}
    </div>
  );
}
