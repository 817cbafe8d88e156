import type { Me, SessionAnswer } from '@fairlead/shared';
import { create } from 'zustand';

/**
 * Who is signed in. The access token lives in memory only; the refresh cookie is HttpOnly and out of reach of scripts.
 * `unknown` until the first refresh answers; `unreachable` when it could not be asked. `left` says why nobody is:
 * the person signed out, the sign-in ran out, or there was none.
 */
export type Session =
  | { status: 'unknown' | 'unreachable'; accessToken: null; me: null; left: null }
  | {
      status: 'signed-out';
      accessToken: null;
      me: null;
      left: 'by-choice' | 'ran-out' | 'never-in';
    }
  | { status: 'signed-in'; accessToken: string; me: Me; left: null };

/** The refresh cookie cannot be seen from here; this mark says whether asking it is worth a request. */
const MARK = 'fairlead.session';

function mark(isIn: boolean): void {
  try {
    if (isIn) localStorage.setItem(MARK, 'in');
    else localStorage.removeItem(MARK);
  } catch {
    // Without storage every load asks.
  }
}

/** False only where this device is known to have nobody signed in. */
export function mayBeSignedIn(): boolean {
  try {
    return localStorage.getItem(MARK) !== null;
  } catch {
    return true;
  }
}

const nobody = { accessToken: null, me: null } as const;

export const useSession = create<Session>(() => ({ status: 'unknown', ...nobody, left: null }));

export function startSession({ accessToken, me }: SessionAnswer): void {
  mark(true);
  useSession.setState({ status: 'signed-in', accessToken, me, left: null }, true);
}

export function endSession(byChoice: boolean): void {
  const wasIn = useSession.getState().status === 'signed-in';
  const left = byChoice ? 'by-choice' : wasIn ? 'ran-out' : 'never-in';
  mark(false);
  useSession.setState({ status: 'signed-out', ...nobody, left }, true);
}

export function resetSession(status: 'unknown' | 'unreachable'): void {
  useSession.setState({ status, ...nobody, left: null }, true);
}
