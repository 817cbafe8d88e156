import { BOUNDS, LIMITS } from '@fairlead/shared';
import type { PullPoint } from '@fairlead/shared';
import { useWords } from '../../../../hooks/use-words';
import { useRunEditor } from '../../state/use-run-editor';
import fieldClasses from '../fields/fields.module.css';
import { LengthField } from '../fields/length-field';
import { SwitchField } from '../fields/switch-field';
import { TextField } from '../fields/text-field';
import { usePatch } from '../hooks/use-patch';
import { BoxEntries } from './box-entries';
import { BoxSizeFields } from './box-size-fields';

/** Free conductor at a pull point where nothing is given, in. */
const MAKE_UP = '8″';

/** What the crew and the box check need of a pull point. */
export function PullPointMore({ piece }: { piece: PullPoint }) {
  const { say } = useWords();
  const canEdit = useRunEditor((state) => state.canEdit);
  const patch = usePatch(piece.id);
  return (
    <div className={fieldClasses.stack}>
      <div className={fieldClasses.rowWide}>
        <LengthField
          label={say('workbench.field.makeUp')}
          fieldKey={`${piece.id}.makeUp`}
          value={piece.makeUp ?? null}
          max={BOUNDS.dimension}
          allowZero
          isOptional
          placeholder={MAKE_UP}
          help={piece.makeUp === undefined ? say('workbench.field.assumed') : undefined}
          disabled={!canEdit}
          onCommit={(makeUp) => patch({ makeUp: makeUp ?? undefined })}
        />
        <TextField
          label={say('workbench.field.place')}
          fieldKey={`${piece.id}.place`}
          value={piece.place ?? ''}
          maxLength={LIMITS.label}
          disabled={!canEdit}
          onCommit={(place) => patch({ place: place === '' ? undefined : place })}
        />
      </div>
      <SwitchField
        label={say('workbench.field.reach')}
        checked={piece.reach !== false}
        disabled={!canEdit}
        onChange={(reach) => void patch({ reach: reach ? undefined : false })}
      />
      <BoxSizeFields piece={piece} />
      <BoxEntries piece={piece} />
    </div>
  );
}
