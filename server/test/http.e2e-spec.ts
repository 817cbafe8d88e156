import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { connect } from 'node:net';
import type { AddressInfo } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { NestExpressApplication } from '@nestjs/platform-express';
import { buildRun } from '@fairlead/shared';
import { Sequelize } from 'sequelize-typescript';
import request from 'supertest';
import { newId } from '../src/common/new-id';
import { api } from './api';
import { createSecondApp, createTestApp, serverOf } from './create-test-app';
import { factories } from './factories';
import type { Factories, TestPerson } from './factories';

let app: NestExpressApplication;
let make: Factories;
let owner: TestPerson;

beforeAll(async () => {
  app = await createTestApp();
  make = factories(app);
  owner = await make.buildPerson();
});
afterAll(() => app.close());

const postRaw = (body: string, type = 'application/json') =>
  request(serverOf(app))
    .post('/api/jobs')
    .set('Authorization', `Bearer ${owner.token}`)
    .set('Idempotency-Key', newId())
    .set('Content-Type', type)
    .send(body);

describe('every response', () => {
  it.each([
    ['an answer', '/api/health', 200],
    ['a refusal', '/api/me', 401],
    ['a wrong address', '/api/nothing', 404],
    ['a wrong address outside the API', '/nothing', 404],
  ])('%s carries the build, a request id and the security headers', async (_name, path, status) => {
    const { headers, body, ...answer } = await request(serverOf(app)).get(path);
    expect(answer.status).toBe(status);
    expect(headers).toMatchObject({
      'x-fairlead-build': 'test',
      'x-content-type-options': 'nosniff',
      'referrer-policy': 'no-referrer',
      'cross-origin-opener-policy': 'same-origin',
      'x-frame-options': 'DENY',
      'content-security-policy':
        "default-src 'self';style-src 'self' 'unsafe-inline';img-src 'self' data: blob:;" +
        "object-src 'none';base-uri 'none';form-action 'self';frame-ancestors 'none'",
    });
    expect(headers['x-powered-by']).toBeUndefined();
    expect(headers['access-control-allow-origin']).toBeUndefined();
    // Plain http on this machine: a browser must not be told to come back by https.
    expect(headers['strict-transport-security']).toBeUndefined();
    if (path.startsWith('/api')) expect(headers['cache-control']).toBe('no-store');
    if (status >= 400) expect(body.requestId).toBe(headers['x-request-id']);
  });
});

describe('a hostile body', () => {
  const nested = (depth: number) => '['.repeat(depth) + ']'.repeat(depth);

  it.each([
    ['deep lists', `{"name":${nested(50_000)}}`, 400, 'too-deep'],
    ['a list at the top, too deep', nested(40), 400, 'too-deep'],
    ['deep objects', `${'{"a":'.repeat(8000)}1${'}'.repeat(8000)}`, 400, 'too-deep'],
    ['a prototype', '{"__proto__":{"role":"owner"}}', 400, 'bad-request'],
    ['a constructor, deeper', '{"a":[{"constructor":{"prototype":{}}}]}', 400, 'bad-request'],
    ['half of one', '{"name":', 400, 'bad-request'],
    ['not JSON', 'name=Roof', 400, 'bad-request'],
    ['a word', '"name"', 400, 'bad-request'],
    ['too much', `{"name":"${'x'.repeat(400_000)}"}`, 413, 'too-large'],
    ['nothing', '', 400, 'validation-failed'],
    ['a list', '[]', 400, 'validation-failed'],
  ])('of %s is refused', async (_name, body, status, code) => {
    const start = performance.now();
    const answer = await postRaw(body);
    expect([answer.status, answer.body.code]).toEqual([status, code]);
    expect(performance.now() - start).toBeLessThan(1000);
    expect(({} as { role?: string }).role).toBeUndefined();
  });

  it('of another type is no body', async () => {
    const job = JSON.stringify({ id: newId(), number: 'J', name: 'Roof' });
    const { status, body } = await postRaw(job, 'text/plain');
    expect([status, body.code]).toEqual([400, 'validation-failed']);
  });

  it('with a document at the depth limit still arrives', async () => {
    const { id } = await make.buildJob({ by: owner });
    const document = { ...buildRun(), surprise: JSON.parse(nested(30)) };
    const sent = { id: newId(), document };
    const { body } = await api(app)('post', `/jobs/${id}/runs`, owner, sent);
    expect(body.code).toBe('invalid-document');
  });
});

describe('when something breaks', () => {
  it('the answer says neither what nor where', async () => {
    const query = jest
      .spyOn(app.get(Sequelize), 'query')
      .mockRejectedValue(new Error('SELECT secret FROM users at /srv/app.ts:1'));
    try {
      const { status, body, text } = await api(app)('get', '/me', owner);
      expect(status).toBe(500);
      expect(body).toEqual({ status: 500, code: 'server-error', requestId: expect.any(String) });
      expect(text).not.toMatch(/secret|users|\.ts/);
      const health = await api(app)('get', '/health');
      expect(health.status).toBe(503);
      expect(health.headers['retry-after']).toBe('2');
    } finally {
      query.mockRestore();
    }
    expect((await api(app)('get', '/me', owner)).status).toBe(200);
  });
});

it('TRACE and method overrides do nothing', async () => {
  const { port } = serverOf(app).address() as AddressInfo;
  const socket = connect(port, '127.0.0.1');
  socket.write(
    'TRACE /api/me HTTP/1.1\r\nHost: x\r\nX-Secret: canary\r\nConnection: close\r\n\r\n',
  );
  let text = '';
  for await (const chunk of socket) text += String(chunk);
  expect(text).toMatch(/^HTTP\/1.1 404/);
  expect(text).not.toContain('canary');
  const job = await make.buildJob({ by: owner });
  await request(serverOf(app))
    .get(`/api/jobs/${job.id}?_method=DELETE`)
    .set('Authorization', `Bearer ${owner.token}`)
    .set('X-HTTP-Method-Override', 'DELETE');
  expect((await api(app)('get', `/jobs/${job.id}`, owner)).status).toBe(200);
});

describe('with a built client', () => {
  let folder: string;
  let served: NestExpressApplication;
  const get = (path: string) => request(serverOf(served)).get(path);

  beforeAll(async () => {
    folder = mkdtempSync(join(tmpdir(), 'fairlead-client-'));
    mkdirSync(join(folder, 'assets'));
    writeFileSync(join(folder, 'index.html'), '<!doctype html><title>Fairlead</title>');
    writeFileSync(
      join(folder, 'assets', 'app-1a2b.js'),
      `export const words = '${'word '.repeat(500)}';`,
    );
    served = await createSecondApp({ clientDir: folder });
  });
  afterAll(async () => {
    await served.close();
    rmSync(folder, { recursive: true });
  });

  it.each(['/', '/index.html', '/jobs', '/jobs/x/runs/y', '/apiary'])(
    '%s is the page, asked for each time',
    async (path) => {
      const { status, text, headers } = await get(path);
      expect([status, text]).toEqual([200, expect.stringContaining('<title>Fairlead')]);
      expect(headers['cache-control']).toBe('no-cache');
      expect(headers['content-security-policy']).toContain("default-src 'self'");
    },
  );

  it('a file with a hash in its name is kept for good, and compressed', async () => {
    const { status, headers } = await get('/assets/app-1a2b.js').set('Accept-Encoding', 'gzip');
    expect(status).toBe(200);
    expect(headers['cache-control']).toBe('public, max-age=31536000, immutable');
    expect(headers['content-encoding']).toBe('gzip');
  });

  it.each(['/assets/app-9z9z.js', '/api/nothing', '/api', '/assets/../../package.json'])(
    '%s is missing, and not the page',
    async (path) => {
      const { status, text } = await get(path);
      expect(status).toBe(404);
      expect(text).not.toContain('<title>');
    },
  );
});
