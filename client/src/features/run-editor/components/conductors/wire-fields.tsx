import {
  INSULATIONS,
  MATERIALS,
  STRANDINGS,
  WIRE_SIZES,
  conductorDimensions,
} from '@fairlead/shared';
import type { WireGroup } from '@fairlead/shared';
import { useState } from 'react';
import { useWords } from '../../../../hooks/use-words';
import { SelectField } from '../fields/select-field';
import type { Refusal } from '../hooks/use-edit';
import { listedWire } from '../model/listed-wire';

interface Props {
  group: WireGroup;
  disabled: boolean;
  onCommit: (group: WireGroup) => Refusal;
}

/** A wire of the tables: only what the tables list can be chosen. */
export function WireFields({ group, disabled, onCommit }: Props) {
  const { say } = useWords();
  const [refusal, setRefusal] = useState<Refusal>(null);
  const set = (change: Partial<WireGroup>) => setRefusal(onCommit(listedWire(group, change)));
  const sizes = WIRE_SIZES.filter((size) => conductorDimensions({ ...group, size }) !== null);
  return (
    <>
      <SelectField
        label={say('workbench.conductors.size')}
        value={group.size}
        options={sizes.map((value) => ({ value, label: value }))}
        help={refusal ?? undefined}
        isError={refusal !== null}
        disabled={disabled}
        onChange={(size) => set({ size })}
      />
      <SelectField
        label={say('workbench.conductors.insulation')}
        value={group.insulation}
        options={INSULATIONS.map((value) => ({
          value,
          label: say(`workbench.conductors.insulations.${value}`),
        }))}
        disabled={disabled}
        onChange={(insulation) => set({ insulation })}
      />
      <SelectField
        label={say('workbench.conductors.material')}
        value={group.material}
        options={MATERIALS.map((value) => ({
          value,
          label: say(`workbench.conductors.materials.${value}`),
        }))}
        disabled={disabled}
        onChange={(material) => set({ material })}
      />
      <SelectField
        label={say('workbench.conductors.stranding')}
        value={group.stranding}
        options={STRANDINGS.map((value) => ({
          value,
          label: say(`workbench.conductors.strandings.${value}`),
        }))}
        disabled={disabled}
        onChange={(stranding) => set({ stranding })}
      />
    </>
  );
}
