import { drawStrip, formatLength } from '@fairlead/shared';
import type { CursorPlace, StripVariant } from '@fairlead/shared';
import { useEffect, useId, useMemo, useRef } from 'react';
import type { KeyboardEvent, MouseEvent } from 'react';
import { useWords } from '../../hooks/use-words';
import { DisplayListSvg } from './display-list-svg';
import classes from './drawing.module.css';
import { pieceAt, piecesOf } from './piece-words';
import type { RunView } from './piece-words';
import { SpokenPieces } from './spoken-pieces';
import { StripCursor } from './strip-cursor';
import { StripOverview } from './strip-overview';
import { useScrolled } from './use-scrolled';

interface Props extends RunView {
  width: number;
  variant: StripVariant;
  sun: boolean;
  selectedId: string | null;
  hasPulls?: boolean;
  onSelect: (elementId: string) => void;
  /** Where the pointer stands, at a desk; null once it has left. */
  onPoint: (place: CursorPlace | null) => void;
  /** Enter on the selected piece. */
  onEnter: () => void;
}

/** The run unrolled: one tab stop, in which ← and → walk the pieces, and a list of them for who hears the screen. */
export function Strip(props: Props) {
  const {
    document,
    analysis,
    expanded,
    width,
    variant,
    sun,
    selectedId,
    hasPulls,
    onSelect,
    onPoint,
    onEnter,
  } = props;
  const { say } = useWords();
  const id = useId();
  const scroller = useRef<HTMLDivElement>(null);
  const pieces = useMemo(() => piecesOf(document), [document]);
  const selected = pieceAt(document, selectedId);
  const drawnId = selected?.id ?? null;
  const drawing = useMemo(
    () =>
      drawStrip({ expanded, analysis, width, variant, sun, selectedId: drawnId, hasPulls, say }),
    [expanded, analysis, width, variant, sun, drawnId, hasPulls, say],
  );
  const view = width - (drawing.gutter?.width ?? 0);
  const scrolled = useScrolled(scroller);
  const place = drawing.places.find(({ elementId }) => elementId === selected?.id);
  const middle = place ? (place.from + place.to) / 2 : null;

  useEffect(() => {
    if (middle !== null && scroller.current) scroller.current.scrollLeft = middle - view / 2;
  }, [middle, view]);

  const walk = (event: KeyboardEvent) => {
    const at = pieces.findIndex((piece) => piece.id === selected?.id);
    const last = pieces.length - 1;
    const to: Record<string, number> = {
      ArrowLeft: at < 0 ? last : Math.max(0, at - 1),
      ArrowRight: Math.min(last, at + 1),
      Home: 0,
      End: last,
    };
    const next = pieces[to[event.key] ?? -1];
    if (event.key === 'Enter' && selected) onEnter();
    else if (next) onSelect(next.id);
    else return;
    event.preventDefault();
  };
  const pick = (event: MouseEvent<HTMLElement>) => {
    const x = event.clientX - event.currentTarget.getBoundingClientRect().left;
    const isPiece = new Set(pieces.map((piece) => piece.id));
    const distance = ({ from, to }: { from: number; to: number }) => Math.max(from - x, x - to, 0);
    const [nearest] = drawing.places
      .filter(({ elementId }) => isPiece.has(elementId))
      .sort((a, b) => distance(a) - distance(b));
    if (nearest) onSelect(nearest.elementId);
  };

  const length = expanded.length;
  const total =
    length === null
      ? null
      : say('strip.length', {
          length: formatLength(length, { to: 1 }).replace(/′ 0″$/, '′'),
          count: analysis.totals.sections,
        });
  return (
    <div className={classes.strip} data-variant={variant}>
      {variant !== 'compact-height' && (
        <p className={classes.caption}>
          {variant === 'desk' && <span>{total}</span>}
          <span>{[drawing.caption, drawing.raceways].filter(Boolean).join(' · ')}</span>
        </p>
      )}
      <div className={classes.drawn}>
        {drawing.gutter && <DisplayListSvg list={drawing.gutter} />}
        <div
          ref={scroller}
          className={classes.scroller}
          role="listbox"
          aria-label={say('strip.label')}
          aria-orientation="horizontal"
          aria-activedescendant={selected ? `${id}-${selected.id}` : undefined}
          tabIndex={0}
          onKeyDown={walk}
        >
          {/* The pointer picks what is nearest; the keys reach the same pieces on the list around it. */}
          <div
            className={classes.body}
            style={{ width: drawing.body.width }}
            onClick={pick}
            role="presentation"
          >
            {variant === 'desk' ? (
              <StripCursor view={props} drawing={drawing} onPoint={onPoint}>
                <DisplayListSvg list={drawing.body} />
              </StripCursor>
            ) : (
              <DisplayListSvg list={drawing.body} />
            )}
          </div>
          <SpokenPieces
            id={id}
            selectedId={drawnId}
            document={document}
            analysis={analysis}
            expanded={expanded}
          />
        </div>
      </div>
      {drawing.overview && (
        <StripOverview
          list={drawing.overview}
          sections={drawing.sections}
          bodyWidth={drawing.body.width}
          view={view}
          scrolled={scrolled}
          gutter={drawing.gutter?.width ?? 0}
          onScrollTo={(left) => {
            if (scroller.current) scroller.current.scrollLeft = left;
          }}
        />
      )}
    </div>
  );
}
