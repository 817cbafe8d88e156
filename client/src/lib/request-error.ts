import type { ApiError } from '@fairlead/shared';

/** No answer at all, or an answer that says no. */
export type RequestFailure = { kind: 'network' } | { kind: 'api'; error: ApiError };

export class RequestError extends Error {
  constructor(readonly failure: RequestFailure) {
    super(failure.kind === 'network' ? 'network' : failure.error.code);
    this.name = 'RequestError';
  }
}

export function failureOf(error: unknown): RequestFailure | null {
  return error instanceof RequestError ? error.failure : null;
}

/** The server's answer, when that is what went wrong. */
export function apiErrorOf(error: unknown): ApiError | null {
  const failure = failureOf(error);
  return failure?.kind === 'api' ? failure.error : null;
}
