import { createWords } from '@fairlead/shared';
import { signOut } from '../features/auth/api/session-requests';
import { clearToasts, showToast } from '../lib/toasts';
import { useSession } from '../lib/session';
import { queryClient } from './query-client';

const { say } = createWords('en');

/** Signs out and leaves nothing of the shop behind on this device: answers kept in memory and runs kept for recovery. */
export async function leave(): Promise<void> {
  const { me } = useSession.getState();
  try {
    await signOut();
  } catch {
    showToast(say('auth.person.signOutFailed'));
    return;
  }
  queryClient.clear();
  clearToasts();
  if (me) {
    const { clearLocalRuns } = await import('../features/run-editor/state/recovery');
    await clearLocalRuns({ companyId: me.company.id, userId: me.user.id });
  }
  showToast(say('auth.person.signedOut'));
}
