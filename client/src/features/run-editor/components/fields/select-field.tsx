import { useId } from 'react';
import { FieldFrame, helpId } from './field-frame';
import classes from './fields.module.css';

interface Props<T extends string> {
  label: string;
  value: T;
  options: readonly { value: T; label: string }[];
  help?: string;
  isError?: boolean;
  disabled?: boolean;
  onChange: (value: T) => void;
}

export function SelectField<T extends string>(props: Props<T>) {
  const { label, value, options, help, isError, disabled, onChange } = props;
  const id = useId();
  return (
    <FieldFrame label={label} controlId={id} help={help} isError={isError} isPicked>
      <select
        id={id}
        className={classes.select}
        value={value}
        disabled={disabled}
        aria-describedby={help ? helpId(id) : undefined}
        onChange={(event) => {
          const chosen = options.find((option) => option.value === event.target.value);
          if (chosen) onChange(chosen.value);
        }}
      >
        {options.map((option) => (
          <option key={option.value} value={option.value}>
            {option.label}
          </option>
        ))}
      </select>
    </FieldFrame>
  );
}
