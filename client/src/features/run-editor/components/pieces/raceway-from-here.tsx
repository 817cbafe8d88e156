import type { PullPoint } from '@fairlead/shared';
import { useWords } from '../../../../hooks/use-words';
import { useRunEditor } from '../../state/use-run-editor';
import { RacewayFields } from '../fields/raceway-fields';
import { SwitchField } from '../fields/switch-field';
import { usePatch } from '../hooks/use-patch';

/** What leaves a pull point, where it is another raceway. */
export function RacewayFromHere({ piece }: { piece: PullPoint }) {
  const { say } = useWords();
  const canEdit = useRunEditor((state) => state.canEdit);
  const placed = useRunEditor((state) =>
    state.expanded.elements.find(({ element }) => element.id === piece.id),
  );
  const patch = usePatch(piece.id);
  const { raceway } = piece;
  return (
    <>
      <SwitchField
        label={say('workbench.field.racewayFromHere')}
        checked={raceway !== undefined}
        disabled={!canEdit}
        onChange={(changes) => void patch({ raceway: changes ? placed?.raceway : undefined })}
      />
      {raceway && (
        <RacewayFields
          fieldKey={`${piece.id}.raceway`}
          raceway={raceway}
          disabled={!canEdit}
          onCommit={(next) => patch({ raceway: next })}
        />
      )}
    </>
  );
}
