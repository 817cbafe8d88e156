import { useCallback, useEffect, useRef } from 'react';
import type { RunEditorState } from '../../state/run-editor-state';
import { useRunEditor } from '../../state/use-run-editor';
import { useLetters } from '../hooks/use-letters';
import { commandFor } from '../shortcuts';
import { commandOf } from './commands';
import type { Around, CommandId } from './commands';

const wholeState = (state: RunEditorState) => state;

/** Keys belong to a field while a person types in it, and to a dialog while it is open. */
function isTaken(target: EventTarget | null): boolean {
  if (!(target instanceof HTMLElement)) return false;
  if (target.closest('[role="dialog"],[role="menu"]')) return true;
  const isTyping = /^(INPUT|TEXTAREA|SELECT)$/.test(target.tagName);
  return isTyping && !(target instanceof HTMLInputElement && target.type === 'checkbox');
}

/** Enter and the arrows mean something of their own on a button. */
function isButton(target: EventTarget | null): boolean {
  return target instanceof HTMLElement && target.closest('button,a,[role="radio"]') !== null;
}

/** Carries out commands as things stand at that moment. */
export function useCommand(around: Around): (id: CommandId) => boolean {
  const state = useRunEditor(wholeState);
  const latest = useRef({ state, around });
  useEffect(() => {
    latest.current = { state, around };
  });
  return useCallback((id) => {
    const command = commandOf(id);
    const now = latest.current;
    if (!command.isEnabled(now.state)) return false;
    command.act(now.state, now.around);
    return true;
  }, []);
}

/** Listens for the keys of the whole page. */
export function useShortcuts(doCommand: (id: CommandId) => boolean): void {
  const lettersAct = useLetters((letters) => letters.lettersAct);
  useEffect(() => {
    const onKeyDown = (event: KeyboardEvent) => {
      if (event.defaultPrevented || isTaken(event.target)) return;
      const id = commandFor(event, lettersAct);
      if (id === null) return;
      const isOwn = ['edit', 'previous', 'next'].includes(id);
      if (isOwn && isButton(event.target)) return;
      if (doCommand(id)) event.preventDefault();
    };
    window.addEventListener('keydown', onKeyDown);
    return () => window.removeEventListener('keydown', onKeyDown);
  }, [doCommand, lettersAct]);
}
