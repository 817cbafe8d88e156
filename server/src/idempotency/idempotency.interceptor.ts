import { createHash } from 'node:crypto';
import { promisify } from 'node:util';
import { deflate, inflate } from 'node:zlib';
import { Injectable } from '@nestjs/common';
import type { CallHandler, ExecutionContext, NestInterceptor } from '@nestjs/common';
import { Reflector } from '@nestjs/core';
import { InjectModel } from '@nestjs/sequelize';
import type { Request, Response } from 'express';
import { UniqueConstraintError } from 'sequelize';
import { defaultIfEmpty, firstValueFrom, from } from 'rxjs';
import type { Observable } from 'rxjs';
import { ApiException } from '../common/api-exception';
import { ACCESS } from '../common/decorators/access';
import type { AccessDecision } from '../common/decorators/access';
import { viewerOf } from '../common/decorators/viewer';
import { isId } from '../common/pipes/id.pipe';
import { Transactions } from '../database/transactions';
import { IdempotencyKey } from './models/idempotency-key.model';

const WRITES = new Set(['POST', 'PUT', 'PATCH', 'DELETE']);
const compress = promisify<Buffer, Buffer>(deflate);
const expand = promisify<Buffer, Buffer>(inflate);

/**
 * A write that is sent again, because its answer was lost, has one effect and gets the first answer. The key is written
 * first, in the transaction of the write itself: a second request with the same key waits there until the first one
 * commits, and whatever refuses the write takes the key back with it.
 */
@Injectable()
export class IdempotencyInterceptor implements NestInterceptor {
  constructor(
    private readonly reflector: Reflector,
    private readonly transactions: Transactions,
    @InjectModel(IdempotencyKey) private readonly keys: typeof IdempotencyKey,
  ) {}

  intercept(context: ExecutionContext, next: CallHandler): Observable<unknown> {
    const request = context.switchToHttp().getRequest<Request>();
    const response = context.switchToHttp().getResponse<Response>();
    const decision = this.reflector.get<AccessDecision>(ACCESS, context.getHandler());
    if (!WRITES.has(request.method) || decision.kind === 'public') return next.handle();
    const row = this.newRow(request);
    return from(this.once(row, response, next));
  }

  private newRow(request: Request) {
    const viewer = viewerOf(request);
    const key = request.headers['idempotency-key'];
    if (!viewer || !isId(key)) {
      throw new ApiException(400, 'idempotency-key-missing', {
        problems: [
          {
            pointer: '/headers/idempotency-key',
            code: key === undefined ? 'required' : 'id',
            found: typeof key === 'string' ? key.slice(0, 64) : null,
            allowed: 'a lower-case UUID',
          },
        ],
      });
    }
    const route = `${request.method} ${request.path}`.slice(0, 200);
    return {
      companyId: viewer.companyId,
      userId: viewer.userId,
      idempotencyKey: key,
      route,
      requestHash: hashOf(route, request.body),
    };
  }

  private async once(
    row: ReturnType<IdempotencyInterceptor['newRow']>,
    response: Response,
    next: CallHandler,
  ): Promise<unknown> {
    const outcome = await this.transactions.run(async () => {
      const earlier = await this.claim(row);
      if (earlier) return { earlier };
      const answer: unknown = await firstValueFrom(next.handle().pipe(defaultIfEmpty(undefined)));
      const { companyId, userId, idempotencyKey } = row;
      await this.keys.update(
        { status: response.statusCode, answer: await pack(answer) },
        { where: { companyId, userId, idempotencyKey } },
      );
      return { answer };
    });
    return outcome.earlier
      ? this.replay(outcome.earlier, row.requestHash, response)
      : outcome.answer;
  }

  /** Takes the key, or returns the row of whoever took it before. */
  private async claim(
    row: ReturnType<IdempotencyInterceptor['newRow']>,
  ): Promise<IdempotencyKey | null> {
    try {
      await this.keys.create({ ...row, status: null, answer: null, createdAt: new Date() });
      return null;
    } catch (thrown) {
      if (!(thrown instanceof UniqueConstraintError)) throw thrown;
      const { companyId, userId, idempotencyKey } = row;
      const where = { companyId, userId, idempotencyKey };
      return this.keys.findOne({ where, rejectOnEmpty: true });
    }
  }

  private async replay(
    earlier: IdempotencyKey,
    requestHash: string,
    response: Response,
  ): Promise<unknown> {
    if (earlier.requestHash !== requestHash) throw new ApiException(422, 'idempotency-key-reused');
    response.status(earlier.status ?? 200);
    response.setHeader('Idempotency-Replayed', 'true');
    return unpack(earlier.answer);
  }
}

function hashOf(route: string, body: unknown): string {
  return createHash('sha256')
    .update(`${route}\n${JSON.stringify(body ?? null)}`)
    .digest('hex');
}

async function pack(answer: unknown): Promise<Buffer | null> {
  return answer === undefined ? null : compress(Buffer.from(JSON.stringify(answer)));
}

async function unpack(stored: Buffer | null): Promise<unknown> {
  if (stored === null) return undefined;
  return JSON.parse((await expand(stored)).toString('utf8')) as unknown;
}
