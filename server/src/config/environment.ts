/** What the process is told from outside, checked once at boot. */
export interface AppConfig {
  production: boolean;
  host: string;
  port: number;
  /** The address people type: feeds the Origin check and whether cookies are Secure. */
  publicUrl: URL;
  /** Sent with each response, so that an open page notices a newer build. */
  buildId: string;
  /** Folder of the built client; null: the API alone. */
  clientDir: string | null;
  logLevel: string;
  jwtSecret: string;
  database: DatabaseConfig;
  /** Multiplies every rate limit; 1 outside load tests and browser journeys. */
  rateLimitScale: number;
}

export interface DatabaseConfig {
  host: string;
  port: number;
  name: string;
  user: string;
  password: string;
}

/** Every fault at once, so that a first start is not a guessing game. */
export class EnvironmentError extends Error {
  constructor(readonly faults: string[]) {
    super(`The environment is not complete:\n${faults.map((fault) => `  ${fault}`).join('\n')}`);
  }
}

type Environment = Record<string, string | undefined>;

/** HS256 wants a key at least as long as its hash: 256 bits (RFC 7518, 3.2). */
const SECRET_BYTES = 32;
/** Only outside production, so that a developer's first start needs nothing. */
const DEVELOPMENT_SECRET = 'a development secret, never used in production';

export function readEnvironment(env: Environment): AppConfig {
  const faults: string[] = [];
  const production = env.NODE_ENV === 'production';
  const host = env.HOST || '127.0.0.1';
  const port = readPort('PORT', env.PORT, 3000, faults);
  const config: AppConfig = {
    production,
    host,
    port,
    publicUrl: readUrl(env.PUBLIC_URL || `http://${host}:${port}`, faults),
    buildId: env.BUILD_ID || 'development',
    clientDir: env.CLIENT_DIR || null,
    logLevel: env.LOG_LEVEL || 'info',
    jwtSecret: readSecret(env.JWT_SECRET, production, faults),
    database: readDatabase(env, faults),
    rateLimitScale: readScale(env.RATE_LIMIT_SCALE, faults),
  };
  if (faults.length > 0) throw new EnvironmentError(faults);
  return config;
}

export function readDatabaseEnvironment(env: Environment): DatabaseConfig {
  const faults: string[] = [];
  const database = readDatabase(env, faults);
  if (faults.length > 0) throw new EnvironmentError(faults);
  return database;
}

function readDatabase(env: Environment, faults: string[]): DatabaseConfig {
  const name = env.DATABASE_NAME || 'fairlead';
  if (!/^[A-Za-z0-9_]{1,64}$/.test(name)) {
    faults.push('DATABASE_NAME: letters, digits and _ only');
  }
  return {
    host: env.DATABASE_HOST || '127.0.0.1',
    port: readPort('DATABASE_PORT', env.DATABASE_PORT, 3307, faults),
    name,
    user: env.DATABASE_USER || 'fairlead',
    password: env.DATABASE_PASSWORD ?? '',
  };
}

function readSecret(value: string | undefined, production: boolean, faults: string[]): string {
  if (!value) {
    if (production) faults.push(`JWT_SECRET: missing; at least ${SECRET_BYTES} bytes`);
    return DEVELOPMENT_SECRET;
  }
  if (Buffer.byteLength(value) < SECRET_BYTES) {
    faults.push(`JWT_SECRET: too short; at least ${SECRET_BYTES} bytes`);
  }
  if (production && value === DEVELOPMENT_SECRET) {
    faults.push('JWT_SECRET: the development secret is known to everyone');
  }
  return value;
}

function readPort(name: string, value: string | undefined, fallback: number, faults: string[]) {
  if (!value) return fallback;
  const port = Number(value);
  if (!/^\d+$/.test(value) || port < 0 || port > 65_535) {
    faults.push(`${name}: a port from 0 to 65535`);
    return fallback;
  }
  return port;
}

function readUrl(value: string, faults: string[]): URL {
  const url = URL.canParse(value) ? new URL(value) : null;
  if (url && (url.protocol === 'http:' || url.protocol === 'https:')) return url;
  faults.push('PUBLIC_URL: an http or https address');
  return new URL('http://127.0.0.1');
}

function readScale(value: string | undefined, faults: string[]): number {
  if (!value) return 1;
  const scale = Number(value);
  if (Number.isFinite(scale) && scale >= 1) return scale;
  faults.push('RATE_LIMIT_SCALE: a number from 1');
  return 1;
}
