import { useEffect } from 'react';
import { Navigate, Outlet, useLocation } from 'react-router-dom';
import { openSession } from '../features/auth/api/session-requests';
import { paths } from '../lib/paths';
import { useSession } from '../lib/session';

/** Sign-in and sign-up. They show at once; who turns out to be signed in already goes on to where they came from. */
export function SignedOut() {
  const status = useSession((session) => session.status);
  const state = useLocation().state as { backTo?: string } | null;
  useEffect(() => {
    if (status === 'unknown') void openSession();
  }, [status]);

  if (status === 'signed-in') return <Navigate to={state?.backTo ?? paths.jobs} replace />;
  return <Outlet />;
}
