import { elementNumber, formatAngle, formatLength } from '@fairlead/shared';
import type { PathElement, Raceway, RunDocument } from '@fairlead/shared';
import { pieceOf } from './list-rows';
import type { Say } from '../../../../hooks/use-words';

/** A box offset is a small jog at the face of a box, in (common practice, no source). */
const BOX_OFFSET_RISE = 1;

export function wordRaceway({ type, tradeSize }: Raceway, say: Say): string {
  return say('workbench.raceway.named', {
    size: tradeSize,
    type: say(`workbench.raceway.type.${type}`),
  });
}

/** What a piece is, as the trade calls it: "90", "Kick 45", "Offset 10″", "Pull box". */
export function wordPiece(element: PathElement, say: Say): string {
  switch (element.kind) {
    case 'pull-point':
      return element.body ?? say(`workbench.device.${element.device}`);
    case 'straight':
      return say('workbench.piece.straight', { length: formatLength(element.length) });
    case 'bend': {
      const angle = formatAngle(element.angle).replace('°', '');
      return say(`workbench.piece.${element.angle < 90 ? 'kick' : 'bend'}`, { angle });
    }
    case 'offset':
      if (element.rise <= BOX_OFFSET_RISE) return say('workbench.piece.boxOffset');
      return say('workbench.piece.offset', { rise: formatLength(element.rise) });
    case 'saddle-3':
    case 'saddle-4':
      return say(`workbench.piece.${element.kind}`, { height: formatLength(element.height) });
    case 'flex':
      return say('workbench.piece.flex', { length: formatLength(element.length) });
    case 'fitting':
      return say(`workbench.piece.fitting.${element.fitting}`);
    case 'transition':
      return say('workbench.piece.transition', { raceway: wordRaceway(element.raceway, say) });
  }
}

/** The degrees a piece bends, part by part: "90°", "2×45°", "22½°, 45°, 22½°"; null for one that does not bend. */
export function wordAngles(angles: readonly number[], say: Say): string | null {
  const [first, second] = angles;
  if (first === undefined) return null;
  const angle = formatAngle(first);
  if (angles.length === 3 && second !== undefined) {
    return say('workbench.piece.three', { angle, centre: formatAngle(second) });
  }
  if (angles.length === 2) return say('workbench.piece.twice', { angle });
  if (angles.length === 4) return say('workbench.piece.four', { angle });
  return angle;
}

/** What a place is called: a pull point by its label, any other piece by its number and name. */
export function labelOf(document: Pick<RunDocument, 'path'>, elementId: string, say: Say): string {
  const element = document.path.find(({ id }) => id === elementId);
  if (!element) return '';
  if (element.kind === 'straight') {
    const next = pieceOf(document, elementId);
    return next ? say('workbench.piece.legBefore', { piece: labelOf(document, next.id, say) }) : '';
  }
  if (element.kind === 'pull-point' && element.label) return element.label;
  const number = elementNumber(document, elementId);
  const piece = wordPiece(element, say);
  return number === null ? piece : say('workbench.piece.numbered', { number, piece });
}
