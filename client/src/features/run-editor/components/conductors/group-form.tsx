import { BOUNDS, CONDUCTOR_USES, PHASES, WIRE_COLOURS } from '@fairlead/shared';
import type { ConductorGroup } from '@fairlead/shared';
import { useWords } from '../../../../hooks/use-words';
import { useRunEditor } from '../../state/use-run-editor';
import fieldClasses from '../fields/fields.module.css';
import { NumberField } from '../fields/number-field';
import { SelectField } from '../fields/select-field';
import { useEdit } from '../hooks/use-edit';
import type { Refusal } from '../hooks/use-edit';
import { useLabelOf } from '../hooks/use-labels';
import { CableFields } from './cable-fields';
import { WireFields } from './wire-fields';

/** Every field of a group of conductors. */
export function GroupForm({ group }: { group: ConductorGroup }) {
  const { say } = useWords();
  const labelOf = useLabelOf();
  const path = useRunEditor((state) => state.document.path);
  const canEdit = useRunEditor((state) => state.canEdit);
  const edit = useEdit();
  const set = (next: ConductorGroup): Refusal =>
    edit([{ command: 'set-conductors', args: { group: next } }]);
  const places = path
    .filter(({ kind }) => kind === 'pull-point')
    .map(({ id }) => ({ value: id, label: labelOf(id) }));
  const whole = (label: string) => ({ value: '', label });
  return (
    <div className={fieldClasses.stack}>
      <div className={fieldClasses.row}>
        <NumberField
          label={say('workbench.conductors.count')}
          fieldKey={`${group.id}.count`}
          value={group.count}
          unit=""
          min={1}
          max={BOUNDS.count}
          isWhole
          disabled={!canEdit}
          onCommit={(count) => set({ ...group, count: count ?? 1 })}
        />
        {'cable' in group ? (
          <CableFields group={group} disabled={!canEdit} onCommit={set} />
        ) : (
          <WireFields group={group} disabled={!canEdit} onCommit={set} />
        )}
        <SelectField
          label={say('workbench.conductors.use')}
          value={group.use}
          options={CONDUCTOR_USES.map((value) => ({
            value,
            label: say(`workbench.conductors.uses.${value}`),
          }))}
          disabled={!canEdit}
          onChange={(use) => void set({ ...group, use })}
        />
        <SelectField
          label={say('workbench.conductors.colour')}
          value={group.colour ?? ''}
          options={[
            { value: '' as const, label: say('workbench.conductors.noColour') },
            ...WIRE_COLOURS.map((value) => ({
              value,
              label: say('workbench.conductors.colourNamed', {
                code: value,
                colour: say(`workbench.conductors.colours.${value}`),
              }),
            })),
          ]}
          disabled={!canEdit}
          onChange={(colour) => void set({ ...group, colour: colour === '' ? undefined : colour })}
        />
        <SelectField
          label={say('workbench.conductors.phase')}
          value={group.phase ?? ''}
          options={[
            { value: '' as const, label: say('workbench.conductors.noPhase') },
            ...PHASES.map((value) => ({ value, label: value })),
          ]}
          disabled={!canEdit}
          onChange={(phase) => void set({ ...group, phase: phase === '' ? undefined : phase })}
        />
      </div>
      <div className={fieldClasses.rowWide}>
        <SelectField
          label={say('workbench.conductors.from')}
          value={group.from ?? ''}
          options={[whole(say('workbench.conductors.wholeRun')), ...places]}
          disabled={!canEdit}
          onChange={(from) => void set({ ...group, from: from || undefined })}
        />
        <SelectField
          label={say('workbench.conductors.to')}
          value={group.to ?? ''}
          options={[whole(say('workbench.conductors.wholeRunEnd')), ...places]}
          disabled={!canEdit}
          onChange={(to) => void set({ ...group, to: to || undefined })}
        />
      </div>
    </div>
  );
}
