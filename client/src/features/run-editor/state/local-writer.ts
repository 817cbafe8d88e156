import type { EditLabel } from '@fairlead/shared';
import { journalOf } from './local-run';
import type { LocalRun, LocalRunStorage } from './local-run';

/** A change reaches the journal within this, and the database within the other. */
export const JOURNAL_WITHIN_MS = 200;
export const STORE_WITHIN_MS = 300;

export interface LocalWriter {
  /** Something changed that a reload has to bring back. */
  touched(): void;
  /** Writes now: the journal before this returns, the database as soon as it can; false where that failed. */
  writeNow(): Promise<boolean>;
  stop(): void;
}

export interface LocalWriterHost {
  /** What to keep; null where the server has all of it and there is nothing to bring back. */
  snapshot(): LocalRun | null;
  /** Counts the changes. */
  seq(): number;
  slot: string;
  runId: string;
  lastLabel(): EditLabel | null;
  /** Whether the last write got through. */
  kept(isKept: boolean): void;
}

/**
 * Keeps the open run on this device. The timers are not put off by further changes, so that steady typing is written too.
 * The journal is taken back as soon as the database holds the same or more.
 */
export function createLocalWriter(host: LocalWriterHost, storage: LocalRunStorage): LocalWriter {
  const { runId, slot } = host;
  let journalTimer: ReturnType<typeof setTimeout> | null = null;
  let storeTimer: ReturnType<typeof setTimeout> | null = null;
  let journalSeq = -1;
  let queue: Promise<boolean> = Promise.resolve(true);

  function writeJournal(): void {
    journalTimer = null;
    const run = host.snapshot();
    if (!run) return;
    try {
      storage.putJournal(journalOf(run, host.lastLabel()));
      journalSeq = run.seq;
    } catch {
      // No room: the database has it a moment later.
    }
  }

  /** One after the other, so that an older write never lands on a newer one. */
  function store(): Promise<boolean> {
    storeTimer = null;
    const run = host.snapshot();
    const seq = host.seq();
    const write = async (): Promise<boolean> => {
      try {
        await (run ? storage.put(run) : storage.remove(runId, slot));
        if (journalSeq <= seq) storage.removeJournal(runId, slot);
        host.kept(storage.durable || run === null);
        return true;
      } catch {
        host.kept(false);
        return false;
      }
    };
    queue = queue.then(write);
    return queue;
  }

  function clear(): void {
    if (journalTimer !== null) clearTimeout(journalTimer);
    if (storeTimer !== null) clearTimeout(storeTimer);
    journalTimer = null;
    storeTimer = null;
  }

  return {
    touched: () => {
      journalTimer ??= setTimeout(writeJournal, JOURNAL_WITHIN_MS);
      storeTimer ??= setTimeout(() => void store(), STORE_WITHIN_MS);
    },
    writeNow: () => {
      clear();
      writeJournal();
      return store();
    },
    stop: clear,
  };
}
