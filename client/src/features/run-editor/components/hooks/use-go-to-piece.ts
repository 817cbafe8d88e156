import { useCallback } from 'react';
import { useRunEditor } from '../../state/use-run-editor';
import type { Place } from '../commands/commands';

/** Shows a place of the run: the layout with that piece selected. */
export function useGoToPiece(goTo: (place: Place) => void): (elementId: string) => void {
  const select = useRunEditor((state) => state.select);
  return useCallback(
    (elementId) => {
      goTo('layout');
      select(elementId);
    },
    [goTo, select],
  );
}
