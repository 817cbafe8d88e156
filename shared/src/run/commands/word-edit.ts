import type { ElementKind } from '../run-document';
import type { EditLabel, EditValues } from './edit-label';

/** What wording an edit needs of the words; `say` of `createWords` fits. */
type SayEdit = (
  key:
    | EditLabel['key']
    | `edits.piece.${ElementKind}`
    | 'edits.numbered'
    | 'edits.legBefore'
    | 'edits.somewhere',
  values?: Record<string, string | number>,
) => string;

/** An edit in words, to stand behind Undo or Redo. Example: "offset 9 angle", "leg before JB-3 length". */
export function wordEdit({ key, values }: EditLabel, say: SayEdit): string {
  const { count, size } = values;
  return say(key, {
    what: wordPiece(values, say),
    ...(count !== undefined && { number: count }),
    ...(size !== undefined && { size }),
  });
}

function wordPiece({ piece, number, name, leg }: EditValues, say: SayEdit): string {
  if (!piece) return say('edits.somewhere');
  const word = say(`edits.piece.${piece}`);
  const called = name ?? (number === undefined ? word : say('edits.numbered', { word, number }));
  return leg ? say('edits.legBefore', { what: called }) : called;
}
