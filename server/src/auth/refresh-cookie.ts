import type { CookieOptions, Request, Response } from 'express';
import { IDLE_MS } from './sessions.service';

/**
 * `__Host-` lets no other host or path set the cookie, and needs Secure; over plain http a browser would refuse both.
 */
export function cookieName(publicUrl: URL): string {
  return publicUrl.protocol === 'https:' ? '__Host-fairlead_refresh' : 'fairlead_refresh';
}

function options(publicUrl: URL): CookieOptions {
  return {
    httpOnly: true,
    sameSite: 'strict',
    path: '/',
    secure: publicUrl.protocol === 'https:',
  };
}

export function readRefreshCookie(request: Request, publicUrl: URL): string | undefined {
  const cookies = request.cookies as Record<string, unknown> | undefined;
  const value = cookies?.[cookieName(publicUrl)];
  return typeof value === 'string' ? value : undefined;
}

export function setRefreshCookie(response: Response, publicUrl: URL, token: string): void {
  response.cookie(cookieName(publicUrl), token, { ...options(publicUrl), maxAge: IDLE_MS });
}

export function clearRefreshCookie(response: Response, publicUrl: URL): void {
  response.clearCookie(cookieName(publicUrl), options(publicUrl));
}
