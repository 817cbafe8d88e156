import { useId } from 'react';
import { useWords } from '../../../../hooks/use-words';
import { FieldFrame } from '../fields/field-frame';
import fieldClasses from '../fields/fields.module.css';
import { SelectField } from '../fields/select-field';
import type { WhatIf } from './what-if-card';
import classes from './pull.module.css';

const NUMBERS = ['friction', 'feedTension', 'puller'] as const;
const ATTACHMENTS = ['tied-head', 'basket-grip', 'eye'] as const;

/** What is tried is reckoned with as it is typed; nothing of it is stored. */
export function WhatIfFields({ tried, onTry }: { tried: WhatIf; onTry: (next: WhatIf) => void }) {
  const { say } = useWords();
  return (
    <div className={classes.fields}>
      {NUMBERS.map((name) => (
        <TriedNumber
          key={name}
          label={say(`workbench.pull.tried.${name}`)}
          unit={say(name === 'friction' ? 'workbench.pull.noUnit' : 'workbench.pull.pounds')}
          value={tried[name]}
          onChange={(value) => onTry({ ...tried, [name]: value })}
        />
      ))}
      <SelectField
        label={say('workbench.pull.tried.attachment')}
        value={tried.attachment ?? ''}
        options={[
          { value: '' as const, label: say('workbench.pull.triedNothing') },
          ...ATTACHMENTS.map((value) => ({
            value,
            label: say(`workbench.pull.attachment.${value}`),
          })),
        ]}
        onChange={(value) => onTry({ ...tried, attachment: value === '' ? null : value })}
      />
    </div>
  );
}

function TriedNumber({
  label,
  unit,
  value,
  onChange,
}: {
  label: string;
  unit: string;
  value: number | null;
  onChange: (value: number | null) => void;
}) {
  const id = useId();
  return (
    <FieldFrame label={label} controlId={id}>
      <div className={fieldClasses.withUnit}>
        <input
          id={id}
          className={fieldClasses.input}
          type="number"
          inputMode="decimal"
          min={0}
          step="any"
          value={value ?? ''}
          autoComplete="off"
          onChange={({ target }) => {
            const given = target.valueAsNumber;
            onChange(Number.isFinite(given) && given >= 0 ? given : null);
          }}
        />
        <span className={fieldClasses.unit}>{unit}</span>
      </div>
    </FieldFrame>
  );
}
