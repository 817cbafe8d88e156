import { editionOf } from '@fairlead/shared';
import type { CodeEdition } from '@fairlead/shared';
import { useRunEditor } from '../../state/use-run-editor';
import { useSettings } from './use-settings';

/** The edition the open run is judged by. */
export function useEdition(): CodeEdition {
  const settings = useSettings();
  return useRunEditor((state) => editionOf(state.document, settings));
}
