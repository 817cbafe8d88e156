import type { Configuration } from '../contracts/run-analysis';

/** How many of one outside diameter, in. */
export interface SetOfDiameter {
  diameter: number;
  count: number;
}

export interface Bundle {
  configuration: Configuration;
  /** w: what the wall bears, as a multiple of the weight. */
  weightCorrection: number;
  /** The part of tension over radius that presses on the worst conductor. */
  sidewallShare: number;
  /** False where so many of this diameter do not go into the bore at all. */
  fits: boolean;
}

/** Largest ratio within which diameters count as equal: 10 %. */
const EQUAL = 1.1;
/** Conductors up to this share of the three equal ones ride along without changing how those lie; judgement, no source. */
const RIDES_ALONG = 0.6;
/** Below this D/d three equal ones lie in a triangle, from it on in a cradle; from memory. */
const CRADLED_FROM = 2.5;
/** Least D/d by geometry: two 2, three 1 + 2/√3, four 1 + √2. */
const LEAST_RATIO = { two: 2, three: 1 + 2 / Math.sqrt(3), four: 1 + Math.SQRT2 };
/** Weight correction of sets that cannot be derived: a convention. */
const COMPLEX = 1.4;
/** Two wedged between the walls press without bound as D/d nears 2; past this nobody pulls. */
const MOST_CORRECTION = 10;

/**
 * Configuration and weight correction of a set in a bore, both in inches, with r = d/(D − d) of the largest:
 * one 1 · two 1/√(1 − r²) · three in a triangle 1/√(1 − r²), in a cradle 1 + 4r²/3 · four max(1.4, 1 + 2r²) · else 1.4.
 *
 * Source: Saudi Electricity TES-P-104.05 (2007) for the triangle; a cable maker's published data for single, cradle and
 * complex; two and four by frictionless statics of cylinders in a cylinder.
 *
 * @example bundleOf([{ diameter: 0.949, count: 3 }, { diameter: 0.352, count: 1 }], 3.356) // cradled, 1.2073
 */
export function bundleOf(set: readonly SetOfDiameter[], bore: number): Bundle {
  const sizes = set.filter(({ count }) => count > 0).sort((a, b) => b.diameter - a.diameter);
  const d = sizes[0]?.diameter ?? 0;
  const ratio = bore / d;
  const r = d / (bore - d);
  const equal = sizes.filter(({ diameter }) => diameter * EQUAL >= d);
  const others = sizes.filter(({ diameter }) => diameter * EQUAL < d);
  const equals = countOf(equal);
  const count = equals + countOf(others);
  const ride = others.every(({ diameter }) => diameter <= RIDES_ALONG * d);

  if (count === 1) return bundle('single', 1, 1, ratio > 1);
  if (count === 2) {
    const both = sizes.reduce((sum, each) => sum + each.count * each.diameter, 0);
    // Two unlike ones may fit where the formula, made for two of the larger, has no answer.
    if (equals === 1 && ratio <= LEAST_RATIO.two) return complex(both < bore);
    const w = Math.min(MOST_CORRECTION, 1 / Math.sqrt(1 - r * r));
    return bundle('two', w, w / 2, ratio > LEAST_RATIO.two);
  }
  if (equals === 3 && ride) {
    const fits = ratio >= LEAST_RATIO.three;
    if (ratio < CRADLED_FROM) {
      const w = 1 / Math.sqrt(1 - r * r);
      return bundle('triangular', w, w / 2, fits);
    }
    return cradled(r, fits);
  }
  // A cradle of unlike ones needs room beside the largest.
  if (count === 3 && ratio > LEAST_RATIO.two) return cradled(r, true);
  if (equals === 4 && count === 4) {
    const w = Math.max(COMPLEX, 1 + 2 * r * r);
    return bundle('diamond', w, Math.max(w - 1, 1 / 2), ratio >= LEAST_RATIO.four);
  }
  return complex(ratio > 1);
}

function cradled(r: number, fits: boolean): Bundle {
  const w = 1 + (4 / 3) * r * r;
  return bundle('cradled', w, (3 * w - 2) / 3, fits);
}

function complex(fits: boolean): Bundle {
  return bundle('complex', COMPLEX, COMPLEX / 2, fits);
}

/** A set that does not go in has no weight correction: the formulas have no answer there. */
function bundle(
  configuration: Configuration,
  weightCorrection: number,
  sidewallShare: number,
  fits: boolean,
): Bundle {
  return fits
    ? { configuration, weightCorrection, sidewallShare, fits }
    : { configuration, weightCorrection: 1, sidewallShare: 1, fits };
}

const countOf = (sizes: readonly SetOfDiameter[]): number =>
  sizes.reduce((sum, { count }) => sum + count, 0);
