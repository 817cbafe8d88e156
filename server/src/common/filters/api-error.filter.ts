import { Catch, HttpException, Logger } from '@nestjs/common';
import type { ArgumentsHost, ExceptionFilter } from '@nestjs/common';
import { ConnectionAcquireTimeoutError, ConnectionError } from 'sequelize';
import type { Request, Response } from 'express';
import type { ApiError, ErrorCode } from '@fairlead/shared';
import { ApiException } from '../api-exception';
import { requestIdOf } from '../middleware/request-id';

/** Seconds to wait when every database connection is taken. */
const BUSY_RETRY = 2;

const CODES: Partial<Record<number, ErrorCode>> = {
  401: 'not-signed-in',
  403: 'forbidden',
  404: 'not-found',
  413: 'too-large',
  429: 'too-many-requests',
};

/** The one place that turns what was thrown into an `ApiError`. */
@Catch()
export class ApiErrorFilter implements ExceptionFilter {
  private readonly logger = new Logger(ApiErrorFilter.name);

  catch(thrown: unknown, host: ArgumentsHost): void {
    const http = host.switchToHttp();
    const response = http.getResponse<Response>();
    const answer = toApiError(thrown, requestIdOf(http.getRequest<Request>()));
    if (answer.status >= 500) this.logger.error(describe(thrown), stackOf(thrown));
    if (response.headersSent) {
      response.end();
      return;
    }
    if (answer.retryAfter !== undefined) response.setHeader('Retry-After', answer.retryAfter);
    response.status(answer.status).json(answer);
  }
}

export function toApiError(thrown: unknown, requestId: string): ApiError {
  if (thrown instanceof ApiException) {
    return { status: thrown.getStatus(), code: thrown.code, requestId, ...thrown.extra };
  }
  if (isBusy(thrown)) {
    return { status: 503, code: 'server-error', requestId, retryAfter: BUSY_RETRY };
  }
  const status = statusOf(thrown);
  const code = CODES[status] ?? (status < 500 ? 'bad-request' : 'server-error');
  return { status, code, requestId };
}

function isBusy(thrown: unknown): boolean {
  return thrown instanceof ConnectionAcquireTimeoutError || thrown instanceof ConnectionError;
}

/** Nest's own exceptions and the body parser's errors carry a status; anything else is ours to fix. */
function statusOf(thrown: unknown): number {
  if (thrown instanceof HttpException) return thrown.getStatus();
  if (thrown instanceof Error && 'status' in thrown) {
    const { status } = thrown;
    if (typeof status === 'number' && status >= 400 && status < 500) return status;
  }
  return 500;
}

/** A database error's text holds the values of the statement; only its number and name are logged. */
function describe(thrown: unknown): string {
  if (!(thrown instanceof Error)) return 'something that is no Error was thrown';
  const errno = (thrown as { original?: { errno?: number } }).original?.errno;
  return errno === undefined ? `${thrown.name}: ${thrown.message}` : `${thrown.name} ${errno}`;
}

function stackOf(thrown: unknown): string | undefined {
  if (!(thrown instanceof Error)) return undefined;
  return thrown.stack
    ?.split('\n')
    .filter((line) => line.startsWith('    at '))
    .join('\n');
}
