import type { Direction } from '@fairlead/shared';
import type { Piece } from './list-rows';

/** Which way a piece goes; undefined for one that has no way of its own or was not given one. */
export function towardOf(piece: Piece): Direction | undefined {
  switch (piece.kind) {
    case 'bend':
    case 'offset':
    case 'saddle-3':
    case 'saddle-4':
      return piece.toward;
    case 'pull-point':
      return piece.turn?.toward;
    default:
      return undefined;
  }
}
