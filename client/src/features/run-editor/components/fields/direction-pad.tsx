import { vectorDirection } from '@fairlead/shared';
import type { Direction, Vector } from '@fairlead/shared';
import { useId, useState } from 'react';
import { useWords } from '../../../../hooks/use-words';
import type { Refusal } from '../hooks/use-edit';
import { isAlongPipe, padWays } from '../model/pad-directions';
import { wordDirection } from '../model/word-direction';
import { ExactDirection } from './exact-direction';
import { helpId } from './field-frame';
import classes from './fields.module.css';

interface Props {
  label: string;
  fieldKey: string;
  /** The way the pipe runs where the piece begins; null where it is not known. */
  heading: Vector | null;
  value: Direction | undefined;
  isOptional?: boolean;
  disabled?: boolean;
  onCommit: (direction: Direction | undefined) => Refusal;
}

/** Which way a piece goes: seen along the pipe from the start, on a riser by the plan; the compass stands second. */
export function DirectionPad(props: Props) {
  const { label, heading, value, disabled } = props;
  const { say } = useWords();
  const id = useId();
  const [refusal, setRefusal] = useState<Refusal>(null);
  const ways = padWays(heading, value);
  const isOther = value !== undefined && !ways.some(({ isChosen }) => isChosen);
  const [isOpen, setOpen] = useState(false);
  const isPlan = ways.some(({ key }) => key === 'north');
  const caption = heading === null ? 'padUnknown' : isPlan ? 'padRiser' : 'pad';
  const choose = (direction: Direction | undefined) => setRefusal(props.onCommit(direction));
  const isAlong = value !== undefined && isAlongPipe(heading, value);
  return (
    <fieldset className={classes.fieldset} aria-describedby={helpId(id)}>
      <legend className={classes.legend}>{say(`workbench.direction.${caption}`, { label })}</legend>
      <div className={classes.padKeys}>
        {ways.map((way) => (
          <button
            key={way.key}
            type="button"
            className={classes.choice}
            aria-pressed={way.isChosen}
            disabled={disabled}
            onClick={() => choose(way.direction)}
          >
            <b>{say(`workbench.direction.${way.key}`)}</b>
            {!isPlan && way.key !== 'up' && way.key !== 'down' && (
              <small>{wordDirection(way.direction, say)}</small>
            )}
          </button>
        ))}
        <button
          type="button"
          className={`${classes.choice} ${classes.wide}`}
          aria-pressed={isOther}
          aria-expanded={isOpen}
          disabled={disabled}
          onClick={() => setOpen(!isOpen)}
        >
          <b>{say('workbench.direction.other')}</b>
          {isOther && value !== undefined && <small>{wordDirection(value, say)}</small>}
        </button>
        {props.isOptional && (
          <button
            type="button"
            className={`${classes.choice} ${classes.wide}`}
            aria-pressed={value === undefined}
            disabled={disabled}
            onClick={() => choose(undefined)}
          >
            <b>{say('workbench.direction.none')}</b>
          </button>
        )}
      </div>
      {isOpen && (
        <ExactDirection
          fieldKey={props.fieldKey}
          value={value ?? (heading ? (vectorDirection(heading) ?? undefined) : undefined)}
          heading={heading}
          onCommit={props.onCommit}
        />
      )}
      <p
        id={helpId(id)}
        className={classes.help}
        data-error={refusal !== null || isAlong || undefined}
      >
        {refusal ?? (isAlong && say('workbench.direction.parallel'))}
      </p>
    </fieldset>
  );
}
