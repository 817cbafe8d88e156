import type { SessionAnswer, SignInBody, SignUpBody } from '@fairlead/shared';
import { api, refreshSession } from '../../../lib/api-client';
import { failureOf } from '../../../lib/request-error';
import {
  endSession,
  mayBeSignedIn,
  resetSession,
  startSession,
  useSession,
} from '../../../lib/session';

export async function signUp(body: SignUpBody): Promise<void> {
  startSession(await api.post<SessionAnswer>('/api/auth/sign-up', body, { anonymous: true }));
}

export async function signIn(body: SignInBody): Promise<void> {
  startSession(await api.post<SessionAnswer>('/api/auth/sign-in', body, { anonymous: true }));
}

/** Ends the session on the server first: without that answer the cookie would sign the next person in. */
export async function signOut(): Promise<void> {
  await api.post('/api/auth/sign-out', {}, { anonymous: true });
  endSession(true);
}

/** Asks the refresh cookie who is here; never throws, the session store holds the outcome. */
export async function openSession(): Promise<void> {
  if (!mayBeSignedIn()) return endSession(false);
  try {
    await refreshSession();
  } catch (error) {
    const failure = failureOf(error);
    const busy = failure?.kind === 'api' && failure.error.status === 429;
    const refused = failure?.kind === 'api' && failure.error.status < 500 && !busy;
    // A 401 has ended the session already.
    if (!refused) resetSession('unreachable');
    else if (useSession.getState().status !== 'signed-out') endSession(false);
  }
}
