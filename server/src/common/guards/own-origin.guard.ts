import { Inject, Injectable, SetMetadata } from '@nestjs/common';
import type { CanActivate, ExecutionContext } from '@nestjs/common';
import { Reflector } from '@nestjs/core';
import type { Request } from 'express';
import { APP_CONFIG } from '../../config/config.module';
import type { AppConfig } from '../../config/environment';
import { ApiException } from '../api-exception';

const CHECK = 'fairlead:origin-required';
/** The handler acts on the cookie alone, so the request must say that it comes from our own page. */
export const OriginRequired = () => SetMetadata(CHECK, true);

const LOOPBACK = ['localhost', '127.0.0.1', '[::1]'];

/**
 * Cookies travel with requests a foreign page makes; `Origin` tells them apart. Where the handler needs the cookie the
 * header must be there and be ours, elsewhere a foreign one is refused. A form cannot send JSON, so the body's type is
 * asked for too.
 */
@Injectable()
export class OwnOriginGuard implements CanActivate {
  private readonly allowed: ReadonlySet<string>;

  constructor(
    private readonly reflector: Reflector,
    @Inject(APP_CONFIG) config: AppConfig,
  ) {
    this.allowed = allowedOrigins(config.publicUrl);
  }

  canActivate(context: ExecutionContext): boolean {
    const request = context.switchToHttp().getRequest<Request>();
    const required = this.reflector.get<boolean>(CHECK, context.getHandler()) === true;
    const { origin } = request.headers;
    const site = request.headers['sec-fetch-site'];
    const known = origin === undefined ? !required : this.allowed.has(origin);
    const sameSite = site === undefined || site === 'same-origin' || site === 'none';
    const json = !required || request.is('application/json') === 'application/json';
    if (known && sameSite && json) return true;
    throw new ApiException(403, 'origin-refused');
  }
}

/** On loopback a person may type any of its names; the port still has to be ours. */
export function allowedOrigins(publicUrl: URL): ReadonlySet<string> {
  if (!LOOPBACK.includes(publicUrl.hostname)) return new Set([publicUrl.origin]);
  return new Set(
    LOOPBACK.map((name) => {
      const url = new URL(publicUrl);
      url.hostname = name;
      return url.origin;
    }),
  );
}
