import { BOUNDS, FITTINGS } from '@fairlead/shared';
import type { Fitting } from '@fairlead/shared';
import { useWords } from '../../../../hooks/use-words';
import { useRunEditor } from '../../state/use-run-editor';
import { AngleField } from '../fields/angle-field';
import fieldClasses from '../fields/fields.module.css';
import { LegField } from '../fields/leg-field';
import { SelectField } from '../fields/select-field';
import { usePatch } from '../hooks/use-patch';

export function FittingFields({ piece }: { piece: Fitting }) {
  const { say } = useWords();
  const canEdit = useRunEditor((state) => state.canEdit);
  const patch = usePatch(piece.id);
  return (
    <>
      <LegField pieceId={piece.id} />
      <div className={fieldClasses.row}>
        <SelectField
          label={say('workbench.field.fitting')}
          value={piece.fitting}
          options={FITTINGS.map((value) => ({
            value,
            label: say(`workbench.piece.fitting.${value}`),
          }))}
          disabled={!canEdit}
          onChange={(fitting) => patch({ fitting })}
        />
        <AngleField
          label={say('workbench.field.fittingAngle')}
          fieldKey={`${piece.id}.angle`}
          value={piece.angle ?? null}
          max={BOUNDS.fittingAngle}
          isOptional
          placeholder={say('workbench.field.notGiven')}
          disabled={!canEdit}
          onCommit={(angle) => patch({ angle: angle ?? undefined })}
        />
      </div>
    </>
  );
}
