import { degrees, radians } from './angles';
import { add, cross, dot, magnitude, scale, subtract, unit } from './vector';
import type { Vector } from './vector';

/** Below this share of the direction lying across the pipe, it is parallel: rounding would choose the side. */
const PARALLEL = 1e-6;

/**
 * The part of `toward` that lies across the pipe, as a unit vector: p = unit(d − (d·h)h). null where d is parallel to h.
 * Example: heading east, toward up gives up; heading east, toward north-east gives north.
 */
export function across(heading: Vector, toward: Vector): Vector | null {
  const sideways = withoutPart(toward, heading);
  if (magnitude(sideways) < PARALLEL) return null;
  // Once more: what is left of a nearly parallel direction still carries rounding along the pipe.
  return unit(withoutPart(unit(sideways), heading));
}

function withoutPart(vector: Vector, along: Vector): Vector {
  return subtract(vector, scale(along, dot(vector, along)));
}

/**
 * The heading after a bend of θ degrees toward the unit vector p across the pipe: h′ = cos θ · h + sin θ · p.
 * Example: east, 90 toward up gives up; east, 45 toward north gives (0.7071, 0.7071, 0).
 */
export function turn(heading: Vector, sideways: Vector, angle: number): Vector {
  const theta = radians(angle);
  return unit(add(scale(heading, Math.cos(theta)), scale(sideways, Math.sin(theta))));
}

/** A vector turned by `angle` degrees about a unit axis, right-handed (Rodrigues' rotation formula). */
export function rotateAbout(vector: Vector, axis: Vector, angle: number): Vector {
  const theta = radians(angle);
  return add(
    add(scale(vector, Math.cos(theta)), scale(cross(axis, vector), Math.sin(theta))),
    scale(axis, dot(axis, vector) * (1 - Math.cos(theta))),
  );
}

/**
 * The angle between two unit vectors in degrees, 2·atan2(|a−b|, |a+b|): exact near 0 and near 180, where the arccosine
 * of the dot product loses half its digits.
 */
export function angleBetween(a: Vector, b: Vector): number {
  return degrees(2 * Math.atan2(magnitude(subtract(a, b)), magnitude(add(a, b))));
}

/**
 * The roll between two bend planes about the leg they share, degrees in (−180, 180]:
 * ρ = atan2(u·(n₁×n₂), n₁·n₂) with n = heading before × heading after of each bend and u the shared heading.
 * 0 bends the same way, 180 back (an offset), ±90 square out of the plane.
 * Example: east → up → north is −90.
 */
export function signedRoll(before: Vector, shared: Vector, after: Vector): number {
  const first = cross(before, shared);
  const second = cross(shared, after);
  const roll = degrees(Math.atan2(dot(shared, cross(first, second)), dot(first, second)));
  return roll <= -180 ? 180 : roll;
}
