import type { Request } from 'express';

/** Who is counted where nobody is signed in. */
export function addressOf(request: Request): string {
  return request.ip ?? 'unknown';
}
