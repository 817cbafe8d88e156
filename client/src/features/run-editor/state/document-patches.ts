import { applyPatches, enablePatches } from 'immer';
import type { Patch } from 'immer';
import type { RunDocument } from '@fairlead/shared';
import { deepEqual } from './deep-equal';

enablePatches();

type Path = (string | number)[];

/**
 * The patches that lead from one document to another, small enough to keep hundreds of them: what is inserted in or taken
 * out of a list costs one patch for each piece, not one for each piece behind it.
 */
export function diffDocuments(before: RunDocument, after: RunDocument): Patch[] {
  const patches: Patch[] = [];
  diffValues(before, after, [], patches);
  return patches;
}

export function patchDocument(document: RunDocument, patches: readonly Patch[]): RunDocument {
  return applyPatches(document, patches);
}

function diffValues(before: unknown, after: unknown, path: Path, patches: Patch[]): void {
  if (deepEqual(before, after)) return;
  if (Array.isArray(before) && Array.isArray(after)) {
    diffLists(before, after, path, patches);
  } else if (isFields(before) && isFields(after)) {
    diffFields(before, after, path, patches);
  } else {
    patches.push({ op: 'replace', path, value: after });
  }
}

type Fields = Record<string, unknown>;

function isFields(value: unknown): value is Fields {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}

function diffFields(before: Fields, after: Fields, path: Path, patches: Patch[]): void {
  for (const key of Object.keys(before)) {
    if (!Object.hasOwn(after, key)) patches.push({ op: 'remove', path: [...path, key] });
  }
  for (const [key, value] of Object.entries(after)) {
    const place = [...path, key];
    if (Object.hasOwn(before, key)) diffValues(before[key], value, place, patches);
    else patches.push({ op: 'add', path: place, value });
  }
}

/** Lists are compared from both ends; what differs in the middle is taken out from behind and put in from the front. */
function diffLists(before: unknown[], after: unknown[], path: Path, patches: Patch[]): void {
  const shortest = Math.min(before.length, after.length);
  let front = 0;
  while (front < shortest && isSameItem(before[front], after[front])) front += 1;
  let back = 0;
  while (
    back < shortest - front &&
    isSameItem(before[before.length - 1 - back], after[after.length - 1 - back])
  ) {
    back += 1;
  }
  for (let index = before.length - back - 1; index >= front; index -= 1) {
    patches.push({ op: 'remove', path: [...path, index] });
  }
  for (let index = front; index < after.length - back; index += 1) {
    patches.push({ op: 'add', path: [...path, index], value: after[index] });
  }
  for (let index = 0; index < front; index += 1) {
    diffValues(before[index], after[index], [...path, index], patches);
  }
  for (let index = after.length - back; index < after.length; index += 1) {
    const old = before[index - after.length + before.length];
    diffValues(old, after[index], [...path, index], patches);
  }
}

/** Pieces are the same piece while they carry the same id; items without an id are compared by value. */
function isSameItem(a: unknown, b: unknown): boolean {
  if (isFields(a) && isFields(b) && typeof a.id === 'string') return a.id === b.id;
  return deepEqual(a, b);
}
