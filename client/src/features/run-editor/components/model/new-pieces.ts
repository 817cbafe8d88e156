import {
  bend,
  fitting,
  flex,
  offset,
  pullPoint,
  saddle3,
  saddle4,
  straight,
  transition,
} from '@fairlead/shared';
import type { PathElement, RunDocument } from '@fairlead/shared';
import type { Piece } from './list-rows';

/** The keys that add a piece, in the order they stand. */
export const ADD_KEYS = [
  'bend-90',
  'kick-45',
  'kick-30',
  'kick-22',
  'offset-22',
  'offset-30',
  'offset-45',
  'box-offset',
  'saddle-3',
  'saddle-4',
  'box',
  'lb',
  'flex',
  'union',
  'transition',
] as const;
export type AddKey = (typeof ADD_KEYS)[number];

/** The groups the keys stand in. */
export const ADD_GROUPS = [
  { group: 'bend', keys: ['bend-90'] },
  { group: 'kick', keys: ['kick-45', 'kick-30', 'kick-22'] },
  { group: 'offset', keys: ['offset-22', 'offset-30', 'offset-45', 'box-offset'] },
  { group: 'saddle', keys: ['saddle-3', 'saddle-4'] },
  { group: 'pullPoint', keys: ['box', 'lb'] },
  { group: 'other', keys: ['flex', 'union', 'transition'] },
] as const satisfies readonly { group: string; keys: readonly AddKey[] }[];

/** The leg a new piece brings along, in; shown as given and meant to be changed. Our choice, no source. */
export const NEW_LEG = 120;
/** A box offset follows a box closely, in (common practice, no source). */
const LEG_OUT_OF_A_BOX = 3;
/** Face of a knockout to a wall, in (common practice, no source). */
const BOX_OFFSET_RISE = 0.5;

function pieceFor(key: AddKey, document: RunDocument): Piece {
  const { raceway } = document;
  switch (key) {
    case 'bend-90':
      return bend({ angle: 90 });
    case 'kick-45':
      return bend({ angle: 45 });
    case 'kick-30':
      return bend({ angle: 30 });
    case 'kick-22':
      return bend({ angle: 22.5 });
    case 'offset-22':
      return offset({ angle: 22.5 });
    case 'offset-30':
      return offset({ angle: 30 });
    case 'offset-45':
      return offset({ angle: 45 });
    case 'box-offset':
      return offset({ rise: BOX_OFFSET_RISE, angle: 10 });
    case 'saddle-3':
      return saddle3();
    case 'saddle-4':
      return saddle4();
    case 'box':
      return pullPoint({ device: 'box', label: nextBoxLabel(document) });
    case 'lb':
      return pullPoint({ device: 'conduit-body', body: 'LB' });
    case 'flex':
      return flex({ raceway: { type: 'FMC', tradeSize: raceway.tradeSize } });
    case 'union':
      return fitting();
    case 'transition':
      return transition({ raceway: { type: raceway.type, tradeSize: raceway.tradeSize } });
  }
}

/** "JB-4" after "JB-1 … JB-3". */
export function nextBoxLabel(document: Pick<RunDocument, 'path'>): string {
  const numbers = document.path.flatMap((element) => {
    const digits =
      element.kind === 'pull-point' ? /^JB-(\d{1,4})$/.exec(element.label ?? '') : null;
    return digits ? [Number(digits[1])] : [];
  });
  return `JB-${Math.max(0, ...numbers) + 1}`;
}

/** A run whose bends were entered without any length stays without: one leg would make the others 0. */
function hasNoLengths(path: readonly PathElement[]): boolean {
  const isBent = path.some(({ kind }) => kind !== 'pull-point');
  return isBent && !path.some(({ kind }) => kind === 'straight' || kind === 'flex');
}

/** A key's piece and the leg before it, without ids and direction. */
export function newPieces(
  key: AddKey,
  document: RunDocument,
  after: PathElement | undefined,
): PathElement[] {
  const piece = pieceFor(key, document);
  if (hasNoLengths(document.path)) return [piece];
  const length = key === 'box-offset' && after?.kind === 'pull-point' ? LEG_OUT_OF_A_BOX : NEW_LEG;
  return [straight({ length }), piece];
}
