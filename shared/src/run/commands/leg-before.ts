import { elementIdAfter } from '../element-ids';
import type { PathElement, RunDocument, Straight } from '../run-document';
import type { RunCommand } from '../run-command';
import { CommandError } from './command-error';
import { indexOfElement } from './path-edits';

export interface LegBefore {
  /** The straights of the leg that lie before the piece, in order. */
  straights: Straight[];
  /** Their sum, in, to the corner; null where there are none. */
  length: number | null;
}

/** A union, a seal or a change of raceway stands in a leg without ending it. */
function isInline(element: PathElement): boolean {
  return element.kind === 'transition' || (element.kind === 'fitting' && !element.angle);
}

/**
 * The leg before a piece: every straight back to the previous corner, or to the box face. Pieces that only stand in the
 * pipe are passed over. Example: before the 90 of box, 4 ft, union, 6 ft, 90: two straights, 120 in.
 */
export function legBefore(document: Pick<RunDocument, 'path'>, elementId: string): LegBefore {
  const straights: Straight[] = [];
  for (let index = indexOfElement(document, elementId) - 1; index >= 0; index -= 1) {
    const element = document.path[index] as PathElement;
    if (element.kind === 'straight') straights.unshift(element);
    else if (!isInline(element)) break;
  }
  const length = straights.reduce((sum, straight) => sum + straight.length, 0);
  return { straights, length: straights.length > 0 ? length : null };
}

/**
 * The commands that make the leg before a piece `inches` long, to the corner; null takes it out.
 *
 * The straight next to the piece takes the whole difference, so pieces standing in the leg stay where they are. Where it
 * would vanish, the straights between the piece and the last piece standing in the leg become one; a leg that would end
 * before such a piece is refused.
 */
export function setLegBefore(
  document: RunDocument,
  elementId: string,
  inches: number | null,
): RunCommand[] {
  const index = indexOfElement(document, elementId);
  const { straights, length } = legBefore(document, elementId);
  const beside = straightsBeside(document.path, index);
  const nearest = beside[beside.length - 1];
  if (inches === null) {
    return nearest ? [remove(beside.map(({ id }) => id))] : [];
  }
  const fixed = straights
    .filter((straight) => !beside.includes(straight))
    .reduce((sum, straight) => sum + straight.length, 0);
  if (inches <= fixed && fixed > 0) throw new CommandError('outside-the-straight', elementId);
  if (!nearest) return insertLeg(document, index, elementId, inches - fixed);
  if (inches === length) return [];
  const adjusted = nearest.length + inches - (length ?? 0);
  if (adjusted > 0) return [setLength(nearest.id, adjusted)];
  const others = beside.slice(0, -1).map(({ id }) => id);
  return [setLength(nearest.id, inches - fixed), remove(others)];
}

/** The straights with nothing between them and the piece. */
function straightsBeside(path: readonly PathElement[], index: number): Straight[] {
  const beside: Straight[] = [];
  for (let place = index - 1; path[place]?.kind === 'straight'; place -= 1) {
    beside.unshift(path[place] as Straight);
  }
  return beside;
}

function insertLeg(
  document: RunDocument,
  index: number,
  elementId: string,
  length: number,
): RunCommand[] {
  const previous = document.path[index - 1];
  if (!previous) throw new CommandError('past-the-end', elementId);
  const straight: Straight = { kind: 'straight', id: elementIdAfter(document), length };
  return [{ command: 'insert-elements', args: { afterId: previous.id, elements: [straight] } }];
}

function remove(elementIds: string[]): RunCommand {
  return { command: 'remove-elements', args: { elementIds } };
}

function setLength(elementId: string, length: number): RunCommand {
  return { command: 'set-element', args: { elementId, patch: { length } } };
}
