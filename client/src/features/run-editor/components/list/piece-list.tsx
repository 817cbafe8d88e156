import { Fragment, useRef } from 'react';
import type { KeyboardEvent, UIEvent } from 'react';
import { useWords } from '../../../../hooks/use-words';
import { useRunEditor } from '../../state/use-run-editor';
import { useCommands } from '../commands/commands-context';
import { useSections, useSelectedPiece } from '../hooks/use-piece';
import { useScrollToSelected } from '../hooks/use-scroll-to-selected';
import classes from './list.module.css';
import { PieceRowCells } from './piece-row';
import { SectionLine } from './section-heading';

const COLUMNS = ['number', 'piece', 'toward', 'leg', 'along', 'angle', 'since', 'pull'] as const;
const NUMERIC: ReadonlySet<string> = new Set(['leg', 'along', 'angle', 'since', 'pull']);

/** The run piece by piece, by section. One tab stop; the arrows walk the rows. */
export function PieceList({ onScroll }: { onScroll?: (event: UIEvent<HTMLDivElement>) => void }) {
  const { say } = useWords();
  const sections = useSections();
  const selected = useSelectedPiece();
  const select = useRunEditor((state) => state.select);
  const pointedId = useRunEditor((state) => state.cursor?.elementId ?? null);
  const { doCommand } = useCommands();
  const body = useRef<HTMLTableElement>(null);
  useScrollToSelected(body, selected?.id ?? null);
  const firstId = sections[0]?.rows[0]?.id;
  const tabStop = selected?.id ?? firstId;

  const onKeyDown = (event: KeyboardEvent) => {
    if (event.altKey || event.ctrlKey || event.metaKey) return;
    if (event.key === 'ArrowDown' || event.key === 'ArrowUp') {
      event.preventDefault();
      event.stopPropagation();
      doCommand(event.key === 'ArrowDown' ? 'next' : 'previous');
    }
    if (event.key === 'Home' || event.key === 'End') {
      event.preventDefault();
      const rows = sections.flatMap((section) => section.rows);
      select((event.key === 'Home' ? rows[0] : rows[rows.length - 1])?.id ?? null);
    }
  };

  return (
    <div className={classes.scroll} onScroll={onScroll}>
      <table
        ref={body}
        role="grid"
        className={classes.table}
        aria-label={say('workbench.list.title')}
      >
        <thead>
          <tr>
            {COLUMNS.map((column) => (
              <th
                key={column}
                scope="col"
                className={NUMERIC.has(column) ? classes.number : undefined}
              >
                {say(`workbench.list.${column}`)}
              </th>
            ))}
          </tr>
        </thead>
        <tbody onKeyDown={onKeyDown}>
          {sections.map(({ section, rows }) => (
            <Fragment key={section.id}>
              <tr className={classes.section}>
                <th colSpan={COLUMNS.length} scope="rowgroup">
                  <SectionLine section={section} />
                </th>
              </tr>
              {rows.map((row) => (
                <tr
                  key={row.id}
                  className={classes.row}
                  data-piece={row.id}
                  data-pointed={row.id === pointedId || undefined}
                  tabIndex={row.id === tabStop ? 0 : -1}
                  aria-selected={row.id === selected?.id}
                  onClick={() => select(row.id)}
                  onFocus={() => row.id !== selected?.id && select(row.id)}
                >
                  <PieceRowCells row={row} />
                </tr>
              ))}
            </Fragment>
          ))}
        </tbody>
      </table>
    </div>
  );
}
