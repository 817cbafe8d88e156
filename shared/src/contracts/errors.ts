/** Stable codes the client decides by; the words stand in `words/en`. */
export const ERROR_CODES = [
  'bad-request',
  'validation-failed',
  'invalid-document',
  'too-deep',
  'too-large',
  'base-version-missing',
  'not-signed-in',
  'wrong-credentials',
  'refresh-superseded',
  'refresh-invalid',
  'origin-refused',
  'forbidden',
  'not-found',
  'stale-version',
  'already-exists',
  'idempotency-key-missing',
  'idempotency-key-reused',
  'too-many-requests',
  'server-error',
] as const;
export type ErrorCode = (typeof ERROR_CODES)[number];

/** One thing wrong with what was sent; `pointer` is a JSON pointer. */
export interface Problem {
  pointer: string;
  code: string;
  found: unknown;
  allowed: unknown;
}

export interface ApiError {
  status: number;
  code: ErrorCode;
  requestId: string;
  problems?: Problem[];
  /** On `stale-version`: what stands now. */
  current?: unknown;
  /** On `too-many-requests`: seconds. */
  retryAfter?: number;
}
