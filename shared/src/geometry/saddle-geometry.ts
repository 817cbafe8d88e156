import { radians } from './angles';
import { tangentLength } from './bend-geometry';
import { offsetRun, offsetTravel } from './offset-geometry';

/**
 * Saddles: the pipe leaves its line, crosses an object and comes back. θ is the outer angle; heights are of the centre
 * line above its old line, lengths are corner to corner, in inches.
 */

/**
 * Height of the corner of the centre bend of a 3-bend saddle, h′ = h + R(sec θ − 1): the centre arc cuts the corner, so
 * the corner stands higher than the pipe. Example: h 2, θ 22.5, R 4.353 gives 2.35865.
 */
export function saddle3VertexHeight(height: number, angle: number, radius: number): number {
  return height + radius * (1 / Math.cos(radians(angle)) - 1);
}

/** Run of a 3-bend saddle, first corner to last: 2h′ cot θ. */
export function saddle3Run(height: number, angle: number, radius: number): number {
  return 2 * offsetRun(saddle3VertexHeight(height, angle, radius), angle);
}

/** Slope of a 3-bend saddle, outer corner to centre corner: h′ csc θ. */
export function saddle3Travel(height: number, angle: number, radius: number): number {
  return offsetTravel(saddle3VertexHeight(height, angle, radius), angle);
}

/**
 * The straight left on each slope of a 3-bend saddle, h′ csc θ − R tan(θ/2) − R tan θ; negative where the arcs overlap.
 * Example: h 2, θ 22.5, R 4.353 gives 3.49452.
 */
export function saddle3Straight(height: number, angle: number, radius: number): number {
  const tangents = tangentLength(radius, angle) + tangentLength(radius, 2 * angle);
  return saddle3Travel(height, angle, radius) - tangents;
}

/** Flat top of a 4-bend saddle, inner corner to inner corner, F = W + 2T: the curves end at the object's faces. */
export function saddle4Top(width: number, angle: number, radius: number): number {
  return width + 2 * tangentLength(radius, angle);
}

/** Run of a 4-bend saddle, first corner to last: 2h cot θ + F. Example: h 4, θ 30, W 12, R 0 gives 25.8564. */
export function saddle4Run(height: number, width: number, angle: number, radius: number): number {
  return 2 * offsetRun(height, angle) + saddle4Top(width, angle, radius);
}
