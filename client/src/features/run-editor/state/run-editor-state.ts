import type {
  CommandErrorCode,
  CursorPlace,
  EditLabel,
  ExpandedRun,
  Finding,
  Problem,
  Run,
  RunAnalysis,
  RunCommand,
  RunDocument,
} from '@fairlead/shared';
import type { StoreApi } from 'zustand/vanilla';

/** The four things the saving line may say: Saved · Saving · On this phone, N to send · Needs you. */
export type SavingState = 'saved' | 'saving' | 'local' | 'needs-you';

/** Why a person has to act before the run can be saved. */
export type NeedsYouReason =
  'conflict' | 'invalid' | 'signed-out' | 'not-allowed' | 'gone' | 'refused';

export interface Saving {
  state: SavingState;
  /** When the server last confirmed this run, UTC ISO. */
  savedAt: string | null;
  /** How many runs wait on this device to be sent: 1 while this one does. */
  waiting: number;
  /** Only with `needs-you`. */
  reason: NeedsYouReason | null;
  /** What the server found wrong, only with `needs-you`. */
  problems: Problem[];
  /** Quoted to whoever helps; null where no server answered. */
  requestId: string | null;
  /** False where this device would not keep unsent edits once the page is closed: say so instead of "On this phone". */
  kept: boolean;
}

/** One place where the two versions of a run differ. */
export interface ConflictField {
  /** JSON pointer into my document, or into theirs where mine no longer has it. */
  pointer: string;
  /** The piece or conductor group it belongs to. */
  elementId: string | null;
  /** The field's own name, e.g. `angle`; null for a whole piece added or removed. */
  field: string | null;
  /** undefined: not there. */
  base: unknown;
  mine: unknown;
  theirs: unknown;
  changedBy: 'me' | 'them' | 'both';
}

export interface Conflict {
  /** Their revision: `revision.savedBy` and `revision.savedAt` name who and when. */
  theirs: Run;
  mine: RunDocument;
  /** What both started from. */
  base: RunDocument;
  fields: ConflictField[];
  /** True where no field was changed by both. It is still asked. */
  disjoint: boolean;
}

export type EditResult =
  | { ok: true }
  | { ok: false; reason: 'refused'; code: CommandErrorCode }
  | { ok: false; reason: 'invalid'; problems: Problem[] }
  | { ok: false; reason: 'read-only' };

export interface EditOptions {
  /** Names the step; by default the first command names it. */
  label?: EditLabel;
  /** Edits with the same key in quick succession (a held key, a drag) are one step. */
  coalesce?: string;
}

export interface RunEditorActions {
  /** Carries out the commands as one step; on a refusal nothing has changed. */
  run(commands: readonly RunCommand[], options?: EditOptions): EditResult;
  select(elementId: string | null): void;
  pointAt(cursor: CursorPlace | null): void;
  undo(): void;
  redo(): void;
  /** Keeps what is being typed in a field, so that a value that can't be read yet survives a reload. */
  setDraft(fieldKey: string, text: string): void;
  clearDraft(fieldKey: string): void;
  resolveConflict(choice: 'keep-mine' | 'take-theirs'): void;
  /** Sends what waits now; resolves when the answer, or its failure, is known. */
  flush(): Promise<void>;
  /** The person asks to try again. */
  retry(): Promise<void>;
  /** Writes what is unsaved to this device, makes a last attempt to send it and stops listening. */
  dispose(): void;
}

export interface RunEditorData {
  runId: string;
  /** The server's last answer; its `revision.document` is what `document` is compared with. */
  server: Run;
  canEdit: boolean;
  document: RunDocument;
  analysis: RunAnalysis;
  expanded: ExpandedRun;
  /** The findings of `analysis`; `fixes` are filled a moment after an edit. */
  findings: Finding[];
  fixesReady: boolean;
  selectedId: string | null;
  /** Where the pointer stands on the strip; null: nowhere. */
  cursor: CursorPlace | null;
  saving: Saving;
  conflict: Conflict | null;
  /** What undo would take back; null: nothing. */
  undoLabel: EditLabel | null;
  redoLabel: EditLabel | null;
  /** Raw text of fields being typed, by field key. */
  drafts: Readonly<Record<string, string>>;
  /** True when unsent work of an earlier visit was brought back. */
  restored: boolean;
}

export type RunEditorState = RunEditorData & RunEditorActions;

/** The open run: a vanilla zustand store. Made by `openRunEditor` (which brings back unsent work) or `createRunEditor`. */
export type RunEditor = StoreApi<RunEditorState>;
