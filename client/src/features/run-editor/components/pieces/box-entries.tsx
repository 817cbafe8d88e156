import { TRADE_SIZES, WALLS } from '@fairlead/shared';
import type { BoxEntry, PullPoint } from '@fairlead/shared';
import { useWords } from '../../../../hooks/use-words';
import { useRunEditor } from '../../state/use-run-editor';
import fieldClasses from '../fields/fields.module.css';
import { NumberField } from '../fields/number-field';
import { SelectField } from '../fields/select-field';
import { usePatch } from '../hooks/use-patch';

const MOST_ROWS = 100;

/** The raceways that enter a box: which wall, which row, which size. */
export function BoxEntries({ piece }: { piece: PullPoint }) {
  const { say } = useWords();
  const canEdit = useRunEditor((state) => state.canEdit);
  const tradeSize = useRunEditor((state) => state.document.raceway.tradeSize);
  const patch = usePatch(piece.id);
  const entries = piece.entries ?? [];
  const setEntries = (next: BoxEntry[]) => patch({ entries: next.length === 0 ? undefined : next });
  const setEntry = (place: number, change: Partial<BoxEntry>) =>
    setEntries(entries.map((entry, at) => (at === place ? { ...entry, ...change } : entry)));
  return (
    <div className={fieldClasses.stack}>
      <span className={fieldClasses.legend}>{say('workbench.field.entries')}</span>
      {entries.map((entry, place) => {
        const number = place + 1;
        return (
          <fieldset key={number} className={fieldClasses.fieldset}>
            <legend className={fieldClasses.legend}>
              {say('workbench.field.entry', { number })}
            </legend>
            <div className={fieldClasses.row}>
              <SelectField
                label={say('workbench.field.entryWall')}
                value={entry.wall}
                options={WALLS.map((value) => ({ value, label: say(`workbench.wall.${value}`) }))}
                disabled={!canEdit}
                onChange={(wall) => void setEntry(place, { wall })}
              />
              <NumberField
                label={say('workbench.field.entryRow')}
                fieldKey={`${piece.id}.entry.${place}.row`}
                value={entry.row}
                unit=""
                min={1}
                max={MOST_ROWS}
                isWhole
                disabled={!canEdit}
                onCommit={(row) => setEntry(place, { row: row ?? 1 })}
              />
              <SelectField
                label={say('workbench.field.entrySize')}
                value={entry.tradeSize}
                options={TRADE_SIZES.map((value) => ({ value, label: value }))}
                disabled={!canEdit}
                onChange={(size) => void setEntry(place, { tradeSize: size })}
              />
            </div>
            <button
              type="button"
              className={fieldClasses.textButton}
              disabled={!canEdit}
              onClick={() => void setEntries(entries.filter((_, at) => at !== place))}
            >
              {say('workbench.field.entryRemove', { number })}
            </button>
          </fieldset>
        );
      })}
      <button
        type="button"
        className={fieldClasses.textButton}
        disabled={!canEdit}
        onClick={() => void setEntries([...entries, { wall: 'left', row: 1, tradeSize }])}
      >
        {say('workbench.field.entryAdd')}
      </button>
    </div>
  );
}
