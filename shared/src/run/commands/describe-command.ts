import type { RunCommand } from '../run-command';
import type { ConductorGroup, PathElement, RunDocument } from '../run-document';
import type { EDIT_KEYS, EditLabel, EditValues } from './edit-label';
import { elementNumber } from './element-number';

type EditKey = (typeof EDIT_KEYS)[number];

/**
 * Names an edit for Undo, read in the document as it was before it. Example: a new angle for the ninth piece, an offset,
 * gives `edits.did.angle` with piece offset, number 9: "offset 9 angle".
 */
export function describeCommand(document: RunDocument, command: RunCommand): EditLabel {
  switch (command.command) {
    case 'set-identity':
      return label(command.args.tag === undefined ? 'title' : 'tag');
    case 'set-raceway':
      return label('raceway');
    case 'set-rules':
      return label('rules');
    case 'set-start':
      return label('heading');
    case 'set-sets':
      return label('sets');
    case 'set-environment':
      return label('environment');
    case 'set-circuit':
      return label('circuit');
    case 'set-conditions':
      return label('conditions');
    case 'set-pulls':
      return label('pulls');
    case 'insert-elements':
      return describeInsert(document, command.args.afterId, command.args.elements);
    case 'set-element':
      return describeChange(document, command.args.elementId, command.args.patch);
    case 'replace-element':
      return label('replace', pieceOf(document, command.args.elementId));
    case 'remove-elements':
      return describeRemoval(document, command.args.elementIds);
    case 'move-element':
      return label('move', pieceOf(document, command.args.elementId));
    case 'split-straight':
      return label('split', newPiece(command.args.element));
    case 'add-conductors':
      return label('addWires', wiresOf(command.args.group));
    case 'set-conductors':
      return label('changeWires', wiresOf(command.args.group));
    case 'remove-conductors': {
      const group = document.conductors?.find(({ id }) => id === command.args.groupId);
      return label('removeWires', group && wiresOf(group));
    }
  }
}

/** Names a step of several edits after the first of them. */
export function describeCommands(
  document: RunDocument,
  commands: readonly RunCommand[],
): EditLabel {
  const first = commands[0];
  return first ? describeCommand(document, first) : label('change');
}

function label(key: EditKey, values: EditValues = {}): EditLabel {
  return { key: `edits.did.${key}`, values };
}

/** How a piece is called: by its own label, by its number, or, for a leg, after the piece it leads to. */
export function pieceOf(document: RunDocument, elementId: string): EditValues {
  const index = document.path.findIndex(({ id }) => id === elementId);
  const element = document.path[index];
  if (!element) return {};
  if (element.kind === 'straight') {
    const next = document.path.slice(index).find(({ kind }) => kind !== 'straight');
    return next ? { ...pieceOf(document, next.id), leg: true } : { piece: 'straight' };
  }
  const number = elementNumber(document, elementId);
  return { ...newPiece(element), ...(number !== null && { number }) };
}

function newPiece(element: PathElement): EditValues {
  const name = element.kind === 'pull-point' ? element.label : undefined;
  return { piece: element.kind, ...(name && { name }) };
}

function wiresOf(group: ConductorGroup): EditValues {
  const size = 'cable' in group ? group.cable.name : group.size;
  return { count: group.count, size };
}

function describeInsert(
  document: RunDocument,
  afterId: string | null,
  elements: readonly PathElement[],
): EditLabel {
  const pieces = elements.filter(({ kind }) => kind !== 'straight');
  const piece = pieces[0];
  if (pieces.length > 1) return label('addSeveral', { count: pieces.length });
  if (piece) return label('add', newPiece(piece));
  const place = document.path.findIndex(({ id }) => id === afterId);
  const next = document.path.slice(place + 1).find(({ kind }) => kind !== 'straight');
  return label('add', next ? { ...pieceOf(document, next.id), leg: true } : { piece: 'straight' });
}

function describeRemoval(document: RunDocument, elementIds: readonly string[]): EditLabel {
  const first = elementIds[0];
  if (elementIds.length === 1 && first !== undefined)
    return label('remove', pieceOf(document, first));
  return label('removeSeveral', { count: elementIds.length });
}

/** The fields a patch may set, and the word for each; what several fields share stands under `change`. */
const FIELD_KEYS: Record<string, EditKey> = {
  angle: 'angle',
  toward: 'direction',
  rise: 'rise',
  height: 'height',
  width: 'width',
  length: 'length',
  radius: 'radius',
  label: 'label',
  device: 'device',
  body: 'device',
  counts: 'counting',
  made: 'made',
  degrees: 'flexDegrees',
  raceway: 'pieceRaceway',
  turn: 'turn',
};

function describeChange(
  document: RunDocument,
  elementId: string,
  patch: Record<string, unknown>,
): EditLabel {
  const piece = pieceOf(document, elementId);
  const [field, ...others] = Object.keys(patch);
  if (field === 'accessible' && others.length === 0) {
    return label(patch.accessible === false ? 'notAccessible' : 'accessible', piece);
  }
  const key = field !== undefined && others.length === 0 ? FIELD_KEYS[field] : undefined;
  return label(key ?? 'change', piece);
}
