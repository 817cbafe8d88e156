import { createRunEditor } from './create-run-editor';
import type { LocalScope } from './local-run';
import { recoverRun } from './recover-run';
import { openRunChannel } from './run-channel';
import type { RunChannel } from './run-channel';
import type { RunEditorOptions } from './run-editor-options';
import type { RunEditor } from './run-editor-state';

export type OpenRunOptions = Omit<RunEditorOptions, 'start'> & { scope: LocalScope };

/** A tab that is alive answers well within this. */
export const ANSWER_OF_TABS_MS = 80;

/**
 * Opens a run: what the server has, with the unsent work and the undo history that closed tabs of this device left behind.
 * A copy that belongs to another open tab stays that tab's.
 */
export async function openRunEditor(options: OpenRunOptions): Promise<RunEditor> {
  const { run, storage, scope } = options;
  const channel = options.channel ?? openRunChannel(scope, run.id);
  const copies = await storage.list(run.id).catch(() => []);
  const journals = storage.listJournals(run.id);
  if (copies.length + journals.length === 0) return createRunEditor({ ...options, channel });
  const alive = await livingSlots(channel);
  const isLeft = ({ slot }: { slot: string }) => !alive.has(slot);
  const start = recoverRun(run, copies.filter(isLeft), journals.filter(isLeft));
  return createRunEditor({ ...options, channel, start });
}

function livingSlots(channel: RunChannel): Promise<Set<string>> {
  const slots = new Set<string>();
  const stop = channel.listen((message) => {
    if (message.type === 'here') slots.add(message.slot);
  });
  channel.post({ type: 'who' });
  return new Promise((resolve) => {
    setTimeout(() => {
      stop();
      resolve(slots);
    }, ANSWER_OF_TABS_MS);
  });
}
