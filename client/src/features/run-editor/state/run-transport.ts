import type { ApiError, Run, SaveRunBody } from '@fairlead/shared';

/** What the store needs of the server. */
export interface RunTransport {
  /** Rejects with a `TransportFailure`. */
  saveDocument(
    runId: string,
    body: SaveRunBody,
    idempotencyKey: string,
    signal?: AbortSignal,
  ): Promise<Run>;
}

/** `network`: no answer, so whether the save arrived is not known. */
export type TransportFailure = { kind: 'network' } | { kind: 'api'; error: ApiError };

/** Anything thrown that is not an answer of the API counts as no answer. */
export function asTransportFailure(thrown: unknown): TransportFailure {
  if (typeof thrown === 'object' && thrown !== null && 'kind' in thrown) {
    const failure = thrown as { kind: unknown; error?: unknown };
    if (failure.kind === 'api' && typeof failure.error === 'object' && failure.error !== null) {
      return { kind: 'api', error: failure.error as ApiError };
    }
  }
  return { kind: 'network' };
}
