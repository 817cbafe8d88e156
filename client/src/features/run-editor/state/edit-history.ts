import type { Patch } from 'immer';
import type { EditLabel, RunDocument } from '@fairlead/shared';
import { diffDocuments, patchDocument } from './document-patches';

/** One thing Undo takes back. */
export interface EditStep {
  label: EditLabel;
  undo: Patch[];
  redo: Patch[];
  /** Steps with the same key in quick succession are one. */
  coalesce: string | null;
  /** When it was last added to, ms. */
  at: number;
}

/** The document stands between the last of `past` and the first of `future`. */
export interface EditHistory {
  past: readonly EditStep[];
  future: readonly EditStep[];
}

export const NO_HISTORY: EditHistory = { past: [], future: [] };

/** How many steps are kept. */
export const HISTORY_STEPS = 400;

/** A held key first repeats after half a second; two edits further apart than this are two steps. */
export const COALESCE_WITHIN_MS = 800;

export interface RecordedEdit {
  label: EditLabel;
  coalesce: string | null;
  at: number;
}

/** Adds the step from one document to the next; what was undone before it is gone. */
export function recordEdit(
  history: EditHistory,
  before: RunDocument,
  after: RunDocument,
  edit: RecordedEdit,
): EditHistory {
  const last = history.past[history.past.length - 1];
  if (last && history.future.length === 0 && joins(last, edit)) {
    return { past: joined(history.past.slice(0, -1), last, before, after, edit), future: [] };
  }
  const step = stepBetween(before, after, edit);
  if (step.redo.length === 0) return history;
  return { past: [...history.past, step].slice(-HISTORY_STEPS), future: [] };
}

function joins(last: EditStep, edit: RecordedEdit): boolean {
  return (
    edit.coalesce !== null &&
    last.coalesce === edit.coalesce &&
    edit.at - last.at <= COALESCE_WITHIN_MS
  );
}

/** Only where the drag started and where it is now are kept; a drag that came back to its start leaves no step. */
function joined(
  earlier: readonly EditStep[],
  last: EditStep,
  before: RunDocument,
  after: RunDocument,
  { at }: RecordedEdit,
): EditStep[] {
  const start = patchDocument(before, last.undo);
  const step = stepBetween(start, after, { label: last.label, coalesce: last.coalesce, at });
  return step.redo.length === 0 ? [...earlier] : [...earlier, step];
}

export function stepBetween(before: RunDocument, after: RunDocument, edit: RecordedEdit): EditStep {
  return { ...edit, undo: diffDocuments(after, before), redo: diffDocuments(before, after) };
}

export interface Stepped {
  document: RunDocument;
  history: EditHistory;
}

/** One step back; null where there is none. */
export function undoStep(document: RunDocument, { past, future }: EditHistory): Stepped | null {
  const step = past[past.length - 1];
  if (!step) return null;
  return {
    document: patchDocument(document, step.undo),
    history: { past: past.slice(0, -1), future: [closed(step), ...future] },
  };
}

/** One step forward again; null where there is none. */
export function redoStep(document: RunDocument, { past, future }: EditHistory): Stepped | null {
  const step = future[0];
  if (!step) return null;
  return {
    document: patchDocument(document, step.redo),
    history: { past: [...past, step], future: future.slice(1) },
  };
}

/** A step that was undone is finished: a later edit never joins it. */
function closed(step: EditStep): EditStep {
  return { ...step, coalesce: null };
}

/** The document a history began with. */
export function firstDocument(document: RunDocument, { past }: EditHistory): RunDocument {
  return past.reduceRight((later, step) => patchDocument(later, step.undo), document);
}
