import { openDB } from 'idb';
import type { DBSchema, IDBPDatabase } from 'idb';
import { isLocalRun, scopeKey } from './local-run';
import type { LocalRun, LocalScope } from './local-run';

interface Schema extends DBSchema {
  /** Under [scope, run, slot]. */
  runs: { key: [string, string, string]; value: LocalRun };
}

const NAME = 'fairlead-runs';
const VERSION = 1;

let opening: Promise<IDBPDatabase<Schema>> | null = null;

/** One connection for the page; a failed opening is tried again the next time. */
function database(): Promise<IDBPDatabase<Schema>> {
  opening ??= openDB<Schema>(NAME, VERSION, {
    upgrade: (db) => void db.createObjectStore('runs'),
    blocking: (_current, _blocked, event) => (event.target as IDBDatabase).close(),
    terminated: () => {
      opening = null;
    },
  }).catch((error: unknown) => {
    opening = null;
    throw error;
  });
  return opening;
}

/** Keys sort by their parts, and a list sorts after every text: everything that begins with these parts. */
function under(...parts: string[]): IDBKeyRange {
  return IDBKeyRange.bound(parts, [...parts, []]);
}

export async function readLocalRuns(scope: LocalScope, runId: string): Promise<LocalRun[]> {
  const found: unknown[] = await (await database()).getAll('runs', under(scopeKey(scope), runId));
  return found.filter(isLocalRun);
}

export async function writeLocalRun(scope: LocalScope, run: LocalRun): Promise<void> {
  await (await database()).put('runs', run, [scopeKey(scope), run.runId, run.slot]);
}

export async function deleteLocalRun(
  scope: LocalScope,
  runId: string,
  slot: string,
): Promise<void> {
  await (await database()).delete('runs', [scopeKey(scope), runId, slot]);
}

export async function deleteLocalRunsOf(scope: LocalScope): Promise<void> {
  await (await database()).delete('runs', under(scopeKey(scope)));
}
