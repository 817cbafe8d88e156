import { Inject, Injectable } from '@nestjs/common';
import { PassportStrategy } from '@nestjs/passport';
import { ExtractJwt, Strategy } from 'passport-jwt';
import { isId } from '../common/pipes/id.pipe';
import type { Viewer } from '../common/viewer';
import { APP_CONFIG } from '../config/config.module';
import type { AppConfig } from '../config/environment';
import { PeopleService } from '../people/people.service';
import { ACCESS_SECONDS, AUDIENCE, ISSUER } from './token-rules';

/**
 * The library alone accepts a token without an expiry, so the claims are checked one by one: an expiry, no further
 * away than we ever sign, and ids that are ids.
 */
@Injectable()
export class JwtStrategy extends PassportStrategy(Strategy, 'jwt') {
  constructor(
    @Inject(APP_CONFIG) config: AppConfig,
    private readonly people: PeopleService,
  ) {
    super({
      jwtFromRequest: ExtractJwt.fromAuthHeaderAsBearerToken(),
      secretOrKey: config.jwtSecret,
      algorithms: ['HS256'],
      issuer: ISSUER,
      audience: AUDIENCE,
      ignoreExpiration: false,
    });
  }

  async validate(claims: Record<string, unknown>): Promise<Viewer | false> {
    const { sub, sid, cid, exp, iat, aud } = claims;
    if (typeof exp !== 'number' || typeof iat !== 'number') return false;
    if (exp - iat > ACCESS_SECONDS || aud !== AUDIENCE) return false;
    if (!isId(sub) || !isId(sid) || !isId(cid)) return false;
    return (await this.people.findViewer({ userId: sub, sessionId: sid, companyId: cid })) ?? false;
  }
}
