import { BOUNDS, turnOf } from '@fairlead/shared';
import type { PullPoint, Turn } from '@fairlead/shared';
import { useWords } from '../../../../hooks/use-words';
import { useRunEditor } from '../../state/use-run-editor';
import { AngleField } from '../fields/angle-field';
import { DirectionPad } from '../fields/direction-pad';
import fieldClasses from '../fields/fields.module.css';
import { LengthField } from '../fields/length-field';
import { usePatch } from '../hooks/use-patch';

/** How the conductors turn inside a box or body. Empty: straight through, or the quarter a body turns by itself. */
export function TurnFields({ piece }: { piece: PullPoint }) {
  const { say } = useWords();
  const expanded = useRunEditor((state) => state.expanded);
  const canEdit = useRunEditor((state) => state.canEdit);
  const patch = usePatch(piece.id);
  const turn = turnOf(piece);
  const placed = expanded.elements.find(({ element }) => element.id === piece.id);
  const setTurn = (change: Partial<Turn>) => {
    const next = { angle: turn?.angle ?? 90, ...piece.turn, ...change };
    const given = Object.entries(next).filter(([, value]) => value !== undefined);
    return patch({ turn: Object.fromEntries(given) });
  };
  return (
    <>
      <div className={fieldClasses.row}>
        <AngleField
          label={say('workbench.field.turn')}
          fieldKey={`${piece.id}.turn`}
          value={turn?.angle ?? null}
          max={BOUNDS.turnAngle}
          isOptional
          placeholder={say('workbench.field.straightThrough')}
          disabled={!canEdit}
          onCommit={(angle) => (angle === null ? patch({ turn: undefined }) : setTurn({ angle }))}
        />
        {turn && (
          <LengthField
            label={say('workbench.field.sheave')}
            fieldKey={`${piece.id}.sheave`}
            value={turn.sheaveRadius ?? null}
            max={BOUNDS.dimension}
            isOptional
            placeholder={say('workbench.field.notGiven')}
            disabled={!canEdit}
            onCommit={(sheaveRadius) => setTurn({ sheaveRadius: sheaveRadius ?? undefined })}
          />
        )}
      </div>
      {turn && (
        <DirectionPad
          label={say('workbench.field.turnToward')}
          fieldKey={`${piece.id}.turnToward`}
          heading={placed?.headingBefore ?? null}
          value={turn.toward}
          isOptional
          disabled={!canEdit}
          onCommit={(toward) => setTurn({ toward })}
        />
      )}
    </>
  );
}
