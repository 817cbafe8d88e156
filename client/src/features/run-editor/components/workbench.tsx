import { useMediaQuery } from '@mantine/hooks';
import { memo, useCallback, useMemo, useState } from 'react';
import { useRunEditor } from '../state/use-run-editor';
import { CommandsProvider } from './commands/commands-context';
import type { Place } from './commands/commands';
import { DeskWorkbench } from './desk-workbench';
import { ConflictDialog } from './dialogs/conflict-dialog';
import type { DialogName } from './dialogs/dialog-name';
import { Dialogs } from './dialogs/dialogs';
import { focusFirstField } from './hooks/focus-first-field';
import { PhoneWorkbench } from './phone/phone-workbench';
import type { PhoneView } from './phone/phone-view';

/** Held in a hand, upright or sideways. */
const IN_HAND = '(max-width: 767px), (max-height: 479px)';

interface Props {
  place: Place;
  goTo: (place: Place) => void;
}

/** The open run: at a desk or in a hand, with its dialogs and its keys. */
export const Workbench = memo(function Workbench({ place, goTo }: Props) {
  const isInHand = useMediaQuery(IN_HAND, false, { getInitialValueInEffect: false });
  const [dialog, setDialog] = useState<DialogName | null>(null);
  const [view, setView] = useState<PhoneView>('list');
  const hasConflict = useRunEditor((state) => state.conflict !== null);

  const editSelected = useCallback(() => {
    goTo('layout');
    setView('piece');
    // The fields may only now come onto the screen.
    setTimeout(focusFirstField);
  }, [goTo]);
  const showKeys = useCallback(() => setDialog('keys'), []);
  const around = useMemo(() => ({ goTo, editSelected, showKeys }), [goTo, editSelected, showKeys]);

  return (
    <CommandsProvider around={around}>
      {isInHand ? (
        <PhoneWorkbench place={place} view={view} onView={setView} onOpen={setDialog} />
      ) : (
        <DeskWorkbench place={place} onOpen={setDialog} />
      )}
      {hasConflict ? <ConflictDialog /> : <Dialogs open={dialog} onClose={() => setDialog(null)} />}
    </CommandsProvider>
  );
});
