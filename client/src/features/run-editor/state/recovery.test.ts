import { bend, buildRun, offset, pullPoint, straight } from '@fairlead/shared';
import type { RunCommand, RunDocument } from '@fairlead/shared';
import fc from 'fast-check';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { deepEqual } from './deep-equal';
import { clearLocalRuns, openLocalRuns } from './recovery';
import type { JournalEntry } from './local-run';
import type { RunEditor } from './run-editor-state';
import { EditorWorld } from './testing/editor-world';
import type { Weather } from './testing/fake-server';

/** Each run opens several editors and lives through minutes of fake time. */
const RUNS = (process.env.FAIRLEAD_LONG === '1' ? 10_000 : 1_000) / 10;

beforeEach(() => void vi.useFakeTimers());
afterEach(() => void vi.useRealTimers());

const START = buildRun({
  path: [
    pullPoint(),
    straight(),
    bend(),
    straight(),
    offset({ angle: 45 }),
    straight(),
    pullPoint(),
  ],
});
const setLength = (length: number): RunCommand => ({
  command: 'set-element',
  args: { elementId: 'e2', patch: { length } },
});
const state = (editor: RunEditor) => editor.getState();

describe('a killed tab', () => {
  it('brings back an edit older than half a second, sends it, and can still undo it', async () => {
    const world = new EditorWorld(START);
    world.server.weather = 'request-lost';
    const editor = await world.open();
    state(editor).run([setLength(90)]);
    await world.wait(500);
    world.kill();
    world.server.weather = 'good';
    const again = await world.open();
    expect(state(again).document).toEqual(state(editor).document);
    expect(state(again)).toMatchObject({ restored: true, saving: { state: 'saving', waiting: 1 } });
    await world.wait(1_000);
    expect(state(again).saving.state).toBe('saved');
    expect(world.server.run.revision.document).toEqual(state(editor).document);
    state(again).undo();
    expect(state(again).document).toEqual(START);
  });

  it('brings back what the journal has and the database had no time for', async () => {
    const world = new EditorWorld(START);
    const editor = await world.open();
    state(editor).run([setLength(90)]);
    await world.wait(210);
    world.kill();
    expect(await world.storage.list('run-1')).toEqual([]);
    const again = await world.open();
    expect(state(again).document).toEqual(state(editor).document);
    state(again).undo();
    expect(state(again).document).toEqual(START);
  });

  it('brings back the last keystroke before the page was hidden, however late', async () => {
    const world = new EditorWorld(START);
    const editor = await world.open();
    state(editor).run([setLength(90)]);
    world.page.tell('hide');
    world.kill();
    expect(state(await world.open()).document).toEqual(state(editor).document);
  });

  it('sends a save without an answer again under its own key: one effect', async () => {
    const world = new EditorWorld(START);
    world.server.weather = 'answer-lost';
    const stale = structuredClone(world.server.run);
    const editor = await world.open();
    state(editor).run([setLength(90)]);
    await world.wait(700);
    state(editor).run([setLength(91)]);
    await world.wait(400);
    world.kill();
    world.server.weather = 'good';
    // The page is handed the answer it had before the save.
    const again = await world.open(stale);
    await world.wait(2_000);
    expect(state(again).saving.state).toBe('saved');
    expect(world.server.effects).toBe(2);
    expect(world.server.run.revision.document).toEqual(state(editor).document);
  });

  it('knows its own save in the server’s newer version and does not ask', async () => {
    const world = new EditorWorld(START);
    world.server.weather = 'answer-lost';
    const editor = await world.open();
    state(editor).run([setLength(90)]);
    await world.wait(700);
    state(editor).run([setLength(91)]);
    await world.wait(400);
    world.kill();
    world.server.weather = 'good';
    const again = await world.open();
    expect(state(again).conflict).toBeNull();
    await world.wait(2_000);
    expect(state(again).saving.state).toBe('saved');
    expect(world.server.run.revision).toMatchObject({
      version: 3,
      document: state(editor).document,
    });
  });

  it('asks where somebody else saved meanwhile, and loses neither', async () => {
    const world = new EditorWorld(START);
    world.page.online = false;
    const editor = await world.open();
    state(editor).run([setLength(90)]);
    await world.wait(500);
    world.kill();
    world.page.online = true;
    const theirs = { ...START, tag: 'F-9' };
    world.server.saveElsewhere(theirs);
    const again = await world.open();
    expect(state(again).saving).toMatchObject({ state: 'needs-you', reason: 'conflict' });
    expect(state(again).conflict).toMatchObject({ mine: state(editor).document, base: START });
    await world.wait(60_000);
    expect(world.server.run.revision.document).toEqual(theirs);
    state(again).resolveConflict('keep-mine');
    await world.wait(100);
    expect(world.server.run.revision.document).toEqual(state(editor).document);
  });

  it('keeps the text of a field that cannot be read yet', async () => {
    const world = new EditorWorld(START);
    const editor = await world.open();
    state(editor).setDraft('e2.length', '3\' 13"');
    await world.wait(500);
    world.kill();
    const again = await world.open();
    expect(state(again).drafts).toEqual({ 'e2.length': '3\' 13"' });
    expect(state(again).restored).toBe(false);
    state(again).clearDraft('e2.length');
    await world.wait(500);
    world.kill();
    expect(state(await world.open()).drafts).toEqual({});
  });

  it('keeps two hundred steps of undo for tomorrow', async () => {
    const world = new EditorWorld(START);
    const editor = await world.open();
    for (let length = 1; length <= 250; length += 1) state(editor).run([setLength(length)]);
    await world.wait(2_000);
    expect(state(editor).saving.state).toBe('saved');
    world.kill();
    const again = await world.open();
    expect(state(again)).toMatchObject({ restored: false, saving: { state: 'saved' } });
    for (let step = 0; step < 250; step += 1) state(again).undo();
    expect(state(again).document).toEqual(START);
    expect(state(again).undoLabel).toBeNull();
    for (let step = 0; step < 250; step += 1) state(again).redo();
    expect(state(again).document).toEqual(state(editor).document);
  });

  it('of two tabs that both had unsent work gives back the newer, with the older under Undo', async () => {
    const world = new EditorWorld(START);
    world.page.online = false;
    const one = await world.open();
    const two = await world.open();
    state(one).run([setLength(90)]);
    await world.wait(500);
    state(two).run([setLength(80)]);
    await world.wait(500);
    world.kill();
    const closed = new EditorWorld(START);
    Object.assign(closed, { storage: world.storage });
    const again = await closed.open();
    expect(state(again).document).toEqual(state(two).document);
    const seen: RunDocument[] = [];
    while (state(again).undoLabel) {
      state(again).undo();
      seen.push(state(again).document);
    }
    expect(seen).toContainEqual(state(one).document);
  });

  it('leaves the copy of a tab that is still open alone', async () => {
    const world = new EditorWorld(START);
    world.page.online = false;
    const one = await world.open();
    state(one).run([setLength(90)]);
    await world.wait(500);
    const two = await world.open();
    expect(state(two).document).toEqual(START);
    expect(await world.storage.list('run-1')).toHaveLength(1);
  });

  it('leaves no copy behind once everything is saved and undone', async () => {
    const world = new EditorWorld(START);
    const editor = await world.open();
    state(editor).setDraft('tag', 'F');
    await world.wait(500);
    expect(await world.storage.list('run-1')).toHaveLength(1);
    state(editor).clearDraft('tag');
    await world.wait(500);
    expect(await world.storage.list('run-1')).toEqual([]);
    expect(world.storage.listJournals('run-1')).toEqual([]);
  });

  it('closed and opened again while the last save is on its way asks nobody', async () => {
    const world = new EditorWorld(START);
    world.server.delay = 2_000;
    const stale = structuredClone(world.server.run);
    const editor = await world.open();
    state(editor).run([setLength(90)]);
    state(editor).dispose();
    const again = await world.open(stale);
    await world.wait(10_000);
    expect(state(again).document).toEqual(state(editor).document);
    expect(state(again)).toMatchObject({ conflict: null, saving: { state: 'saved' } });
    expect(world.server.effects).toBe(1);
    world.kill();
    expect(state(await world.open())).toMatchObject({ conflict: null, restored: false });
  });

  it('at any moment, in any weather, loses nothing that is older than half a second', async () => {
    const weather = fc.constantFrom<Weather>('good', 'request-lost', 'answer-lost', 'silent');
    const act = fc.oneof(
      {
        weight: 4,
        arbitrary: fc.record({
          do: fc.constant('edit' as const),
          length: fc.integer({ min: 1, max: 9 }),
        }),
      },
      { weight: 1, arbitrary: fc.constant({ do: 'undo' as const }) },
      { weight: 1, arbitrary: fc.constant({ do: 'redo' as const }) },
      { weight: 2, arbitrary: fc.record({ do: fc.constant('weather' as const), weather }) },
    );
    const moment = fc.record({
      act,
      wait: fc.oneof(fc.integer({ min: 0, max: 250 }), fc.integer({ min: 0, max: 4_000 })),
    });
    await fc.assert(
      fc.asyncProperty(
        fc.array(fc.array(moment, { maxLength: 8 }), { minLength: 1, maxLength: 3 }),
        async (lives) => {
          const world = new EditorWorld(START);
          let first = START;
          for (const life of lives) {
            const editor = await world.open();
            expect(state(editor).conflict).toBeNull();
            const shown: { at: number; document: RunDocument }[] = [
              { at: -Infinity, document: first },
            ];
            for (const { act: next, wait } of life) {
              if (next.do === 'edit') state(editor).run([setLength(next.length)]);
              else if (next.do === 'weather') world.server.weather = next.weather;
              else state(editor)[next.do]();
              shown.push({ at: Date.now(), document: state(editor).document });
              await world.wait(wait);
            }
            const killedAt = Date.now();
            world.kill();
            const lastSafe = shown.reduce(
              (found, { at }, index) => (at <= killedAt - 500 ? index : found),
              0,
            );
            const again = await world.open();
            first = state(again).document;
            expect(shown.slice(lastSafe).some(({ document }) => deepEqual(document, first))).toBe(
              true,
            );
            world.kill();
          }
          world.server.weather = 'good';
          const last = await world.open();
          await world.wait(60_000);
          expect(state(last).saving.state).toBe('saved');
          expect(world.server.run.revision.document).toEqual(state(last).document);
          expect(world.server.mostInFlight).toBeLessThanOrEqual(1);
          world.kill();
        },
      ),
      { numRuns: RUNS },
    );
  });
});

describe('what a device keeps', () => {
  const mine = { companyId: 'company-1', userId: 'pat' };
  const other = { companyId: 'company-1', userId: 'sam' };
  const entry: JournalEntry = {
    schema: 1,
    runId: 'run-1',
    slot: 'slot-1',
    seq: 1,
    writtenAt: 0,
    base: { version: 1, document: START },
    document: START,
    drafts: {},
    pending: null,
    label: null,
  };

  beforeEach(() => {
    vi.useRealTimers();
    localStorage.clear();
  });

  it('is shown to nobody else who signs in on it', async () => {
    (await openLocalRuns(mine)).putJournal(entry);
    expect((await openLocalRuns(mine)).listJournals('run-1')).toEqual([entry]);
    expect((await openLocalRuns(other)).listJournals('run-1')).toEqual([]);
    expect(
      (await openLocalRuns({ ...mine, companyId: 'company-2' })).listJournals('run-1'),
    ).toEqual([]);
  });

  it('is gone after signing out, and only one’s own', async () => {
    (await openLocalRuns(mine)).putJournal(entry);
    (await openLocalRuns(other)).putJournal(entry);
    await clearLocalRuns(mine);
    expect((await openLocalRuns(mine)).listJournals('run-1')).toEqual([]);
    expect((await openLocalRuns(other)).listJournals('run-1')).toEqual([entry]);
  });

  it('says that it keeps nothing for long where the browser has no database, and still works', async () => {
    const storage = await openLocalRuns(mine);
    expect(storage.durable).toBe(false);
    await storage.put({ ...entry, history: { past: [], future: [] } });
    expect(await storage.list('run-1')).toHaveLength(1);
    await storage.remove('run-1', 'slot-1');
    expect(await storage.list('run-1')).toEqual([]);
  });

  it('reads past an entry that was cut short', async () => {
    const storage = await openLocalRuns(mine);
    storage.putJournal(entry);
    localStorage.setItem('fairlead.edit|company-1/pat|run-1|slot-2', '{"schema":1,');
    expect(storage.listJournals('run-1')).toEqual([entry]);
  });
});
