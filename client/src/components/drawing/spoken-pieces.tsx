import { memo, useDeferredValue, useMemo } from 'react';
import { typicalPulls } from '@fairlead/shared';
import { useWords } from '../../hooks/use-words';
import classes from './drawing.module.css';
import { piecesOf, wordPieceFully } from './piece-words';
import type { RunView } from './piece-words';

interface Props extends RunView {
  /** Of the listbox: an option's id is this with the piece's behind it. */
  id: string;
  selectedId: string | null;
}

/** The pieces in order for who hears the screen. An edit is drawn first; these words come right after it. */
export function SpokenPieces({ id, selectedId, document, analysis, expanded }: Props) {
  const view = useMemo(() => ({ document, analysis, expanded }), [document, analysis, expanded]);
  return <Options id={id} selectedId={selectedId} view={useDeferredValue(view)} />;
}

const Options = memo(function Options({
  id,
  selectedId,
  view,
}: Pick<Props, 'id' | 'selectedId'> & { view: RunView }) {
  const { say } = useWords();
  const pieces = useMemo(() => {
    const pulls = typicalPulls(view.analysis, view.expanded);
    return piecesOf(view.document).map((piece) => ({
      pieceId: piece.id,
      words: wordPieceFully(view, piece, pulls, say),
    }));
  }, [view, say]);
  return pieces.map(({ pieceId, words }) => (
    <div
      key={pieceId}
      id={`${id}-${pieceId}`}
      className={classes.spoken}
      role="option"
      aria-selected={pieceId === selectedId}
    >
      {words}
    </div>
  ));
});
