import { useWords } from '../../../../hooks/use-words';
import { DialogFrame } from '../../../../components/dialog-frame';
import type { DialogName } from './dialog-name';
import { IdentityForm } from './identity-form';
import { RacewayForm } from './raceway-form';
import { RulesForm } from './rules-form';
import { SavingProblem } from './saving-problem';
import { ShortcutsList } from './shortcuts-list';

interface Props {
  open: DialogName | null;
  onClose: () => void;
}

/** The dialogs of the run editor. They change the run as one types, so they only close. */
export function Dialogs({ open, onClose }: Props) {
  const { say } = useWords();
  const titles: Record<DialogName, string> = {
    identity: say('workbench.rename.title'),
    saving: say('workbench.saving.title'),
    keys: say('workbench.shortcut.title'),
    raceway: say('workbench.raceway.title'),
    rules: say('workbench.rules.title'),
  };
  return (
    <DialogFrame
      isOpen={open !== null}
      onClose={onClose}
      title={open === null ? '' : titles[open]}
      size={open === 'keys' || open === 'rules' ? 'lg' : 'md'}
    >
      {open === 'identity' && <IdentityForm />}
      {open === 'saving' && <SavingProblem onClose={onClose} />}
      {open === 'keys' && <ShortcutsList />}
      {open === 'raceway' && <RacewayForm />}
      {open === 'rules' && <RulesForm />}
    </DialogFrame>
  );
}
