import { radians } from './angles';

/**
 * One bend of θ degrees at centre-line radius R: plane geometry of a circular arc between two tangents.
 */

/**
 * Tangent length T = R tan(θ/2), in: from the corner, where the straight legs would meet, to where the arc begins.
 * Example: R 4.353, 90° gives 4.353.
 */
export function tangentLength(radius: number, angle: number): number {
  return radius * Math.tan(radians(angle) / 2);
}

/** Arc length A = Rθ, in. Example: R 4.353, 90° gives 6.83768. */
export function arcLength(radius: number, angle: number): number {
  return radius * radians(angle);
}

/** Under this, the difference 2 tan(θ/2) − θ cancels and its series is used. */
const SERIES_BELOW = 3;

/**
 * Gain g = 2T − A = R(2 tan(θ/2) − θ), in: how much less pipe the arc takes than the square corner.
 * Below 3° by its series θ³/12 + θ⁵/120 + 17θ⁷/20160. Example: R 16, 60° gives 1.72005.
 */
export function bendGain(radius: number, angle: number): number {
  const theta = radians(angle);
  if (angle < SERIES_BELOW) {
    return radius * (theta ** 3 / 12 + theta ** 5 / 120 + (17 * theta ** 7) / 20160);
  }
  return radius * (2 * Math.tan(theta / 2) - theta);
}
