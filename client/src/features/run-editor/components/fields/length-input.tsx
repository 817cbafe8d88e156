import { useId } from 'react';
import type { Ref } from 'react';
import { useWords } from '../../../../hooks/use-words';
import { FieldFrame, helpId } from './field-frame';
import classes from './fields.module.css';
import { readLength, shownLength } from './length-reading';
import type { LengthFieldProps } from './length-reading';
import { useTypedField } from './use-typed-field';

interface Props extends LengthFieldProps {
  inputRef?: Ref<HTMLInputElement>;
  /** Our own keys type into it: the device's keyboard stays away. */
  isKeyed?: boolean;
}

/** A length as text, in every form a length is written; shown in the one form once it is left. */
export function LengthInput({ inputRef, isKeyed, ...props }: Props) {
  const { say } = useWords();
  const id = useId();
  const field = useTypedField({
    fieldKey: props.fieldKey,
    shown: shownLength(props),
    read: (typed) => readLength(typed, props, say),
    commit: props.onCommit,
  });
  const help = field.error ?? (field.isFocused ? say('workbench.length.bare') : props.help);
  const isRaw = field.text !== shownLength(props);
  return (
    <FieldFrame label={props.label} controlId={id} help={help} isError={field.error !== null}>
      <div className={props.measured ? classes.withMeasure : undefined}>
        <input
          ref={inputRef}
          id={id}
          className={classes.input}
          value={field.text}
          inputMode={isKeyed ? 'none' : 'text'}
          placeholder={props.placeholder}
          disabled={props.disabled}
          data-raw={isRaw || undefined}
          aria-invalid={field.error !== null}
          aria-describedby={helpId(id)}
          autoComplete="off"
          spellCheck={false}
          onChange={(event) => field.type(event.target.value)}
          onFocus={(event) => {
            field.onFocus();
            event.target.select();
          }}
          onBlur={field.onBlur}
          onKeyDown={field.onKeyDown}
        />
        {props.measured && <span className={classes.unit}>{props.measured}</span>}
      </div>
    </FieldFrame>
  );
}
