import { BOUNDS } from '@fairlead/shared';
import type { Offset } from '@fairlead/shared';
import { useWords } from '../../../../hooks/use-words';
import { useRunEditor } from '../../state/use-run-editor';
import { AngleField } from '../fields/angle-field';
import fieldClasses from '../fields/fields.module.css';
import { LegField } from '../fields/leg-field';
import { LengthField } from '../fields/length-field';
import { usePatch } from '../hooks/use-patch';
import { AngleChoiceRow } from './angle-choice';
import { MadeField } from './made-field';
import { MoreFields } from './more-fields';
import type { PieceProps } from './piece-fields';
import { RadiusField } from './radius-field';
import { TowardField } from './toward-field';

export function OffsetFields({ piece, sectionId }: PieceProps<Offset>) {
  const { say } = useWords();
  const canEdit = useRunEditor((state) => state.canEdit);
  const patch = usePatch(piece.id);
  return (
    <>
      <AngleChoiceRow piece={piece} sectionId={sectionId} />
      <LegField
        pieceId={piece.id}
        beside={
          <LengthField
            label={say('workbench.field.rise')}
            fieldKey={`${piece.id}.rise`}
            value={piece.rise}
            max={BOUNDS.dimension}
            disabled={!canEdit}
            onCommit={(rise) => patch({ rise })}
          />
        }
      />
      <TowardField piece={piece} />
      <MoreFields>
        <div className={fieldClasses.row}>
          <AngleField
            label={say('workbench.field.angle')}
            fieldKey={`${piece.id}.angle`}
            value={piece.angle}
            max={BOUNDS.offsetAngleBelow}
            isBelow
            disabled={!canEdit}
            onCommit={(angle) => patch({ angle })}
          />
          <RadiusField piece={piece} />
          <MadeField piece={piece} />
        </div>
      </MoreFields>
    </>
  );
}
