import { Inject, Injectable } from '@nestjs/common';
import { JwtService } from '@nestjs/jwt';
import { APP_CONFIG } from '../config/config.module';
import type { AppConfig } from '../config/environment';
import type { Session } from './models/session.model';
import { ACCESS_SECONDS, AUDIENCE, ISSUER } from './token-rules';

@Injectable()
export class AccessTokensService {
  constructor(
    private readonly jwt: JwtService,
    @Inject(APP_CONFIG) private readonly config: AppConfig,
  ) {}

  /** Says who, in which session and company; role and membership are asked of the database on each request. */
  sign({ id, userId, companyId }: Session): Promise<string> {
    return this.jwt.signAsync(
      { sid: id, cid: companyId },
      {
        secret: this.config.jwtSecret,
        algorithm: 'HS256',
        subject: userId,
        issuer: ISSUER,
        audience: AUDIENCE,
        expiresIn: ACCESS_SECONDS,
      },
    );
  }
}
