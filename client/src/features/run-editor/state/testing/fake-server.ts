import type { ApiError, Run, RunDocument, SaveRunBody } from '@fairlead/shared';
import { deepEqual } from '../deep-equal';
import type { RunTransport } from '../run-transport';
import { buildRunAnswer } from './build-run-answer';

/** What happens to the next save, or to every one from now on. */
export type Weather =
  | 'good'
  | 'request-lost'
  | 'answer-lost'
  | 'silent'
  | { status: number; code: ApiError['code']; retryAfter?: number };

export interface SaveCall {
  key: string;
  body: SaveRunBody;
}

/** A server with one run: versions, idempotency keys and bad weather. Answers come after `delay` ms. */
export class FakeServer implements RunTransport {
  run: Run;
  weather: Weather = 'good';
  delay = 20;
  calls: SaveCall[] = [];
  /** How many saves took effect. */
  effects = 0;
  inFlight = 0;
  mostInFlight = 0;
  private answers = new Map<string, { body: SaveRunBody; run: Run }>();

  constructor(document?: RunDocument) {
    this.run = buildRunAnswer(document);
  }

  /** Somebody else saves. */
  saveElsewhere(document: RunDocument, savedBy = 'Sam'): Run {
    this.run = buildRunAnswer(document, {
      version: this.run.revision.version + 1,
      savedBy,
      savedAt: `2026-12-04T08:00:${String(this.run.revision.version).padStart(2, '0')}.000Z`,
    });
    return this.run;
  }

  async saveDocument(
    _runId: string,
    body: SaveRunBody,
    key: string,
    signal?: AbortSignal,
  ): Promise<Run> {
    this.calls.push(structuredClone({ key, body }));
    this.inFlight += 1;
    this.mostInFlight = Math.max(this.mostInFlight, this.inFlight);
    try {
      const { weather } = this;
      await new Promise((resolve, reject) => {
        setTimeout(resolve, weather === 'silent' ? 1e9 : this.delay);
        signal?.addEventListener('abort', () => reject({ kind: 'network' }));
      });
      if (weather === 'request-lost') throw { kind: 'network' };
      if (typeof weather === 'object') throw apiFailure(weather);
      const run = this.save(structuredClone(body), key);
      if (weather === 'answer-lost') throw { kind: 'network' };
      return structuredClone(run);
    } finally {
      this.inFlight -= 1;
    }
  }

  private save(body: SaveRunBody, key: string): Run {
    const known = this.answers.get(key);
    if (known) {
      if (!deepEqual(known.body, body))
        throw apiFailure({ status: 422, code: 'idempotency-key-reused' });
      return known.run;
    }
    if (body.baseVersion !== this.run.revision.version) {
      throw apiFailure({ status: 409, code: 'stale-version', current: structuredClone(this.run) });
    }
    this.effects += 1;
    const run = this.saveElsewhere(body.document, 'Pat');
    this.answers.set(key, { body, run });
    return run;
  }
}

function apiFailure(error: Partial<ApiError>) {
  return { kind: 'api', error: { requestId: 'req-1', problems: undefined, ...error } };
}
