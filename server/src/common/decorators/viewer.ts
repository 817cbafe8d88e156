import { createParamDecorator } from '@nestjs/common';
import type { ExecutionContext } from '@nestjs/common';
import type { Request } from 'express';
import type { Viewer } from '../viewer';
import { notSignedIn } from '../api-exception';

export function viewerOf(request: Request): Viewer | undefined {
  return request.user as Viewer | undefined;
}

/** The signed-in person, for a handler's parameter. */
export const CurrentViewer = createParamDecorator((_: unknown, context: ExecutionContext) => {
  const viewer = viewerOf(context.switchToHttp().getRequest<Request>());
  if (!viewer) throw notSignedIn();
  return viewer;
});
