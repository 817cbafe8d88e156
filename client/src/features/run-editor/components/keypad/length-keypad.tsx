import { IconBackspace } from '@tabler/icons-react';
import { useContext, useEffect, useRef } from 'react';
import { useWords } from '../../../../hooks/use-words';
import { LengthInput } from '../fields/length-input';
import { typeInto } from './type-into';
import { KeypadContext } from './keypad-context';
import classes from './keypad.module.css';

const DIGITS = ['7', '8', '9', '4', '5', '6', '1', '2', '3'] as const;
const EIGHTHS = ['1⁄8', '1⁄4', '3⁄8', '1⁄2', '5⁄8', '3⁄4', '7⁄8'] as const;

/** One field and the keys a length is made of; the drawing above stays in sight. */
export function LengthKeypad() {
  const { say } = useWords();
  const keypad = useContext(KeypadContext);
  const input = useRef<HTMLInputElement>(null);
  const activeKey = keypad?.activeKey ?? null;
  useEffect(() => input.current?.focus(), [activeKey]);
  const field = activeKey === null ? null : keypad?.fieldOf(activeKey);
  if (!keypad || !field) return null;

  const type = (text: string | null) => input.current && typeInto(input.current, text);
  // Held back on the way down, so that the field keeps its caret while a key is pressed.
  const keepCaret = (event: { preventDefault: () => void }) => event.preventDefault();
  const key = (label: string, text: string, name?: string) => (
    <button
      key={label}
      type="button"
      className={classes.key}
      aria-label={name}
      onPointerDown={keepCaret}
      onMouseDown={keepCaret}
      onClick={() => type(text)}
    >
      {label}
    </button>
  );
  const leave = (act: () => void) => () => {
    input.current?.blur();
    act();
  };

  return (
    <section
      className={classes.keypad}
      aria-label={say('workbench.keypad.title')}
      onKeyDown={(event) => {
        if (event.key === 'Enter') leave(keypad.next)();
        if (event.key === 'Escape') {
          event.stopPropagation();
          leave(keypad.close)();
        }
      }}
    >
      <div className={classes.fieldRow}>
        <LengthInput key={field.fieldKey} {...field} inputRef={input} isKeyed />
      </div>
      <div className={classes.eighths} role="group" aria-label={say('workbench.keypad.eighths')}>
        {EIGHTHS.map((value) => key(value, ` ${value}`, say('workbench.keypad.eighth', { value })))}
      </div>
      <div className={classes.keys}>
        {DIGITS.slice(0, 3).map((digit) => key(digit, digit))}
        {key('′', '′ ', say('workbench.keypad.feet'))}
        {DIGITS.slice(3, 6).map((digit) => key(digit, digit))}
        {key('″', '″', say('workbench.keypad.inches'))}
        {DIGITS.slice(6).map((digit) => key(digit, digit))}
        {key('⁄', '⁄', say('workbench.keypad.slash'))}
        {key('.', '.', say('workbench.keypad.point'))}
        {key('0', '0')}
        {key('␣', ' ', say('workbench.keypad.space'))}
        <button
          type="button"
          className={classes.key}
          aria-label={say('workbench.keypad.erase')}
          onPointerDown={keepCaret}
          onMouseDown={keepCaret}
          onClick={() => type(null)}
        >
          <IconBackspace aria-hidden />
        </button>
      </div>
      <div className={classes.acts}>
        <button type="button" className={classes.act} onClick={leave(keypad.next)}>
          {say('workbench.keypad.next')}
        </button>
        <button type="button" className={classes.done} onClick={leave(keypad.close)}>
          {say('workbench.keypad.done')}
        </button>
      </div>
    </section>
  );
}
