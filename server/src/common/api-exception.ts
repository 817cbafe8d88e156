import { HttpException } from '@nestjs/common';
import type { ApiError, ErrorCode, Problem } from '@fairlead/shared';

type Extra = Pick<ApiError, 'problems' | 'current' | 'retryAfter'>;

/** An answer the client decides by: status and code, never words. */
export class ApiException extends HttpException {
  constructor(
    status: number,
    readonly code: ErrorCode,
    readonly extra: Extra = {},
  ) {
    super(code, status);
  }
}

export const notFound = () => new ApiException(404, 'not-found');
export const forbidden = () => new ApiException(403, 'forbidden');
export const notSignedIn = () => new ApiException(401, 'not-signed-in');
export const staleVersion = (current: unknown) =>
  new ApiException(409, 'stale-version', { current });

export function alreadyExists(pointer: string, found: unknown): ApiException {
  return new ApiException(409, 'already-exists', {
    problems: [{ pointer, code: 'already-exists', found, allowed: null }],
  });
}

export function invalid(code: ErrorCode, problems: Problem[]): ApiException {
  return new ApiException(400, code, { problems });
}
