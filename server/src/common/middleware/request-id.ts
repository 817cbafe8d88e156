import { randomUUID } from 'node:crypto';
import type { NextFunction, Request, Response } from 'express';

const ids = new WeakMap<Request, string>();

export function requestIdOf(request: Request): string {
  return ids.get(request) ?? 'unknown';
}

/** Names each request, on every response and in the log; says which build answered. */
export function requestId(buildId: string) {
  return (request: Request, response: Response, next: NextFunction): void => {
    const id = randomUUID();
    ids.set(request, id);
    response.setHeader('X-Request-Id', id);
    response.setHeader('X-Fairlead-Build', buildId);
    next();
  };
}
