import type { Run, RunDocument } from '@fairlead/shared';
import { deepEqual } from './deep-equal';
import type { PendingSave, ServerBase } from './local-run';
import type { PageSignals } from './page-signals';
import type { NeedsYouReason, Saving } from './run-editor-state';
import { asTransportFailure } from './run-transport';
import type { RunTransport } from './run-transport';
import { readFailedSave } from './save-answer';
import type { FailedSave } from './save-answer';

/** A pause in the edits this long sends them. */
export const SAVE_AFTER_MS = 600;
/** An answer that takes longer counts as none. */
export const ANSWER_WITHIN_MS = 30_000;
const FIRST_RETRY_MS = 1_000;
const LONGEST_RETRY_MS = 30_000;

/** What the saver reads of the open run and tells it. */
export interface SaverHost {
  runId: string;
  document(): RunDocument;
  base(): ServerBase;
  pending(): PendingSave | null;
  /** Kept on this device before anything is sent. */
  setPending(pending: PendingSave | null): void;
  /** The server has `document`; `run` is its answer. */
  confirmed(run: Run, document: RunDocument): void;
  conflict(theirs: Run): void;
  inConflict(): boolean;
  status(saving: Omit<Saving, 'savedAt' | 'kept'>): void;
  newId(): string;
}

export interface RunSaver {
  /** The document changed. */
  touched(): void;
  /** Sends now what waits; resolves when its answer, or that there is none, is known. Not while a person is asked. */
  flush(): Promise<void>;
  /** The person asks to try again, whatever the last answer was. */
  retry(): Promise<void>;
  hasUnsent(): boolean;
  stop(): void;
}

/**
 * Sends the document to the server: after a pause in the edits, one save at a time, each on top of the version the last
 * one gave. A save without an answer is sent again as it was, under its own key, before anything newer; so whether it
 * had arrived or not, it has one effect and the next save knows its version.
 */
export function createRunSaver(
  host: SaverHost,
  transport: RunTransport,
  page: PageSignals,
): RunSaver {
  let timer: ReturnType<typeof setTimeout> | null = null;
  let sending: Promise<void> | null = null;
  let failures = 0;
  let asked: NeedsYouReason | null = null;
  let isStopped = false;

  const isDirty = () => !deepEqual(host.document(), host.base().document);
  const hasUnsent = () => host.pending() !== null || isDirty();
  const status = (state: Saving['state'], rest: Partial<Saving> = {}) =>
    host.status({
      state,
      waiting: state === 'saved' ? 0 : 1,
      reason: null,
      problems: [],
      requestId: null,
      ...rest,
    });

  function schedule(afterMs: number): void {
    if (timer !== null) clearTimeout(timer);
    timer = isStopped ? null : setTimeout(() => void flush(), afterMs);
  }

  function touched(): void {
    if (isStopped || host.inConflict()) return;
    if (asked === 'not-allowed' || asked === 'gone' || asked === 'signed-out') return;
    if (!hasUnsent()) {
      if (sending === null) settle();
      return;
    }
    asked = null;
    if (failures === 0 && page.isOnline()) status('saving');
    else status('local');
    // While the server can't be reached the next attempt is set already; typing doesn't put it off.
    if (failures === 0 || timer === null) schedule(SAVE_AFTER_MS);
  }

  function settle(): void {
    if (timer !== null) clearTimeout(timer);
    timer = null;
    failures = 0;
    asked = null;
    status('saved');
  }

  function flush(): Promise<void> {
    if (timer !== null) clearTimeout(timer);
    timer = null;
    if (sending !== null)
      return sending.then(() => (failures === 0 && hasUnsent() ? flush() : undefined));
    if (host.inConflict() || asked !== null) return Promise.resolve();
    if (!hasUnsent()) {
      settle();
      return Promise.resolve();
    }
    if (!page.isOnline()) {
      failures = Math.max(failures, 1);
      status('local');
      schedule(LONGEST_RETRY_MS);
      return Promise.resolve();
    }
    sending = send().finally(() => {
      sending = null;
    });
    return sending;
  }

  async function send(): Promise<void> {
    const pending = host.pending() ?? {
      key: host.newId(),
      body: { baseVersion: host.base().version, document: host.document() },
    };
    host.setPending(pending);
    if (failures === 0) status('saving');
    const abort = new AbortController();
    const tooLong = setTimeout(() => abort.abort(), ANSWER_WITHIN_MS);
    try {
      const answer = transport.saveDocument(host.runId, pending.body, pending.key, abort.signal);
      const run = await Promise.race([answer, rejectOn(abort.signal)]);
      accept(run, pending.body.document);
    } catch (thrown) {
      failed(readFailedSave(asTransportFailure(thrown)), pending);
    } finally {
      clearTimeout(tooLong);
    }
  }

  /** More may have been typed while the answer was on its way. */
  function accept(run: Run, document: RunDocument): void {
    failures = 0;
    host.setPending(null);
    host.confirmed(run, document);
    if (!hasUnsent()) return settle();
    status('saving');
    schedule(SAVE_AFTER_MS);
  }

  function failed(answer: FailedSave, { body }: PendingSave): void {
    switch (answer.next) {
      case 'again':
        return tryLater(answer.afterMs);
      case 'again-with-new-key':
        host.setPending(null);
        return tryLater(null);
      case 'conflict':
        host.setPending(null);
        return metAnother(answer.theirs, body.document);
      case 'ask':
        if (answer.isSettled) host.setPending(null);
        asked = answer.reason;
        failures = 0;
        return status('needs-you', {
          reason: answer.reason,
          problems: answer.problems,
          requestId: answer.requestId,
        });
    }
  }

  function tryLater(afterMs: number | null): void {
    const doubled = Math.min(FIRST_RETRY_MS * 2 ** failures, LONGEST_RETRY_MS);
    failures += 1;
    status('local');
    schedule(afterMs ?? doubled);
  }

  /** A newer version that holds exactly what was sent, or what it was sent on top of, took nothing from anyone. */
  function metAnother(theirs: Run, sent: RunDocument): void {
    const { document } = theirs.revision;
    const isKnown = [host.document(), sent, host.base().document].some((own) =>
      deepEqual(own, document),
    );
    failures = 0;
    if (!isKnown) {
      status('needs-you', { reason: 'conflict' });
      return host.conflict(theirs);
    }
    host.confirmed(theirs, document);
    if (!hasUnsent()) return settle();
    schedule(0);
  }

  const stopListening = page.on('online', () => {
    if (hasUnsent()) void flush();
  });

  return {
    touched,
    flush,
    retry: () => {
      asked = null;
      return flush();
    },
    hasUnsent,
    stop: () => {
      isStopped = true;
      if (timer !== null) clearTimeout(timer);
      timer = null;
      stopListening();
    },
  };
}

function rejectOn(signal: AbortSignal): Promise<never> {
  return new Promise((_, reject) => {
    signal.addEventListener('abort', () => reject({ kind: 'network' }));
  });
}
