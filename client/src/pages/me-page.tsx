import { useOutletContext } from 'react-router-dom';
import { PersonPanel } from '../features/auth/components/person-panel';
import { usePageTitle } from '../hooks/use-page-title';
import { useWords } from '../hooks/use-words';

/** Signing out reaches into several features, so the shell brings it. */
interface ShellContext {
  leave: () => Promise<void>;
}

export default function MePage() {
  const { say } = useWords();
  const { leave } = useOutletContext<ShellContext>();
  usePageTitle(say('auth.person.title'));
  return <PersonPanel onSignOut={() => void leave()} />;
}
