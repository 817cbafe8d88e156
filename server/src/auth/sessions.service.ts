import { createHash, randomBytes } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import { InjectModel } from '@nestjs/sequelize';
import { ApiException } from '../common/api-exception';
import { newId } from '../common/new-id';
import { Transactions } from '../database/transactions';
import { RefreshToken } from './models/refresh-token.model';
import { Session } from './models/session.model';

const DAY = 24 * 60 * 60 * 1000;
/** A session nobody uses ends after this. */
export const IDLE_MS = 14 * DAY;
/** Every session ends after this. */
export const LONGEST_MS = 90 * DAY;
/** Two tabs, or an answer lost on the way, replay a token within this; later it is a stolen one. */
export const REPLAY_GRACE_MS = 10_000;

export interface OpenSession {
  session: Session;
  /** For the cookie; only its hash is stored. */
  refreshToken: string;
}

type Rotation =
  { kind: 'rotated'; open: OpenSession } | { kind: 'superseded' } | { kind: 'refused' };

/**
 * A session is a family of refresh tokens: each may be used once and is replaced by the next. Whoever replays an old
 * one holds a copy, and nobody can tell which of the two is the thief: the family dies.
 */
@Injectable()
export class SessionsService {
  constructor(
    @InjectModel(Session) private readonly sessions: typeof Session,
    @InjectModel(RefreshToken) private readonly tokens: typeof RefreshToken,
    private readonly transactions: Transactions,
  ) {}

  open(companyId: string, userId: string): Promise<OpenSession> {
    return this.transactions.run(async () => {
      const now = new Date();
      const session = await this.sessions.create({
        id: newId(),
        companyId,
        userId,
        createdAt: now,
        lastUsedAt: now,
        revokedAt: null,
      });
      return { session, refreshToken: await this.issue(session.id, now) };
    });
  }

  /** Trades a refresh token for the next one. */
  async rotate(refreshToken: string | undefined): Promise<OpenSession> {
    if (!refreshToken) throw new ApiException(401, 'refresh-invalid');
    // The outcome is returned, not thrown, so that ending the family is committed.
    const rotation = await this.transactions.run(() => this.tryRotation(refreshToken));
    if (rotation.kind === 'superseded') throw new ApiException(409, 'refresh-superseded');
    if (rotation.kind === 'refused') throw new ApiException(401, 'refresh-invalid');
    return rotation.open;
  }

  /** Ends the token's family; an unknown token has none. */
  async close(refreshToken: string | undefined): Promise<void> {
    if (!refreshToken) return;
    const token = await this.tokens.findByPk(hashOf(refreshToken));
    if (token) await this.revoke(token.sessionId, new Date());
  }

  private async tryRotation(refreshToken: string): Promise<Rotation> {
    const now = new Date();
    // The lock makes twenty simultaneous refreshes queue up: one rotates, the others find it superseded.
    const token = await this.tokens.findByPk(hashOf(refreshToken), { lock: true });
    const session = token && (await this.sessions.findByPk(token.sessionId));
    if (!session || !isAlive(session, now)) return { kind: 'refused' };
    if (token.supersededAt) {
      const age = now.getTime() - token.supersededAt.getTime();
      if (age <= REPLAY_GRACE_MS) return { kind: 'superseded' };
      await this.revoke(session.id, now);
      return { kind: 'refused' };
    }
    await token.update({ supersededAt: now });
    await session.update({ lastUsedAt: now });
    return { kind: 'rotated', open: { session, refreshToken: await this.issue(session.id, now) } };
  }

  private async issue(sessionId: string, now: Date): Promise<string> {
    const refreshToken = randomBytes(32).toString('base64url');
    await this.tokens.create({
      tokenHash: hashOf(refreshToken),
      sessionId,
      createdAt: now,
      supersededAt: null,
    });
    return refreshToken;
  }

  private async revoke(id: string, now: Date): Promise<void> {
    await this.sessions.update({ revokedAt: now }, { where: { id, revokedAt: null } });
  }
}

function isAlive(session: Session, now: Date): boolean {
  return (
    session.revokedAt === null &&
    now.getTime() - session.lastUsedAt.getTime() < IDLE_MS &&
    now.getTime() - session.createdAt.getTime() < LONGEST_MS
  );
}

/** The token is 256 random bits, so a plain hash cannot be turned back. */
function hashOf(refreshToken: string): string {
  return createHash('sha256').update(refreshToken).digest('hex');
}
