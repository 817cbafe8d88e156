import { formatAngle } from '@fairlead/shared';
import { IconChevronLeft, IconChevronRight } from '@tabler/icons-react';
import { useWords } from '../../hooks/use-words';
import classes from './drawing.module.css';
import { pieceAt, piecesOf, sinceAt, wordPieceShort } from './piece-words';
import type { RunView } from './piece-words';

interface Props extends RunView {
  selectedId: string | null;
  onSelect: (elementId: string) => void;
  /** A tap on the piece itself. */
  onOpen: () => void;
}

/** "‹ 9. Offset 2×45° · 180° since JB-4 ›": walks the pieces with a thumb. */
export function PieceStepper({ selectedId, onSelect, onOpen, ...view }: Props) {
  const { say } = useWords();
  const pieces = piecesOf(view.document);
  const selected = pieceAt(view.document, selectedId);
  const at = pieces.findIndex(({ id }) => id === selected?.id);
  const before = at < 0 ? undefined : pieces[at - 1];
  const after = pieces[at + 1];
  const since = selected ? sinceAt(view, selected) : null;
  const start = pieces.find(({ id }) => id === since?.fromId);
  return (
    <div className={classes.stepper}>
      <button
        type="button"
        className={classes.step}
        aria-label={say('strip.before')}
        disabled={!before}
        onClick={() => before && onSelect(before.id)}
      >
        <IconChevronLeft aria-hidden="true" />
      </button>
      <button type="button" className={classes.stepped} disabled={!selected} onClick={onOpen}>
        {selected ? (
          <>
            <b>{wordPieceShort(view, selected, say)}</b>
            {since && start && (
              <span>
                {say('strip.sinceLabel', {
                  degrees: formatAngle(since.degrees),
                  label: wordPieceShort(view, start, say),
                })}
              </span>
            )}
          </>
        ) : (
          say('strip.none')
        )}
      </button>
      <button
        type="button"
        className={classes.step}
        aria-label={say('strip.after')}
        disabled={!after}
        onClick={() => after && onSelect(after.id)}
      >
        <IconChevronRight aria-hidden="true" />
      </button>
    </div>
  );
}
