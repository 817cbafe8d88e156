import { BOUNDS } from '@fairlead/shared';
import type { Cable, CableGroup } from '@fairlead/shared';
import { useWords } from '../../../../hooks/use-words';
import { LengthField } from '../fields/length-field';
import { NumberField } from '../fields/number-field';
import { TextField } from '../fields/text-field';
import type { Refusal } from '../hooks/use-edit';

interface Props {
  group: CableGroup;
  disabled: boolean;
  onCommit: (group: CableGroup) => Refusal;
}

/** Nothing that goes into a pipe is thinner or lighter, in and lb/ft. */
const LEAST = 0.001;

/** A cable that is in no table, with the figures of its maker. */
export function CableFields({ group, disabled, onCommit }: Props) {
  const { say } = useWords();
  const { cable, id } = group;
  const set = (change: Partial<Cable>): Refusal => {
    const fields = Object.entries({ ...cable, ...change }).filter(
      ([, value]) => value !== undefined,
    );
    return onCommit({ ...group, cable: Object.fromEntries(fields) as unknown as Cable });
  };
  const notGiven = say('workbench.field.notGiven');
  return (
    <>
      <TextField
        label={say('workbench.conductors.cableName')}
        fieldKey={`${id}.cableName`}
        value={cable.name}
        maxLength={BOUNDS.cableName}
        needed={say('workbench.conductors.cableNeedsName')}
        disabled={disabled}
        onCommit={(name) => set({ name })}
      />
      <LengthField
        label={say('workbench.conductors.od')}
        fieldKey={`${id}.od`}
        value={cable.od}
        max={BOUNDS.dimension}
        disabled={disabled}
        onCommit={(od) => set({ od: od ?? cable.od })}
      />
      <NumberField
        label={say('workbench.conductors.weight')}
        fieldKey={`${id}.weight`}
        value={cable.weight}
        unit={say('workbench.number.unitWeight')}
        min={LEAST}
        max={BOUNDS.weight}
        disabled={disabled}
        onCommit={(weight) => set({ weight: weight ?? cable.weight })}
      />
      <NumberField
        label={say('workbench.conductors.maxTension')}
        fieldKey={`${id}.maxTension`}
        value={cable.maxTension}
        unit={say('workbench.number.unitForce')}
        min={LEAST}
        max={BOUNDS.force}
        disabled={disabled}
        onCommit={(force) => set({ maxTension: force ?? cable.maxTension })}
      />
      <NumberField
        label={say('workbench.conductors.cableConductors')}
        fieldKey={`${id}.cableConductors`}
        value={cable.conductors ?? null}
        unit=""
        min={1}
        max={BOUNDS.count}
        isWhole
        isOptional
        placeholder={notGiven}
        disabled={disabled}
        onCommit={(conductors) => set({ conductors: conductors ?? undefined })}
      />
      <NumberField
        label={say('workbench.conductors.maxSidewall')}
        fieldKey={`${id}.maxSidewall`}
        value={cable.maxSidewall ?? null}
        unit={say('workbench.number.unitWeight')}
        min={LEAST}
        max={BOUNDS.force}
        isOptional
        placeholder={notGiven}
        disabled={disabled}
        onCommit={(force) => set({ maxSidewall: force ?? undefined })}
      />
      <LengthField
        label={say('workbench.conductors.minBendRadius')}
        fieldKey={`${id}.minBendRadius`}
        value={cable.minBendRadius ?? null}
        max={BOUNDS.dimension}
        isOptional
        placeholder={notGiven}
        disabled={disabled}
        onCommit={(radius) => set({ minBendRadius: radius ?? undefined })}
      />
    </>
  );
}
