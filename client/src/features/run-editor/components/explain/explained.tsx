import { Popover } from '@mantine/core';
import type { Explanation, WordKey } from '@fairlead/shared';
import type { ReactNode } from 'react';
import { useEffect, useState } from 'react';
import { useWords } from '../../../../hooks/use-words';
import classes from './explain.module.css';

interface Props {
  /** What stands in the page. */
  children: ReactNode;
  /** The figure as read aloud. */
  name: string;
  /** Worked out only when it is opened; null: nothing to open. */
  explain: () => Explanation | null;
}

/** A computed figure: it opens to its formula with the numbers in it, what went in, and where that comes from. */
export function Explained({ children, name, explain }: Props) {
  const { say } = useWords();
  const [opened, setOpened] = useState<Explanation | null>(null);
  const isOpen = opened !== null;
  // Wherever the focus is by then, Esc closes this and nothing under it.
  useEffect(() => {
    if (!isOpen) return undefined;
    const close = (event: KeyboardEvent) => {
      if (event.key !== 'Escape') return;
      event.stopPropagation();
      setOpened(null);
    };
    window.addEventListener('keydown', close, { capture: true });
    return () => window.removeEventListener('keydown', close, { capture: true });
  }, [isOpen]);
  return (
    <Popover
      opened={isOpen}
      onChange={(stays) => !stays && setOpened(null)}
      position="bottom-start"
      shadow="none"
      closeOnEscape={false}
      trapFocus
      returnFocus
    >
      <Popover.Target>
        <button
          type="button"
          className={classes.figure}
          aria-label={say('explain.open', { figure: name })}
          onClick={() => setOpened(opened === null ? explain() : null)}
        >
          {children}
        </button>
      </Popover.Target>
      <Popover.Dropdown className={classes.panel} data-explanation={opened?.title}>
        {opened && <ExplanationText explanation={opened} />}
      </Popover.Dropdown>
    </Popover>
  );
}

function ExplanationText({ explanation }: { explanation: Explanation }) {
  const { say } = useWords();
  const { title, exact, shownTo, formula, worked, inputs } = explanation;
  return (
    <div tabIndex={-1} data-autofocus>
      <h3 className={classes.title}>{say(`explain.title.${title}` as WordKey)}</h3>
      <p className={classes.exact}>
        {shownTo === null
          ? say('explain.exact', { value: exact })
          : say('explain.exactShown', { value: exact, step: shownTo })}
      </p>
      {formula !== '' && (
        <>
          <h4 className={classes.part}>{say('explain.formula')}</h4>
          <p className={classes.math}>{formula}</p>
        </>
      )}
      {worked.length > 0 && (
        <>
          <h4 className={classes.part}>{say('explain.worked')}</h4>
          <ol className={classes.steps}>
            {worked.map((line, index) => (
              <li key={index}>{line}</li>
            ))}
          </ol>
        </>
      )}
      {inputs.length > 0 && (
        <>
          <h4 className={classes.part}>{say('explain.inputs')}</h4>
          <dl className={classes.inputs}>
            {inputs.map(({ what, value, source }, index) => (
              <div key={index}>
                <dt>{say(`explain.input.${what}` as WordKey)}</dt>
                <dd>
                  {value && <b>{value}</b>} <span>{source}</span>
                </dd>
              </div>
            ))}
          </dl>
        </>
      )}
    </div>
  );
}
