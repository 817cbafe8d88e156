import { formatAngle, formatForce, formatLength, readCursor, textWidth } from '@fairlead/shared';
import type { CursorPlace, StripDrawing } from '@fairlead/shared';
import { useState } from 'react';
import type { PointerEvent, ReactNode } from 'react';
import { useWords } from '../../hooks/use-words';
import classes from './drawing.module.css';
import { pieceAt, wordPieceShort } from './piece-words';
import type { RunView } from './piece-words';

interface Props {
  view: RunView;
  drawing: StripDrawing;
  onPoint: (place: CursorPlace | null) => void;
  children: ReactNode;
}

/** Of the flag's text and its sides, px. */
const FLAG = { size: 12.5, side: 8 };

/** A line through every lane under the pointer, with a flag on the axis that says what the run says there. */
export function StripCursor({ view, drawing, onPoint, children }: Props) {
  const [place, setPlace] = useState<CursorPlace | null>(null);
  const point = (next: CursorPlace | null) => {
    if (next?.x === place?.x && next?.elementId === place?.elementId) return;
    setPlace(next);
    onPoint(next);
  };
  const onPointerMove = (event: PointerEvent<HTMLElement>) => {
    if (event.pointerType === 'touch') return;
    point(drawing.cursorAt(event.clientX - event.currentTarget.getBoundingClientRect().left));
  };
  return (
    <div
      className={classes.cursorArea}
      onPointerMove={onPointerMove}
      onPointerLeave={() => point(null)}
    >
      {children}
      {place && drawing.lanes && (
        <CursorFlag view={view} place={place} lanes={drawing.lanes} width={drawing.body.width} />
      )}
    </div>
  );
}

interface FlagProps {
  view: RunView;
  place: CursorPlace;
  lanes: { top: number; axis: number };
  width: number;
}

/** The spoken list says the same of every piece. */
function CursorFlag({ view, place, lanes, width }: FlagProps) {
  const { say } = useWords();
  const { degrees, fromId, pull } = readCursor(view, place);
  const from = pieceAt(view.document, fromId);
  const words = [
    formatLength(place.station, { to: 1 }),
    degrees !== null && from
      ? say('strip.sinceLabel', {
          degrees: formatAngle(degrees),
          label: wordPieceShort(view, from, say),
        })
      : null,
    pull === null ? null : say('strip.typical', { pounds: formatForce(pull) }),
  ].filter((each) => each !== null);
  const text = words.join(' · ');
  const half = textWidth(text, FLAG.size, 600) / 2 + FLAG.side;
  const middle = Math.min(Math.max(place.x, half), Math.max(half, width - half));
  return (
    <div aria-hidden="true">
      <div
        className={classes.cursorLine}
        style={{ left: place.x, top: lanes.top, height: lanes.axis - lanes.top }}
      />
      <div className={classes.cursorFlag} style={{ left: middle, top: lanes.axis + 3 }}>
        {text}
      </div>
    </div>
  );
}
