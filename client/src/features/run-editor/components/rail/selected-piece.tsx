import { IconArrowDown, IconArrowUp } from '@tabler/icons-react';
import { useWords } from '../../../../hooks/use-words';
import { useRunEditor } from '../../state/use-run-editor';
import { useCommands, useIsEnabled } from '../commands/commands-context';
import fieldClasses from '../fields/fields.module.css';
import { useLabelOf } from '../hooks/use-labels';
import { useSelectedPiece } from '../hooks/use-piece';
import { PieceFields } from '../pieces/piece-fields';
import { sectionOf } from '../model/section-of';
import { PieceFigures } from './piece-figures';
import classes from './rail.module.css';

/** The selected piece with every field it has. */
export function SelectedPiece({ isBare = false }: { isBare?: boolean }) {
  const { say } = useWords();
  const labelOf = useLabelOf();
  const piece = useSelectedPiece();
  const analysis = useRunEditor((state) => state.analysis);
  const expanded = useRunEditor((state) => state.expanded);
  const { doCommand } = useCommands();
  const canMoveUp = useIsEnabled('move-up');
  const canMoveDown = useIsEnabled('move-down');
  const canDelete = useIsEnabled('delete');
  if (!piece) {
    return (
      <section className={classes.card} aria-label={say('workbench.selected.title')}>
        <h2 className={classes.title}>{say('workbench.selected.title')}</h2>
        <p className={classes.quiet}>{say('workbench.selected.none')}</p>
      </section>
    );
  }
  const name = labelOf(piece.id);
  const section = sectionOf(analysis, expanded, piece.id);
  return (
    <section
      className={classes.card}
      aria-label={isBare ? undefined : name}
      data-selected-piece={piece.id}
    >
      <div className={classes.head} hidden={isBare}>
        <h2 className={classes.title}>{name}</h2>
        {section && (
          <span className={classes.aside}>
            {say('workbench.list.section', {
              from: labelOf(section.from),
              to: labelOf(section.to),
            })}
          </span>
        )}
      </div>
      <div className={classes.fields}>
        <PieceFields key={piece.id} piece={piece} sectionId={section?.id ?? null} />
      </div>
      <PieceFigures piece={piece} />
      <div className={classes.acts}>
        <button
          type="button"
          className={classes.iconButton}
          disabled={!canMoveUp}
          aria-label={say('workbench.selected.moveUp', { piece: name })}
          onClick={() => doCommand('move-up')}
        >
          <IconArrowUp size={20} aria-hidden />
        </button>
        <button
          type="button"
          className={classes.iconButton}
          disabled={!canMoveDown}
          aria-label={say('workbench.selected.moveDown', { piece: name })}
          onClick={() => doCommand('move-down')}
        >
          <IconArrowDown size={20} aria-hidden />
        </button>
        <button
          type="button"
          className={fieldClasses.textButton}
          disabled={!canDelete}
          aria-label={say('workbench.selected.delete', { piece: name })}
          onClick={() => doCommand('delete')}
        >
          {say('workbench.selected.deleteShort')}
        </button>
      </div>
    </section>
  );
}
