import type { Run, RunDocument, RunListItem } from '@fairlead/shared';
import { mutationOptions } from '@tanstack/react-query';
import type { QueryClient } from '@tanstack/react-query';
import type { Attempt } from '../../../hooks/use-send-form';
import { api } from '../../../lib/api-client';
import { takeFromLists } from '../../../lib/list-cache';
import { jobKeys } from './job-queries';
import { runListKeys } from './run-queries';

/** The list and the job's count of runs. */
const refreshLists = (client: QueryClient, jobId: string) =>
  Promise.all([
    client.invalidateQueries({ queryKey: runListKeys.ofJob(jobId) }),
    client.invalidateQueries({ queryKey: jobKeys.all }),
  ]);

export const createRunMutation = (client: QueryClient, jobId: string) =>
  mutationOptions({
    mutationFn: ({ attempt: { id, key }, document }: { attempt: Attempt; document: RunDocument }) =>
      api.post<Run>(`/api/jobs/${jobId}/runs`, { id, document }, { idempotencyKey: key }),
    onSuccess: () => {
      void refreshLists(client, jobId);
    },
  });

export const deleteRunMutation = (client: QueryClient, jobId: string) =>
  mutationOptions({
    mutationFn: (runId: string) => api.delete<void>(`/api/runs/${runId}`),
    onMutate: async (runId) => {
      const lists = runListKeys.ofJob(jobId);
      await client.cancelQueries({ queryKey: lists });
      return { putBack: takeFromLists<RunListItem>(client, lists, runId) };
    },
    onError: (_error, _runId, context) => context?.putBack(),
    onSettled: () => refreshLists(client, jobId),
  });

export const restoreRunMutation = (client: QueryClient, jobId: string) =>
  mutationOptions({
    mutationFn: (runId: string) => api.post<unknown>(`/api/runs/${runId}/restore`),
    onSuccess: () => refreshLists(client, jobId),
  });
