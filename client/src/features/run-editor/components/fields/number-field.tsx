import { useId } from 'react';
import { useWords } from '../../../../hooks/use-words';
import type { Refusal } from '../hooks/use-edit';
import { FieldFrame, helpId } from './field-frame';
import classes from './fields.module.css';
import { useTypedField } from './use-typed-field';
import type { Read } from './use-typed-field';

interface Props {
  label: string;
  fieldKey: string;
  value: number | null;
  unit: string;
  min: number;
  max: number;
  isWhole?: boolean;
  /** An empty field means "not given". */
  isOptional?: boolean;
  placeholder?: string;
  help?: string;
  disabled?: boolean;
  onCommit: (value: number | null) => Refusal;
}

/** A plain number with its unit inside the field. */
export function NumberField(props: Props) {
  const { label, fieldKey, value, unit, min, max, isWhole, isOptional, help } = props;
  const { say } = useWords();
  const id = useId();
  const read = (typed: string): Read<number | null> => {
    const text = typed.trim().replace(',', '.');
    if (text === '' && isOptional) return { ok: true, value: null };
    const given = text === '' ? NaN : Number(text);
    if (!Number.isFinite(given)) {
      const example = isWhole ? String(Math.max(min, 3)) : '2.5';
      return { ok: false, message: say('workbench.number.problem', { example }) };
    }
    if (given < min || given > max || (isWhole && !Number.isInteger(given))) {
      const key = isWhole ? 'workbench.number.whole' : 'workbench.number.range';
      return { ok: false, message: say(key, { min, max }) };
    }
    return { ok: true, value: given };
  };
  const shown = value === null ? '' : String(value);
  const field = useTypedField({ fieldKey, shown, read, commit: props.onCommit });
  return (
    <FieldFrame
      label={label}
      controlId={id}
      help={field.error ?? help}
      isError={field.error !== null}
    >
      <div className={classes.withUnit}>
        <input
          id={id}
          className={classes.input}
          value={field.text}
          inputMode={isWhole ? 'numeric' : 'decimal'}
          placeholder={props.placeholder}
          disabled={props.disabled}
          aria-invalid={field.error !== null}
          aria-describedby={helpId(id)}
          autoComplete="off"
          onChange={(event) => field.type(event.target.value)}
          onFocus={field.onFocus}
          onBlur={field.onBlur}
          onKeyDown={field.onKeyDown}
        />
        <span className={classes.unit}>{unit}</span>
      </div>
    </FieldFrame>
  );
}
