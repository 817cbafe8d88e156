import {
  BOUNDS,
  CommandError,
  fromCorner,
  LEG_MEASURES,
  legBefore,
  legEndsBefore,
  legMeasureDifference,
  setLegBefore,
  toCorner,
} from '@fairlead/shared';
import type { ReactNode } from 'react';
import { useWords } from '../../../../hooks/use-words';
import { useRunEditor } from '../../state/use-run-editor';
import { useEdit } from '../hooks/use-edit';
import { chooseLegMeasure, useLegMeasure } from '../hooks/use-leg-measure';
import classes from './fields.module.css';
import { LengthField } from './length-field';

interface Props {
  pieceId: string;
  /** A short field that stands before it in one row. */
  beside?: ReactNode;
}

/** The leg that leads to a piece, measured the way the person measures; the run keeps it to the corner. */
export function LegField({ pieceId, beside }: Props) {
  const { say } = useWords();
  const document = useRunEditor((state) => state.document);
  const expanded = useRunEditor((state) => state.expanded);
  const canEdit = useRunEditor((state) => state.canEdit);
  const clearDraft = useRunEditor((state) => state.clearDraft);
  const edit = useEdit();
  const chosen = useLegMeasure((state) => state.measure);
  const ends = legEndsBefore(expanded, pieceId);
  const isKnown = (measure: typeof chosen) => legMeasureDifference(measure, ends) !== null;
  const measure = isKnown(chosen) ? chosen : 'corner';
  const fieldKey = `${pieceId}.leg`;

  const commit = (inches: number | null) => {
    try {
      return edit(setLegBefore(document, pieceId, inches));
    } catch (error) {
      if (error instanceof CommandError) return say(`edits.refused.${error.code}`);
      throw error;
    }
  };
  return (
    <div className={classes.stack}>
      <div className={beside ? classes.beside : undefined}>
        {beside}
        <LengthField
          label={say('workbench.field.leg')}
          fieldKey={fieldKey}
          value={legBefore(document, pieceId).length}
          max={BOUNDS.length}
          isOptional
          placeholder={say('workbench.field.notGiven')}
          measured={say(`workbench.length.${measure}Short`)}
          disabled={!canEdit}
          convert={{
            toKept: (inches) => toCorner(inches, measure, ends) ?? inches,
            toShown: (inches) => fromCorner(inches, measure, ends) ?? inches,
          }}
          onCommit={commit}
        />
      </div>
      <div
        className={`${classes.choices} ${classes.measures}`}
        role="radiogroup"
        aria-label={say('workbench.length.measure')}
      >
        {LEG_MEASURES.map((option) => (
          <button
            key={option}
            type="button"
            role="radio"
            className={classes.choice}
            aria-checked={option === measure}
            disabled={!isKnown(option)}
            onClick={() => {
              clearDraft(fieldKey);
              chooseLegMeasure(option);
            }}
          >
            {say(`workbench.length.${option}`)}
          </button>
        ))}
      </div>
    </div>
  );
}
