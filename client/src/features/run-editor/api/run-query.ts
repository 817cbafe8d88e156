import type { Run } from '@fairlead/shared';
import { queryOptions } from '@tanstack/react-query';
import { api } from '../../../lib/api-client';

/** One run with its document. The open editor keeps its own copy; an older answer never replaces what is being typed. */
export const runQuery = (runId: string) =>
  queryOptions({
    queryKey: ['runs', 'one', runId] as const,
    queryFn: ({ signal }) => api.get<Run>(`/api/runs/${runId}`, { signal }),
    staleTime: 0,
    gcTime: 0,
    refetchOnWindowFocus: false,
    refetchOnReconnect: false,
    refetchOnMount: false,
  });
