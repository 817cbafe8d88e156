import { BOUNDS } from '@fairlead/shared';
import type { Flex } from '@fairlead/shared';
import { useWords } from '../../../../hooks/use-words';
import { useRunEditor } from '../../state/use-run-editor';
import { AngleField } from '../fields/angle-field';
import fieldClasses from '../fields/fields.module.css';
import { LegField } from '../fields/leg-field';
import { LengthField } from '../fields/length-field';
import { RacewayFields } from '../fields/raceway-fields';
import { usePatch } from '../hooks/use-patch';
import { AngleChoiceRow } from './angle-choice';
import type { PieceProps } from './piece-fields';

/** Planned total where nothing is given. */
const PLANNED = '90°';

export function FlexFields({ piece, sectionId }: PieceProps<Flex>) {
  const { say } = useWords();
  const canEdit = useRunEditor((state) => state.canEdit);
  const patch = usePatch(piece.id);
  return (
    <>
      <AngleChoiceRow piece={piece} sectionId={sectionId} />
      <LegField pieceId={piece.id} />
      <div className={fieldClasses.row}>
        <LengthField
          label={say('workbench.field.length')}
          fieldKey={`${piece.id}.length`}
          value={piece.length}
          max={BOUNDS.length}
          disabled={!canEdit}
          onCommit={(length) => patch({ length })}
        />
        <AngleField
          label={say('workbench.field.degrees')}
          fieldKey={`${piece.id}.degrees`}
          value={piece.degrees ?? null}
          max={BOUNDS.flexDegrees}
          allowZero
          isOptional
          placeholder={PLANNED}
          help={piece.degrees === undefined ? say('workbench.field.assumed') : undefined}
          disabled={!canEdit}
          onCommit={(degrees) => patch({ degrees: degrees ?? undefined })}
        />
      </div>
      <RacewayFields
        fieldKey={`${piece.id}.raceway`}
        raceway={piece.raceway}
        disabled={!canEdit}
        onCommit={(raceway) => patch({ raceway })}
      />
    </>
  );
}
