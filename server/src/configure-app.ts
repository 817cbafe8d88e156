import type { NestExpressApplication } from '@nestjs/platform-express';
import compression from 'compression';
import cookieParser from 'cookie-parser';
import type { NextFunction, Request, Response } from 'express';
import helmet from 'helmet';
import { Logger } from 'nestjs-pino';
import { LIMITS } from '@fairlead/shared';
import { jsonGuard } from './common/middleware/json-guard';
import { requestId } from './common/middleware/request-id';
import type { AppConfig } from './config/environment';

/** A whole document and what wraps it. */
const BODY_BYTES = LIMITS.documentBytes + 44 * 1024;

/** Everything around the modules; the tests use the same, so they meet the real thing. */
export function configureApp(app: NestExpressApplication, config: AppConfig): void {
  app.useLogger(app.get(Logger));
  app.setGlobalPrefix('api');
  app.disable('x-powered-by');
  app.use(requestId(config.buildId));
  app.use(securityHeaders(config));
  app.use(compression());
  app.use('/api', noStore);
  app.use(cookieParser());
  app.useBodyParser('json', { limit: BODY_BYTES });
  app.use(jsonGuard);
}

function securityHeaders({ publicUrl }: AppConfig) {
  const https = publicUrl.protocol === 'https:';
  return helmet({
    contentSecurityPolicy: {
      useDefaults: false,
      directives: {
        defaultSrc: ["'self'"],
        // The component library sets styles from script.
        styleSrc: ["'self'", "'unsafe-inline'"],
        imgSrc: ["'self'", 'data:', 'blob:'],
        objectSrc: ["'none'"],
        baseUri: ["'none'"],
        formAction: ["'self'"],
        frameAncestors: ["'none'"],
      },
    },
    frameguard: { action: 'deny' },
    // On plain http a browser would be told to go where nobody listens.
    strictTransportSecurity: https && { maxAge: 31_536_000, includeSubDomains: true },
  });
}

/** Answers belong to one person; no cache keeps them. */
function noStore(_request: Request, response: Response, next: NextFunction): void {
  response.setHeader('Cache-Control', 'no-store');
  next();
}
