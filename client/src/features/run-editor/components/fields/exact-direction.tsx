import { COMPASS, directionVector, vectorDirection } from '@fairlead/shared';
import type { Direction, Vector } from '@fairlead/shared';
import { useWords } from '../../../../hooks/use-words';
import type { Refusal } from '../hooks/use-edit';
import { anglesOf, isAlongPipe } from '../model/pad-directions';
import { AngleField } from './angle-field';
import classes from './fields.module.css';

interface Props {
  fieldKey: string;
  value: Direction | undefined;
  heading: Vector | null;
  onCommit: (direction: Direction) => Refusal;
}

/** Any direction at all: by the compass, or in degrees from north clockwise and above level. */
export function ExactDirection({ fieldKey, value, heading, onCommit }: Props) {
  const { say } = useWords();
  const { azimuth, elevation } = anglesOf(value ?? 'east');
  const isAlong = COMPASS.some((way) => isAlongPipe(heading, way));
  const commit = (next: { azimuth: number; elevation: number }): Refusal => {
    if (isAlongPipe(heading, next)) return say('workbench.direction.parallel');
    return onCommit(vectorDirection(directionVector(next)) ?? next);
  };
  return (
    <div className={classes.stack}>
      <div className={classes.padKeys}>
        {COMPASS.map((way) => (
          <button
            key={way}
            type="button"
            className={classes.choice}
            aria-pressed={value === way}
            disabled={isAlongPipe(heading, way)}
            onClick={() => onCommit(way)}
          >
            {say(`workbench.direction.${way}`)}
          </button>
        ))}
      </div>
      {isAlong && <p className={classes.help}>{say('workbench.direction.struck')}</p>}
      <div className={classes.row}>
        <AngleField
          label={say('workbench.direction.azimuth')}
          fieldKey={`${fieldKey}.azimuth`}
          value={azimuth}
          max={360}
          allowZero
          isBelow
          onCommit={(angle) => commit({ azimuth: angle ?? 0, elevation })}
        />
        <AngleField
          label={say('workbench.direction.elevation')}
          fieldKey={`${fieldKey}.elevation`}
          value={elevation}
          max={90}
          allowNegative
          onCommit={(angle) => commit({ azimuth, elevation: angle ?? 0 })}
        />
      </div>
    </div>
  );
}
