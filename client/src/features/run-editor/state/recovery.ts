import { clearEditJournal, createEditJournal } from './edit-journal';
import {
  deleteLocalRun,
  deleteLocalRunsOf,
  readLocalRuns,
  writeLocalRun,
} from './local-run-database';
import type { LocalRunStorage, LocalScope } from './local-run';
import { createMemoryRunStorage } from './memory-run-storage';

/**
 * Where this device keeps the runs of one person in one company until the server has them. What IndexedDB or localStorage
 * refuse, as in some private windows, is kept in memory instead; `durable` then says that it won't outlive the page.
 */
export async function openLocalRuns(scope: LocalScope): Promise<LocalRunStorage> {
  const memory = createMemoryRunStorage();
  const local = localStorageOrNull();
  const journal = local && createEditJournal(scope, local);
  const durable = await hasDatabase(scope);
  return {
    durable,
    list: durable ? (runId) => readLocalRuns(scope, runId) : memory.list,
    put: durable ? (run) => writeLocalRun(scope, run) : memory.put,
    remove: durable ? (runId, slot) => deleteLocalRun(scope, runId, slot) : memory.remove,
    listJournals: journal?.list ?? memory.listJournals,
    putJournal: journal?.put ?? memory.putJournal,
    removeJournal: journal?.remove ?? memory.removeJournal,
  };
}

/** Takes everything of one person in one company off this device: on signing out. */
export async function clearLocalRuns(scope: LocalScope): Promise<void> {
  const local = localStorageOrNull();
  if (local) clearEditJournal(scope, local);
  if (await hasDatabase(scope)) await deleteLocalRunsOf(scope);
}

async function hasDatabase(scope: LocalScope): Promise<boolean> {
  try {
    await readLocalRuns(scope, '');
    return true;
  } catch {
    return false;
  }
}

/** Even reading the property throws where a browser forbids storage. */
function localStorageOrNull(): Storage | null {
  try {
    return globalThis.localStorage ?? null;
  } catch {
    return null;
  }
}
