import { memo, useDeferredValue } from 'react';
import { formatAngle, formatForce, isAccessible } from '@fairlead/shared';
import { useWords } from '../../../../hooks/use-words';
import { listLength } from '../model/list-length';
import type { PieceRow } from '../model/list-rows';
import { towardOf } from '../model/toward-of';
import { wordDirection } from '../model/word-direction';
import { wordAngles, wordPiece } from '../model/word-piece';
import classes from './list.module.css';

/** An edit changes the figures of many rows: the strip is drawn first, they come right after it. */
export function PieceRowCells({ row }: { row: PieceRow }) {
  return <Cells row={useDeferredValue(row)} />;
}

/** Drawn again only when the run changes, not when another row is selected. */
const Cells = memo(function Cells({ row }: { row: PieceRow }) {
  const { say } = useWords();
  const { piece, number, leg, station, angles, since, isOver, pull } = row;
  const none = <span className={classes.muted}>{say('workbench.list.none')}</span>;
  const toward = towardOf(piece);
  const isPullPoint = piece.kind === 'pull-point';
  return (
    <>
      <td className={classes.muted}>{number}</td>
      <td className={classes.pieceCell}>
        {isPullPoint && piece.label ? (
          <>
            <span className={classes.pullPoint}>{piece.label}</span>
            {', '}
          </>
        ) : null}
        {wordPiece(piece, say)}
        {isPullPoint && !isAccessible(piece) && (
          <span className={classes.muted}>{`, ${say('workbench.list.notReached')}`}</span>
        )}
      </td>
      <td>{toward === undefined ? none : wordDirection(toward, say)}</td>
      <td className={classes.number}>{leg === null ? none : listLength(leg)}</td>
      <td className={classes.number}>{station === null ? none : listLength(station)}</td>
      <td className={classes.number}>{wordAngles(angles, say) ?? none}</td>
      <td className={classes.number}>
        {formatAngle(since)}
        {isOver && <span className={classes.overWord}>{say('workbench.list.over')}</span>}
      </td>
      <td className={classes.number}>
        {pull === null ? none : say('workbench.list.pounds', { pounds: formatForce(pull) })}
      </td>
    </>
  );
});
