import { formatAngle } from '@fairlead/shared';
import { useRef } from 'react';
import { useWords } from '../../../../hooks/use-words';
import { useSections, useSelectedPiece } from '../hooks/use-piece';
import { useScrollToSelected } from '../hooks/use-scroll-to-selected';
import { SectionLine } from '../list/section-heading';
import { listLength } from '../model/list-length';
import type { PieceRow } from '../model/list-rows';
import { towardOf } from '../model/toward-of';
import { wordDirection } from '../model/word-direction';
import { wordAngles, wordPiece } from '../model/word-piece';
import classes from './phone.module.css';

/** The pieces under a thumb: a tap selects one and opens its fields. */
export function PhoneList({ onOpen }: { onOpen: (pieceId: string) => void }) {
  const { say } = useWords();
  const sections = useSections();
  const selected = useSelectedPiece();
  const list = useRef<HTMLDivElement>(null);
  useScrollToSelected(list, selected?.id ?? null);
  return (
    <div ref={list}>
      {sections.map(({ section, rows }) => (
        <section key={section.id}>
          <h2 className={classes.listHead} style={{ margin: 0 }}>
            <SectionLine section={section} />
          </h2>
          <ul className={classes.rows}>
            {rows.map((row) => (
              <li key={row.id}>
                <PhoneRow row={row} isSelected={row.id === selected?.id} onOpen={onOpen} />
              </li>
            ))}
          </ul>
        </section>
      ))}
      <p className={classes.caution}>{say('workbench.caution')}</p>
    </div>
  );
}

interface RowProps {
  row: PieceRow;
  isSelected: boolean;
  onOpen: (pieceId: string) => void;
}

function PhoneRow({ row, isSelected, onOpen }: RowProps) {
  const { say } = useWords();
  const { piece, number, leg, since, isOver } = row;
  const toward = towardOf(piece);
  const details = [
    ...(toward === undefined ? [] : [wordDirection(toward, say)]),
    ...(leg === null ? [] : [say('workbench.list.legShort', { leg: listLength(leg) })]),
  ];
  const name = wordPiece(piece, say);
  const isLabelled = piece.kind === 'pull-point' && piece.label;
  return (
    <button
      type="button"
      className={classes.row}
      data-piece={row.id}
      aria-current={isSelected}
      onClick={() => onOpen(row.id)}
    >
      <span className={classes.rowNumber}>{number}</span>
      <span className={classes.rowName}>
        {isLabelled
          ? say('workbench.piece.named', { label: piece.label ?? '', piece: name })
          : name}
        <small>{details.join(', ')}</small>
      </span>
      <span className={classes.rowSince}>
        {formatAngle(since)} {isOver && say('workbench.list.over')}
        <small>{wordAngles(row.angles, say)}</small>
      </span>
    </button>
  );
}
