import type { CreateJobBody, Job, Person, UpdateJobBody } from '@fairlead/shared';
import { mutationOptions } from '@tanstack/react-query';
import type { QueryClient } from '@tanstack/react-query';
import type { Attempt } from '../../../hooks/use-send-form';
import { api } from '../../../lib/api-client';
import { takeFromLists } from '../../../lib/list-cache';
import { jobKeys } from './job-queries';

export const createJobMutation = (client: QueryClient) =>
  mutationOptions({
    mutationFn: ({ attempt, body }: { attempt: Attempt; body: Omit<CreateJobBody, 'id'> }) =>
      api.post<Job>('/api/jobs', { ...body, id: attempt.id }, { idempotencyKey: attempt.key }),
    onSuccess: (job) => {
      client.setQueryData(jobKeys.one(job.id), job);
      return client.invalidateQueries({ queryKey: jobKeys.lists });
    },
  });

export const updateJobMutation = (client: QueryClient, jobId: string) =>
  mutationOptions({
    mutationFn: ({ attempt, body }: { attempt: Attempt; body: UpdateJobBody }) =>
      api.patch<Job>(`/api/jobs/${jobId}`, body, { idempotencyKey: attempt.key }),
    onSuccess: (job) => {
      client.setQueryData(jobKeys.one(jobId), job);
      return client.invalidateQueries({ queryKey: jobKeys.lists });
    },
  });

/** The row goes at once and comes back if the server says no. */
export const deleteJobMutation = (client: QueryClient) =>
  mutationOptions({
    mutationFn: (jobId: string) => api.delete<void>(`/api/jobs/${jobId}`),
    onMutate: async (jobId) => {
      await client.cancelQueries({ queryKey: jobKeys.lists });
      return { putBack: takeFromLists<Job>(client, jobKeys.lists, jobId) };
    },
    onError: (_error, _jobId, context) => context?.putBack(),
    onSettled: () => client.invalidateQueries({ queryKey: jobKeys.lists }),
  });

export const restoreJobMutation = (client: QueryClient) =>
  mutationOptions({
    mutationFn: (jobId: string) => api.post<unknown>(`/api/jobs/${jobId}/restore`),
    onSuccess: () => client.invalidateQueries({ queryKey: jobKeys.all }),
  });

export interface PersonOnJob {
  person: Person;
  on: boolean;
}

/** Puts a person on the job or takes them off; shown before the server has answered, put back if it says no. */
export const personOnJobMutation = (client: QueryClient, jobId: string) =>
  mutationOptions({
    mutationFn: ({ person, on }: PersonOnJob) => {
      const path = `/api/jobs/${jobId}/people/${person.id}`;
      return on ? api.put<unknown>(path) : api.delete<unknown>(path);
    },
    onMutate: async ({ person, on }) => {
      await client.cancelQueries({ queryKey: jobKeys.one(jobId) });
      const before = client.getQueryData<Job>(jobKeys.one(jobId));
      if (before) {
        const others = before.people.filter(({ id }) => id !== person.id);
        client.setQueryData<Job>(jobKeys.one(jobId), {
          ...before,
          people: on ? [...others, person] : others,
        });
      }
      return { before };
    },
    onError: (_error, _change, context) => client.setQueryData(jobKeys.one(jobId), context?.before),
    onSettled: () => client.invalidateQueries({ queryKey: jobKeys.all }),
  });
