import { setTimeout as wait } from 'node:timers/promises';
import { Injectable } from '@nestjs/common';
import { Transaction } from 'sequelize';
import { Sequelize } from 'sequelize-typescript';
import { inTransaction } from './transaction-context';

/** Deadlock, lock wait timeout, and "record has changed since last read". */
const CONFLICTS = new Set([1213, 1205, 1020]);
const ATTEMPTS = 5;
const LONGEST_PAUSE_MS = 200;

/**
 * Runs work in one transaction; work that already runs in one joins it. When the database says that two transactions
 * met, the whole of it runs again, so `work` must not leave traces outside the database.
 *
 * READ COMMITTED, because every save carries its own version check in the WHERE, and the row that refused it must be
 * read as it stands now.
 */
@Injectable()
export class Transactions {
  constructor(private readonly sequelize: Sequelize) {}

  async run<T>(work: () => Promise<T>): Promise<T> {
    if (inTransaction()) return work();
    const isolationLevel = Transaction.ISOLATION_LEVELS.READ_COMMITTED;
    for (let attempt = 1; ; attempt += 1) {
      try {
        return await this.sequelize.transaction({ isolationLevel }, work);
      } catch (thrown) {
        if (attempt === ATTEMPTS || !isConflict(thrown)) throw thrown;
        await wait(10 + Math.random() * (LONGEST_PAUSE_MS - 10));
      }
    }
  }
}

export function isConflict(thrown: unknown): boolean {
  const errno = errnoOf(thrown);
  return errno !== undefined && CONFLICTS.has(errno);
}

function errnoOf(thrown: unknown): number | undefined {
  if (!(thrown instanceof Error)) return undefined;
  const { original, errno } = thrown as Error & {
    original?: { errno?: number };
    errno?: number;
  };
  return original?.errno ?? errno;
}
