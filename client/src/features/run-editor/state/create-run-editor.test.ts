import { bend, buildRun, offset, pullPoint, straight } from '@fairlead/shared';
import type { RunCommand } from '@fairlead/shared';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { ANSWER_WITHIN_MS } from './run-saver';
import type { RunEditor } from './run-editor-state';
import { EditorWorld } from './testing/editor-world';

beforeEach(() => void vi.useFakeTimers());
afterEach(() => void vi.useRealTimers());

/** e1 box, e2 leg, e3 90, e4 leg, e5 offset 45, e6 leg, e7 box. */
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

const setAngle = (angle: number): RunCommand => ({
  command: 'set-element',
  args: { elementId: 'e5', patch: { angle } },
});
const setLength = (length: number): RunCommand => ({
  command: 'set-element',
  args: { elementId: 'e2', patch: { length } },
});

const state = (editor: RunEditor) => editor.getState();
const saving = (editor: RunEditor) => state(editor).saving.state;
const angleOf = (editor: RunEditor) => state(editor).document.path.find(({ id }) => id === 'e5');

async function opened(): Promise<{ world: EditorWorld; editor: RunEditor }> {
  const world = new EditorWorld(START);
  return { world, editor: await world.open() };
}

describe('an edit', () => {
  it('is analysed before run() returns, and its fixes follow', async () => {
    const world = new EditorWorld(
      buildRun({
        path: [
          pullPoint(),
          ...[1, 2, 3].flatMap(() => [straight(), bend()]),
          straight(),
          offset({ id: 'o', angle: 30 }),
          straight(),
          pullPoint(),
        ],
      }),
    );
    const editor = await world.open();
    expect(state(editor).analysis.sections[0]?.degrees).toBe(330);
    state(editor).run([{ command: 'set-element', args: { elementId: 'o', patch: { angle: 60 } } }]);
    expect(state(editor).analysis.sections[0]?.degrees).toBe(390);
    expect(state(editor).expanded.bends).toHaveLength(5);
    expect(state(editor).fixesReady).toBe(false);
    await world.wait(200);
    const over = state(editor).findings.find(({ code }) => code === 'degrees-over');
    expect(over?.fixes?.[0]?.values).toMatchObject({ angle: 22.5, degrees: 315 });
    expect(state(editor).run(over?.fixes?.[0]?.commands ?? [])).toEqual({ ok: true });
    expect(state(editor).analysis.sections[0]?.degrees).toBe(315);
  });

  it('that is refused, or makes no run, changes nothing and says why', async () => {
    const { editor } = await opened();
    const before = state(editor);
    expect(
      state(editor).run([
        setAngle(30),
        { command: 'remove-elements', args: { elementIds: ['e1'] } },
      ]),
    ).toEqual({
      ok: false,
      reason: 'refused',
      code: 'end-pull-point',
    });
    expect(state(editor).run([setAngle(-5)])).toMatchObject({
      ok: false,
      reason: 'invalid',
      problems: [{ pointer: '/path/4/angle' }],
    });
    expect(state(editor)).toBe(before);
  });

  it('is not for those who may only read', async () => {
    const world = new EditorWorld(START);
    const run = structuredClone(world.server.run);
    const editor = await world.open({ ...run, can: { update: false, delete: false } });
    expect(state(editor).run([setAngle(30)])).toEqual({ ok: false, reason: 'read-only' });
    expect(state(editor).document).toEqual(START);
  });

  it('is named for undo and redo', async () => {
    const { editor } = await opened();
    expect(state(editor).undoLabel).toBeNull();
    state(editor).run([setAngle(30)]);
    expect(state(editor).undoLabel).toEqual({
      key: 'edits.did.angle',
      values: { piece: 'offset', number: 2 },
    });
    state(editor).undo();
    expect(state(editor).document).toEqual(START);
    expect(state(editor).redoLabel?.key).toBe('edits.did.angle');
    state(editor).redo();
    expect(angleOf(editor)).toMatchObject({ angle: 30 });
    state(editor).undo();
    state(editor).undo();
    expect(state(editor).document).toEqual(START);
  });

  it('with the key held is one step', async () => {
    const { world, editor } = await opened();
    for (let length = 121; length <= 150; length += 1) {
      state(editor).run([setLength(length)], { coalesce: 'e2 length' });
      await world.wait(33);
    }
    state(editor).undo();
    expect(state(editor).document).toEqual(START);
    expect(state(editor).undoLabel).toBeNull();
  });

  it('lets go of a selected piece that is gone', async () => {
    const { editor } = await opened();
    state(editor).select('e5');
    state(editor).run([setAngle(30)]);
    expect(state(editor).selectedId).toBe('e5');
    state(editor).run([{ command: 'remove-elements', args: { elementIds: ['e5'] } }]);
    expect(state(editor).selectedId).toBeNull();
  });
});

describe('saving', () => {
  it('waits for a pause, sends once, and says Saved only after the answer', async () => {
    const { world, editor } = await opened();
    world.server.delay = 400;
    expect(saving(editor)).toBe('saved');
    for (const angle of [40, 35, 30]) {
      state(editor).run([setAngle(angle)]);
      await world.wait(300);
    }
    expect(world.server.calls).toHaveLength(0);
    expect(saving(editor)).toBe('saving');
    await world.wait(300);
    expect(world.server.calls).toHaveLength(1);
    await world.wait(399);
    expect(saving(editor)).toBe('saving');
    await world.wait(1);
    expect(state(editor).saving).toMatchObject({
      state: 'saved',
      waiting: 0,
      savedAt: world.server.run.revision.savedAt,
    });
    expect(world.server.run.revision.document).toEqual(state(editor).document);
    await world.wait(60_000);
    expect(world.server.calls).toHaveLength(1);
  });

  it('has one save on its way at a time, each on top of the last', async () => {
    const { world, editor } = await opened();
    world.server.delay = 1_500;
    for (let length = 100; length < 110; length += 1) {
      state(editor).run([setLength(length)]);
      await world.wait(700);
    }
    await world.wait(10_000);
    expect(world.server.mostInFlight).toBe(1);
    expect(world.server.calls.map(({ body }) => body.baseVersion)).toEqual(
      world.server.calls.map((_, index) => index + 1),
    );
    expect(saving(editor)).toBe('saved');
    expect(world.server.run.revision.document).toEqual(state(editor).document);
  });

  it('sends nothing when undo leads back to what the server has', async () => {
    const { world, editor } = await opened();
    state(editor).run([setAngle(30)]);
    state(editor).undo();
    expect(saving(editor)).toBe('saved');
    await world.wait(5_000);
    expect(world.server.calls).toHaveLength(0);
  });

  it('keeps it on this device while the request gets lost, and tries again by itself, further and further apart', async () => {
    const { world, editor } = await opened();
    world.server.weather = 'request-lost';
    state(editor).run([setAngle(30)]);
    await world.wait(700);
    expect(state(editor).saving).toMatchObject({ state: 'local', waiting: 1, kept: true });
    await world.wait(120_000);
    const tries = world.server.calls.length;
    expect(tries).toBeGreaterThan(4);
    expect(tries).toBeLessThan(12);
    expect(new Set(world.server.calls.map(({ key }) => key)).size).toBe(1);
    expect(saving(editor)).toBe('local');
    world.server.weather = 'good';
    await world.wait(31_000);
    expect(saving(editor)).toBe('saved');
    expect(world.server.effects).toBe(1);
  });

  it('has one effect when only the answer gets lost, whatever is typed meanwhile', async () => {
    const { world, editor } = await opened();
    world.server.weather = 'answer-lost';
    state(editor).run([setAngle(30)]);
    await world.wait(700);
    expect(saving(editor)).toBe('local');
    state(editor).run([setLength(90)]);
    world.server.weather = 'good';
    await world.wait(5_000);
    expect(saving(editor)).toBe('saved');
    expect(world.server.effects).toBe(2);
    expect(world.server.run.revision.version).toBe(3);
    expect(world.server.run.revision.document).toEqual(state(editor).document);
    const [first, again] = world.server.calls;
    expect(again).toEqual(first);
  });

  it('sends nothing while the device is offline, and at once when it is back', async () => {
    const { world, editor } = await opened();
    world.page.online = false;
    state(editor).run([setAngle(30)]);
    expect(saving(editor)).toBe('local');
    await world.wait(20_000);
    expect(world.server.calls).toHaveLength(0);
    world.page.online = true;
    world.page.tell('online');
    await world.wait(50);
    expect(saving(editor)).toBe('saved');
  });

  it('takes a server that never answers for none', async () => {
    const { world, editor } = await opened();
    world.server.weather = 'silent';
    state(editor).run([setAngle(30)]);
    await world.wait(ANSWER_WITHIN_MS);
    expect(saving(editor)).toBe('saving');
    world.server.weather = 'good';
    await world.wait(3_000);
    expect(saving(editor)).toBe('saved');
    expect(world.server.effects).toBe(1);
  });

  it('waits as long as a busy server asks', async () => {
    const { world, editor } = await opened();
    world.server.weather = { status: 429, code: 'too-many-requests', retryAfter: 12 };
    state(editor).run([setAngle(30)]);
    await world.wait(700);
    expect(saving(editor)).toBe('local');
    world.server.weather = 'good';
    await world.wait(11_000);
    expect(world.server.calls).toHaveLength(1);
    await world.wait(2_000);
    expect(saving(editor)).toBe('saved');
  });

  it.each([
    [400, 'invalid-document', 'invalid'],
    [401, 'not-signed-in', 'signed-out'],
    [403, 'forbidden', 'not-allowed'],
    [404, 'not-found', 'gone'],
    [409, 'already-exists', 'refused'],
  ] as const)(
    'asks a person after %i %s, keeps the edit, and tries again when told',
    async (status, code, reason) => {
      const { world, editor } = await opened();
      world.server.weather = { status, code };
      state(editor).run([setAngle(30)]);
      await world.wait(60_000);
      expect(world.server.calls).toHaveLength(1);
      expect(state(editor).saving).toMatchObject({
        state: 'needs-you',
        reason,
        waiting: 1,
        requestId: 'req-1',
      });
      expect(angleOf(editor)).toMatchObject({ angle: 30 });
      world.server.weather = 'good';
      await Promise.all([state(editor).retry(), world.wait(100)]);
      expect(saving(editor)).toBe('saved');
    },
  );

  it('tries a corrected run by itself', async () => {
    const { world, editor } = await opened();
    world.server.weather = { status: 400, code: 'invalid-document' };
    state(editor).run([setAngle(30)]);
    await world.wait(1_000);
    world.server.weather = 'good';
    state(editor).run([setAngle(22.5)]);
    await world.wait(1_000);
    expect(saving(editor)).toBe('saved');
  });

  it('takes another key where the server says that one was used for something else', async () => {
    const { world, editor } = await opened();
    world.server.weather = { status: 422, code: 'idempotency-key-reused' };
    state(editor).run([setAngle(30)]);
    await world.wait(700);
    world.server.weather = 'good';
    await world.wait(2_000);
    expect(saving(editor)).toBe('saved');
    expect(new Set(world.server.calls.map(({ key }) => key)).size).toBe(2);
  });

  it('sends what waits when the tab is left, and when it is closed', async () => {
    const { world, editor } = await opened();
    state(editor).run([setAngle(30)]);
    world.page.tell('hide');
    await world.wait(50);
    expect(saving(editor)).toBe('saved');
    state(editor).run([setAngle(22.5)]);
    state(editor).dispose();
    await world.wait(5_000);
    expect(world.server.run.revision.document).toEqual(state(editor).document);
  });

  it('flush() resolves once everything typed so far has its answer', async () => {
    const { world, editor } = await opened();
    world.server.delay = 500;
    state(editor).run([setAngle(30)]);
    const first = state(editor).flush();
    state(editor).run([setAngle(22.5)]);
    let isDone = false;
    const all = state(editor)
      .flush()
      .then(() => {
        isDone = true;
      });
    await world.wait(600);
    expect(isDone).toBe(false);
    await world.wait(600);
    await Promise.all([first, all]);
    expect(saving(editor)).toBe('saved');
    expect(world.server.run.revision.document).toEqual(state(editor).document);
  });
});

describe('two people on one run', () => {
  async function conflicting() {
    const { world, editor } = await opened();
    const theirs = structuredClone(START);
    theirs.tag = 'F-9';
    world.server.saveElsewhere(theirs);
    state(editor).run([setAngle(30)]);
    await world.wait(700);
    return { world, editor, theirs };
  }

  it('shows both and asks, even where they touched different things', async () => {
    const { world, editor, theirs } = await conflicting();
    expect(state(editor).saving).toMatchObject({ state: 'needs-you', reason: 'conflict' });
    expect(state(editor).conflict).toMatchObject({
      theirs: { revision: { savedBy: 'Sam' } },
      base: START,
      disjoint: true,
    });
    expect(state(editor).conflict?.mine).toEqual(state(editor).document);
    expect(
      state(editor).conflict?.fields.map(({ pointer, changedBy }) => [pointer, changedBy]),
    ).toEqual([
      ['/tag', 'them'],
      ['/path/4/angle', 'me'],
    ]);
    state(editor).run([setLength(90)]);
    expect(state(editor).conflict?.fields).toHaveLength(3);
    await world.wait(60_000);
    expect(world.server.run.revision.document).toEqual(theirs);
    expect(saving(editor)).toBe('needs-you');
  });

  it('keeps mine on top of theirs', async () => {
    const { world, editor } = await conflicting();
    const mine = state(editor).document;
    state(editor).resolveConflict('keep-mine');
    await world.wait(100);
    expect(state(editor).conflict).toBeNull();
    expect(saving(editor)).toBe('saved');
    expect(world.server.run.revision).toMatchObject({ version: 3, document: mine });
  });

  it('takes theirs, with mine one undo away', async () => {
    const { world, editor, theirs } = await conflicting();
    const mine = state(editor).document;
    state(editor).resolveConflict('take-theirs');
    expect(state(editor).document).toEqual(theirs);
    expect(saving(editor)).toBe('saved');
    expect(state(editor).undoLabel?.key).toBe('edits.did.takeTheirs');
    await world.wait(5_000);
    expect(world.server.calls).toHaveLength(1);
    state(editor).undo();
    expect(state(editor).document).toEqual(mine);
    await world.wait(1_000);
    expect(world.server.run.revision).toMatchObject({ version: 3, document: mine });
  });

  it('does not ask when both did the same', async () => {
    const { world, editor } = await opened();
    state(editor).run([setAngle(30)]);
    world.server.saveElsewhere(structuredClone(state(editor).document));
    await world.wait(700);
    expect(state(editor).conflict).toBeNull();
    expect(saving(editor)).toBe('saved');
    expect(world.server.effects).toBe(0);
  });

  it('asks nobody about an answer it cannot read', async () => {
    const { world, editor } = await opened();
    world.server.weather = { status: 409, code: 'stale-version' };
    state(editor).run([setAngle(30)]);
    await world.wait(700);
    expect(state(editor).saving).toMatchObject({ state: 'needs-you', reason: 'refused' });
    expect(state(editor).conflict).toBeNull();
  });
});

describe('two tabs of one person', () => {
  it('an idle tab follows the one that saved', async () => {
    const world = new EditorWorld(START);
    const one = await world.open();
    const two = await world.open();
    state(one).run([setAngle(30)]);
    await world.wait(1_000);
    expect(state(two).document).toEqual(state(one).document);
    expect(saving(two)).toBe('saved');
    state(two).run([setLength(90)]);
    await world.wait(1_000);
    expect(state(one).document).toEqual(state(two).document);
    expect(world.server.run.revision.version).toBe(3);
    expect(state(one).conflict).toBeNull();
  });

  it('asks where both have edits of their own', async () => {
    const world = new EditorWorld(START);
    const one = await world.open();
    const two = await world.open();
    world.server.delay = 300;
    state(one).run([setAngle(30)]);
    state(two).run([setLength(90)]);
    await world.wait(2_000);
    const asked = [one, two].filter((editor) => state(editor).conflict !== null);
    expect(asked).toHaveLength(1);
  });
});
