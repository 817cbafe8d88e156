import type { JournalEntry, LocalRun, LocalRunStorage } from './local-run';

/** Keeps runs as long as the page lives: where the browser gives no storage, and in tests. */
export function createMemoryRunStorage(): LocalRunStorage {
  const runs = new Map<string, LocalRun>();
  const journals = new Map<string, JournalEntry>();
  const keyOf = (runId: string, slot: string) => `${runId}|${slot}`;
  const of = <T extends { runId: string }>(kept: Map<string, T>, runId: string): T[] =>
    [...kept.values()]
      .filter((entry) => entry.runId === runId)
      .map((entry) => structuredClone(entry));
  return {
    durable: false,
    list: async (runId) => of(runs, runId),
    put: async (run) => void runs.set(keyOf(run.runId, run.slot), structuredClone(run)),
    remove: async (runId, slot) => void runs.delete(keyOf(runId, slot)),
    listJournals: (runId) => of(journals, runId),
    putJournal: (entry) =>
      void journals.set(keyOf(entry.runId, entry.slot), structuredClone(entry)),
    removeJournal: (runId, slot) => void journals.delete(keyOf(runId, slot)),
  };
}
