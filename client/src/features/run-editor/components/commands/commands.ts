import type { RunCommand, RunDocument } from '@fairlead/shared';
import type { RunEditorState } from '../../state/run-editor-state';
import { insertAfter } from '../model/insert-after';
import { pieceIds, pieceOf } from '../model/list-rows';
import { ADD_KEYS } from '../model/new-pieces';
import type { AddKey } from '../model/new-pieces';

export const PLACES = ['layout', 'conductors', 'pull'] as const;
export type Place = (typeof PLACES)[number];

/** What a command may reach beyond the run itself. */
export interface Around {
  goTo: (place: Place) => void;
  editSelected: () => void;
  showKeys: () => void;
}

export type CommandId =
  | 'undo'
  | 'redo'
  | 'delete'
  | 'previous'
  | 'next'
  | 'move-up'
  | 'move-down'
  | 'edit'
  | 'deselect'
  | 'layout'
  | 'conductors'
  | 'pull'
  | 'keys'
  | `add-${AddKey}`;

export interface EditorCommand {
  id: CommandId;
  group: 'edit' | 'move' | 'add';
  isEnabled: (state: RunEditorState) => boolean;
  act: (state: RunEditorState, around: Around) => void;
}

const always = () => true;

function isEnd(state: RunEditorState, id: string): boolean {
  const { path } = state.document;
  return id === path[0]?.id || id === path[path.length - 1]?.id;
}

function selectedInner(state: RunEditorState): string | null {
  const piece = pieceOf(state.document, state.selectedId);
  return piece && state.canEdit && !isEnd(state, piece.id) ? piece.id : null;
}

/** Takes a piece out; the legs before and after it become one, so no pipe is lost. */
export function removalOf(pieceId: string): RunCommand[] {
  return [{ command: 'remove-elements', args: { elementIds: [pieceId] } }];
}

function remove(state: RunEditorState): void {
  const id = selectedInner(state);
  if (id === null) return;
  const ids = pieceIds(state.document);
  const place = ids.indexOf(id);
  if (state.run(removalOf(id)).ok) state.select(ids[place + 1] ?? ids[place - 1] ?? null);
}

function step(by: 1 | -1) {
  return (state: RunEditorState) => {
    const ids = pieceIds(state.document);
    const selected = pieceOf(state.document, state.selectedId);
    const place = selected ? ids.indexOf(selected.id) + by : by > 0 ? 0 : ids.length - 1;
    const id = ids[Math.min(Math.max(place, 0), ids.length - 1)];
    if (id !== undefined) state.select(id);
  };
}

/** Where a piece begins with the straights that lead to it, and where it stands. */
function blockOf(path: RunDocument['path'], place: number): { first: number; size: number } {
  let first = place;
  while (path[first - 1]?.kind === 'straight') first -= 1;
  return { first, size: place - first + 1 };
}

/** Changes places with the neighbouring piece; each takes its leg along. */
export function moveCommands(state: RunEditorState, by: 1 | -1): RunCommand[] | null {
  const id = selectedInner(state);
  if (id === null) return null;
  const { path } = state.document;
  const ids = pieceIds(state.document);
  const upper = ids[ids.indexOf(id) + Math.min(by, 0)];
  const lower = ids[ids.indexOf(id) + Math.max(by, 0)];
  if (!upper || !lower || isEnd(state, upper) || isEnd(state, lower)) return null;
  const above = blockOf(
    path,
    path.findIndex((element) => element.id === upper),
  );
  const below = blockOf(
    path,
    path.findIndex((element) => element.id === lower),
  );
  return path.slice(below.first, below.first + below.size).map((element) => ({
    command: 'move-element',
    args: { elementId: element.id, by: -above.size },
  }));
}

function move(by: 1 | -1) {
  return (state: RunEditorState) => {
    const commands = moveCommands(state, by);
    if (commands) state.run(commands, { coalesce: `move ${state.selectedId}` });
  };
}

/** Adds a piece after the selected one and selects it. */
export function addPiece(state: RunEditorState, key: AddKey): void {
  const { commands, pieceId } = insertAfter(state.document, state.selectedId, key);
  if (state.run(commands).ok) state.select(pieceId);
}

/** Everything a button, a key and later a palette can do in the run editor. */
export const COMMANDS: readonly EditorCommand[] = [
  {
    id: 'undo',
    group: 'edit',
    isEnabled: (state) => state.canEdit && state.undoLabel !== null,
    act: (state) => state.undo(),
  },
  {
    id: 'redo',
    group: 'edit',
    isEnabled: (state) => state.canEdit && state.redoLabel !== null,
    act: (state) => state.redo(),
  },
  { id: 'delete', group: 'edit', isEnabled: (s) => selectedInner(s) !== null, act: remove },
  {
    id: 'move-up',
    group: 'edit',
    isEnabled: (state) => moveCommands(state, -1) !== null,
    act: move(-1),
  },
  {
    id: 'move-down',
    group: 'edit',
    isEnabled: (state) => moveCommands(state, 1) !== null,
    act: move(1),
  },
  { id: 'previous', group: 'move', isEnabled: always, act: step(-1) },
  { id: 'next', group: 'move', isEnabled: always, act: step(1) },
  {
    id: 'edit',
    group: 'move',
    isEnabled: (state) => state.selectedId !== null,
    act: (_, around) => around.editSelected(),
  },
  {
    id: 'deselect',
    group: 'move',
    isEnabled: (state) => state.selectedId !== null,
    act: (state) => state.select(null),
  },
  { id: 'layout', group: 'move', isEnabled: always, act: (_, around) => around.goTo('layout') },
  {
    id: 'conductors',
    group: 'move',
    isEnabled: always,
    act: (_, around) => around.goTo('conductors'),
  },
  { id: 'pull', group: 'move', isEnabled: always, act: (_, around) => around.goTo('pull') },
  { id: 'keys', group: 'move', isEnabled: always, act: (_, around) => around.showKeys() },
  ...ADD_KEYS.map((key): EditorCommand => ({
    id: `add-${key}`,
    group: 'add',
    isEnabled: (state) => state.canEdit,
    act: (state) => addPiece(state, key),
  })),
];

export function commandOf(id: CommandId): EditorCommand {
  const command = COMMANDS.find((candidate) => candidate.id === id);
  if (!command) throw new Error(`No command ${id}.`);
  return command;
}
