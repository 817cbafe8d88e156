import { vi } from 'vitest';

export interface SentRequest {
  method: string;
  path: string;
  headers: Headers;
  body: unknown;
}

/** What the next request gets: an answer with its status, or no answer at all. */
export type Answer = { status: number; body?: unknown } | 'no connection';

/** Answers the requests of a test in order and keeps what was sent; one request too many fails the test. */
export function answerInOrder(...answers: Answer[]): SentRequest[] {
  const sent: SentRequest[] = [];
  vi.stubGlobal('fetch', async (path: string, init: RequestInit) => {
    const answer = answers[sent.length];
    sent.push({
      method: init.method ?? 'GET',
      path,
      headers: new Headers(init.headers),
      body: typeof init.body === 'string' ? JSON.parse(init.body) : undefined,
    });
    if (answer === undefined) throw new Error(`A request nobody answers: ${path}`);
    if (answer === 'no connection') throw new TypeError('Failed to fetch');
    return new Response(answer.status === 204 ? null : JSON.stringify(answer.body ?? {}), {
      status: answer.status,
    });
  });
  return sent;
}

/** The body of an error as the server makes it. */
export const refusal = (status: number, code: string, more: object = {}) => ({
  status,
  body: { status, code, requestId: 'req-1', ...more },
});
