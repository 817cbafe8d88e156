import type { Direction } from '../run/run-document';
import { degrees, radians } from './angles';
import { magnitude, unit } from './vector';
import type { Vector } from './vector';

const NAMED: Record<Extract<Direction, string>, Vector> = {
  up: { x: 0, y: 0, z: 1 },
  down: { x: 0, y: 0, z: -1 },
  north: { x: 0, y: 1, z: 0 },
  south: { x: 0, y: -1, z: 0 },
  east: { x: 1, y: 0, z: 0 },
  west: { x: -1, y: 0, z: 0 },
};

/**
 * A direction as a unit vector: x east, y north, z up.
 *
 * x = cos e · sin a, y = cos e · cos a, z = sin e, with azimuth a from north clockwise and elevation e above level.
 * Example: azimuth 90, elevation 0 is east (1, 0, 0); azimuth 0, elevation 30 is (0, 0.866, 0.5).
 */
export function directionVector(direction: Direction): Vector {
  if (typeof direction === 'string') return NAMED[direction];
  const azimuth = radians(direction.azimuth);
  const elevation = radians(direction.elevation);
  return unit({
    x: Math.cos(elevation) * Math.sin(azimuth),
    y: Math.cos(elevation) * Math.cos(azimuth),
    z: Math.sin(elevation),
  });
}

/** A compass name within this of a vector counts as that name; far below anything a tape could show. */
const SAME = 1e-9;

/**
 * The direction of a vector: a compass name where it is one, else azimuth (0–360) and elevation, degrees.
 * Example: (0, 0, 2) is `up`; (1, 1, 0) is azimuth 45, elevation 0. The zero vector has no direction: null.
 */
export function vectorDirection(vector: Vector): Direction | null {
  if (magnitude(vector) === 0) return null;
  const { x, y, z } = unit(vector);
  for (const [name, named] of Object.entries(NAMED)) {
    if (Math.hypot(x - named.x, y - named.y, z - named.z) < SAME) {
      return name as Extract<Direction, string>;
    }
  }
  const azimuth = (degrees(Math.atan2(x, y)) + 360) % 360;
  return { azimuth, elevation: degrees(Math.atan2(z, Math.hypot(x, y))) };
}
