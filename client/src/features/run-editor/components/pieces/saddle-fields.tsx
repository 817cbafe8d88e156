import { BOUNDS } from '@fairlead/shared';
import type { Saddle3, Saddle4 } from '@fairlead/shared';
import { useWords } from '../../../../hooks/use-words';
import { useRunEditor } from '../../state/use-run-editor';
import { AngleField } from '../fields/angle-field';
import fieldClasses from '../fields/fields.module.css';
import { LegField } from '../fields/leg-field';
import { LengthField } from '../fields/length-field';
import { usePatch } from '../hooks/use-patch';
import { AngleChoiceRow } from './angle-choice';
import { MoreFields } from './more-fields';
import type { PieceProps } from './piece-fields';
import { RadiusField } from './radius-field';
import { TowardField } from './toward-field';

export function SaddleFields({ piece, sectionId }: PieceProps<Saddle3 | Saddle4>) {
  const { say } = useWords();
  const canEdit = useRunEditor((state) => state.canEdit);
  const patch = usePatch(piece.id);
  const isThree = piece.kind === 'saddle-3';
  return (
    <>
      <AngleChoiceRow piece={piece} sectionId={sectionId} />
      <div className={fieldClasses.row}>
        <LengthField
          label={say('workbench.field.height')}
          fieldKey={`${piece.id}.height`}
          value={piece.height}
          max={BOUNDS.dimension}
          disabled={!canEdit}
          onCommit={(height) => patch({ height })}
        />
        {piece.kind === 'saddle-4' && (
          <LengthField
            label={say('workbench.field.width')}
            fieldKey={`${piece.id}.width`}
            value={piece.width}
            max={BOUNDS.dimension}
            disabled={!canEdit}
            onCommit={(width) => patch({ width })}
          />
        )}
      </div>
      <LegField pieceId={piece.id} />
      <TowardField piece={piece} />
      <MoreFields>
        <div className={fieldClasses.row}>
          <AngleField
            label={say(isThree ? 'workbench.field.outerAngle' : 'workbench.field.angle')}
            fieldKey={`${piece.id}.angle`}
            value={piece.angle}
            max={isThree ? BOUNDS.saddle3Angle : BOUNDS.offsetAngleBelow}
            isBelow={!isThree}
            disabled={!canEdit}
            onCommit={(angle) => patch({ angle })}
          />
          <RadiusField piece={piece} />
        </div>
      </MoreFields>
    </>
  );
}
