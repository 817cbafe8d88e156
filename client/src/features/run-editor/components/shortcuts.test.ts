import { describe, expect, it } from 'vitest';
import { COMMANDS, commandOf } from './commands/commands';
import { SHORTCUTS, commandFor } from './shortcuts';

const press = (key: string, held: Partial<Parameters<typeof commandFor>[0]> = {}) => ({
  key,
  ctrlKey: false,
  metaKey: false,
  shiftKey: false,
  altKey: false,
  ...held,
});

describe('shortcuts', () => {
  it('undoes and redoes with Ctrl or Cmd', () => {
    expect(commandFor(press('z', { ctrlKey: true }), true)).toBe('undo');
    expect(commandFor(press('z', { metaKey: true }), true)).toBe('undo');
    expect(commandFor(press('Z', { ctrlKey: true, shiftKey: true }), true)).toBe('redo');
  });

  it('switches single letters off and nothing else', () => {
    expect(commandFor(press('b'), true)).toBe('add-bend-90');
    expect(commandFor(press('b'), false)).toBeNull();
    expect(commandFor(press('?', { shiftKey: true }), false)).toBeNull();
    expect(commandFor(press('Delete'), false)).toBe('delete');
    expect(commandFor(press('z', { ctrlKey: true }), false)).toBe('undo');
  });

  it('leaves keys with other keys held alone', () => {
    expect(commandFor(press('b', { ctrlKey: true }), true)).toBeNull();
    expect(commandFor(press('Delete', { altKey: true }), true)).toBeNull();
    expect(commandFor(press('q'), true)).toBeNull();
  });

  it('stands for commands that exist, each key once', () => {
    for (const { command } of SHORTCUTS) expect(COMMANDS).toContain(commandOf(command));
    const keys = SHORTCUTS.map(({ key, mod, shift, alt }) => [key, mod, shift, alt].join(' '));
    expect(new Set(keys).size).toBe(keys.length);
  });
});
