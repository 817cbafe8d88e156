import {
  INSULATIONS,
  MATERIALS,
  WIRE_SIZES,
  cable,
  conductorDimensions,
  numberGroups,
  wires,
} from '@fairlead/shared';
import type { ConductorGroup } from '@fairlead/shared';
import { useState } from 'react';
import { useWords } from '../../../../hooks/use-words';
import { useRunEditor } from '../../state/use-run-editor';
import { SelectField } from '../fields/select-field';
import { useEdit } from '../hooks/use-edit';
import { listedWire } from '../model/listed-wire';
import { QUICK_SETS, quickWires } from '../model/quick-wires';
import type { QuickWire } from '../model/quick-wires';
import classes from './conductors.module.css';

/** A whole circuit of one size in one tap. */
export function QuickAdd({ onAdded }: { onAdded: (groupId: string) => void }) {
  const { say } = useWords();
  const document = useRunEditor((state) => state.document);
  const edit = useEdit();
  const [wire, setWire] = useState<QuickWire>({ size: '12', insulation: 'THHN', material: 'Cu' });
  const [refusal, setRefusal] = useState<string | null>(null);
  const change = (part: Partial<QuickWire>) => {
    const { size, insulation, material } = listedWire(wires(wire), part);
    setWire({ size, insulation, material });
  };
  const sizes = WIRE_SIZES.filter((size) => conductorDimensions(wires({ ...wire, size })) !== null);
  const addGroup = (group: ConductorGroup) => {
    const [named] = numberGroups(document, [group]);
    if (!named) return;
    const refused = edit([{ command: 'add-conductors', args: { group: named } }]);
    setRefusal(refused);
    if (refused === null) onAdded(named.id);
  };
  return (
    <section className={classes.card} aria-labelledby="quick-title">
      <h2 id="quick-title" className={classes.title}>
        {say('workbench.conductors.add')}
      </h2>
      <div className={classes.quick}>
        <SelectField
          label={say('workbench.conductors.quickSize')}
          value={wire.size}
          options={sizes.map((value) => ({ value, label: value }))}
          onChange={(size) => change({ size })}
        />
        <SelectField
          label={say('workbench.conductors.quickInsulation')}
          value={wire.insulation}
          options={INSULATIONS.map((value) => ({
            value,
            label: say(`workbench.conductors.insulations.${value}`),
          }))}
          onChange={(insulation) => change({ insulation })}
        />
        <SelectField
          label={say('workbench.conductors.quickMaterial')}
          value={wire.material}
          options={MATERIALS.map((value) => ({
            value,
            label: say(`workbench.conductors.materials.${value}`),
          }))}
          onChange={(material) => change({ material })}
        />
      </div>
      <div className={classes.quickKeys}>
        {QUICK_SETS.map((set) => (
          <button
            type="button"
            key={set.key}
            className={classes.quickKey}
            onClick={() => setRefusal(edit(quickWires(document, set, wire)))}
          >
            {say(`workbench.conductors.quick.${set.key}`)}
          </button>
        ))}
        <button
          type="button"
          className={classes.quickKey}
          onClick={() => addGroup(listedWire(wires({ ...wire, count: 1 }), {}))}
        >
          {say('workbench.conductors.quickOne', { size: wire.size })}
        </button>
        <button
          type="button"
          className={classes.quickKey}
          onClick={() => addGroup(cable({ cable: { name: say('workbench.conductors.cable') } }))}
        >
          {say('workbench.conductors.addCable')}
        </button>
      </div>
      {refusal && (
        <p className={classes.quiet} role="alert">
          {refusal}
        </p>
      )}
    </section>
  );
}
