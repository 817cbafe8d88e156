import { useMemo } from 'react';
import { useRunEditor } from '../../state/use-run-editor';
import { listRows, pieceOf } from '../model/list-rows';
import type { Piece, SectionRows } from '../model/list-rows';

/** The piece that is selected; a selected straight stands for the piece it leads to. */
export function useSelectedPiece(): Piece | null {
  const document = useRunEditor((state) => state.document);
  const selectedId = useRunEditor((state) => state.selectedId);
  return useMemo(() => pieceOf(document, selectedId), [document, selectedId]);
}

export function useSections(): SectionRows[] {
  const document = useRunEditor((state) => state.document);
  const analysis = useRunEditor((state) => state.analysis);
  const expanded = useRunEditor((state) => state.expanded);
  return useMemo(() => listRows(document, analysis, expanded), [document, analysis, expanded]);
}
