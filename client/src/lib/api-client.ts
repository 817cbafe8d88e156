import type { ApiError, SessionAnswer } from '@fairlead/shared';
import { noticeBuild } from './build-watch';
import { newId } from './ids';
import { RequestError } from './request-error';
import { endSession, startSession, useSession } from './session';

export type Query = Record<string, string | number | undefined>;

export interface RequestOptions {
  query?: Query;
  body?: unknown;
  signal?: AbortSignal;
  /** Given by whoever repeats a write: the same key has one effect. */
  idempotencyKey?: string;
  /** Sign-in and its kind: no token is sent and a 401 is the answer, not an expired session. */
  anonymous?: boolean;
  /** Lets a last save outlive the page. */
  keepalive?: boolean;
}

type Method = 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE';

/** A replay within moments of a rotation is told so; the newer cookie is then already on its way from another tab. */
const SUPERSEDED_WAITS = [150, 400, 1000];

const pause = (milliseconds: number) =>
  new Promise<void>((resolve) => setTimeout(resolve, milliseconds));

export function urlOf(path: string, query: Query = {}): string {
  const given = Object.entries(query).flatMap(([name, value]) =>
    value === undefined || value === '' ? [] : [[name, String(value)]],
  );
  return given.length === 0 ? path : `${path}?${new URLSearchParams(given).toString()}`;
}

async function errorOf(response: Response): Promise<ApiError> {
  const body = (await response.json().catch(() => null)) as Partial<ApiError> | null;
  const waitHeader = Number(response.headers.get('retry-after'));
  return {
    status: response.status,
    code: body?.code ?? 'server-error',
    requestId: body?.requestId ?? response.headers.get('x-request-id') ?? '',
    problems: body?.problems,
    current: body?.current,
    retryAfter: body?.retryAfter ?? (waitHeader > 0 ? waitHeader : undefined),
  };
}

async function send(method: Method, path: string, options: RequestOptions): Promise<Response> {
  const headers = new Headers({ accept: 'application/json' });
  const token = useSession.getState().accessToken;
  if (!options.anonymous && token) headers.set('authorization', `Bearer ${token}`);
  const hasBody = method !== 'GET' && method !== 'DELETE';
  if (hasBody) headers.set('content-type', 'application/json');
  if (method !== 'GET' && !options.anonymous && options.idempotencyKey) {
    headers.set('idempotency-key', options.idempotencyKey);
  }
  let response: Response;
  try {
    response = await fetch(urlOf(path, options.query), {
      method,
      headers,
      body: hasBody ? JSON.stringify(options.body ?? {}) : undefined,
      signal: options.signal,
      credentials: 'same-origin',
      keepalive: options.keepalive,
    });
  } catch (error) {
    if (options.signal?.aborted) throw error;
    throw new RequestError({ kind: 'network' });
  }
  noticeBuild(response.headers.get('x-fairlead-build'));
  return response;
}

async function refreshOnce(attempt = 0): Promise<SessionAnswer> {
  const response = await send('POST', '/api/auth/refresh', { anonymous: true });
  if (response.ok) return (await response.json()) as SessionAnswer;
  const error = await errorOf(response);
  const wait = SUPERSEDED_WAITS[attempt];
  if (error.code === 'refresh-superseded' && wait !== undefined) {
    await pause(wait);
    return refreshOnce(attempt + 1);
  }
  throw new RequestError({ kind: 'api', error });
}

let refreshing: Promise<SessionAnswer> | null = null;

/** Trades the refresh cookie for a new access token; callers at the same time share one request. */
export function refreshSession(): Promise<SessionAnswer> {
  refreshing ??= refreshOnce()
    .then((answer) => {
      startSession(answer);
      return answer;
    })
    .catch((error: unknown) => {
      const answered = error instanceof RequestError && error.failure.kind === 'api';
      if (answered && error.failure.error.status === 401) endSession(false);
      throw error;
    })
    .finally(() => {
      refreshing = null;
    });
  return refreshing;
}

/** Sends one request; an expired access token is renewed and the same request sent once more. */
export async function request<T>(
  method: Method,
  path: string,
  given: RequestOptions = {},
): Promise<T> {
  const options = { ...given, idempotencyKey: given.idempotencyKey ?? newId() };
  const tokenUsed = useSession.getState().accessToken;
  let response = await send(method, path, options);
  if (response.status === 401 && !options.anonymous) {
    const { accessToken } = useSession.getState();
    if (accessToken === null || accessToken === tokenUsed) await refreshSession();
    response = await send(method, path, options);
  }
  if (!response.ok) throw new RequestError({ kind: 'api', error: await errorOf(response) });
  return (response.status === 204 ? undefined : await response.json()) as T;
}

export const api = {
  get: <T>(path: string, options?: RequestOptions) => request<T>('GET', path, options),
  post: <T>(path: string, body?: unknown, options?: RequestOptions) =>
    request<T>('POST', path, { ...options, body }),
  put: <T>(path: string, body?: unknown, options?: RequestOptions) =>
    request<T>('PUT', path, { ...options, body }),
  patch: <T>(path: string, body?: unknown, options?: RequestOptions) =>
    request<T>('PATCH', path, { ...options, body }),
  delete: <T>(path: string, options?: RequestOptions) => request<T>('DELETE', path, options),
};
