import { BOUNDS, formatLength } from '@fairlead/shared';
import type { Bend, Offset, Saddle3, Saddle4 } from '@fairlead/shared';
import { useWords } from '../../../../hooks/use-words';
import { useRunEditor } from '../../state/use-run-editor';
import { LengthField } from '../fields/length-field';
import { usePatch } from '../hooks/use-patch';

/** Centre-line radius; without one the bender's or the table's is taken, and shown. */
export function RadiusField({ piece }: { piece: Bend | Offset | Saddle3 | Saddle4 }) {
  const { say } = useWords();
  const bends = useRunEditor((state) => state.expanded.bends);
  const canEdit = useRunEditor((state) => state.canEdit);
  const patch = usePatch(piece.id);
  const taken = bends.find(({ elementId }) => elementId === piece.id)?.radius ?? null;
  return (
    <LengthField
      label={say('workbench.field.radius')}
      fieldKey={`${piece.id}.radius`}
      value={piece.radius ?? null}
      max={BOUNDS.dimension}
      isOptional
      placeholder={taken === null ? say('workbench.field.notGiven') : formatLength(taken)}
      help={
        piece.radius === undefined && taken !== null ? say('workbench.field.assumed') : undefined
      }
      disabled={!canEdit}
      onCommit={(radius) => patch({ radius: radius ?? undefined })}
    />
  );
}
