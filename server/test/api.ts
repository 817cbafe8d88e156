import type { NestExpressApplication } from '@nestjs/platform-express';
import request from 'supertest';
import { newId } from '../src/common/new-id';
import { serverOf } from './create-test-app';

type Method = 'get' | 'post' | 'put' | 'patch' | 'delete';

interface Sender {
  token?: string;
}

/** Sends as a person (or nobody), with a fresh idempotency key on each write. */
export function api(app: NestExpressApplication) {
  return (method: Method, path: string, { token }: Sender = {}, body?: object, key?: string) => {
    let call = request(serverOf(app))[method](`/api${path}`);
    if (token) call = call.set('Authorization', `Bearer ${token}`);
    if (method !== 'get') call = call.set('Idempotency-Key', key ?? newId());
    return body === undefined ? call : call.send(body);
  };
}

export type Api = ReturnType<typeof api>;

/** Nobody has it. */
export const missingId = newId;
