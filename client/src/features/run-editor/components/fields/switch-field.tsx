import { useId } from 'react';
import classes from './fields.module.css';

interface Props {
  label: string;
  hint?: string;
  checked: boolean;
  disabled?: boolean;
  onChange: (checked: boolean) => void;
}

export function SwitchField({ label, hint, checked, disabled, onChange }: Props) {
  const id = useId();
  return (
    <label className={classes.switchRow} htmlFor={id}>
      <input
        id={id}
        type="checkbox"
        checked={checked}
        disabled={disabled}
        onChange={(event) => onChange(event.target.checked)}
      />
      <span>
        {label}
        {hint && <small>{hint}</small>}
      </span>
    </label>
  );
}
