import { createHmac, createSign, generateKeyPairSync } from 'node:crypto';

export interface Ids {
  userId: string;
  sessionId: string;
  companyId: string;
}

const encode = (value: unknown) => Buffer.from(JSON.stringify(value)).toString('base64url');

const HASHES: Record<string, string> = { HS256: 'sha256', HS384: 'sha384', HS512: 'sha512' };

function sign(header: { alg: string } & object, claims: object, secret: string): string {
  const text = `${encode(header)}.${encode(claims)}`;
  const hash = HASHES[header.alg] ?? 'sha256';
  return `${text}.${createHmac(hash, secret).update(text).digest('base64url')}`;
}

/** A token as the server itself would sign it; the proof that only the forged part is refused below. */
export function goodToken(ids: Ids, secret: string, changes: object = {}): string {
  return sign(
    { alg: 'HS256', typ: 'JWT' } as { alg: string },
    { ...claimsOf(ids), ...changes },
    secret,
  );
}

function claimsOf({ userId, sessionId, companyId }: Ids) {
  const now = Math.floor(Date.now() / 1000);
  return {
    sub: userId,
    sid: sessionId,
    cid: companyId,
    iat: now,
    exp: now + 600,
    iss: 'fairlead',
    aud: 'fairlead-api',
  };
}

/** Tokens that must open nothing: each differs from a good one in one way. */
export function forgedTokens(ids: Ids, secret: string): [name: string, token: string][] {
  const claims = claimsOf(ids);
  const good = goodToken(ids, secret);
  const [head = '', body = '', signature = ''] = good.split('.');
  const withClaims = (changes: object) => sign({ alg: 'HS256' }, { ...claims, ...changes }, secret);
  const without = (name: string) =>
    sign(
      { alg: 'HS256' },
      Object.fromEntries(Object.entries(claims).filter(([key]) => key !== name)),
      secret,
    );
  const unsigned = (alg: unknown) => `${encode({ alg, typ: 'JWT' })}.${body}.`;
  return [
    ['alg none', unsigned('none')],
    ['alg nOnE', unsigned('nOnE')],
    ['alg missing', unsigned(undefined)],
    ['alg null', unsigned(null)],
    ['alg none with the good signature', `${encode({ alg: 'none' })}.${body}.${signature}`],
    ['HS384', sign({ alg: 'HS384' }, claims, secret)],
    ['HS512', sign({ alg: 'HS512' }, claims, secret)],
    ['RS256 by a key of their own', signRsa(claims)],
    ['another secret', sign({ alg: 'HS256' }, claims, `${secret}x`)],
    ['an empty secret', sign({ alg: 'HS256' }, claims, '')],
    [
      'a kid that names a file',
      sign({ alg: 'HS256', kid: '/dev/null' } as { alg: string }, claims, ''),
    ],
    ['a kid that is SQL', sign({ alg: 'HS256', kid: "' OR 1=1" } as { alg: string }, claims, 'x')],
    [
      'a key inside the header',
      sign({ alg: 'HS256', jwk: { kty: 'oct', k: 'eA' } } as { alg: string }, claims, 'x'),
    ],
    [
      'a key by address',
      sign({ alg: 'HS256', jku: 'https://evil.test' } as { alg: string }, claims, 'x'),
    ],
    ['no signature', `${head}.${body}`],
    ['an empty signature', `${head}.${body}.`],
    ['half a signature', `${head}.${body}.${signature.slice(0, 20)}`],
    ['one bit of the claims flipped', `${head}.${flipped(body)}.${signature}`],
    ['one bit of the signature flipped', `${head}.${body}.${flipped(signature)}`],
    ['no expiry', without('exp')],
    ['an expiry in words', withClaims({ exp: 'tomorrow' })],
    ['an expiry as text', withClaims({ exp: String(claims.exp) })],
    ['expired', withClaims({ exp: claims.iat - 1, iat: claims.iat - 900 })],
    ['an expiry years away', withClaims({ exp: claims.exp + 1e9 })],
    ['no time of issue', without('iat')],
    ['not valid yet', withClaims({ nbf: claims.iat + 600 })],
    ['another issuer', withClaims({ iss: 'fairleads' })],
    ['no issuer', without('iss')],
    ['another audience', withClaims({ aud: 'fairlead-mail' })],
    ['no audience', without('aud')],
    ['several audiences', withClaims({ aud: ['fairlead-api', 'other'] })],
    ['no subject', without('sub')],
    ['no session', without('sid')],
    ['no company', without('cid')],
    ['a subject that matches all', withClaims({ sub: 0 })],
    ['a session that matches all', withClaims({ sid: { $ne: '' } })],
    ['a company as a list', withClaims({ cid: [ids.companyId] })],
    ['somebody else in this session', withClaims({ sub: ids.companyId })],
    ['claims that are no object', sign({ alg: 'HS256' }, [] as object, secret)],
    ['not a token', 'not.a.token'],
    ['a blank', ''],
  ];
}

function signRsa(claims: object): string {
  const { privateKey } = generateKeyPairSync('rsa', { modulusLength: 2048 });
  const text = `${encode({ alg: 'RS256' })}.${encode(claims)}`;
  return `${text}.${createSign('sha256').update(text).sign(privateKey).toString('base64url')}`;
}

function flipped(text: string): string {
  const bytes = Buffer.from(text, 'base64url');
  const at = Math.floor(bytes.length / 2);
  bytes[at] = (bytes[at] ?? 0) ^ 1;
  return bytes.toString('base64url');
}
