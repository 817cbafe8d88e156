import { useCallback } from 'react';
import type { Piece } from '../model/list-rows';
import { useEdit } from './use-edit';
import type { Refusal } from './use-edit';

/** Changes fields of one piece; a field given as undefined is taken out. */
export function usePatch(pieceId: string): (patch: Partial<Record<FieldName, unknown>>) => Refusal {
  const edit = useEdit();
  return useCallback(
    (patch) => edit([{ command: 'set-element', args: { elementId: pieceId, patch } }]),
    [edit, pieceId],
  );
}

/** Every field a piece of any kind can have. */
type FieldName = Piece extends infer T ? (T extends Piece ? keyof T : never) : never;
