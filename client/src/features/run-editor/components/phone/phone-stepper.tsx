import { PieceStepper } from '../../../../components/drawing/piece-stepper';
import { useRunEditor } from '../../state/use-run-editor';
import { useSelectedPiece } from '../hooks/use-piece';

/** "‹ 9. Offset 2×45° · 180° since JB-4 ›": the strip is read, the pieces are picked here. */
export function PhoneStepper({ onOpen }: { onOpen: () => void }) {
  const document = useRunEditor((state) => state.document);
  const analysis = useRunEditor((state) => state.analysis);
  const expanded = useRunEditor((state) => state.expanded);
  const select = useRunEditor((state) => state.select);
  const selected = useSelectedPiece();
  return (
    <PieceStepper
      document={document}
      analysis={analysis}
      expanded={expanded}
      selectedId={selected?.id ?? null}
      onSelect={select}
      onOpen={onOpen}
    />
  );
}
