import { EnvironmentError, readDatabaseEnvironment, readEnvironment } from './environment';

const SECRET = 'x'.repeat(32);
const faultsOf = (env: Record<string, string>): string[] => {
  try {
    readEnvironment(env);
    return [];
  } catch (thrown) {
    if (thrown instanceof EnvironmentError) return thrown.faults;
    throw thrown;
  }
};

it('an empty environment is a developer on this machine', () => {
  const config = readEnvironment({});
  expect(config).toMatchObject({
    production: false,
    host: '127.0.0.1',
    port: 3000,
    clientDir: null,
    rateLimitScale: 1,
  });
  expect(config.publicUrl.origin).toBe('http://127.0.0.1:3000');
  expect(Buffer.byteLength(config.jwtSecret)).toBeGreaterThanOrEqual(32);
});

it('production takes what it is given', () => {
  const config = readEnvironment({
    NODE_ENV: 'production',
    JWT_SECRET: SECRET,
    PUBLIC_URL: 'https://plan.example.test/',
    PORT: '8080',
    DATABASE_PORT: '3400',
  });
  expect(config).toMatchObject({ production: true, port: 8080, jwtSecret: SECRET });
  expect(config.publicUrl.origin).toBe('https://plan.example.test');
  expect(config.database.port).toBe(3400);
});

it.each([
  ['no secret in production', { NODE_ENV: 'production' }, 'JWT_SECRET'],
  [
    'a short secret in production',
    { NODE_ENV: 'production', JWT_SECRET: 'x'.repeat(31) },
    'JWT_SECRET',
  ],
  ['a short secret anywhere', { JWT_SECRET: 'short' }, 'JWT_SECRET'],
  [
    "a developer's secret in production",
    { NODE_ENV: 'production', JWT_SECRET: readEnvironment({}).jwtSecret },
    'JWT_SECRET',
  ],
  ['a port that is none', { PORT: '80a' }, 'PORT'],
  ['a port too high', { PORT: '65536' }, 'PORT'],
  ['a database port below zero', { DATABASE_PORT: '-1' }, 'DATABASE_PORT'],
  ['an address without a scheme', { PUBLIC_URL: 'plan.example.test' }, 'PUBLIC_URL'],
  ['an address of another scheme', { PUBLIC_URL: 'ftp://plan.example.test' }, 'PUBLIC_URL'],
  ['a database name with a quote', { DATABASE_NAME: 'a`b' }, 'DATABASE_NAME'],
  ['a limit that would be tighter', { RATE_LIMIT_SCALE: '0.5' }, 'RATE_LIMIT_SCALE'],
])('refuses %s', (_name, env, variable) => {
  expect(faultsOf(env)).toEqual([expect.stringMatching(new RegExp(`^${variable}: `))]);
});

it('counts the bytes of a secret, not its characters', () => {
  expect(faultsOf({ JWT_SECRET: 'é'.repeat(16) })).toEqual([]);
});

it('names every fault at once', () => {
  expect(faultsOf({ NODE_ENV: 'production', PORT: 'x', PUBLIC_URL: 'y' })).toHaveLength(3);
  expect(() => readDatabaseEnvironment({ DATABASE_PORT: 'x', DATABASE_NAME: '-' })).toThrow(
    EnvironmentError,
  );
});
