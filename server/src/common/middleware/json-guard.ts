import type { NextFunction, Request, Response } from 'express';
import { LIMITS } from '@fairlead/shared';
import { ApiException } from '../api-exception';

/** Keys that a later merge could carry into a prototype. */
const REFUSED_KEYS = new Set(['__proto__', 'constructor', 'prototype']);

/**
 * Refuses a body nested deeper than a run document may be (the wrapper adds one level), and keys that reach for
 * prototypes. It runs before validation, which recurses and would overflow the stack on a hostile body.
 */
export function jsonGuard(request: Request, _response: Response, next: NextFunction): void {
  next(faultOf(request.body));
}

export function faultOf(body: unknown): ApiException | undefined {
  const stack: { value: unknown; depth: number }[] = [{ value: body, depth: 0 }];
  for (let top = stack.pop(); top !== undefined; top = stack.pop()) {
    const { value, depth } = top;
    if (typeof value !== 'object' || value === null) continue;
    if (depth > LIMITS.depth) return new ApiException(400, 'too-deep');
    for (const [key, child] of Object.entries(value)) {
      if (REFUSED_KEYS.has(key)) return new ApiException(400, 'bad-request');
      stack.push({ value: child, depth: depth + 1 });
    }
  }
  return undefined;
}
