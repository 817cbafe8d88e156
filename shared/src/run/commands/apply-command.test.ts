import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { LIMITS } from '../../contracts/limits';
import { bend, buildRun, fitting, offset, pullPoint, straight, wires } from '../build-run';
import { parseRunDocument } from '../parse-run-document';
import type { RunCommand } from '../run-command';
import type { PathElement, RunDocument } from '../run-document';
import { applyCommand, applyCommands } from './apply-command';
import { CommandError } from './command-error';
import type { CommandErrorCode } from './command-error';

const RUNS = process.env.FAIRLEAD_LONG === '1' ? 10_000 : 1_000;

/** e1 box, e2 leg, e3 90, e4 leg, e5 box, e6 leg, e7 offset, e8 leg, e9 box. */
function threeBoxes(overrides: Partial<RunDocument> = {}): RunDocument {
  return buildRun({
    path: [
      pullPoint(),
      straight(),
      bend(),
      straight(),
      pullPoint(),
      straight(),
      offset(),
      straight(),
      pullPoint(),
    ],
    ...overrides,
  });
}

const idsOf = ({ path }: RunDocument) => path.map(({ id }) => id);

function refusal(document: RunDocument, command: RunCommand): CommandErrorCode | null {
  try {
    applyCommand(document, command);
    return null;
  } catch (error) {
    if (error instanceof CommandError) return error.code;
    throw error;
  }
}

describe('the run itself', () => {
  it.each<[RunCommand, Partial<RunDocument>]>([
    [{ command: 'set-identity', args: { tag: 'F-12' } }, { tag: 'F-12' }],
    [{ command: 'set-identity', args: { title: 'Feeder' } }, { title: 'Feeder' }],
    [
      { command: 'set-raceway', args: { raceway: { type: 'RMC', tradeSize: '2' } } },
      { raceway: { type: 'RMC', tradeSize: '2' } },
    ],
    [
      { command: 'set-rules', args: { rules: { code: 'NEC-2020' } } },
      { rules: { code: 'NEC-2020' } },
    ],
    [{ command: 'set-start', args: { start: { heading: 'up' } } }, { start: { heading: 'up' } }],
    [{ command: 'set-sets', args: { sets: 3 } }, { sets: 3 }],
    [
      { command: 'set-environment', args: { environment: { wet: true } } },
      { environment: { wet: true } },
    ],
    [
      { command: 'set-circuit', args: { circuit: { overcurrent: 20 } } },
      { circuit: { overcurrent: 20 } },
    ],
  ])('%j', (command, expected) => {
    const document = threeBoxes();
    expect(applyCommand(document, command)).toEqual({ ...document, ...expected });
  });

  it('takes an emptied title out', () => {
    const titled = threeBoxes({ title: 'Feeder' });
    const emptied = applyCommand(titled, { command: 'set-identity', args: { title: '' } });
    expect(emptied).toStrictEqual(threeBoxes());
  });

  it('keeps no field that was given as undefined, however deep', () => {
    const command: RunCommand = {
      command: 'set-rules',
      args: { rules: { code: 'NEC-2023', overrides: { maxDegrees: undefined, source: 'Spec' } } },
    };
    expect(applyCommand(threeBoxes(), command).rules).toStrictEqual({
      code: 'NEC-2023',
      overrides: { source: 'Spec' },
    });
  });
});

describe('the path', () => {
  it('inserts after a piece and names what has no id', () => {
    const document = threeBoxes();
    const elements = [straight({ length: 24 }), bend({ angle: 30 })];
    const after = applyCommand(document, {
      command: 'insert-elements',
      args: { afterId: 'e3', elements },
    });
    expect(idsOf(after)).toEqual([
      'e1',
      'e2',
      'e3',
      'e10',
      'e11',
      'e4',
      'e5',
      'e6',
      'e7',
      'e8',
      'e9',
    ]);
  });

  it('inserts at the start only what a run can begin with', () => {
    const document = threeBoxes();
    const insert = (elements: PathElement[]): RunCommand => ({
      command: 'insert-elements',
      args: { afterId: null, elements },
    });
    expect(refusal(document, insert([bend()]))).toBe('ends-need-pull-points');
    expect(idsOf(applyCommand(document, insert([pullPoint(), straight()])))[0]).toBe('e10');
    const last: RunCommand = {
      command: 'insert-elements',
      args: { afterId: 'e9', elements: [bend()] },
    };
    expect(refusal(document, last)).toBe('ends-need-pull-points');
  });

  it('sets fields, takes out those given as undefined, and never the kind or the id', () => {
    const document = threeBoxes();
    const set = (patch: Record<string, unknown>): RunCommand => ({
      command: 'set-element',
      args: { elementId: 'e7', patch },
    });
    const changed = applyCommands(document, [
      set({ angle: 22.5, radius: 9 }),
      set({ radius: undefined }),
    ]);
    expect(changed.path[6]).toStrictEqual({ kind: 'offset', id: 'e7', rise: 6, angle: 22.5 });
    expect(refusal(document, set({ kind: 'bend' }))).toBe('kind-fixed');
    expect(refusal(document, set({ id: 'e99' }))).toBe('kind-fixed');
  });

  it('keeps a person from making an end unreachable', () => {
    const command: RunCommand = {
      command: 'set-element',
      args: { elementId: 'e9', patch: { accessible: false } },
    };
    expect(refusal(threeBoxes(), command)).toBe('ends-need-pull-points');
  });

  it('replaces a piece under its own id', () => {
    const element = bend({ id: 'whatever', angle: 45 });
    const command: RunCommand = { command: 'replace-element', args: { elementId: 'e7', element } };
    expect(applyCommand(threeBoxes(), command).path[6]).toEqual({
      kind: 'bend',
      id: 'e7',
      angle: 45,
    });
  });

  it('takes a straight out without merging its neighbours', () => {
    const document = buildRun({
      path: [
        pullPoint(),
        straight({ length: 10 }),
        straight({ length: 20 }),
        straight({ length: 30 }),
        pullPoint(),
      ],
    });
    const after = applyCommand(document, {
      command: 'remove-elements',
      args: { elementIds: ['e3'] },
    });
    expect(after.path).toEqual([
      document.path[0],
      document.path[1],
      document.path[3],
      document.path[4],
    ]);
  });

  it('never takes an end out and never moves it', () => {
    const document = threeBoxes();
    for (const id of ['e1', 'e9']) {
      expect(
        refusal(document, { command: 'remove-elements', args: { elementIds: ['e7', id] } }),
      ).toBe('end-pull-point');
      expect(refusal(document, { command: 'move-element', args: { elementId: id, by: 1 } })).toBe(
        'end-pull-point',
      );
    }
  });

  it('moves a piece along the path, not past an end', () => {
    const document = threeBoxes();
    const move = (by: number): RunCommand => ({
      command: 'move-element',
      args: { elementId: 'e7', by },
    });
    expect(idsOf(applyCommand(document, move(-3)))).toEqual([
      'e1',
      'e2',
      'e3',
      'e7',
      'e4',
      'e5',
      'e6',
      'e8',
      'e9',
    ]);
    expect(idsOf(applyCommand(document, move(1)))).toEqual([
      'e1',
      'e2',
      'e3',
      'e4',
      'e5',
      'e6',
      'e8',
      'e7',
      'e9',
    ]);
    expect(refusal(document, move(2))).toBe('past-the-end');
    expect(refusal(document, move(-6))).toBe('past-the-end');
    expect(refusal(document, move(0.5))).toBe('past-the-end');
  });

  it('cuts a straight in two that add up to it', () => {
    const split = (at: number): RunCommand => ({
      command: 'split-straight',
      args: { elementId: 'e6', at, element: pullPoint({ id: 'p' }), restId: 'r' },
    });
    const after = applyCommand(threeBoxes(), split(47.5));
    expect(after.path.slice(5, 8)).toEqual([
      { kind: 'straight', id: 'e6', length: 47.5 },
      { kind: 'pull-point', id: 'p', device: 'box' },
      { kind: 'straight', id: 'r', length: 72.5 },
    ]);
    for (const at of [0, 120, -1, 121, NaN])
      expect(refusal(threeBoxes(), split(at))).toBe('outside-the-straight');
  });

  it.each<[RunCommand, CommandErrorCode]>([
    [{ command: 'set-element', args: { elementId: 'no', patch: {} } }, 'element-missing'],
    [{ command: 'remove-elements', args: { elementIds: ['no'] } }, 'element-missing'],
    [{ command: 'remove-elements', args: { elementIds: [] } }, 'nothing-given'],
    [
      { command: 'insert-elements', args: { afterId: 'no', elements: [bend()] } },
      'element-missing',
    ],
    [{ command: 'insert-elements', args: { afterId: 'e3', elements: [] } }, 'nothing-given'],
    [
      { command: 'insert-elements', args: { afterId: 'e3', elements: [bend({ id: 'e7' })] } },
      'id-taken',
    ],
    [
      {
        command: 'insert-elements',
        args: { afterId: 'e3', elements: [bend({ id: 'x' }), bend({ id: 'x' })] },
      },
      'id-taken',
    ],
    [
      {
        command: 'split-straight',
        args: { elementId: 'e7', at: 1, element: pullPoint(), restId: 'r' },
      },
      'not-a-straight',
    ],
    [{ command: 'set-conductors', args: { group: wires({ id: 'no' }) } }, 'group-missing'],
    [{ command: 'remove-conductors', args: { groupId: 'no' } }, 'group-missing'],
    [{ command: 'add-conductors', args: { group: wires({ id: 'e7' }) } }, 'id-taken'],
  ])('refuses %j', (command, code) => {
    const document = threeBoxes();
    const copy = structuredClone(document);
    expect(refusal(document, command)).toBe(code);
    expect(document).toEqual(copy);
  });

  it('refuses to grow past what a run may hold', () => {
    const document = threeBoxes();
    const elements = Array.from({ length: LIMITS.elements }, () => straight());
    expect(
      refusal(document, { command: 'insert-elements', args: { afterId: 'e3', elements } }),
    ).toBe('too-many-elements');
    const conductors = Array.from({ length: LIMITS.conductorGroups }, () => wires());
    const full = threeBoxes({ conductors });
    expect(refusal(full, { command: 'add-conductors', args: { group: wires() } })).toBe(
      'too-many-groups',
    );
  });
});

describe('wires', () => {
  it('adds, changes and takes out groups; the last one takes the list with it', () => {
    const add: RunCommand = { command: 'add-conductors', args: { group: wires({ count: 4 }) } };
    const added = applyCommand(threeBoxes(), add);
    expect(added.conductors).toMatchObject([{ id: 'w1', count: 4 }]);
    const group = wires({ id: 'w1', count: 5 });
    const changed = applyCommand(added, { command: 'set-conductors', args: { group } });
    expect(changed.conductors).toEqual([group]);
    const emptied = applyCommand(changed, {
      command: 'remove-conductors',
      args: { groupId: 'w1' },
    });
    expect(emptied).toStrictEqual(threeBoxes());
  });
});

describe('what refers to a pull point that goes', () => {
  const remove = (document: RunDocument, elementId: string) =>
    applyCommand(document, { command: 'remove-elements', args: { elementIds: [elementId] } });

  it('moves a group’s end outward to the next pull point, and leaves an end of the run unsaid', () => {
    const document = threeBoxes({
      conductors: [
        wires({ id: 'whole' }),
        wires({ id: 'first', to: 'e5' }),
        wires({ id: 'last', from: 'e5', to: 'e9' }),
      ],
    });
    const after = remove(document, 'e5');
    expect(after.conductors).toStrictEqual([
      wires({ id: 'whole' }),
      wires({ id: 'first' }),
      wires({ id: 'last', to: 'e9' }),
    ]);
  });

  it('keeps a group that is not touched as it is', () => {
    const document = threeBoxes({ conductors: [wires({ id: 'w', from: 'e1', to: 'e9' })] });
    expect(remove(document, 'e5').conductors).toStrictEqual(document.conductors);
  });

  it('joins the planned pulls on both sides into one', () => {
    const document = threeBoxes({
      pulls: [
        { id: 'p1', from: 'e1', to: 'e5', feedAt: 'to' },
        { id: 'p2', from: 'e5', to: 'e9' },
      ],
    });
    expect(remove(document, 'e5').pulls).toEqual([
      { id: 'p1', from: 'e1', to: 'e9', feedAt: 'to' },
    ]);
  });

  it('does the same when the pull point becomes something else', () => {
    const document = threeBoxes({ conductors: [wires({ id: 'w', from: 'e5' })] });
    const command: RunCommand = {
      command: 'replace-element',
      args: { elementId: 'e5', element: fitting() },
    };
    expect(applyCommand(document, command).conductors).toStrictEqual([wires({ id: 'w' })]);
  });

  it('swaps the ends of a stretch whose pull points changed places', () => {
    const document = buildRun({
      path: [pullPoint(), pullPoint(), pullPoint(), pullPoint()],
      conductors: [wires({ id: 'w', from: 'e2', to: 'e3' })],
      pulls: [{ id: 'p', from: 'e2', to: 'e3' }],
    });
    const after = applyCommand(document, {
      command: 'move-element',
      args: { elementId: 'e2', by: 1 },
    });
    expect(after.conductors?.[0]).toMatchObject({ from: 'e3', to: 'e2' });
    expect(after.pulls?.[0]).toMatchObject({ from: 'e3', to: 'e2' });
  });
});

describe('any sequence of commands', () => {
  const id = fc.constantFrom(
    'e1',
    'e2',
    'e3',
    'e4',
    'e5',
    'e6',
    'e7',
    'e8',
    'e9',
    'e10',
    'e11',
    'no',
  );
  const piece = fc.constantFrom<PathElement>(
    pullPoint(),
    pullPoint({ accessible: false, device: 'conduit-body', body: 'LB' }),
    straight(),
    bend(),
    offset(),
    fitting(),
  );
  const command = fc.oneof(
    fc
      .record({
        afterId: fc.oneof(id, fc.constant(null)),
        elements: fc.array(piece, { maxLength: 3 }),
      })
      .map((args): RunCommand => ({ command: 'insert-elements', args })),
    fc
      .array(id, { maxLength: 3 })
      .map((elementIds): RunCommand => ({ command: 'remove-elements', args: { elementIds } })),
    fc
      .record({ elementId: id, by: fc.integer({ min: -4, max: 4 }) })
      .map((args): RunCommand => ({ command: 'move-element', args })),
    fc
      .record({ elementId: id, element: piece })
      .map((args): RunCommand => ({ command: 'replace-element', args })),
    fc
      .record({ elementId: id, at: fc.integer({ min: 1, max: 100 }) })
      .map(({ elementId, at }): RunCommand => ({
        command: 'split-straight',
        args: { elementId, at, element: pullPoint(), restId: '' },
      })),
    fc
      .record({
        from: fc.oneof(id, fc.constant(undefined)),
        to: fc.oneof(id, fc.constant(undefined)),
      })
      .map((ends): RunCommand => ({ command: 'add-conductors', args: { group: wires(ends) } })),
  );

  it('keeps a document the parser accepts, or refuses with a reason, and never touches the old one', () => {
    fc.assert(
      fc.property(fc.array(command, { maxLength: 12 }), (commands) => {
        let document = threeBoxes({
          conductors: [wires({ id: 'w1', from: 'e1', to: 'e5' }), wires({ id: 'w2', from: 'e5' })],
          pulls: [{ id: 'p1', from: 'e1', to: 'e5' }],
        });
        for (const next of commands) {
          // A stretch that never was one is the parser's to refuse.
          if (next.command === 'add-conductors' && !isStretch(document, next.args.group)) continue;
          const copy = structuredClone(document);
          const before = document;
          try {
            document = applyCommand(document, next);
          } catch (error) {
            expect(error).toBeInstanceOf(CommandError);
          }
          expect(before).toStrictEqual(copy);
          expect(parseRunDocument(document)).toMatchObject({ ok: true });
        }
      }),
      { numRuns: RUNS },
    );
  });

  function isStretch({ path }: RunDocument, { from, to }: { from?: string; to?: string }): boolean {
    const points = path
      .filter(({ kind }) => kind === 'pull-point')
      .map(({ id: pointId }) => pointId);
    const start = from === undefined ? 0 : points.indexOf(from);
    const end = to === undefined ? points.length - 1 : points.indexOf(to);
    return start >= 0 && start < end;
  }
});
