import { useContext, useEffect, useId } from 'react';
import { useWords } from '../../../../hooks/use-words';
import { useRunEditor } from '../../state/use-run-editor';
import { KeypadContext } from '../keypad/keypad-context';
import { FieldFrame, helpId } from './field-frame';
import classes from './fields.module.css';
import { LengthInput } from './length-input';
import { readLength, shownLength } from './length-reading';
import type { LengthFieldProps } from './length-reading';

/** A length: a text field at a desk; where fingers type, a button that opens the length keys. */
export function LengthField(props: LengthFieldProps) {
  const keypad = useContext(KeypadContext);
  return keypad && !props.disabled ? <KeyedLength {...props} /> : <LengthInput {...props} />;
}

function KeyedLength(props: LengthFieldProps) {
  const { say } = useWords();
  const keypad = useContext(KeypadContext);
  const id = useId();
  const draft = useRunEditor((state) => state.drafts[props.fieldKey]);
  useEffect(() => keypad?.register(props));
  useEffect(() => () => keypad?.forget(props.fieldKey), [keypad, props.fieldKey]);

  const answer = draft === undefined ? null : readLength(draft, props, say);
  const problem = answer && !answer.ok ? answer.message : null;
  const shown = draft ?? shownLength(props);
  const measured = props.measured && shown ? ` ${props.measured}` : '';
  return (
    <FieldFrame
      label={props.label}
      controlId={id}
      help={problem ?? props.help}
      isError={problem !== null}
    >
      <button
        id={id}
        type="button"
        className={classes.control}
        data-length-field={props.fieldKey}
        data-invalid={problem !== null || undefined}
        aria-describedby={helpId(id)}
        onClick={() => keypad?.open(props.fieldKey)}
      >
        {shown || <span className={classes.placeholder}>{props.placeholder}</span>}
        <span className={classes.measured}>{measured}</span>
      </button>
    </FieldFrame>
  );
}
