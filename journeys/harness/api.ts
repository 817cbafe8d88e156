import { randomUUID } from 'node:crypto';
import type { Job, Run, RunDocument, SessionAnswer } from '@fairlead/shared';
import { inject } from 'vitest';
import './provided';

export const PASSWORD = 'a password of this journey';

/** A company of its own, made through the API: the quick way to data that no other journey sees. */
export interface Shop {
  email: string;
  token: string;
  session: SessionAnswer;
}

async function send<T>(method: string, path: string, body: unknown, token?: string): Promise<T> {
  const url = inject('url');
  const response = await fetch(`${url}${path}`, {
    method,
    headers: {
      'content-type': 'application/json',
      origin: url,
      'idempotency-key': randomUUID(),
      ...(token && { authorization: `Bearer ${token}` }),
    },
    body: body === undefined ? undefined : JSON.stringify(body),
  });
  if (!response.ok)
    throw new Error(`${method} ${path}: ${response.status} ${await response.text()}`);
  return (await response.json()) as T;
}

export async function makeShop(): Promise<Shop> {
  const email = `owner-${randomUUID()}@journeys.test`;
  const session = await send<SessionAnswer>('POST', '/api/auth/sign-up', {
    name: 'Robin Ortega',
    email,
    password: PASSWORD,
    companyName: 'Journey Electric',
    timeZone: 'America/Chicago',
  });
  return { email, token: session.accessToken, session };
}

export function makeJob({ token }: Shop, name = 'Mill Street Annex'): Promise<Job> {
  const id = randomUUID();
  return send('POST', '/api/jobs', { id, number: `J-${id.slice(0, 6)}`, name }, token);
}

export function makeRun({ token }: Shop, job: Job, document: RunDocument): Promise<Run> {
  return send('POST', `/api/jobs/${job.id}/runs`, { id: randomUUID(), document }, token);
}

export function readRun({ token }: Shop, runId: string): Promise<Run> {
  return send('GET', `/api/runs/${runId}`, undefined, token);
}

export function saveRun({ token }: Shop, run: Run, document: RunDocument): Promise<Run> {
  const body = { baseVersion: run.revision.version, document };
  return send('PUT', `/api/runs/${run.id}/document`, body, token);
}
