import {
  applyCommand,
  expandRun,
  numberElements,
  straight,
  vectorDirection,
} from '@fairlead/shared';
import type { Direction, PathElement, RunCommand, RunDocument, Vector } from '@fairlead/shared';
import { isPiece, pieceOf } from './list-rows';
import { NEW_LEG, newPieces } from './new-pieces';
import type { AddKey } from './new-pieces';

export interface Insertion {
  commands: RunCommand[];
  /** The piece that was added. */
  pieceId: string;
}

/** After which element a new piece goes: the selected piece, or the last one before the end of the run. */
export function insertionPoint(document: RunDocument, selectedId: string | null): PathElement {
  const { path } = document;
  const end = path[path.length - 1];
  const selected = pieceOf(document, selectedId);
  if (selected && selected !== end) return selected;
  const before = path.slice(0, -1).filter(isPiece).at(-1) ?? path[0];
  if (!before) throw new Error('A run has a first pull point.');
  return before;
}

/** Directions a new piece could take, the likeliest first: to the right, to the left, up, down; a riser turns level. */
function candidates(heading: Vector | null, start: Direction): Direction[] {
  const level: Direction[] = ['north', 'east', 'south', 'west'];
  if (!heading) return ['up', ...level];
  const isRiser = Math.hypot(heading.x, heading.y) < 1e-6;
  if (isRiser) return [start, ...level];
  const right = vectorDirection({ x: heading.y, y: -heading.x, z: 0 });
  const left = vectorDirection({ x: -heading.y, y: heading.x, z: 0 });
  return [right, left, 'up', 'down'].flatMap((way) => (way ? [way as Direction] : []));
}

/** Whether a piece takes a direction at all. */
function isDirected(element: PathElement): boolean {
  if (element.kind === 'pull-point') return element.body !== undefined;
  return ['bend', 'offset', 'saddle-3', 'saddle-4'].includes(element.kind);
}

function directed(element: PathElement, toward: Direction): PathElement {
  if (element.kind === 'pull-point') return { ...element, turn: { angle: 90, toward } };
  return { ...element, toward } as PathElement;
}

/** A run in which no direction was given stays so: it is counted as level, and one direction alone answers nothing. */
function isUndirected(document: RunDocument): boolean {
  return expandRun(document).directions === 'assumed-level';
}

/** A corner needs pipe on both sides: where none leads on to the next pull point, a leg comes along behind it too. */
function legBehind(
  document: RunDocument,
  after: PathElement,
  made: readonly PathElement[],
): PathElement[] {
  const next = document.path[document.path.indexOf(after) + 1];
  const hasLeg = made.some(({ kind }) => kind === 'straight');
  const isCorner = ['bend', 'offset', 'saddle-3', 'saddle-4', 'pull-point'].includes(
    made.at(-1)?.kind ?? '',
  );
  return hasLeg && isCorner && next?.kind === 'pull-point' ? [straight({ length: NEW_LEG })] : [];
}

/**
 * The commands behind an add key: a leg and a piece after the selected one. The piece goes the first way that leaves no
 * piece after it parallel to the pipe; a person then sets the way it really goes.
 */
export function insertAfter(
  document: RunDocument,
  selectedId: string | null,
  key: AddKey,
): Insertion {
  const after = insertionPoint(document, selectedId);
  const made = newPieces(key, document, after);
  const elements = numberElements(document, [...made, ...legBehind(document, after, made)]);
  const piece = elements[made.length - 1]!;
  const commandsFor = (turned: PathElement): RunCommand[] => [
    {
      command: 'insert-elements',
      args: {
        afterId: after.id,
        elements: elements.map((element) => (element === piece ? turned : element)),
      },
    },
  ];
  if (!isDirected(piece) || isUndirected(document)) {
    return { commands: commandsFor(piece), pieceId: piece.id };
  }

  const expanded = expandRun(document);
  const heading = expanded.elements.find(({ element }) => element.id === after.id)?.heading ?? null;
  const ways = candidates(heading, document.start?.heading ?? 'east');
  const tried = ways.map((way) => {
    const commands = commandsFor(directed(piece, way));
    const result = commands.reduce(applyCommand, document);
    return { commands, problems: expandRun(result).directionProblems.length };
  });
  const best = tried.reduce((least, next) => (next.problems < least.problems ? next : least));
  return { commands: best.commands, pieceId: piece.id };
}
