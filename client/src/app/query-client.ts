import { QueryClient } from '@tanstack/react-query';
import { failureOf } from '../lib/request-error';
import { useSession } from '../lib/session';

/** An answer that says no is an answer; only a request that found nobody is worth repeating. */
export function worthRepeating(failures: number, error: unknown): boolean {
  const failure = failureOf(error);
  const nobodyThere = failure?.kind === 'network';
  const serverFell = failure?.kind === 'api' && failure.error.status >= 500;
  return failures < 2 && (nobodyThere || serverFell);
}

export const queryClient = new QueryClient({
  defaultOptions: {
    queries: { staleTime: 15_000, retry: worthRepeating, networkMode: 'always' },
    mutations: { retry: false, networkMode: 'always' },
  },
});

let lastPerson: string | null = null;

// What one person may read is not what the next one on this device may read.
useSession.subscribe(({ me }) => {
  if (me && lastPerson !== null && lastPerson !== me.user.id) queryClient.clear();
  if (me) lastPerson = me.user.id;
});
