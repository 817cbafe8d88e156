import { formatAngle } from '@fairlead/shared';
import { useId } from 'react';
import { useWords } from '../../../../hooks/use-words';
import type { Refusal } from '../hooks/use-edit';
import { parseAngle } from '../model/parse-angle';
import { FieldFrame, helpId } from './field-frame';
import classes from './fields.module.css';
import { useTypedField } from './use-typed-field';
import type { Read } from './use-typed-field';

interface Props {
  label: string;
  fieldKey: string;
  value: number | null;
  /** 0 is refused unless allowed. */
  allowZero?: boolean;
  allowNegative?: boolean;
  max: number;
  /** Refuses `max` itself. */
  isBelow?: boolean;
  isOptional?: boolean;
  placeholder?: string;
  /** Said under the field while it is not being typed in. */
  help?: string;
  disabled?: boolean;
  onCommit: (value: number | null) => Refusal;
}

export function AngleField(props: Props) {
  const { label, fieldKey, value, max, isOptional } = props;
  const { say } = useWords();
  const id = useId();
  const read = (typed: string): Read<number | null> => {
    if (typed.trim() === '' && isOptional) return { ok: true, value: null };
    const angle = parseAngle(typed);
    if (angle === null) return { ok: false, message: say('workbench.angle.problem.unreadable') };
    const least = props.allowNegative ? -max : 0;
    const isIn =
      (angle > least || ((props.allowZero || props.allowNegative) && angle === least)) &&
      (props.isBelow ? angle < max : angle <= max);
    if (isIn) return { ok: true, value: angle };
    const kind =
      props.allowZero || props.allowNegative ? 'zero' : props.isBelow ? 'below' : 'range';
    const message = say(`workbench.angle.problem.${kind}`, {
      min: formatAngle(least),
      max: formatAngle(max),
    });
    return { ok: false, message };
  };
  const shown = value === null ? '' : formatAngle(value);
  const field = useTypedField({ fieldKey, shown, read, commit: props.onCommit });
  const help = field.error ?? (field.isFocused ? say('workbench.angle.bare') : props.help);
  return (
    <FieldFrame label={label} controlId={id} help={help} isError={field.error !== null}>
      <input
        id={id}
        className={classes.input}
        value={field.text}
        inputMode="decimal"
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
    </FieldFrame>
  );
}
