/** A vector in the run's axes: x east, y north, z up. Lengths in inches. */
export interface Vector {
  x: number;
  y: number;
  z: number;
}
