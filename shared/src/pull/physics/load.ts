/** What lies in the pipe: weight of the whole set, lb/ft, and the effective friction f = w·μ of its configuration. */
export interface Load {
  weight: number;
  friction: number;
}

/** A straight piece as the cable meets it. */
export interface StraightWay {
  /** ft. */
  length: number;
  /** Sine of the slope, upward in the direction of the pull. */
  rise: number;
  /** Its cosine, given apart: near the vertical it is lost in the sine. */
  run: number;
}

/** A bend as the cable meets it. */
export interface BendWay {
  /** rad. */
  angle: number;
  /** Centre line, ft; 0 for a corner without an arc. */
  radius: number;
  /** Upward part of the unit heading at its beginning. */
  headingUp: number;
  /** Upward part of the unit normal at its beginning, toward the centre. */
  normalUp: number;
}
