import { radians } from './angles';
import { bendGain } from './bend-geometry';

/**
 * An offset: two equal bends of θ degrees that shift the pipe by h inches and leave it parallel.
 * Corners are where the straight legs would meet.
 */

/** Run h cot θ, in: how far along the pipe the second corner lies. Example: 6 in at 30° gives 10.3923. */
export function offsetRun(rise: number, angle: number): number {
  return rise / Math.tan(radians(angle));
}

/** Travel h csc θ, in: corner to corner along the slope. Example: 6 in at 30° gives 12. */
export function offsetTravel(rise: number, angle: number): number {
  return rise / Math.sin(radians(angle));
}

/**
 * Shrink h tan(θ/2) − 2g(θ), in: how much more pipe than run it takes.
 * Example: 6 in at 30°, R 4.353 gives 1.50061.
 */
export function offsetShrink(rise: number, angle: number, radius: number): number {
  return rise * Math.tan(radians(angle) / 2) - 2 * bendGain(radius, angle);
}

/**
 * The lowest offset whose two arcs do not overlap, with s inches of straight between them, in: 2R(1 − cos θ) + s sin θ.
 * Example: R 4.353, 30°, s 2 gives 2.16638.
 */
export function lowestOffset(radius: number, angle: number, straightBetween = 0): number {
  const theta = radians(angle);
  return 2 * radius * (1 - Math.cos(theta)) + straightBetween * Math.sin(theta);
}
