import { BOUNDS } from '@fairlead/shared';
import type { Bend } from '@fairlead/shared';
import { useWords } from '../../../../hooks/use-words';
import { useRunEditor } from '../../state/use-run-editor';
import { AngleField } from '../fields/angle-field';
import fieldClasses from '../fields/fields.module.css';
import { LegField } from '../fields/leg-field';
import { SwitchField } from '../fields/switch-field';
import { TextField } from '../fields/text-field';
import { usePatch } from '../hooks/use-patch';
import { AngleChoiceRow } from './angle-choice';
import { MadeField } from './made-field';
import { MoreFields } from './more-fields';
import type { PieceProps } from './piece-fields';
import { RadiusField } from './radius-field';
import { TowardField } from './toward-field';

export function BendFields({ piece, sectionId }: PieceProps<Bend>) {
  const { say } = useWords();
  const canEdit = useRunEditor((state) => state.canEdit);
  const patch = usePatch(piece.id);
  const counts = piece.counts !== false;
  return (
    <>
      <AngleChoiceRow piece={piece} sectionId={sectionId} />
      <LegField pieceId={piece.id} />
      <TowardField piece={piece} />
      <MoreFields>
        <div className={fieldClasses.row}>
          <AngleField
            label={say('workbench.field.angle')}
            fieldKey={`${piece.id}.angle`}
            value={piece.angle}
            max={BOUNDS.bendAngle}
            disabled={!canEdit}
            onCommit={(angle) => patch({ angle })}
          />
          <RadiusField piece={piece} />
          <MadeField piece={piece} />
        </div>
        <SwitchField
          label={say('workbench.field.counts')}
          checked={counts}
          disabled={!canEdit}
          onChange={(next) =>
            patch(next ? { counts: undefined, why: undefined } : { counts: false })
          }
        />
        {!counts && (
          <TextField
            label={say('workbench.field.why')}
            fieldKey={`${piece.id}.why`}
            value={piece.why ?? ''}
            maxLength={BOUNDS.why}
            disabled={!canEdit}
            onCommit={(why) => patch({ why: why === '' ? undefined : why })}
          />
        )}
      </MoreFields>
    </>
  );
}
