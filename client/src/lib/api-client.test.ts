import { beforeEach, describe, expect, it } from 'vitest';
import { buildSession } from '../test/build-people';
import { answerInOrder, refusal } from '../test/fake-fetch';
import { api, refreshSession, urlOf } from './api-client';
import { apiErrorOf, failureOf } from './request-error';
import { resetSession, startSession, useSession } from './session';

const expired = refusal(401, 'not-signed-in');
const tokenOf = ({ headers }: { headers: Headers }) => headers.get('authorization');
const caught = (request: Promise<unknown>) =>
  request.then(
    () => null,
    (error: unknown) => error,
  );

beforeEach(() => {
  resetSession('unknown');
  startSession(buildSession('old'));
});

describe('a request', () => {
  it('renews an expired token and sends the same write once more, under the same key', async () => {
    const sent = answerInOrder(
      expired,
      { status: 200, body: buildSession('new') },
      { status: 201, body: { id: 'job-1' } },
    );
    expect(await api.post('/api/jobs', { name: 'Clinic' })).toEqual({ id: 'job-1' });
    expect(sent.map(({ path }) => path)).toEqual(['/api/jobs', '/api/auth/refresh', '/api/jobs']);
    expect(sent.map(tokenOf)).toEqual(['Bearer old', null, 'Bearer new']);
    const [first, , second] = sent.map(({ headers }) => headers.get('idempotency-key'));
    expect(first).toMatch(/^[0-9a-f-]{36}$/);
    expect(second).toBe(first);
  });

  it('shares one renewal between requests that expire together', async () => {
    const sent = answerInOrder(
      expired,
      expired,
      { status: 200, body: buildSession('new') },
      { status: 200, body: 1 },
      { status: 200, body: 2 },
    );
    await Promise.all([api.get('/api/jobs'), api.get('/api/me')]);
    expect(sent.filter(({ path }) => path === '/api/auth/refresh')).toHaveLength(1);
  });

  it('ends the session when the renewal is refused', async () => {
    answerInOrder(expired, refusal(401, 'refresh-invalid'));
    expect(apiErrorOf(await caught(api.get('/api/jobs')))?.code).toBe('refresh-invalid');
    expect(useSession.getState()).toMatchObject({ status: 'signed-out', left: 'ran-out' });
  });

  it('keeps the session when the renewal found no connection', async () => {
    answerInOrder(expired, 'no connection');
    expect(failureOf(await caught(api.get('/api/jobs')))).toEqual({ kind: 'network' });
    expect(useSession.getState().status).toBe('signed-in');
  });

  it('carries problems, the current row and the wait of a refusal', async () => {
    const problems = [{ pointer: '/name', code: 'too-long', found: 200, allowed: 120 }];
    answerInOrder(refusal(409, 'stale-version', { problems, current: { version: 3 } }));
    expect(apiErrorOf(await caught(api.patch('/api/jobs/1', {})))).toMatchObject({
      status: 409,
      requestId: 'req-1',
      problems,
      current: { version: 3 },
    });
  });
});

describe('renewal', () => {
  it('asks again when another tab has just renewed', async () => {
    const sent = answerInOrder(refusal(409, 'refresh-superseded'), {
      status: 200,
      body: buildSession('newer'),
    });
    expect((await refreshSession()).accessToken).toBe('newer');
    expect(sent).toHaveLength(2);
  });
});

it('leaves out of the address what is not given', () => {
  expect(urlOf('/api/jobs', { limit: 50, search: '', cursor: undefined, sort: '-name' })).toBe(
    '/api/jobs?limit=50&sort=-name',
  );
});
