import { Inject, Injectable, Logger } from '@nestjs/common';
import { Interval } from '@nestjs/schedule';
import { QueryTypes } from 'sequelize';
import { Sequelize } from 'sequelize-typescript';
import { IDLE_MS, LONGEST_MS } from '../auth/sessions.service';
import { APP_CONFIG } from '../config/config.module';
import type { AppConfig } from '../config/environment';
import { withNamedLock } from '../database/named-lock';

const HOUR = 60 * 60 * 1000;
const DAY = 24 * HOUR;
/** How long a deletion can be undone. */
export const UNDO_MS = 30 * DAY;
export const IDEMPOTENCY_MS = 14 * DAY;
/** Small enough that nobody waits behind its locks. */
const BATCH = 500;

/** Removes for good what nobody can need any more. One process at a time does it. */
@Injectable()
export class HousekeepingService {
  private readonly logger = new Logger(HousekeepingService.name);

  constructor(
    private readonly sequelize: Sequelize,
    @Inject(APP_CONFIG) private readonly config: AppConfig,
  ) {}

  @Interval(HOUR)
  async hourly(): Promise<void> {
    try {
      await this.purge(new Date());
    } catch (thrown) {
      // The next hour tries again.
      this.logger.warn(`purge failed: ${thrown instanceof Error ? thrown.name : 'unknown'}`);
    }
  }

  async purge(now: Date): Promise<void> {
    const before = (ms: number) => new Date(now.getTime() - ms);
    await withNamedLock(this.config.database, 'fairlead-purge', 0, async () => {
      await this.drain('runs WHERE deleted_at < :limit', before(UNDO_MS));
      await this.drain('jobs WHERE deleted_at < :limit', before(UNDO_MS));
      await this.drain('idempotency_keys WHERE created_at < :limit', before(IDEMPOTENCY_MS));
      await this.drain('sessions WHERE last_used_at < :limit', before(IDLE_MS));
      await this.drain('sessions WHERE created_at < :limit', before(LONGEST_MS));
      await this.drain('rate_limits WHERE window_start < :limit', before(DAY));
    });
  }

  /** Tables that hang on a row go with it: their foreign keys say ON DELETE CASCADE. */
  private async drain(what: string, limit: Date): Promise<void> {
    for (;;) {
      const removed = await this.sequelize.query(`DELETE FROM ${what} LIMIT ${BATCH}`, {
        replacements: { limit },
        type: QueryTypes.BULKDELETE,
      });
      if (removed < BATCH) return;
    }
  }
}
