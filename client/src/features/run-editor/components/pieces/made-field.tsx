import type { Bend, Made, Offset } from '@fairlead/shared';
import { useWords } from '../../../../hooks/use-words';
import { useRunEditor } from '../../state/use-run-editor';
import { SelectField } from '../fields/select-field';
import { usePatch } from '../hooks/use-patch';

/** Bent in the field, or a factory elbow. */
export function MadeField({ piece }: { piece: Bend | Offset }) {
  const { say } = useWords();
  const canEdit = useRunEditor((state) => state.canEdit);
  const patch = usePatch(piece.id);
  const options: { value: Made | ''; label: string }[] = [
    { value: '', label: say('workbench.field.madeNotGiven') },
    { value: 'field', label: say('workbench.field.madeField') },
    { value: 'factory', label: say('workbench.field.madeFactory') },
  ];
  return (
    <SelectField
      label={say('workbench.field.made')}
      value={piece.made ?? ''}
      options={options}
      disabled={!canEdit}
      onChange={(made) => patch({ made: made === '' ? undefined : made })}
    />
  );
}
