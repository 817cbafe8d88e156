import { Injectable } from '@nestjs/common';
import type { SessionAnswer, SignInBody, SignUpBody } from '@fairlead/shared';
import { ApiException, alreadyExists } from '../common/api-exception';
import { Transactions } from '../database/transactions';
import { PeopleService } from '../people/people.service';
import { presentMe } from '../people/person.presenter';
import { AccessTokensService } from './access-tokens.service';
import { PasswordsService } from './passwords.service';
import { RATE_LIMITS, RateLimitsService } from '../rate-limits/rate-limits.service';
import { SessionsService } from './sessions.service';
import type { OpenSession } from './sessions.service';
import { ACCESS_SECONDS } from './token-rules';

export interface SignedIn {
  answer: SessionAnswer;
  refreshToken: string;
}

@Injectable()
export class AuthService {
  constructor(
    private readonly people: PeopleService,
    private readonly passwords: PasswordsService,
    private readonly sessions: SessionsService,
    private readonly accessTokens: AccessTokensService,
    private readonly limits: RateLimitsService,
    private readonly transactions: Transactions,
  ) {}

  /**
   * A company and its owner, or neither. A taken e-mail is said openly: until mail can carry the answer, silence would
   * leave a person who forgot an earlier sign-up stuck, and the limit per address keeps it from listing e-mails.
   */
  async signUp(body: SignUpBody, address: string): Promise<SignedIn> {
    await this.limits.hit(RATE_LIMITS.signUp, address);
    const passwordHash = await this.passwords.hash(body.password);
    const open = await this.transactions.run(async () => {
      const owner = await this.people.createCompanyWithOwner({ ...body, passwordHash });
      if (!owner) throw alreadyExists('/email', body.email);
      return this.sessions.open(owner.companyId, owner.userId);
    });
    return this.present(open);
  }

  /** Unknown person, wrong password, no company: one answer, one duration. */
  async signIn(body: SignInBody, address: string): Promise<SignedIn> {
    const person = `${body.email}\0${address}`;
    await this.limits.hit(RATE_LIMITS.signInByAddress, address);
    await this.limits.hit(RATE_LIMITS.signInByPerson, person);
    const account = await this.people.findAccount(body.email);
    const right = await this.passwords.verify(body.password, account?.passwordHash ?? null);
    if (!account || !right) throw new ApiException(401, 'wrong-credentials');
    await this.limits.refund(RATE_LIMITS.signInByAddress, address);
    await this.limits.refund(RATE_LIMITS.signInByPerson, person);
    return this.present(await this.sessions.open(account.companyId, account.userId));
  }

  async refresh(refreshToken: string | undefined, address: string): Promise<SignedIn> {
    await this.limits.hit(RATE_LIMITS.refresh, address);
    return this.present(await this.sessions.rotate(refreshToken));
  }

  signOut(refreshToken: string | undefined): Promise<void> {
    return this.sessions.close(refreshToken);
  }

  private async present({ session, refreshToken }: OpenSession): Promise<SignedIn> {
    const { id, userId, companyId } = session;
    const viewer = await this.people.findViewer({ sessionId: id, userId, companyId });
    if (!viewer) throw new ApiException(401, 'refresh-invalid');
    const accessToken = await this.accessTokens.sign(session);
    return {
      answer: { accessToken, expiresIn: ACCESS_SECONDS, me: presentMe(viewer) },
      refreshToken,
    };
  }
}
