import { useWords } from '../../../../hooks/use-words';
import { useRunEditor } from '../../state/use-run-editor';
import { DirectionPad } from '../fields/direction-pad';
import type { Piece } from '../model/list-rows';
import { towardOf } from '../model/toward-of';
import { usePatch } from '../hooks/use-patch';

/** Which way a piece goes, seen from the way the pipe comes to it. */
export function TowardField({ piece }: { piece: Exclude<Piece, { kind: 'pull-point' }> }) {
  const { say } = useWords();
  const expanded = useRunEditor((state) => state.expanded);
  const canEdit = useRunEditor((state) => state.canEdit);
  const patch = usePatch(piece.id);
  const placed = expanded.elements.find(({ element }) => element.id === piece.id);
  return (
    <DirectionPad
      label={say('workbench.field.toward')}
      fieldKey={`${piece.id}.toward`}
      heading={placed?.headingBefore ?? null}
      value={towardOf(piece)}
      isOptional
      disabled={!canEdit}
      onCommit={(toward) => patch({ toward })}
    />
  );
}
