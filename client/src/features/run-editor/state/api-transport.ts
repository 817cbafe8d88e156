import type { Run } from '@fairlead/shared';
import { api } from '../../../lib/api-client';
import { failureOf } from '../../../lib/request-error';
import type { RunTransport } from './run-transport';

/** Saves over the API; expired sessions are renewed there. */
export const apiTransport: RunTransport = {
  saveDocument: async (runId, body, idempotencyKey, signal) => {
    try {
      return await api.put<Run>(`/api/runs/${runId}/document`, body, { idempotencyKey, signal });
    } catch (error) {
      throw failureOf(error) ?? error;
    }
  },
};
