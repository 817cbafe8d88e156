import { describe, expect, it } from 'vitest';
import {
  applyCommands,
  bend,
  buildRun,
  offset,
  pullPoint,
  straight,
  wires,
} from '@fairlead/shared';
import type { RunCommand } from '@fairlead/shared';
import { conflictBetween, conflictFields } from './conflict-fields';
import { buildRunAnswer } from './testing/build-run-answer';

const base = buildRun({
  path: [pullPoint(), straight(), bend(), straight(), offset(), straight(), pullPoint()],
});
const set = (elementId: string, patch: Record<string, unknown>): RunCommand => ({
  command: 'set-element',
  args: { elementId, patch },
});
const edited = (...commands: RunCommand[]) => applyCommands(base, commands);

describe('conflictFields', () => {
  it('names the field, who changed it, and all three values', () => {
    const mine = edited(set('e5', { angle: 22.5 }), set('e2', { length: 90 }));
    const theirs = edited(set('e5', { angle: 45 }), {
      command: 'set-identity',
      args: { tag: 'F-9' },
    });
    expect(conflictFields(mine, theirs, base)).toEqual([
      {
        pointer: '/tag',
        elementId: null,
        field: 'tag',
        base: 'F-1',
        mine: 'F-1',
        theirs: 'F-9',
        changedBy: 'them',
      },
      {
        pointer: '/path/1/length',
        elementId: 'e2',
        field: 'length',
        base: 120,
        mine: 90,
        theirs: 120,
        changedBy: 'me',
      },
      {
        pointer: '/path/4/angle',
        elementId: 'e5',
        field: 'angle',
        base: 30,
        mine: 22.5,
        theirs: 45,
        changedBy: 'both',
      },
    ]);
  });

  it('counts a piece put in once and moves nothing behind it', () => {
    const mine = edited({
      command: 'insert-elements',
      args: { afterId: 'e2', elements: [bend({ id: 'new', angle: 45 })] },
    });
    expect(conflictFields(mine, base, base)).toMatchObject([
      {
        pointer: '/path/2',
        elementId: 'new',
        field: null,
        base: undefined,
        theirs: undefined,
        changedBy: 'me',
      },
    ]);
  });

  it('sees a piece one side took out and the other changed', () => {
    const mine = edited({ command: 'remove-elements', args: { elementIds: ['e5'] } });
    const theirs = edited(set('e5', { angle: 45 }));
    expect(conflictFields(mine, theirs, base)).toMatchObject([
      { pointer: '/path/4', elementId: 'e5', field: null, mine: undefined, changedBy: 'both' },
    ]);
  });

  it('sees another order, wires, and settings inside settings', () => {
    const mine = edited({ command: 'move-element', args: { elementId: 'e5', by: -2 } });
    const theirs = edited(
      { command: 'add-conductors', args: { group: wires({ id: 'w1' }) } },
      { command: 'set-raceway', args: { raceway: { type: 'EMT', tradeSize: '1' } } },
    );
    expect(
      conflictFields(mine, theirs, base).map(({ pointer, changedBy }) => [pointer, changedBy]),
    ).toEqual([
      ['/raceway/tradeSize', 'them'],
      ['/conductors/0', 'them'],
      ['/path', 'me'],
    ]);
  });

  it('finds nothing between two that are the same', () => {
    expect(
      conflictFields(edited(set('e2', { length: 9 })), edited(set('e2', { length: 9 })), base),
    ).toEqual([]);
  });
});

it('tells when nobody touched what the other did', () => {
  const mine = edited(set('e2', { length: 90 }));
  const apart = buildRunAnswer(edited(set('e5', { angle: 45 })));
  expect(conflictBetween(mine, apart, base).disjoint).toBe(true);
  const same = buildRunAnswer(edited(set('e2', { length: 80 })));
  expect(conflictBetween(mine, same, base).disjoint).toBe(false);
});
