import { Module } from '@nestjs/common';
import { JwtModule } from '@nestjs/jwt';
import { PassportModule } from '@nestjs/passport';
import { SequelizeModule } from '@nestjs/sequelize';
import { PeopleModule } from '../people/people.module';
import { RateLimitsModule } from '../rate-limits/rate-limits.module';
import { AccessTokensService } from './access-tokens.service';
import { AuthController } from './auth.controller';
import { AuthService } from './auth.service';
import { JwtStrategy } from './jwt.strategy';
import { RefreshToken } from './models/refresh-token.model';
import { Session } from './models/session.model';
import { PasswordsService } from './passwords.service';
import { SessionsService } from './sessions.service';

@Module({
  imports: [
    SequelizeModule.forFeature([Session, RefreshToken]),
    JwtModule.register({}),
    PassportModule,
    PeopleModule,
    RateLimitsModule,
  ],
  controllers: [AuthController],
  providers: [AccessTokensService, AuthService, JwtStrategy, PasswordsService, SessionsService],
  exports: [AccessTokensService, PasswordsService, SessionsService],
})
export class AuthModule {}
