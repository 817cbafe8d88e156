import type { RunDocument } from '../run-document';

/**
 * The number of a piece as the list shows it: its place among the pieces that are neither a straight (those are legs)
 * nor one of the two ends of the run, from 1. null for a straight, an end, and an id that is not there.
 * Example: box, 10 ft, 90, 10 ft, offset, box numbers the 90 as 1 and the offset as 2.
 */
export function elementNumber(
  document: Pick<RunDocument, 'path'>,
  elementId: string,
): number | null {
  const last = document.path.length - 1;
  let number = 0;
  for (const [index, element] of document.path.entries()) {
    const counted = element.kind !== 'straight' && index !== 0 && index !== last;
    if (counted) number += 1;
    if (element.id === elementId) return counted ? number : null;
  }
  return null;
}
