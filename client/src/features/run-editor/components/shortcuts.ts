import type { CommandId } from './commands/commands';

export interface Shortcut {
  command: CommandId;
  /** As `KeyboardEvent.key` says it. */
  key: string;
  mod?: boolean;
  shift?: boolean;
  alt?: boolean;
}

/** Every key of the run editor. Single letters and digits can be switched off. */
export const SHORTCUTS: readonly Shortcut[] = [
  { command: 'undo', key: 'z', mod: true },
  { command: 'redo', key: 'z', mod: true, shift: true },
  { command: 'redo', key: 'y', mod: true },
  { command: 'delete', key: 'Delete' },
  { command: 'move-up', key: 'ArrowUp', alt: true },
  { command: 'move-down', key: 'ArrowDown', alt: true },
  { command: 'previous', key: 'ArrowUp' },
  { command: 'next', key: 'ArrowDown' },
  { command: 'edit', key: 'Enter' },
  { command: 'deselect', key: 'Escape' },
  { command: 'layout', key: '1' },
  { command: 'conductors', key: '2' },
  { command: 'pull', key: '3' },
  { command: 'keys', key: '?' },
  { command: 'add-bend-90', key: 'b' },
  { command: 'add-kick-45', key: 'k' },
  { command: 'add-offset-30', key: 'o' },
  { command: 'add-box-offset', key: 'x' },
  { command: 'add-saddle-3', key: 's' },
  { command: 'add-saddle-4', key: 'd' },
  { command: 'add-box', key: 'p' },
  { command: 'add-lb', key: 'l' },
  { command: 'add-flex', key: 'f' },
];

type KeyPress = Pick<KeyboardEvent, 'key' | 'ctrlKey' | 'metaKey' | 'shiftKey' | 'altKey'>;

/** A printable key without Ctrl: what a speech program or a stray hand may press. */
export function isSingleLetter(shortcut: Shortcut): boolean {
  return shortcut.key.length === 1 && !shortcut.mod && !shortcut.alt;
}

/** The command a key press stands for; null for none. */
export function commandFor(press: KeyPress, lettersAct: boolean): CommandId | null {
  const found = SHORTCUTS.find((shortcut) => {
    // A sign like "?" already tells whether Shift was held.
    const isSign = shortcut.key.length === 1 && !/[a-z0-9]/.test(shortcut.key);
    return (
      shortcut.key.toLowerCase() === press.key.toLowerCase() &&
      Boolean(shortcut.mod) === (press.ctrlKey || press.metaKey) &&
      Boolean(shortcut.alt) === press.altKey &&
      (isSign || Boolean(shortcut.shift) === press.shiftKey)
    );
  });
  if (!found || (!lettersAct && isSingleLetter(found))) return null;
  return found.command;
}
