import { availableParallelism } from 'node:os';
import { Injectable } from '@nestjs/common';
import type { OnApplicationShutdown } from '@nestjs/common';
import { LIMITS } from '@fairlead/shared';
import { ApiException } from '../common/api-exception';
import { WorkerPool } from './worker-pool';

/** bcrypt's work factor: 2^12 rounds. */
const COST = 12;
/** What sign-in compares with when nobody has the e-mail, so that both answers take as long. Matches no password. */
const NOBODYS_HASH = '$2b$12$IbMxw5ZIqFuWv0rArqVmyOOimmT8ZegVC8eC5OKc4GU5vsP.NiqEK';
/** At a quarter of a second each, more than these would keep the last one waiting too long. */
const LONGEST_QUEUE = 60;

/** The worker's program: plain JavaScript, so that it runs from the sources and from the build alike. */
const PROGRAM = `
  const { parentPort, workerData } = require('node:worker_threads');
  const bcrypt = require(workerData.bcrypt);
  const tasks = {
    hash: ({ password, cost }) => bcrypt.hash(password, cost),
    verify: ({ password, hash }) => bcrypt.compare(password, hash),
  };
  parentPort.on('message', ({ id, task, args }) => {
    tasks[task](args).then(
      (result) => parentPort.postMessage({ id, result }),
      (error) => parentPort.postMessage({ id, error: String(error) }),
    );
  });
`;

/** Hashes away from the main thread, where ten of them would stall every other request for seconds. */
@Injectable()
export class PasswordsService implements OnApplicationShutdown {
  private readonly pool = new WorkerPool(
    PROGRAM,
    { bcrypt: require.resolve('bcryptjs') },
    Math.max(1, Math.min(2, availableParallelism() - 1)),
  );

  hash(password: string): Promise<string> {
    return this.run<string>('hash', { password, cost: COST });
  }

  /** `hash` null: the person is unknown; the answer is false and takes as long as any other. */
  async verify(password: string, hash: string | null): Promise<boolean> {
    // bcrypt ignores what follows the 72nd byte: a longer password must not pass for its beginning.
    const readable = Buffer.byteLength(password) <= LIMITS.passwordBytes;
    const matches = await this.run<boolean>('verify', { password, hash: hash ?? NOBODYS_HASH });
    return matches && readable && hash !== null;
  }

  async onApplicationShutdown(): Promise<void> {
    await this.pool.close();
  }

  private run<T>(task: string, args: object): Promise<T> {
    if (this.pool.waiting >= LONGEST_QUEUE) {
      throw new ApiException(503, 'server-error', { retryAfter: 5 });
    }
    return this.pool.run<T>(task, args);
  }
}
