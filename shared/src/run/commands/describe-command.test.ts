import { describe, expect, it } from 'vitest';
import english from '../../words/en/edits.json';
import { bend, buildRun, offset, pullPoint, straight, wires } from '../build-run';
import type { RunCommand } from '../run-command';
import { ELEMENT_KINDS } from '../run-document';
import { COMMAND_ERROR_CODES } from './command-error';
import { describeCommand } from './describe-command';
import { EDIT_KEYS } from './edit-label';
import { wordEdit } from './word-edit';

/** Reads `edits.a.b` out of the English words and fills in the values. */
function say(key: string, values: Record<string, string | number> = {}): string {
  const [, ...steps] = key.split('.');
  const found = steps.reduce<unknown>(
    (words, step) => (words as Record<string, unknown>)[step],
    english,
  );
  return String(found).replace(/\{\{(\w+)\}\}/g, (_, name: string) => String(values[name]));
}

/** e1 box, e2 leg, e3 90, e4 leg, e5 JB-3, e6 leg, e7 offset, e8 leg, e9 AHU-4. */
const document = buildRun({
  path: [
    pullPoint(),
    straight(),
    bend(),
    straight(),
    pullPoint({ label: 'JB-3' }),
    straight(),
    offset(),
    straight(),
    pullPoint({ label: 'AHU-4' }),
  ],
  conductors: [wires({ id: 'w1', count: 3, size: '500' })],
});

const named = (command: RunCommand) => wordEdit(describeCommand(document, command), say);
const set = (elementId: string, patch: Record<string, unknown>): RunCommand => ({
  command: 'set-element',
  args: { elementId, patch },
});

describe('describeCommand', () => {
  it.each<[string, RunCommand]>([
    ['offset 3 angle', set('e7', { angle: 22.5 })],
    ['bend 1 direction', set('e3', { toward: 'up' })],
    ['leg before offset 3 length', set('e6', { length: 90 })],
    ['leg before AHU-4 length', set('e8', { length: 90 })],
    ['JB-3 label', set('e5', { label: 'JB-4' })],
    ["JB-3 can't be reached", set('e5', { accessible: false })],
    ['JB-3 can be reached', set('e5', { accessible: true })],
    ['change offset 3', set('e7', { angle: 30, rise: 4 })],
    ['change pull point', set('e1', { makeUp: 12 })],
    [
      'replace bend 1',
      { command: 'replace-element', args: { elementId: 'e3', element: offset() } },
    ],
    ['remove offset 3', { command: 'remove-elements', args: { elementIds: ['e7'] } }],
    ['remove 2 pieces', { command: 'remove-elements', args: { elementIds: ['e6', 'e7'] } }],
    ['remove leg before JB-3', { command: 'remove-elements', args: { elementIds: ['e4'] } }],
    ['move bend 1', { command: 'move-element', args: { elementId: 'e3', by: 1 } }],
    [
      'add bend',
      { command: 'insert-elements', args: { afterId: 'e3', elements: [straight(), bend()] } },
    ],
    [
      'add leg before JB-3',
      { command: 'insert-elements', args: { afterId: 'e3', elements: [straight()] } },
    ],
    [
      'add 2 pieces',
      { command: 'insert-elements', args: { afterId: 'e3', elements: [bend(), bend()] } },
    ],
    [
      'add pull point in a leg',
      {
        command: 'split-straight',
        args: { elementId: 'e6', at: 5, element: pullPoint(), restId: 'r' },
      },
    ],
    ['remove 3 × 500', { command: 'remove-conductors', args: { groupId: 'w1' } }],
    ['add 3 × 12', { command: 'add-conductors', args: { group: wires() } }],
    ['raceway', { command: 'set-raceway', args: { raceway: { type: 'EMT', tradeSize: '1' } } }],
    ['title', { command: 'set-identity', args: { title: 'Feeder' } }],
    ['tag', { command: 'set-identity', args: { tag: 'F-2' } }],
    ['piece length', set('not there', { length: 3 })],
  ])('%s', (words, command) => {
    expect(named(command)).toBe(words);
  });

  it('has a word for every edit, piece and refusal, and none to spare', () => {
    expect(Object.keys(english.did).sort()).toEqual([...EDIT_KEYS].sort());
    expect(Object.keys(english.piece).sort()).toEqual([...ELEMENT_KINDS].sort());
    expect(Object.keys(english.refused).sort()).toEqual([...COMMAND_ERROR_CODES].sort());
  });
});
