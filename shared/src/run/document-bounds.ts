/**
 * What a number in a run document may be. Wide enough for any real run, narrow enough that no sum overflows or
 * loses its last inch. Inclusive unless the name says otherwise.
 */
export const BOUNDS = {
  /** Longest length of one piece, in: a little under sixteen miles. */
  length: 1_000_000,
  /** Longest rise, height, width, radius or box side, in. */
  dimension: 10_000,
  bendAngle: 150,
  /** Offsets and 4-bend saddles stay under this. */
  offsetAngleBelow: 90,
  /** The centre bend of a 3-bend saddle is twice the outer one. */
  saddle3Angle: 60,
  turnAngle: 180,
  fittingAngle: 180,
  /** Planned degrees of a flexible tail. */
  flexDegrees: 720,
  /** Conductors in one group. */
  count: 1_000,
  /** Identical raceways side by side. */
  sets: 100,
  friction: 1.2,
  /** lbf. */
  force: 1_000_000,
  /** lb/ft. */
  weight: 1_000,
  /** Degrees between pull points a job may set. */
  maxDegrees: 3_600,
  percent: 100,
  /** °F. */
  temperatureLow: -100,
  temperatureHigh: 300,
  /** A. */
  current: 10_000,
  people: 50,
  cableName: 80,
  why: 160,
} as const;
