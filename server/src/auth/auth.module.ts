import { Module } from '@nestjs/common';
import { JwtModule } from '@nestjs/jwt';
import { PassportModule } from '@nestjs/passport';
import { SequelizeModule } from '@nestjs/sequelize';
import { PeopleModule } from '../people/people.module';
import { AccessTokensService } from './access-tokens.service';
import { AuthController } from './auth.controller';
import { AuthService } from './auth.service';
import { JwtStrategy } from './jwt.strategy';
import { RefreshToken } from './models/refresh-token.model';
import { Session } from './models/session.model';
import { PasswordsService } from './passwords.service';
import { RateLimitsService } from './rate-limits.service';
import { SessionsService } from './sessions.service';

@Module({
  imports: [
    SequelizeModule.forFeature([Session, RefreshToken]),
    JwtModule.register({}),
    PassportModule,
    PeopleModule,
  ],
  controllers: [AuthController],
  providers: [
    AccessTokensService,
    AuthService,
    JwtStrategy,
    PasswordsService,
    RateLimitsService,
    SessionsService,
  ],
  exports: [AccessTokensService, PasswordsService, SessionsService],
})
export class AuthModule {}
