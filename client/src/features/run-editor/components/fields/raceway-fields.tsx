import {
  BOUNDS,
  RACEWAY_TYPES,
  TRADE_SIZES,
  formatLength,
  bendRadiusFor,
  tradeSizesOf,
} from '@fairlead/shared';
import type { Raceway, RacewayType, TradeSize } from '@fairlead/shared';
import { useState } from 'react';
import { useWords } from '../../../../hooks/use-words';
import type { Refusal } from '../hooks/use-edit';
import classes from './fields.module.css';
import { LengthField } from './length-field';
import { SelectField } from './select-field';

interface Props {
  fieldKey: string;
  raceway: Raceway;
  disabled?: boolean;
  onCommit: (raceway: Raceway) => Refusal;
}

/** The same size in another type, or the nearest the type has. */
function nearestSize(type: RacewayType, size: TradeSize): TradeSize {
  const sizes = tradeSizesOf(type);
  const wanted = TRADE_SIZES.indexOf(size);
  const nearest = [...sizes].sort(
    (a, b) => Math.abs(TRADE_SIZES.indexOf(a) - wanted) - Math.abs(TRADE_SIZES.indexOf(b) - wanted),
  )[0];
  return nearest ?? size;
}

/** Type, trade size and bend radius of a raceway; only sizes that are made can be chosen. */
export function RacewayFields({ fieldKey, raceway, disabled, onCommit }: Props) {
  const { say } = useWords();
  const [refusal, setRefusal] = useState<Refusal>(null);
  const { type, tradeSize, bendRadius } = raceway;
  const radius = bendRadiusFor(type, tradeSize);
  const placeholder = radius === null ? say('workbench.field.notGiven') : formatLength(radius);
  const isFromTable = typeof bendRadius !== 'number' && radius !== null;
  return (
    <div className={classes.row}>
      <SelectField
        label={say('workbench.field.racewayType')}
        value={type}
        options={RACEWAY_TYPES.map((value) => ({
          value,
          label: say(`workbench.raceway.type.${value}`),
        }))}
        help={refusal ?? undefined}
        isError={refusal !== null}
        disabled={disabled}
        onChange={(next) =>
          setRefusal(onCommit({ ...raceway, type: next, tradeSize: nearestSize(next, tradeSize) }))
        }
      />
      <SelectField
        label={say('workbench.field.tradeSize')}
        value={tradeSize}
        options={tradeSizesOf(type).map((value) => ({ value, label: value }))}
        disabled={disabled}
        onChange={(next) => setRefusal(onCommit({ ...raceway, tradeSize: next }))}
      />
      <LengthField
        label={say('workbench.field.radius')}
        fieldKey={`${fieldKey}.radius`}
        value={bendRadius ?? null}
        max={BOUNDS.dimension}
        isOptional
        placeholder={placeholder}
        help={isFromTable ? say('workbench.field.fromTable') : undefined}
        disabled={disabled}
        onCommit={(next) => onCommit({ ...raceway, bendRadius: next })}
      />
    </div>
  );
}
