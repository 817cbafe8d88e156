import type { NestExpressApplication } from '@nestjs/platform-express';
import { QueryTypes } from 'sequelize';
import { Sequelize } from 'sequelize-typescript';
import request from 'supertest';
import { RATE_LIMITS, RateLimitsService } from '../src/rate-limits/rate-limits.service';
import { newId } from '../src/common/new-id';
import { api } from './api';
import {
  OWN_ORIGIN,
  TEST_SECRET,
  createSecondApp,
  createTestApp,
  serverOf,
} from './create-test-app';
import { PASSWORD, factories } from './factories';
import type { Factories } from './factories';
import { forgedTokens, goodToken } from './forged-tokens';

let app: NestExpressApplication;
let make: Factories;

beforeAll(async () => {
  app = await createTestApp();
  make = factories(app);
});
// The limits count what earlier tests of this worker did from the same address.
beforeEach(() => sql('DELETE FROM rate_limits'));
afterAll(() => app.close());

function sql(text: string, replacements: object = {}) {
  return app
    .get(Sequelize)
    .query(text, { replacements: { ...replacements }, type: QueryTypes.UPDATE });
}

function rows<T extends object>(text: string, replacements: object = {}) {
  return app
    .get(Sequelize)
    .query<T>(text, { replacements: { ...replacements }, type: QueryTypes.SELECT });
}

const post = (path: string, body: object | string = {}, on = app) =>
  request(serverOf(on)).post(`/api/auth/${path}`).send(body);

const newcomer = (changes: object = {}) => ({
  name: 'Ann Lee',
  email: `ann-${newId()}@shop.test`,
  password: PASSWORD,
  companyName: `Shop ${newId()}`,
  ...changes,
});

function cookieOf(response: request.Response): string {
  const [cookie = ''] = response.get('Set-Cookie') ?? [];
  return cookie;
}
const tokenIn = (cookie: string) => cookie.split(';')[0] ?? '';

describe('signing up', () => {
  it('makes a company with its owner and signs in', async () => {
    const body = newcomer({ timeZone: 'America/Denver' });
    const answer = await post('sign-up', body);
    expect(answer.status).toBe(201);
    expect(answer.body).toMatchObject({
      expiresIn: 900,
      me: {
        user: { name: 'Ann Lee', email: body.email },
        company: { name: body.companyName, timeZone: 'America/Denver' },
        role: 'owner',
        can: { createJobs: true },
      },
    });
    const { body: me } = await api(app)('get', '/me', { token: answer.body.accessToken });
    expect(me).toEqual(answer.body.me);
    expect(cookieOf(answer)).toMatch(
      /^fairlead_refresh=[\w-]{43}; Max-Age=1209600; Path=\/; Expires=[^;]+; HttpOnly; SameSite=Strict$/,
    );
  });

  it('hashes with bcrypt at cost 12', async () => {
    const { body } = await post('sign-up', newcomer());
    const [user] = await rows<{ hash: string }>(
      'SELECT password_hash AS hash FROM users WHERE id = :id',
      {
        id: body.me.user.id,
      },
    );
    expect(user?.hash).toMatch(/^\$2b\$12\$/);
  });

  it('leaves nothing of a company behind when the e-mail is taken', async () => {
    const first = newcomer();
    await post('sign-up', first);
    const second = newcomer({ email: `  ${first.email.toUpperCase()} ` });
    const refused = await post('sign-up', second);
    expect(refused.body).toMatchObject({ status: 409, code: 'already-exists' });
    const name = { name: second.companyName };
    expect(await rows('SELECT id FROM companies WHERE name = :name', name)).toEqual([]);
  });

  it('takes a time zone it does not know for UTC', async () => {
    const { body } = await post('sign-up', newcomer({ timeZone: 'Mars/Olympus' }));
    expect(body.me.company.timeZone).toBe('UTC');
  });

  it.each([
    ['7 characters', 'seven77'],
    ['73 bytes', 'a'.repeat(73)],
    ['73 bytes in 37 characters', `${'é'.repeat(36)}a`],
    ['a NUL byte, which ends a password early', `${'a'.repeat(9)}\0b`],
    ['a number', 12345678],
    ['nothing', undefined],
  ])('refuses a password of %s and does not repeat it', async (_name, password) => {
    const { status, body, text } = await post('sign-up', newcomer({ password }));
    expect(status).toBe(400);
    expect(body.problems).toMatchObject([
      { pointer: '/password', found: null, allowed: { characters: 8, bytes: 72 } },
    ]);
    if (password) expect(text).not.toContain(String(password));
  });

  it.each(['', 'ann', 'a@b@c', 'a b@c.test', `${'a'.repeat(250)}@b.test`])(
    'refuses an e-mail that is none (%#)',
    async (email) => {
      const { body } = await post('sign-up', newcomer({ email }));
      expect(body.problems).toMatchObject([{ pointer: '/email', code: 'email' }]);
    },
  );
});

describe('signing in', () => {
  it('finds the person however the e-mail is typed', async () => {
    const { email } = await make.buildPerson({ role: 'foreman' });
    const { status, body } = await post('sign-in', {
      email: ` ${email.toUpperCase()}`,
      password: PASSWORD,
    });
    expect(status).toBe(200);
    expect(body.me).toMatchObject({ user: { email }, role: 'foreman' });
  });

  it('answers an unknown e-mail and a wrong password alike', async () => {
    const { email } = await make.buildPerson();
    const wrong = await post('sign-in', { email, password: 'not the password' });
    const unknown = await post('sign-in', { email: 'nobody@shop.test', password: PASSWORD });
    expect(wrong.status).toBe(401);
    expect({ ...unknown.body, requestId: '' }).toEqual({ ...wrong.body, requestId: '' });
    const shape = ({ headers }: request.Response) => Object.keys(headers as object).sort();
    expect(shape(unknown)).toEqual(shape(wrong));
    expect(unknown.headers['content-length']).toBe(wrong.headers['content-length']);
  });

  it('takes as long for an unknown e-mail as for a known one', async () => {
    const { body: known } = await post('sign-up', newcomer());
    const time = async (email: string) => {
      const start = performance.now();
      await post('sign-in', { email, password: 'not the password' });
      return performance.now() - start;
    };
    const times = { known: [] as number[], unknown: [] as number[] };
    for (let round = 0; round < 9; round += 1) {
      times.known.push(await time(known.me.user.email));
      times.unknown.push(await time(`nobody-${round}@shop.test`));
    }
    const median = (values: number[]) => [...values].sort((a, b) => a - b)[4] ?? 0;
    const [knownTime, unknownTime] = [median(times.known), median(times.unknown)];
    // Without the dummy hash the unknown one answers in a few milliseconds; other work on the machine moves both.
    expect(unknownTime / knownTime).toBeGreaterThan(0.6);
    expect(unknownTime / knownTime).toBeLessThan(1.67);
  });

  it('does not take a longer password for its first 72 bytes', async () => {
    const body = newcomer({ password: 'a'.repeat(72) });
    await post('sign-up', body);
    const { email } = body;
    expect((await post('sign-in', { email, password: 'a'.repeat(72) })).status).toBe(200);
    expect((await post('sign-in', { email, password: `${'a'.repeat(72)}X` })).status).toBe(401);
  });

  it.each([0, true, null, [], { $ne: '' }])('refuses %j as a password', async (password) => {
    const { email } = await make.buildPerson();
    expect((await post('sign-in', { email, password })).status).toBe(400);
  });

  it('refuses a foreign page', async () => {
    const { email } = await make.buildPerson();
    const call = post('sign-in', { email, password: PASSWORD }).set('Origin', 'https://evil.test');
    expect((await call).body.code).toBe('origin-refused');
  });
});

describe('rate limits', () => {
  it('are shared by two servers, tell when to come back and touch nobody else', async () => {
    const other = await createSecondApp();
    try {
      const [one, two] = [await make.buildPerson(), await make.buildPerson()];
      const wrong = { email: one.email, password: 'not the password' };
      for (let attempt = 0; attempt < 10; attempt += 1) {
        const { status } = await post('sign-in', wrong, attempt % 2 ? app : other);
        expect(status).toBe(401);
      }
      for (const server of [app, other]) {
        const refused = await post('sign-in', { ...wrong, password: PASSWORD }, server)
          // A header anybody can write changes no address.
          .set('X-Forwarded-For', `10.0.0.${Math.ceil(Math.random() * 200)}`);
        expect(refused.body).toMatchObject({ status: 429, code: 'too-many-requests' });
        expect(Number(refused.headers['retry-after'])).toBe(refused.body.retryAfter);
        expect(refused.body.retryAfter).toBeGreaterThan(0);
      }
      expect((await post('sign-in', { email: two.email, password: PASSWORD })).status).toBe(200);
    } finally {
      await other.close();
    }
  });

  it('do not count sign-ins that succeed', async () => {
    const { email } = await make.buildPerson();
    for (let attempt = 0; attempt < 14; attempt += 1) {
      expect((await post('sign-in', { email, password: PASSWORD })).status).toBe(200);
    }
  });

  it('stop one address that tries many people', async () => {
    const limits = app.get(RateLimitsService);
    const limit = RATE_LIMITS.signInByAddress;
    // Counted by the service itself, without sixty slow hashes.
    for (let hit = 0; hit < limit.hits; hit += 1) await limits.hit(limit, '127.0.0.1');
    const { email } = await make.buildPerson();
    expect((await post('sign-in', { email, password: PASSWORD })).status).toBe(429);
  });

  it('stop one address that signs up again and again', async () => {
    const limits = app.get(RateLimitsService);
    for (let hit = 0; hit < RATE_LIMITS.signUp.hits; hit += 1) {
      await limits.hit(RATE_LIMITS.signUp, '127.0.0.1');
    }
    expect((await post('sign-up', newcomer())).body.code).toBe('too-many-requests');
  });

  it('open again when their window is over', async () => {
    const limits = app.get(RateLimitsService);
    const limit = { name: newId(), hits: 2, seconds: 60 };
    const hit = () => limits.hit(limit, 'somebody');
    await hit();
    await hit();
    await expect(hit()).rejects.toMatchObject({ extra: { retryAfter: 60 } });
    await sql('UPDATE rate_limits SET window_start = window_start - INTERVAL 60 SECOND');
    await hit();
    await hit();
    await expect(hit()).rejects.toMatchObject({ code: 'too-many-requests' });
  });

  it('count exactly while many requests arrive at once', async () => {
    const limits = app.get(RateLimitsService);
    const limit = { name: newId(), hits: 10, seconds: 3600 };
    const hits = Array.from({ length: 25 }, () => limits.hit(limit, 'somebody'));
    const results = await Promise.allSettled(hits);
    expect(results.filter(({ status }) => status === 'fulfilled')).toHaveLength(10);
  });
});

describe('access tokens', () => {
  it('open nothing when anything about them is forged', async () => {
    const person = await make.buildPerson();
    const opened: string[] = [];
    const variants = forgedTokens(person, TEST_SECRET);
    for (const [name, token] of variants) {
      const { status, body } = await api(app)('get', '/me', { token: token || ' ' });
      if (status !== 401 || body.code !== 'not-signed-in') opened.push(`${name}: ${status}`);
    }
    expect(opened).toEqual([]);
    expect(variants.length).toBeGreaterThanOrEqual(24);
    const good = await api(app)('get', '/me', { token: goodToken(person, TEST_SECRET) });
    expect(good.status).toBe(200);
  });

  it('are not refresh tokens', async () => {
    const person = await make.buildPerson();
    expect((await api(app)('get', '/me', { token: person.refreshToken })).status).toBe(401);
  });

  it('carry no role: what the database says now counts', async () => {
    const person = await make.buildPerson({ role: 'foreman' });
    const ids = { company: person.companyId, user: person.userId };
    expect((await api(app)('get', '/people', person)).status).toBe(200);
    await sql(
      "UPDATE memberships SET role = 'crew' WHERE company_id = :company AND user_id = :user",
      ids,
    );
    expect((await api(app)('get', '/people', person)).status).toBe(403);
    await sql('DELETE FROM memberships WHERE company_id = :company AND user_id = :user', ids);
    expect((await api(app)('get', '/me', person)).status).toBe(401);
  });

  it('end with their session', async () => {
    const person = await make.buildPerson();
    await ownPage('sign-out', person.refreshToken);
    expect((await api(app)('get', '/me', person)).status).toBe(401);
  });
});

/** As our own page sends it. */
const ownPage = (path: string, refreshToken: string, name = 'fairlead_refresh') =>
  post(path).set('Origin', OWN_ORIGIN).set('Cookie', `${name}=${refreshToken}`);

const refreshTokenOf = (response: request.Response) =>
  tokenIn(cookieOf(response)).replace(/^\w+=/, '');

describe('refreshing', () => {
  it('trades a token for the next one', async () => {
    const person = await make.buildPerson();
    const first = await ownPage('refresh', person.refreshToken);
    expect(first.status).toBe(200);
    expect(first.body.me.user.id).toBe(person.userId);
    const next = refreshTokenOf(first);
    expect(next).not.toBe(person.refreshToken);
    expect((await ownPage('refresh', next)).status).toBe(200);
  });

  it('answers twenty at once with one new token and nineteen "superseded"', async () => {
    const person = await make.buildPerson();
    const answers = await Promise.all(
      Array.from({ length: 20 }, () => ownPage('refresh', person.refreshToken)),
    );
    const statuses = answers.map(({ status, body }) => `${status} ${body.code ?? ''}`).sort();
    expect(statuses).toEqual(['200 ', ...new Array<string>(19).fill('409 refresh-superseded')]);
    const winner = answers.find(({ status }) => status === 200);
    expect(winner && (await ownPage('refresh', refreshTokenOf(winner))).status).toBe(200);
  });

  it('ends the whole family when a token comes back late', async () => {
    const person = await make.buildPerson();
    const next = refreshTokenOf(await ownPage('refresh', person.refreshToken));
    await sql(
      `UPDATE refresh_tokens SET superseded_at = superseded_at - INTERVAL 11 SECOND
       WHERE session_id = :id AND superseded_at IS NOT NULL`,
      { id: person.sessionId },
    );
    const replay = await ownPage('refresh', person.refreshToken);
    expect(replay.body).toMatchObject({ status: 401, code: 'refresh-invalid' });
    expect((await ownPage('refresh', next)).status).toBe(401);
    expect((await api(app)('get', '/me', person)).status).toBe(401);
  });

  it.each([
    ['unused for 14 days', 'last_used_at = last_used_at - INTERVAL 14 DAY'],
    ['older than 90 days', 'created_at = created_at - INTERVAL 90 DAY'],
    ['ended', 'revoked_at = UTC_TIMESTAMP(3)'],
  ])('refuses a session that is %s', async (_name, change) => {
    const person = await make.buildPerson();
    await sql(`UPDATE sessions SET ${change} WHERE id = :id`, { id: person.sessionId });
    expect((await ownPage('refresh', person.refreshToken)).status).toBe(401);
  });

  it.each(['', 'x', "' OR 1=1 -- ", 'a'.repeat(3000)])(
    'refuses a token that is none (%#)',
    async (token) => {
      const answer = await ownPage('refresh', encodeURIComponent(token));
      expect(answer.body).toMatchObject({ status: 401, code: 'refresh-invalid' });
    },
  );

  it('stores no token that could be used', async () => {
    const person = await make.buildPerson();
    const [stored] = await rows<{ hash: string }>(
      'SELECT token_hash AS hash FROM refresh_tokens WHERE session_id = :id',
      { id: person.sessionId },
    );
    expect(stored?.hash).toMatch(/^[0-9a-f]{64}$/);
    expect((await ownPage('refresh', stored?.hash ?? '')).status).toBe(401);
  });

  it.each(['refresh', 'sign-out'])('by %s is for our own page only', async (path) => {
    const person = await make.buildPerson();
    const cookie = `fairlead_refresh=${person.refreshToken}`;
    const send = (headers: Record<string, string>, body: object | string = {}) =>
      post(path, body).set('Cookie', cookie).set(headers);
    const origin = { Origin: OWN_ORIGIN };
    const refused = [
      await send({}),
      await send({ Origin: 'https://evil.test' }),
      await send({ Origin: 'null' }),
      await send({ Origin: `${OWN_ORIGIN}.evil.test` }),
      await send({ Origin: 'https://fairlead.test' }),
      await send({ Origin: `${OWN_ORIGIN}:81` }),
      await send({ ...origin, 'Sec-Fetch-Site': 'cross-site' }),
      await send({ ...origin, 'Sec-Fetch-Site': 'same-site' }),
      await send({ ...origin, 'Content-Type': 'text/plain' }, '{}'),
      await send({ ...origin, 'Content-Type': 'application/x-www-form-urlencoded' }, 'a=1'),
    ];
    expect(refused.map(({ body }) => body.code)).toEqual(refused.map(() => 'origin-refused'));
    const own = await send({ ...origin, 'Sec-Fetch-Site': 'same-origin' });
    expect(own.status).toBe(path === 'refresh' ? 200 : 204);
  });
});

describe('signing out', () => {
  it('ends the session and takes the cookie back', async () => {
    const person = await make.buildPerson();
    const answer = await ownPage('sign-out', person.refreshToken);
    expect(answer.status).toBe(204);
    expect(cookieOf(answer)).toMatch(/^fairlead_refresh=; Path=\/; Expires=Thu, 01 Jan 1970/);
    expect((await ownPage('refresh', person.refreshToken)).status).toBe(401);
  });

  it('without a session is no fault', async () => {
    expect((await post('sign-out').set('Origin', OWN_ORIGIN)).status).toBe(204);
  });
});

describe('on https', () => {
  it('the cookie is Secure and bound to this host', async () => {
    const secure = await createSecondApp({ publicUrl: new URL('https://plan.fairlead.test') });
    try {
      const answer = await post('sign-up', newcomer(), secure);
      expect(cookieOf(answer)).toMatch(
        /^__Host-fairlead_refresh=.*; Path=\/;.*; HttpOnly; Secure; SameSite=Strict$/,
      );
      expect(answer.headers['strict-transport-security']).toContain('max-age=31536000');
      const next = post('refresh', {}, secure)
        .set('Origin', 'https://plan.fairlead.test')
        .set('Cookie', tokenIn(cookieOf(answer)));
      expect((await next).status).toBe(200);
    } finally {
      await secure.close();
    }
  });
});
