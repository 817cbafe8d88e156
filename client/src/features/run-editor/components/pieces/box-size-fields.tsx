import { BOUNDS } from '@fairlead/shared';
import type { BoxSize, PullPoint } from '@fairlead/shared';
import { useWords } from '../../../../hooks/use-words';
import { useRunEditor } from '../../state/use-run-editor';
import fieldClasses from '../fields/fields.module.css';
import { LengthField } from '../fields/length-field';
import { SwitchField } from '../fields/switch-field';
import { usePatch } from '../hooks/use-patch';

/** A usual pull box to begin with, in (common practice, no source). */
const FIRST: BoxSize = { width: 12, height: 12, depth: 6 };
const SIDES = ['width', 'height', 'depth'] as const;
const LABELS = { width: 'boxWidth', height: 'boxHeight', depth: 'boxDepth' } as const;

export function BoxSizeFields({ piece }: { piece: PullPoint }) {
  const { say } = useWords();
  const canEdit = useRunEditor((state) => state.canEdit);
  const patch = usePatch(piece.id);
  const { boxSize } = piece;
  return (
    <>
      <SwitchField
        label={say('workbench.field.boxSize')}
        checked={boxSize !== undefined}
        disabled={!canEdit}
        onChange={(isGiven) => void patch({ boxSize: isGiven ? FIRST : undefined })}
      />
      {boxSize && (
        <div className={fieldClasses.row}>
          {SIDES.map((side) => (
            <LengthField
              key={side}
              label={say(`workbench.field.${LABELS[side]}`)}
              fieldKey={`${piece.id}.box.${side}`}
              value={boxSize[side]}
              max={BOUNDS.dimension}
              disabled={!canEdit}
              onCommit={(inches) => patch({ boxSize: { ...boxSize, [side]: inches ?? 0 } })}
            />
          ))}
        </div>
      )}
    </>
  );
}
