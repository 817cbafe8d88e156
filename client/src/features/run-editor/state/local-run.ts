import type { EditLabel, RunDocument, SaveRunBody } from '@fairlead/shared';
import type { EditHistory } from './edit-history';

/** Whose work it is: nobody else signed in on this device ever reads it. */
export interface LocalScope {
  companyId: string;
  userId: string;
}

/** What the server last confirmed and the edits since then started from. */
export interface ServerBase {
  version: number;
  document: RunDocument;
}

/** A save that was sent and not answered: sent again as it is, under the same key, it has one effect. */
export interface PendingSave {
  key: string;
  body: SaveRunBody;
}

export type Drafts = Readonly<Record<string, string>>;

/** One open run as this device keeps it. Each tab writes under its own `slot`. */
export interface LocalRun {
  schema: 1;
  runId: string;
  slot: string;
  /** Counts the changes of this slot; the larger of two copies is the newer. */
  seq: number;
  /** ms. */
  writtenAt: number;
  base: ServerBase;
  document: RunDocument;
  history: EditHistory;
  drafts: Drafts;
  pending: PendingSave | null;
}

/** The last keystrokes, written at once where a larger write might come too late. */
export interface JournalEntry extends Omit<LocalRun, 'history'> {
  /** What the last edit was. */
  label: EditLabel | null;
}

export interface LocalRunStorage {
  /** False where nothing outlives this page, as in some private windows. */
  readonly durable: boolean;
  list(runId: string): Promise<LocalRun[]>;
  put(run: LocalRun): Promise<void>;
  remove(runId: string, slot: string): Promise<void>;
  listJournals(runId: string): JournalEntry[];
  /** Throws where there is no room. */
  putJournal(entry: JournalEntry): void;
  removeJournal(runId: string, slot: string): void;
}

/** The history is left to the database: a journal is written while the page is being taken away. */
export function journalOf(run: LocalRun, label: EditLabel | null): JournalEntry {
  const { schema, runId, slot, seq, writtenAt, base, document, drafts, pending } = run;
  return { schema, runId, slot, seq, writtenAt, base, document, drafts, pending, label };
}

export function scopeKey({ companyId, userId }: LocalScope): string {
  return `${companyId}/${userId}`;
}

/** Something else may stand under our key, from another version or another hand. */
export function isLocalRun(value: unknown): value is LocalRun {
  return isJournalEntry(value) && 'history' in value;
}

export function isJournalEntry(value: unknown): value is JournalEntry {
  if (typeof value !== 'object' || value === null) return false;
  const { schema, runId, slot, seq, base, document } = value as Record<string, unknown>;
  return (
    schema === 1 &&
    typeof runId === 'string' &&
    typeof slot === 'string' &&
    typeof seq === 'number' &&
    typeof base === 'object' &&
    base !== null &&
    typeof document === 'object' &&
    document !== null
  );
}
