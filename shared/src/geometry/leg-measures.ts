import { radians } from './angles';
import { bendGain } from './bend-geometry';

/**
 * Three ways to measure one leg. The document keeps the first; the others are what a tape on a finished bend, or a mark
 * on straight pipe, shows.
 *
 * - `corner`: along the centre line to where the straight legs would meet.
 * - `back`: along the leg to where the outside faces would meet. For a bend of θ on pipe of outside diameter OD the
 *   outside corner lies (R + OD/2) tan(θ/2) past the tangent point and the centre-line corner R tan(θ/2), so it adds
 *   (OD/2) tan(θ/2): half the diameter at a 90.
 * - `centre`: along the pipe itself to the middle of the arc. The corner lies T past the tangent point, the middle of
 *   the arc A/2, so it takes away T − A/2 = g/2, half the gain.
 *
 * Source: plane geometry of an arc between two tangents. A leg between two bends is measured back to back or centre to
 * centre: both ends count. At a box face nothing is added or taken.
 */
export type LegMeasure = 'corner' | 'back' | 'centre';
export const LEG_MEASURES = ['corner', 'back', 'centre'] as const satisfies readonly LegMeasure[];

export interface LegEnd {
  /** Degrees. */
  angle: number;
  /** Centre-line radius, in; null where nothing gives one. */
  radius: number | null;
}

export interface LegEnds {
  /** The bend a leg starts and ends at; null: the face of a box, a fitting, a flexible piece. */
  before: LegEnd | null;
  after: LegEnd | null;
  /** Of the conduit, in; null where no list gives one. */
  outsideDiameter: number | null;
}

/**
 * What has to be added to the length to the corner, in; null where a radius or diameter it needs is unknown.
 * Example: 3/4 EMT (OD 0.922) from a box to a 90 of R 5.46: back +0.461, centre −1.17173.
 */
export function legMeasureDifference(measure: LegMeasure, ends: LegEnds): number | null {
  if (measure === 'corner') return 0;
  let difference = 0;
  for (const end of [ends.before, ends.after]) {
    const part = end === null ? 0 : endDifference(measure, end, ends.outsideDiameter);
    if (part === null) return null;
    difference += part;
  }
  return difference;
}

function endDifference(
  measure: 'back' | 'centre',
  { angle, radius }: LegEnd,
  outsideDiameter: number | null,
): number | null {
  if (measure === 'centre') return radius === null ? null : -bendGain(radius, angle) / 2;
  if (outsideDiameter === null) return null;
  return (outsideDiameter / 2) * Math.tan(radians(angle) / 2);
}

/** A length to the corner as another measure shows it, in. Example: 120 to the corner is 120.461 to the back above. */
export function fromCorner(corner: number, measure: LegMeasure, ends: LegEnds): number | null {
  const difference = legMeasureDifference(measure, ends);
  return difference === null ? null : corner + difference;
}

/** A measured length as the document keeps it, to the corner, in. Example: 120.461 to the back above is 120. */
export function toCorner(measured: number, measure: LegMeasure, ends: LegEnds): number | null {
  const difference = legMeasureDifference(measure, ends);
  return difference === null ? null : measured - difference;
}
