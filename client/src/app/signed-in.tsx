import { useEffect } from 'react';
import { Navigate, Outlet, useLocation } from 'react-router-dom';
import { OpeningSession } from '../features/auth/components/opening-session';
import { openSession } from '../features/auth/api/session-requests';
import { paths } from '../lib/paths';
import { useSession } from '../lib/session';

/** Pages for people who are signed in. A reload asks the refresh cookie first. */
export function SignedIn() {
  const { status, left } = useSession();
  const { pathname, search } = useLocation();
  useEffect(() => {
    if (status === 'unknown') void openSession();
  }, [status]);

  if (status === 'signed-in') return <Outlet />;
  if (status === 'signed-out') {
    return (
      <Navigate
        to={paths.signIn}
        replace
        state={left === 'by-choice' ? null : { backTo: pathname + search }}
      />
    );
  }
  return <OpeningSession unreachable={status === 'unreachable'} />;
}
