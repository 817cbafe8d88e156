import { elementNumber, legBefore, typicalPulls } from '@fairlead/shared';
import type {
  ExpandedRun,
  PathElement,
  PullPoint,
  RunAnalysis,
  RunDocument,
  SectionAnalysis,
  Straight,
} from '@fairlead/shared';

export type Piece = Exclude<PathElement, Straight>;

/** One line of the list: a piece with the leg that leads to it. */
export interface PieceRow {
  id: string;
  piece: Piece;
  /** As the list numbers it; null for the two ends of the run. */
  number: number | null;
  /** Corner to corner, in; null where no straight leads to it. */
  leg: number | null;
  /** Where the piece begins, developed inches from the start; null where the run has no lengths. */
  station: number | null;
  /** Degrees of each of its bends. */
  angles: readonly number[];
  /** Degrees since the pull point, this piece included. */
  since: number;
  isOver: boolean;
  /** lbf, typical, when the head of the pull leaves the piece; null where the pull has no answer. */
  pull: number | null;
}

export interface SectionRows {
  section: SectionAnalysis;
  from: PullPoint;
  to: PullPoint;
  rows: PieceRow[];
}

const PAST_LIMIT = 0.05;

/** The piece a straight leads to; any other element is its own piece. null for an id that is not there. */
export function pieceOf(
  document: Pick<RunDocument, 'path'>,
  elementId: string | null,
): Piece | null {
  const index = document.path.findIndex((element) => element.id === elementId);
  const found = index < 0 ? undefined : document.path.slice(index).find(isPiece);
  return found ?? null;
}

export function isPiece(element: PathElement): element is Piece {
  return element.kind !== 'straight';
}

/**
 * The list by section. Each pull point stands once: the first at the head of its section, every other as the last line
 * of the section it ends.
 */
export function listRows(
  document: RunDocument,
  analysis: RunAnalysis,
  expanded: ExpandedRun,
): SectionRows[] {
  const pulls = typicalPulls(analysis, expanded);
  const bySection = new Map(analysis.sections.map((section) => [section.id, section]));
  return expanded.sections.flatMap((span, order) => {
    const section = bySection.get(span.id);
    if (!section) return [];
    const since = new Map(section.bends.map((bend) => [bend.elementId, bend.cumulative]));
    const first = order === 0 ? span.firstElement : span.firstElement + 1;
    let total = 0;
    const rows: PieceRow[] = [];
    for (const placed of expanded.elements.slice(first, span.lastElement + 1)) {
      const { element } = placed;
      if (!isPiece(element)) continue;
      total = since.get(element.id) ?? total;
      rows.push({
        id: element.id,
        piece: element,
        number: elementNumber(document, element.id),
        leg: legBefore(document, element.id).length,
        station: expanded.length === null ? null : placed.from,
        angles: placed.bends.map((bend) => expanded.bends[bend]?.angle ?? 0),
        since: total,
        isOver: total > section.limitDegrees + PAST_LIMIT,
        pull: pulls.get(element.id) ?? null,
      });
    }
    return [{ section, from: span.from, to: span.to, rows }];
  });
}

/** The pieces in order, as the arrow keys walk them. */
export function pieceIds(document: Pick<RunDocument, 'path'>): string[] {
  return document.path.filter(isPiece).map(({ id }) => id);
}
