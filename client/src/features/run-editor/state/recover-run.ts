import type { EditLabel, Run, RunDocument } from '@fairlead/shared';
import { parseRunDocument } from '@fairlead/shared';
import { deepEqual } from './deep-equal';
import { patchDocument } from './document-patches';
import { NO_HISTORY, firstDocument, recordEdit, stepBetween } from './edit-history';
import type { EditHistory } from './edit-history';
import type { Drafts, JournalEntry, LocalRun, PendingSave, ServerBase } from './local-run';

/** Where an opened run starts from. */
export interface StartingPoint {
  base: ServerBase;
  document: RunDocument;
  history: EditHistory;
  drafts: Drafts;
  pending: PendingSave | null;
  /** True when work the server doesn't have was brought back. */
  restored: boolean;
  /** True when the server moved on while this work lay here: a person has to choose. */
  conflict: boolean;
  /** The copies this start has taken over; removed once its own is written. */
  adopted: string[];
}

export function freshStart(run: Run): StartingPoint {
  return {
    base: baseOf(run),
    document: run.revision.document,
    history: NO_HISTORY,
    drafts: {},
    pending: null,
    restored: false,
    conflict: false,
    adopted: [],
  };
}

export function baseOf(run: Run): ServerBase {
  return { version: run.revision.version, document: run.revision.document };
}

/**
 * Puts together what the server has and what closed tabs of this device left behind. The newest unsent copy is the run;
 * an older unsent one becomes a step Undo goes back to. Nothing is dropped unless the server has it.
 */
export function recoverRun(
  run: Run,
  copies: readonly LocalRun[],
  journals: readonly JournalEntry[],
): StartingPoint {
  const kept = withJournals(copies, journals)
    .filter(({ document }) => parseRunDocument(document).ok)
    .sort((a, b) => b.writtenAt - a.writtenAt);
  const fresh = freshStart(run);
  const newest = kept[0];
  if (!newest) return fresh;
  const adopted = kept.map(({ slot }) => slot);
  const unsent = kept.filter((copy) => !isKnown(copy.document, run, copy));
  const mine = unsent[0];
  if (!mine) {
    const same = kept.find(({ document }) => deepEqual(document, run.revision.document));
    return {
      ...fresh,
      document: same?.document ?? fresh.document,
      history: same?.history ?? NO_HISTORY,
      drafts: newest.drafts,
      adopted,
    };
  }
  const placed = placeBase(run, mine);
  return {
    ...placed,
    document: mine.document,
    history: unsent
      .slice(1)
      .filter((older) => !passedThrough(mine, older.document))
      .reduce((history, older) => startedFrom(older, mine, history), mine.history),
    drafts: newest.drafts,
    restored: true,
    adopted,
  };
}

/** A copy without anything the server has not seen: what it shows now, or what it had confirmed to that copy. */
function isKnown(document: RunDocument, run: Run, copy: LocalRun): boolean {
  return (
    deepEqual(document, run.revision.document) ||
    (copy.pending === null && deepEqual(document, copy.base.document))
  );
}

/** Which of the server's versions the unsent work stands on. */
function placeBase(
  run: Run,
  { base, pending }: LocalRun,
): Pick<StartingPoint, 'base' | 'pending' | 'conflict'> {
  const shown = run.revision.document;
  // The page may have been handed an older answer than the one this copy was made from.
  if (base.version >= run.revision.version) return { base, pending, conflict: false };
  const isOurs = pending !== null && deepEqual(shown, pending.body.document);
  if (isOurs || deepEqual(shown, base.document)) {
    return { base: baseOf(run), pending: null, conflict: false };
  }
  return { base, pending: null, conflict: true };
}

/** A journal is the last word of its slot where it is newer than the copy. */
function withJournals(copies: readonly LocalRun[], journals: readonly JournalEntry[]): LocalRun[] {
  const bySlot = new Map(copies.map((copy) => [copy.slot, copy]));
  for (const entry of journals) {
    const copy = bySlot.get(entry.slot);
    if (copy && copy.seq >= entry.seq) continue;
    const { label, ...kept } = entry;
    const edit = { label: label ?? RESTORED, coalesce: null, at: entry.writtenAt };
    const history = copy
      ? recordEdit(copy.history, copy.document, entry.document, edit)
      : recordEdit(NO_HISTORY, entry.base.document, entry.document, edit);
    bySlot.set(entry.slot, { ...kept, history });
  }
  return [...bySlot.values()];
}

const RESTORED: EditLabel = { key: 'edits.did.restored', values: {} };

/** True where Undo gets back to that document: an earlier copy of the same work. */
function passedThrough({ document, history }: LocalRun, other: RunDocument): boolean {
  let state = document;
  if (deepEqual(state, other)) return true;
  return [...history.past].reverse().some((step) => {
    state = patchDocument(state, step.undo);
    return deepEqual(state, other);
  });
}

/** Puts an older copy under the history of a newer one, so that Undo reaches it. */
function startedFrom(older: LocalRun, newer: LocalRun, history: EditHistory): EditHistory {
  const first = firstDocument(newer.document, history);
  const edit = { label: RESTORED, coalesce: null, at: older.writtenAt };
  const step = stepBetween(older.document, first, edit);
  const between = step.redo.length > 0 ? [step] : [];
  return { ...history, past: [...older.history.past, ...between, ...history.past] };
}
