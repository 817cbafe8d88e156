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
  value: string;
  maxLength: number;
  /** Said when it is left empty; without it an empty text is a value. */
  needed?: string;
  help?: string;
  disabled?: boolean;
  onCommit: (value: string) => Refusal;
}

export function TextField(props: Props) {
  const { label, fieldKey, value, maxLength, needed, help, disabled, onCommit } = props;
  const { say } = useWords();
  const id = useId();
  const read = (typed: string): Read<string> => {
    const text = typed.trim();
    if (text === '' && needed) return { ok: false, message: needed };
    if (text.length > maxLength) {
      return { ok: false, message: say('workbench.text.long', { max: maxLength }) };
    }
    return { ok: true, value: text };
  };
  const field = useTypedField({ fieldKey, shown: value, read, commit: onCommit });
  return (
    <FieldFrame
      label={label}
      controlId={id}
      help={field.error ?? help}
      isError={field.error !== null}
    >
      <input
        id={id}
        className={classes.input}
        value={field.text}
        disabled={disabled}
        aria-invalid={field.error !== null}
        aria-describedby={helpId(id)}
        autoComplete="off"
        onChange={(event) => field.type(event.target.value)}
        onFocus={field.onFocus}
        onBlur={field.onBlur}
        onKeyDown={field.onKeyDown}
      />
    </FieldFrame>
  );
}
