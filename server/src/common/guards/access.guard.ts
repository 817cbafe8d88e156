import { Injectable } from '@nestjs/common';
import type { ExecutionContext } from '@nestjs/common';
import { Reflector } from '@nestjs/core';
import { AuthGuard } from '@nestjs/passport';
import type { Request } from 'express';
import type { Viewer } from '../viewer';
import { holds } from '../access/rights';
import { forbidden, notSignedIn } from '../api-exception';
import { ACCESS } from '../decorators/access';
import type { AccessDecision } from '../decorators/access';
import { viewerOf } from '../decorators/viewer';

/** Asks the handler's decision, then the token, then the role. Nothing is open by omission. */
@Injectable()
export class AccessGuard extends AuthGuard('jwt') {
  constructor(private readonly reflector: Reflector) {
    super();
  }

  override async canActivate(context: ExecutionContext): Promise<boolean> {
    const decision = this.reflector.get<AccessDecision | undefined>(ACCESS, context.getHandler());
    if (!decision) throw new Error(`${context.getHandler().name} carries no access decision`);
    if (decision.kind === 'public') return true;
    await super.canActivate(context);
    const viewer = viewerOf(context.switchToHttp().getRequest<Request>());
    if (!viewer) throw notSignedIn();
    if (decision.kind === 'can' && !holds(viewer.role, decision.right)) throw forbidden();
    return true;
  }

  override handleRequest<TUser = Viewer>(error: unknown, viewer: TUser | false): TUser {
    // A broken database must not read as "signed out".
    if (error) throw error;
    if (!viewer) throw notSignedIn();
    return viewer;
  }
}
