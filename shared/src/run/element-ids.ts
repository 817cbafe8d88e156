import type { ConductorGroup, PathElement, RunDocument } from './run-document';

type Ids = Pick<RunDocument, 'path' | 'conductors'>;

function takenIds(document: Ids): Set<string> {
  return new Set([...document.path, ...(document.conductors ?? [])].map((part) => part.id));
}

function nextFree(prefix: string, taken: ReadonlySet<string>): string {
  let highest = 0;
  for (const id of taken) {
    const digits = id.startsWith(prefix) ? id.slice(prefix.length) : '';
    if (/^\d{1,6}$/.test(digits)) highest = Math.max(highest, Number(digits));
  }
  return `${prefix}${highest + 1}`;
}

/**
 * The next free element id in a document: `e12` after `e1 … e11`. It depends on the document alone, so the same edit of
 * the same document names its piece alike on every device.
 */
export function elementIdAfter(document: Ids): string {
  return nextFree('e', takenIds(document));
}

/** The next free conductor-group id: `w3` after `w1` and `w2`. */
export function groupIdAfter(document: Ids): string {
  return nextFree('w', takenIds(document));
}

/** Gives each part without an id (`''`) the next free one; parts that have one keep it. */
function numbered<T extends { id: string }>(
  prefix: string,
  parts: readonly T[],
  taken: Set<string>,
): T[] {
  return parts.map((part) => {
    if (part.id !== '') return part;
    const id = nextFree(prefix, taken);
    taken.add(id);
    return { ...part, id };
  });
}

/** Names the elements that have no id yet, free in the document they will go into. */
export function numberElements(document: Ids, elements: readonly PathElement[]): PathElement[] {
  const taken = takenIds(document);
  for (const element of elements) taken.add(element.id);
  return numbered('e', elements, taken);
}

/** Names the conductor groups that have no id yet, free in the document they will go into. */
export function numberGroups(document: Ids, groups: readonly ConductorGroup[]): ConductorGroup[] {
  const taken = takenIds(document);
  for (const group of groups) taken.add(group.id);
  return numbered('w', groups, taken);
}
