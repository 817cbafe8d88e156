import { LIMITS } from '../../contracts/limits';
import { numberElements } from '../element-ids';
import { isAccessible, isPullPoint } from '../pull-points';
import type { PathElement, RunDocument } from '../run-document';
import { CommandError } from './command-error';
import { repairReferences } from './repair-references';
import { replacedAt, sparse } from './sparse';

export function indexOfElement(document: Pick<RunDocument, 'path'>, elementId: string): number {
  const index = document.path.findIndex(({ id }) => id === elementId);
  if (index < 0) throw new CommandError('element-missing', elementId);
  return index;
}

/** The document with another path: still between two pull points people can reach, references kept true. */
export function withPath(document: RunDocument, path: PathElement[]): RunDocument {
  if (path.length > LIMITS.elements) throw new CommandError('too-many-elements');
  for (const end of [path[0], path[path.length - 1]]) {
    if (!end || !isPullPoint(end) || !isAccessible(end)) {
      throw new CommandError('ends-need-pull-points', end?.id ?? null);
    }
  }
  return repairReferences(document, path);
}

export function insertElements(
  document: RunDocument,
  afterId: string | null,
  elements: readonly PathElement[],
): RunDocument {
  if (elements.length === 0) throw new CommandError('nothing-given');
  const at = afterId === null ? 0 : indexOfElement(document, afterId) + 1;
  const named = nameElements(document, elements);
  return withPath(document, [...document.path.slice(0, at), ...named, ...document.path.slice(at)]);
}

/** Gives new pieces their ids and refuses those that are taken. */
function nameElements(document: RunDocument, elements: readonly PathElement[]): PathElement[] {
  const taken = new Set([...document.path, ...(document.conductors ?? [])].map(({ id }) => id));
  return numberElements(document, elements).map((element) => {
    if (taken.has(element.id)) throw new CommandError('id-taken', element.id);
    taken.add(element.id);
    return sparse(element);
  });
}

export function setElement(
  document: RunDocument,
  elementId: string,
  patch: Record<string, unknown>,
): RunDocument {
  const index = indexOfElement(document, elementId);
  const element = document.path[index] as PathElement;
  const isAnother = (key: 'kind' | 'id') => key in patch && patch[key] !== element[key];
  if (isAnother('kind') || isAnother('id')) throw new CommandError('kind-fixed', elementId);
  return withPath(
    document,
    replacedAt(document.path, index, sparse({ ...element, ...patch }) as PathElement),
  );
}

export function replaceElement(
  document: RunDocument,
  elementId: string,
  element: PathElement,
): RunDocument {
  const index = indexOfElement(document, elementId);
  return withPath(
    document,
    replacedAt(document.path, index, sparse({ ...element, id: elementId })),
  );
}

export function removeElements(document: RunDocument, elementIds: readonly string[]): RunDocument {
  if (elementIds.length === 0) throw new CommandError('nothing-given');
  const removed = new Set(elementIds);
  for (const elementId of removed) refuseEnd(document, elementId);
  return withPath(
    document,
    document.path.filter(({ id }) => !removed.has(id)),
  );
}

/** The pull points a run begins and ends at are changed, never removed or moved. */
function refuseEnd(document: RunDocument, elementId: string): number {
  const index = indexOfElement(document, elementId);
  if (index === 0 || index === document.path.length - 1) {
    throw new CommandError('end-pull-point', elementId);
  }
  return index;
}

export function moveElement(document: RunDocument, elementId: string, by: number): RunDocument {
  const index = refuseEnd(document, elementId);
  const to = index + by;
  if (!Number.isInteger(by) || to < 1 || to > document.path.length - 2) {
    throw new CommandError('past-the-end', elementId);
  }
  const path = document.path.filter((_, place) => place !== index);
  path.splice(to, 0, document.path[index] as PathElement);
  return withPath(document, path);
}

/** The first part keeps the straight's id, the rest gets `restId`; the two lengths add up to the old one. */
export function splitStraight(
  document: RunDocument,
  {
    elementId,
    at,
    element,
    restId,
  }: { elementId: string; at: number; element: PathElement; restId: string },
): RunDocument {
  const index = indexOfElement(document, elementId);
  const straight = document.path[index] as PathElement;
  if (straight.kind !== 'straight') throw new CommandError('not-a-straight', elementId);
  if (!(at > 0 && at < straight.length)) throw new CommandError('outside-the-straight', elementId);
  const rest = { kind: 'straight', id: restId, length: straight.length - at } as const;
  return withPath(document, [
    ...document.path.slice(0, index),
    { ...straight, length: at },
    ...nameElements(document, [element, rest]),
    ...document.path.slice(index + 1),
  ]);
}
