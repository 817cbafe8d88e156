import { isJournalEntry, scopeKey } from './local-run';
import type { JournalEntry, LocalScope } from './local-run';

const PREFIX = 'fairlead.edit';

export interface EditJournal {
  list(runId: string): JournalEntry[];
  put(entry: JournalEntry): void;
  remove(runId: string, slot: string): void;
}

/** A synchronous journal in localStorage: small, and written even while the page is being taken away. */
export function createEditJournal(scope: LocalScope, storage: Storage): EditJournal {
  const prefixOf = (runId: string) => `${PREFIX}|${scopeKey(scope)}|${runId}|`;
  return {
    list: (runId) =>
      keysUnder(storage, prefixOf(runId))
        .map((key) => read(storage, key))
        .filter((entry) => entry !== null),
    put: (entry) => storage.setItem(prefixOf(entry.runId) + entry.slot, JSON.stringify(entry)),
    remove: (runId, slot) => storage.removeItem(prefixOf(runId) + slot),
  };
}

export function clearEditJournal(scope: LocalScope, storage: Storage): void {
  for (const key of keysUnder(storage, `${PREFIX}|${scopeKey(scope)}|`)) storage.removeItem(key);
}

function keysUnder(storage: Storage, prefix: string): string[] {
  const keys = Array.from({ length: storage.length }, (_, index) => storage.key(index) ?? '');
  return keys.filter((key) => key.startsWith(prefix));
}

/** An entry cut short by a crash is no entry. */
function read(storage: Storage, key: string): JournalEntry | null {
  try {
    const entry: unknown = JSON.parse(storage.getItem(key) ?? 'null');
    return isJournalEntry(entry) ? entry : null;
  } catch {
    return null;
  }
}
