/** A vector in the run's axes: x east, y north, z up. Lengths in inches. */
export interface Vector {
  x: number;
  y: number;
  z: number;
}

export const ORIGIN: Vector = { x: 0, y: 0, z: 0 };

export function add(a: Vector, b: Vector): Vector {
  return { x: a.x + b.x, y: a.y + b.y, z: a.z + b.z };
}

export function subtract(a: Vector, b: Vector): Vector {
  return { x: a.x - b.x, y: a.y - b.y, z: a.z - b.z };
}

export function scale(a: Vector, factor: number): Vector {
  return { x: a.x * factor, y: a.y * factor, z: a.z * factor };
}

export function dot(a: Vector, b: Vector): number {
  return a.x * b.x + a.y * b.y + a.z * b.z;
}

/** Right-handed cross product. */
export function cross(a: Vector, b: Vector): Vector {
  return {
    x: a.y * b.z - a.z * b.y,
    y: a.z * b.x - a.x * b.z,
    z: a.x * b.y - a.y * b.x,
  };
}

export function magnitude(a: Vector): number {
  return Math.hypot(a.x, a.y, a.z);
}

/** The unit vector along `a`; the zero vector for the zero vector. */
export function unit(a: Vector): Vector {
  const length = magnitude(a);
  return length === 0 ? ORIGIN : scale(a, 1 / length);
}
