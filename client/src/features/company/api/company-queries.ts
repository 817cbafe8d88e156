import type { Company, SaveCompanySettingsBody } from '@fairlead/shared';
import { mutationOptions, queryOptions } from '@tanstack/react-query';
import type { QueryClient } from '@tanstack/react-query';
import type { Attempt } from '../../../hooks/use-send-form';
import { api } from '../../../lib/api-client';

const KEY = ['company'] as const;

export const companyQuery = () =>
  queryOptions({
    queryKey: KEY,
    queryFn: ({ signal }) => api.get<Company>('/api/company', { signal }),
  });

/** Runs and their lists are judged by the settings: what was read of them before is read anew. */
export const saveSettingsMutation = (client: QueryClient) =>
  mutationOptions({
    mutationFn: ({ attempt, body }: { attempt: Attempt; body: SaveCompanySettingsBody }) =>
      api.put<Company>('/api/company/settings', body, { idempotencyKey: attempt.key }),
    onSuccess: async (company) => {
      client.setQueryData(KEY, company);
      await client.invalidateQueries({ predicate: ({ queryKey }) => queryKey[0] !== KEY[0] });
    },
  });
