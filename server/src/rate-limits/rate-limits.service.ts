import { createHash } from 'node:crypto';
import { Inject, Injectable } from '@nestjs/common';
import { QueryTypes } from 'sequelize';
import { Sequelize } from 'sequelize-typescript';
import { ApiException } from '../common/api-exception';
import { APP_CONFIG } from '../config/config.module';
import type { AppConfig } from '../config/environment';

export interface RateLimit {
  name: string;
  hits: number;
  seconds: number;
}

/** Sign-ins count only while they fail; see `refund`. */
export const RATE_LIMITS = {
  signInByPerson: { name: 'sign-in-person', hits: 10, seconds: 15 * 60 },
  signInByAddress: { name: 'sign-in-address', hits: 60, seconds: 15 * 60 },
  signUp: { name: 'sign-up', hits: 20, seconds: 60 * 60 },
  refresh: { name: 'refresh', hits: 300, seconds: 5 * 60 },
  analyses: { name: 'analyses', hits: 120, seconds: 60 },
} as const satisfies Record<string, RateLimit>;

/**
 * A window opens with the first hit and lasts its seconds. Counted in one table, so that all processes share a limit
 * and a restart forgets nothing.
 */
@Injectable()
export class RateLimitsService {
  constructor(
    private readonly sequelize: Sequelize,
    @Inject(APP_CONFIG) private readonly config: AppConfig,
  ) {}

  /** Counts one; throws 429 with the seconds to wait once the window is full. */
  async hit(limit: RateLimit, subject: string): Promise<void> {
    const length = limit.seconds * 1000;
    const now = new Date();
    // MariaDB assigns from left to right: `hits` still sees the old start of the window.
    const [row] = await this.sequelize.query<{ hits: number; windowStart: Date }>(
      `INSERT INTO rate_limits (bucket, window_start, hits) VALUES (:bucket, :now, 1)
       ON DUPLICATE KEY UPDATE
         hits = IF(window_start <= :over, 1, hits + 1),
         window_start = IF(window_start <= :over, :now, window_start)
       RETURNING hits, window_start AS windowStart`,
      {
        replacements: {
          bucket: bucketOf(limit, subject),
          now,
          over: new Date(now.getTime() - length),
        },
        type: QueryTypes.SELECT,
        transaction: null,
      },
    );
    if (!row || row.hits <= limit.hits * this.config.rateLimitScale) return;
    const wait = row.windowStart.getTime() + length - now.getTime();
    throw new ApiException(429, 'too-many-requests', {
      retryAfter: Math.max(1, Math.ceil(wait / 1000)),
    });
  }

  /** Takes one back: what succeeded is not guessing. Failures before it stay counted. */
  async refund(limit: RateLimit, subject: string): Promise<void> {
    await this.sequelize.query(
      'UPDATE rate_limits SET hits = hits - 1 WHERE bucket = :bucket AND hits > 0',
      {
        replacements: { bucket: bucketOf(limit, subject) },
        type: QueryTypes.UPDATE,
        transaction: null,
      },
    );
  }
}

/** Addresses and e-mails are not kept in clear. */
function bucketOf(limit: RateLimit, subject: string): string {
  return createHash('sha256').update(`${limit.name}\0${subject}`).digest('hex');
}
