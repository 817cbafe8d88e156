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
 * What the wall bears of a set by how it lies, as a multiple of its weight, r = d/(D − d): by frictionless statics of
 * cylinders in a cylinder; 1.4 by convention for what cannot be derived.
 *
 * @example WEIGHT_CORRECTION.cradled(0.3943) // 1.2073
 */
export const WEIGHT_CORRECTION: Record<Configuration, (r: number) => number> = {
  single: () => 1,
  two: (r) => 1 / Math.sqrt(1 - r * r),
  triangular: (r) => 1 / Math.sqrt(1 - r * r),
  cradled: (r) => 1 + (4 / 3) * r * r,
  diamond: (r) => 1 + 2 * r * r,
  complex: () => COMPLEX,
};

/**
 * The part of tension over radius that presses on the worst conductor, by weight correction w. Of four, the bottom one bears
 * w − 1 and each at the side a half.
 *
 * @example SIDEWALL_SHARE.cradled(1.2073) // 0.5406
 */
export const SIDEWALL_SHARE: Record<Configuration, (w: number) => number> = {
  single: () => 1,
  two: (w) => w / 2,
  triangular: (w) => w / 2,
  cradled: (w) => (3 * w - 2) / 3,
  diamond: (w) => Math.max(w - 1, 1 / 2),
  complex: (w) => w / 2,
};

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

  if (count === 1) return bundle('single', r, ratio > 1);
  if (count === 2) {
    const both = sizes.reduce((sum, each) => sum + each.count * each.diameter, 0);
    // Two unlike ones may fit where the formula, made for two of the larger, has no answer.
    if (equals === 1 && ratio <= LEAST_RATIO.two) return bundle('complex', r, both < bore);
    return bundle('two', r, ratio > LEAST_RATIO.two);
  }
  if (equals === 3 && ride) {
    const lies = ratio < CRADLED_FROM ? 'triangular' : 'cradled';
    return bundle(lies, r, ratio >= LEAST_RATIO.three);
  }
  // A cradle of unlike ones needs room beside the largest.
  if (count === 3 && ratio > LEAST_RATIO.two) return bundle('cradled', r, true);
  if (equals === 4 && count === 4) return bundle('diamond', r, ratio >= LEAST_RATIO.four);
  return bundle('complex', r, ratio > 1);
}

/** A set that does not go in has no weight correction: the formulas have no answer there. */
function bundle(configuration: Configuration, r: number, fits: boolean): Bundle {
  if (!fits) return { configuration, weightCorrection: 1, sidewallShare: 1, fits };
  const derived = Math.min(MOST_CORRECTION, WEIGHT_CORRECTION[configuration](r));
  // Four lie as they like: never less than a set that cannot be derived.
  const weightCorrection = configuration === 'diamond' ? Math.max(COMPLEX, derived) : derived;
  const sidewallShare = SIDEWALL_SHARE[configuration](weightCorrection);
  return { configuration, weightCorrection, sidewallShare, fits };
}

const countOf = (sizes: readonly SetOfDiameter[]): number =>
  sizes.reduce((sum, { count }) => sum + count, 0);
