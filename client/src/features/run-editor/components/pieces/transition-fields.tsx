import type { Transition } from '@fairlead/shared';
import { useRunEditor } from '../../state/use-run-editor';
import { LegField } from '../fields/leg-field';
import { RacewayFields } from '../fields/raceway-fields';
import { usePatch } from '../hooks/use-patch';

export function TransitionFields({ piece }: { piece: Transition }) {
  const canEdit = useRunEditor((state) => state.canEdit);
  const patch = usePatch(piece.id);
  return (
    <>
      <LegField pieceId={piece.id} />
      <RacewayFields
        fieldKey={`${piece.id}.raceway`}
        raceway={piece.raceway}
        disabled={!canEdit}
        onCommit={(raceway) => patch({ raceway })}
      />
    </>
  );
}
