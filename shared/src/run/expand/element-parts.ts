import { offsetTravel } from '../../geometry/offset-geometry';
import { saddle3Travel, saddle4Top } from '../../geometry/saddle-geometry';
import type { PathElement } from '../run-document';

/** One bend of an element, and the length corner to corner from the bend before it in the same element. */
export interface BendPart {
  angle: number;
  /** in; 0 for the first. */
  lengthBefore: number;
  /** +1 turns the way the element is directed, −1 back. */
  sense: 1 | -1;
}

/**
 * The bends an element is made of, in order: one for a bend, two for an offset, three for a 3-bend saddle with the
 * centre twice the outer angle, four for a 4-bend saddle. Everything else has none.
 */
export function bendParts(element: PathElement, radius: number): BendPart[] {
  switch (element.kind) {
    case 'bend':
      return [{ angle: element.angle, lengthBefore: 0, sense: 1 }];
    case 'offset': {
      const { angle, rise } = element;
      return [
        { angle, lengthBefore: 0, sense: 1 },
        { angle, lengthBefore: offsetTravel(rise, angle), sense: -1 },
      ];
    }
    case 'saddle-3': {
      const { angle, height } = element;
      const slope = saddle3Travel(height, angle, radius);
      return [
        { angle, lengthBefore: 0, sense: 1 },
        { angle: 2 * angle, lengthBefore: slope, sense: -1 },
        { angle, lengthBefore: slope, sense: 1 },
      ];
    }
    case 'saddle-4': {
      const { angle, height, width } = element;
      const slope = offsetTravel(height, angle);
      return [
        { angle, lengthBefore: 0, sense: 1 },
        { angle, lengthBefore: slope, sense: -1 },
        { angle, lengthBefore: saddle4Top(width, angle, radius), sense: -1 },
        { angle, lengthBefore: slope, sense: 1 },
      ];
    }
    default:
      return [];
  }
}

/** True for a piece whose bends are made in the pipe, as against a turn in a box, a fitting or planned flex. */
export function isBentPipe(element: PathElement): boolean {
  return bendParts(element, 0).length > 0;
}
