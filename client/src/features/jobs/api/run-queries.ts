import type { Page, RunListItem, Status } from '@fairlead/shared';
import { infiniteQueryOptions } from '@tanstack/react-query';
import { api } from '../../../lib/api-client';

export interface RunListParams {
  search: string;
  sort: string;
  status: Status | '';
}

export const RUNS_PER_PAGE = 50;
export const runListKeys = {
  ofJob: (jobId: string) => ['runs', 'list', jobId] as const,
  list: (jobId: string, params: RunListParams) => ['runs', 'list', jobId, params] as const,
};

export const runListQuery = (jobId: string, params: RunListParams) =>
  infiniteQueryOptions({
    queryKey: runListKeys.list(jobId, params),
    queryFn: ({ pageParam, signal }) =>
      api.get<Page<RunListItem>>(`/api/jobs/${jobId}/runs`, {
        query: { ...params, limit: RUNS_PER_PAGE, cursor: pageParam },
        signal,
      }),
    initialPageParam: undefined as string | undefined,
    getNextPageParam: (page) => page.nextCursor ?? undefined,
  });
