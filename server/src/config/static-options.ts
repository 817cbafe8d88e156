import { sep } from 'node:path';
import type { ServerResponse } from 'node:http';
import type { ServeStaticModuleOptions } from '@nestjs/serve-static';

/**
 * Any other address gets the page, which routes by itself. Not so below `/api` and `/assets`: a missing file answered
 * with HTML would be cached as a script. Files with a hash in their name never change; the page must be asked for.
 */
export function staticOptions(rootPath: string): ServeStaticModuleOptions {
  return {
    rootPath,
    exclude: ['/api/{*rest}', '/assets/{*rest}'],
    serveStaticOptions: {
      setHeaders: (response: ServerResponse, path: string) => {
        const hashed = path.includes(`${sep}assets${sep}`);
        response.setHeader(
          'Cache-Control',
          hashed ? 'public, max-age=31536000, immutable' : 'no-cache',
        );
      },
    },
  };
}
