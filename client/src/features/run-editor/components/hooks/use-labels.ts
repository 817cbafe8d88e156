import { useCallback, useMemo } from 'react';
import { useWords } from '../../../../hooks/use-words';
import { useRunEditor } from '../../state/use-run-editor';
import { labelOf } from '../model/word-piece';

/** What each place of the open run is called. */
export function useLabelOf(): (elementId: string) => string {
  const { say } = useWords();
  const document = useRunEditor((state) => state.document);
  return useCallback((elementId) => labelOf(document, elementId, say), [document, say]);
}

/** What wording a finding, a fix or a verdict needs. */
export function useWording() {
  const { say } = useWords();
  const labelOfPlace = useLabelOf();
  return useMemo(() => ({ say, labelOf: labelOfPlace }), [say, labelOfPlace]);
}
