import type { IncomingMessage } from 'node:http';
import type { Options } from 'pino-http';
import type { Request } from 'express';
import { requestIdOf } from '../common/middleware/request-id';
import type { AppConfig } from './environment';

/** One JSON line per event; no headers, bodies or query strings, so no secret can be in one. */
export function loggerOptions({ logLevel }: AppConfig): Options {
  return {
    level: logLevel,
    quietReqLogger: true,
    genReqId: (request: IncomingMessage) => requestIdOf(request as Request),
    serializers: {
      req: ({ id, method, url }: { id: string; method: string; url: string }) => ({
        id,
        method,
        path: url.split('?')[0],
      }),
      res: ({ statusCode }: { statusCode: number }) => ({ status: statusCode }),
      err: ({ type, message }: { type: string; message: string }) => ({ type, message }),
    },
  };
}
