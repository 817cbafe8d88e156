import { elementNumber, formatAngle, formatForce, formatLength, wordBends } from '@fairlead/shared';
import type {
  ExpandedRun,
  PathElement,
  RunAnalysis,
  RunDocument,
  Say,
  Straight,
} from '@fairlead/shared';

/** What the strip stops at: everything but the straights, which are the legs between. */
export type Piece = Exclude<PathElement, Straight>;

export interface RunView {
  document: RunDocument;
  analysis: RunAnalysis;
  expanded: ExpandedRun;
}

/** Past the limit by more than the tenth degrees are compared to. */
const PAST_LIMIT = 0.05;

export function piecesOf({ path }: RunDocument): Piece[] {
  return path.filter((element): element is Piece => element.kind !== 'straight');
}

/** The piece a selection stands at: the piece itself, or the one a selected leg leads to. */
export function pieceAt(document: RunDocument, selectedId: string | null): Piece | undefined {
  const index = document.path.findIndex(({ id }) => id === selectedId);
  if (index < 0) return undefined;
  return piecesOf({ ...document, path: document.path.slice(index) })[0];
}

/** "9. Offset 2×45°"; a pull point by its label. */
export function wordPieceShort({ document, expanded }: RunView, piece: Piece, say: Say): string {
  if (piece.kind === 'pull-point' && piece.label) return piece.label;
  const kind = say(`strip.kind.${piece.kind}`);
  const placed = expanded.elements.find(({ element }) => element.id === piece.id);
  const bends = wordBends(expanded, placed?.bends ?? [], say);
  const named = bends === null ? kind : say('strip.withBends', { piece: kind, bends });
  const number = elementNumber(document, piece.id);
  return number === null ? named : say('strip.numbered', { number, piece: named });
}

export interface Since {
  degrees: number;
  limit: number;
  isOver: boolean;
  /** The pull point the count starts at. */
  fromId: string;
}

/** The degrees since the last pull point, this piece included; null where a count has just started. */
export function sinceAt({ analysis, expanded }: RunView, piece: Piece): Since | null {
  const placed = expanded.elements.find(({ element }) => element.id === piece.id);
  const section = placed && analysis.sections[placed.section];
  if (!placed || !section || section.from === piece.id) return null;
  const order = new Map(expanded.elements.map(({ element, index }) => [element.id, index]));
  const passed = section.bends.filter(
    ({ elementId }) => (order.get(elementId) ?? 0) <= placed.index,
  );
  const degrees = passed.at(-1)?.cumulative ?? 0;
  const { limitDegrees: limit, from: fromId } = section;
  return { degrees, limit, isOver: degrees > limit + PAST_LIMIT, fromId };
}

/** Everything the drawing shows of one piece, in words: name, station, total since the pull point, pull, status. */
export function wordPieceFully(
  view: RunView,
  piece: Piece,
  /** `typicalPulls` of the run. */
  pulls: ReadonlyMap<string, number>,
  say: Say,
): string {
  const { expanded } = view;
  const placed = expanded.elements.find(({ element }) => element.id === piece.id);
  const since = sinceAt(view, piece);
  const words = [wordPieceShort(view, piece, say)];
  if (piece.kind === 'pull-point' && piece.accessible === false)
    words.push(say('strip.notReached'));
  if (placed && expanded.length !== null) {
    words.push(say('strip.atStation', { station: formatLength(placed.from, { to: 1 }) }));
  }
  if (since) {
    const { degrees, limit } = since;
    words.push(say('strip.ofLimit', { degrees: formatAngle(degrees), limit: formatAngle(limit) }));
    if (since.isOver) words.push(say('strip.overLimit'));
  }
  const pull = pulls.get(piece.id);
  if (pull !== undefined) words.push(say('strip.typical', { pounds: formatForce(pull) }));
  return words.join(', ');
}
