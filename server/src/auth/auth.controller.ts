import { Body, Controller, Get, HttpCode, Inject, Post, Req, Res, UseGuards } from '@nestjs/common';
import type { Request, Response } from 'express';
import type { Me, SessionAnswer } from '@fairlead/shared';
import { addressOf } from '../common/address-of';
import { Public, SignedIn } from '../common/decorators/access';
import { CurrentViewer } from '../common/decorators/viewer';
import { OriginRequired, OwnOriginGuard } from '../common/guards/own-origin.guard';
import type { Viewer } from '../common/viewer';
import { APP_CONFIG } from '../config/config.module';
import type { AppConfig } from '../config/environment';
import { presentMe } from '../people/person.presenter';
import { AuthService } from './auth.service';
import type { SignedIn as SignedInPerson } from './auth.service';
import { EmptyDto } from './dto/empty.dto';
import { SignInDto } from './dto/sign-in.dto';
import { SignUpDto } from './dto/sign-up.dto';
import { clearRefreshCookie, readRefreshCookie, setRefreshCookie } from './refresh-cookie';

@Controller()
@UseGuards(OwnOriginGuard)
export class AuthController {
  constructor(
    private readonly auth: AuthService,
    @Inject(APP_CONFIG) private readonly config: AppConfig,
  ) {}

  @Public()
  @Post('auth/sign-up')
  async signUp(
    @Body() body: SignUpDto,
    @Req() request: Request,
    @Res({ passthrough: true }) response: Response,
  ): Promise<SessionAnswer> {
    return this.hand(response, await this.auth.signUp(body, addressOf(request)));
  }

  @Public()
  @Post('auth/sign-in')
  @HttpCode(200)
  async signIn(
    @Body() body: SignInDto,
    @Req() request: Request,
    @Res({ passthrough: true }) response: Response,
  ): Promise<SessionAnswer> {
    return this.hand(response, await this.auth.signIn(body, addressOf(request)));
  }

  @Public()
  @OriginRequired()
  @Post('auth/refresh')
  @HttpCode(200)
  async refresh(
    @Body() _body: EmptyDto,
    @Req() request: Request,
    @Res({ passthrough: true }) response: Response,
  ): Promise<SessionAnswer> {
    const token = readRefreshCookie(request, this.config.publicUrl);
    return this.hand(response, await this.auth.refresh(token, addressOf(request)));
  }

  @Public()
  @OriginRequired()
  @Post('auth/sign-out')
  @HttpCode(204)
  async signOut(
    @Body() _body: EmptyDto,
    @Req() request: Request,
    @Res({ passthrough: true }) response: Response,
  ): Promise<void> {
    await this.auth.signOut(readRefreshCookie(request, this.config.publicUrl));
    clearRefreshCookie(response, this.config.publicUrl);
  }

  @SignedIn()
  @Get('me')
  me(@CurrentViewer() viewer: Viewer): Me {
    return presentMe(viewer);
  }

  /** The refresh token goes into the cookie and nowhere else. */
  private hand(response: Response, { answer, refreshToken }: SignedInPerson): SessionAnswer {
    setRefreshCookie(response, this.config.publicUrl, refreshToken);
    return answer;
  }
}
