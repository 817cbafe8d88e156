import type { Job, JobStatus, Page, Person } from '@fairlead/shared';
import { infiniteQueryOptions, queryOptions } from '@tanstack/react-query';
import { api } from '../../../lib/api-client';

export interface JobListParams {
  search: string;
  sort: string;
  status: JobStatus | '';
}

export const JOBS_PER_PAGE = 50;
export const jobKeys = {
  all: ['jobs'] as const,
  lists: ['jobs', 'list'] as const,
  list: (params: JobListParams) => ['jobs', 'list', params] as const,
  one: (jobId: string) => ['jobs', 'one', jobId] as const,
  people: ['people'] as const,
};

export const jobListQuery = (params: JobListParams) =>
  infiniteQueryOptions({
    queryKey: jobKeys.list(params),
    queryFn: ({ pageParam, signal }) =>
      api.get<Page<Job>>('/api/jobs', {
        query: { ...params, limit: JOBS_PER_PAGE, cursor: pageParam },
        signal,
      }),
    initialPageParam: undefined as string | undefined,
    getNextPageParam: (page) => page.nextCursor ?? undefined,
  });

export const jobQuery = (jobId: string) =>
  queryOptions({
    queryKey: jobKeys.one(jobId),
    queryFn: ({ signal }) => api.get<Job>(`/api/jobs/${jobId}`, { signal }),
  });

export const peopleQuery = () =>
  queryOptions({
    queryKey: jobKeys.people,
    queryFn: ({ signal }) => api.get<Person[]>('/api/people', { signal }),
    staleTime: 60_000,
  });
