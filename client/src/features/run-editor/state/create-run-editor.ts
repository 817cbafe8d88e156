import { CommandError, InvalidRunError, applyCommands, describeCommands } from '@fairlead/shared';
import type { EditLabel, Run, RunCommand } from '@fairlead/shared';
import { createStore } from 'zustand/vanilla';
import { analysedDocument } from './analysed-document';
import type { AnalysedDocument } from './analysed-document';
import { conflictBetween } from './conflict-fields';
import { deepEqual } from './deep-equal';
import { recordEdit, redoStep, undoStep } from './edit-history';
import type { EditHistory, Stepped } from './edit-history';
import { firstSaving } from './first-saving';
import { createFixSuggester } from './fix-suggester';
import type { LocalRun, PendingSave, ServerBase } from './local-run';
import { createLocalWriter } from './local-writer';
import { browserPage } from './page-signals';
import { baseOf, freshStart } from './recover-run';
import { SILENT_CHANNEL } from './run-channel';
import type {
  EditOptions,
  EditResult,
  RunEditor,
  RunEditorData,
  RunEditorState,
  Saving,
} from './run-editor-state';
import type { RunEditorOptions } from './run-editor-options';
import { createRunSaver } from './run-saver';

const TAKE_THEIRS: EditLabel = { key: 'edits.did.takeTheirs', values: {} };
const OTHER_TAB: EditLabel = { key: 'edits.did.otherTab', values: {} };

/**
 * The open run: document in, document out. Every edit is analysed at once, kept on this device within a third of a
 * second, sent after a pause, and can be undone.
 */
export function createRunEditor(options: RunEditorOptions): RunEditor {
  const { run: opened, settings, transport, storage, now, newId } = options;
  const { start = freshStart(opened), channel = SILENT_CHANNEL, page = browserPage() } = options;
  const runId = opened.id;
  const slot = newId();
  let base: ServerBase = start.base;
  let pending: PendingSave | null = start.pending;
  let history: EditHistory = start.history;
  let seq = 0;
  let isDisposed = false;
  /** After closing: another tab keeps this work now. */
  let isAdopted = false;

  const store: RunEditor = createStore<RunEditorState>()(() => ({
    runId,
    server: opened,
    canEdit: opened.can.update,
    ...analysedDocument(start.document, settings),
    selectedId: null,
    cursor: null,
    saving: firstSaving(opened, start, storage.durable),
    conflict: start.conflict ? conflictBetween(start.document, opened, start.base.document) : null,
    drafts: start.drafts,
    restored: start.restored,
    ...labels(),
    run: edit,
    select: (elementId) => store.setState({ selectedId: elementId }),
    pointAt: (cursor) => store.setState({ cursor }),
    undo: () => step(undoStep(store.getState().document, history)),
    redo: () => step(redoStep(store.getState().document, history)),
    setDraft: (fieldKey, text) => setDrafts({ ...store.getState().drafts, [fieldKey]: text }),
    clearDraft: (fieldKey) => {
      const { [fieldKey]: cleared, ...drafts } = store.getState().drafts;
      if (cleared !== undefined) setDrafts(drafts);
    },
    resolveConflict,
    flush: () => saver.flush(),
    retry: () => saver.retry(),
    dispose,
  }));

  const writer = createLocalWriter(
    {
      runId,
      slot,
      snapshot,
      seq: () => seq,
      lastLabel: () => store.getState().undoLabel,
      kept: (kept) => setSaving({ kept }),
    },
    storage,
  );

  const saver = createRunSaver(
    {
      runId,
      newId,
      document: () => store.getState().document,
      base: () => base,
      pending: () => pending,
      setPending: (next) => {
        pending = next;
        seq += 1;
        if (next) void writer.writeNow();
        else writer.touched();
      },
      confirmed: (run, document) => {
        base = { version: run.revision.version, document };
        changed({ server: run });
        setSaving({ savedAt: run.revision.savedAt });
        channel.post({ type: 'saved', slot, run });
      },
      conflict: (theirs) =>
        store.setState(({ document }) => ({
          conflict: conflictBetween(document, theirs, base.document),
        })),
      inConflict: () => store.getState().conflict !== null,
      status: setSaving,
    },
    transport,
    page,
  );

  const fixes = createFixSuggester(store, settings);

  function labels(): Pick<RunEditorData, 'undoLabel' | 'redoLabel'> {
    return {
      undoLabel: history.past[history.past.length - 1]?.label ?? null,
      redoLabel: history.future[0]?.label ?? null,
    };
  }

  function edit(
    commands: readonly RunCommand[],
    { label, coalesce }: EditOptions = {},
  ): EditResult {
    const { document: before, canEdit } = store.getState();
    if (!canEdit) return { ok: false, reason: 'read-only' };
    try {
      const after = applyCommands(before, commands);
      if (deepEqual(before, after)) return { ok: true };
      const answers = analysedDocument(after, settings);
      history = recordEdit(history, before, after, {
        label: label ?? describeCommands(before, commands),
        coalesce: coalesce ?? null,
        at: now(),
      });
      show(answers);
      return { ok: true };
    } catch (error) {
      if (error instanceof CommandError) return { ok: false, reason: 'refused', code: error.code };
      if (error instanceof InvalidRunError) {
        return { ok: false, reason: 'invalid', problems: error.problems };
      }
      throw error;
    }
  }

  function step(stepped: Stepped | null): void {
    if (!stepped || !store.getState().canEdit) return;
    history = stepped.history;
    show(analysedDocument(stepped.document, settings));
  }

  /** Shows a new document and lets the device and the server know. */
  function show(answers: AnalysedDocument): void {
    const { selectedId, conflict } = store.getState();
    const isThere = answers.document.path.some(({ id }) => id === selectedId);
    changed({
      ...answers,
      selectedId: isThere ? selectedId : null,
      cursor: null,
      conflict: conflict && conflictBetween(answers.document, conflict.theirs, conflict.base),
    });
    fixes.schedule();
    saver.touched();
  }

  function changed(state: Partial<RunEditorData>): void {
    seq += 1;
    store.setState({ ...state, ...labels() });
    writer.touched();
  }

  function setDrafts(drafts: RunEditorData['drafts']): void {
    changed({ drafts });
  }

  function setSaving(change: Partial<Saving>): void {
    const { saving } = store.getState();
    const next = { ...saving, ...change };
    if (!deepEqual(saving, next)) store.setState({ saving: next });
  }

  function resolveConflict(choice: 'keep-mine' | 'take-theirs'): void {
    const { conflict } = store.getState();
    if (!conflict) return;
    base = baseOf(conflict.theirs);
    changed({ conflict: null, server: conflict.theirs });
    setSaving({ savedAt: conflict.theirs.revision.savedAt });
    if (choice === 'take-theirs') replaceBy(conflict.theirs, TAKE_THEIRS);
    else saver.touched();
    void saver.retry();
  }

  /** Another document takes the place of this one; what stood here is one Undo away. */
  function replaceBy(run: Run, label: EditLabel): void {
    const { document } = store.getState();
    const edit = { label, coalesce: null, at: now() };
    history = recordEdit(history, document, run.revision.document, edit);
    show(analysedDocument(run.revision.document, settings));
  }

  const stopHearing = channel.listen((message) => {
    if (message.type === 'adopted' && message.slots.includes(slot)) isAdopted = true;
    if (isDisposed) return;
    if (message.type === 'who') channel.post({ type: 'here', slot });
    if (message.type !== 'saved' || message.slot === slot) return;
    const isNewer = message.run.revision.version > base.version;
    if (!isNewer || saver.hasUnsent() || store.getState().conflict) return;
    base = baseOf(message.run);
    changed({ server: message.run });
    setSaving({ savedAt: message.run.revision.savedAt });
    replaceBy(message.run, OTHER_TAB);
  });

  const stopHiding = page.on('hide', () => {
    if (saver.hasUnsent() || Object.keys(store.getState().drafts).length > 0)
      void writer.writeNow();
    void saver.flush();
  });

  function snapshot(): LocalRun | null {
    if (isAdopted) return null;
    const { document, drafts } = store.getState();
    const isEmpty = history.past.length + history.future.length + Object.keys(drafts).length === 0;
    if (isEmpty && !saver.hasUnsent()) return null;
    return {
      schema: 1,
      runId,
      slot,
      seq,
      writtenAt: now(),
      base,
      document,
      history,
      drafts,
      pending,
    };
  }

  function dispose(): void {
    if (isDisposed) return;
    isDisposed = true;
    stopHiding();
    fixes.stop();
    void writer.writeNow();
    void saver
      .flush()
      .then(writer.writeNow)
      .finally(() => {
        stopHearing();
        channel.close();
      });
    saver.stop();
  }

  /** What was brought back is written under this tab's own slot before the copies it came from are taken away. */
  function adopt(): void {
    if (start.adopted.length === 0) return;
    channel.post({ type: 'adopted', slots: start.adopted });
    void writer.writeNow().then((isWritten) => {
      for (const old of isWritten ? start.adopted : []) {
        void storage.remove(runId, old).catch(() => undefined);
        storage.removeJournal(runId, old);
      }
    });
  }

  adopt();
  fixes.schedule();
  if (store.getState().conflict === null && saver.hasUnsent()) saver.touched();
  return store;
}
