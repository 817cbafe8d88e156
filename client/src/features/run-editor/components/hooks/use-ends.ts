import { useWords } from '../../../../hooks/use-words';
import { useRunEditor } from '../../state/use-run-editor';
import { useLabelOf } from './use-labels';

/** What the two ends of the run are called. */
export function useEnds(): { from: string; to: string } {
  const { say } = useWords();
  const path = useRunEditor((state) => state.document.path);
  const labelOf = useLabelOf();
  const name = (place: number) => {
    const end = path.at(place);
    if (!end) return '';
    const isOpen = end.kind === 'pull-point' && end.device === 'open-end' && !end.label;
    return isOpen ? say('workbench.openEnd') : labelOf(end.id);
  };
  return { from: name(0), to: name(-1) };
}
