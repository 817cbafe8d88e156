import type { Finding } from '../contracts/run-analysis';
import { racewayDimensions } from '../tables/raceway-dimensions';
import { threeEqual } from './jam';
import { areaOf, sizedGroups } from './section-conductors';
import type { SectionConductors, SizedGroup } from './section-conductors';

/** Room over the conductors below which a pull is tight; cable makers' pulling guides, in. */
const TIGHT = 0.25;

export interface ClearanceCheck {
  /** in; null where no figure applies: sets of many conductors are judged by fill. */
  answer: number | null;
  findings: Finding[];
}

/**
 * The room between the top of the conductors and the bore.
 * Source: the single and triangular forms by TES-P-104.05 clause 5.4.1; the cradled form, two and four conductors derived
 * from their geometry. A quarter inch as the least is what US pulling guides ask for.
 *
 * @example 3×500 THHN (0.949) in 3 EMT (3.356), cradled: 3.356/2 − 0.949/2 + 1.2035 × (1 − 2 × 0.3943²) = 2.03 in
 */
export function checkClearance(context: SectionConductors): ClearanceCheck {
  const dimensions = racewayDimensions(context.raceway.type, context.raceway.tradeSize);
  const sized = sizedGroups(context.groups);
  if (!dimensions || sized.length === 0) return { answer: null, findings: [] };
  const { bore, area } = dimensions;
  const answer = clearanceOf(bore, sized)?.clearance ?? null;
  const finding = (code: 'clearance-tight' | 'clearance-negative'): Finding => ({
    code,
    severity: code === 'clearance-tight' ? 'caution' : 'stop',
    at: { sectionId: context.sectionId },
    values: { clearance: answer, bore },
    rule: null,
  });
  const cannot = areaOf(sized) > area || widestPair(sized) > bore;
  if (cannot || (answer !== null && answer < 0)) {
    return { answer, findings: [finding('clearance-negative')] };
  }
  return {
    answer,
    findings: answer !== null && answer < TIGHT ? [finding('clearance-tight')] : [],
  };
}

/** The two widest conductors side by side, in; one alone counts once. */
function widestPair(sized: readonly SizedGroup[]): number {
  const [first = 0, second = 0] = diametersOf(sized, 2);
  return first + second;
}

/** The diameters of the widest conductors, widest first, at most `most` of them. */
function diametersOf(sized: readonly SizedGroup[], most: number): number[] {
  return sized
    .flatMap(({ diameter, count }) => Array<number>(Math.min(count, most)).fill(diameter))
    .sort((a, b) => b - a)
    .slice(0, most);
}

/** How a set lies, by which its clearance is reckoned; `-too-wide`: it does not go in, and lacks so much. */
export type ClearanceForm =
  'one' | 'two' | 'two-too-wide' | 'triangular' | 'cradled' | 'three-too-wide' | 'four';

/** The circles round three and round four touching conductors, in their diameters. */
const ROUND_THREE = 1 + 2 / Math.sqrt(3);
const ROUND_FOUR = 1 + Math.SQRT2;
/** Below this D/d three lie as a triangle, above it they cradle. */
const CRADLED_FROM = 2.5;

const CLEARANCES: Record<ClearanceForm, (bore: number, diameter: number) => number> = {
  one: (bore, diameter) => bore - diameter,
  two: clearanceOfTwo,
  'two-too-wide': (bore, diameter) => bore - 2 * diameter,
  triangular: triangularClearance,
  cradled: cradledClearance,
  'three-too-wide': (bore, diameter) => bore - ROUND_THREE * diameter,
  four: (bore, diameter) => bore - ROUND_FOUR * diameter,
};
/**
 * Clearance, in, of one, two, three or four equal conductors (and of three with small ones beside them); null for any
 * other set.
 */
export function clearanceOf(
  bore: number,
  sized: readonly SizedGroup[],
): { form: ClearanceForm; diameter: number; clearance: number } | null {
  const three = threeEqual(sized);
  const [first, ...rest] = diametersOf(sized, 5);
  const diameter = three ?? first;
  if (diameter === undefined) return null;
  const count = three === null ? 1 + rest.length : 3;
  // Three that are not alike enough to be reckoned as three have no form.
  if (three === null && (count === 3 || rest.some((each) => each !== first))) return null;
  const form = formOf(count, bore / diameter);
  return form && { form, diameter, clearance: CLEARANCES[form](bore, diameter) };
}

function formOf(count: number, ratio: number): ClearanceForm | null {
  switch (count) {
    case 1:
      return 'one';
    case 2:
      return ratio < 2 ? 'two-too-wide' : 'two';
    case 3:
      if (ratio < ROUND_THREE) return 'three-too-wide';
      return ratio < CRADLED_FROM ? 'triangular' : 'cradled';
    case 4:
      return 'four';
    default:
      return null;
  }
}

/** Two side by side in the bottom of the bore: their centres lie (D − d)/2 from its axis and d apart. in. */
function clearanceOfTwo(bore: number, diameter: number): number {
  const radius = (bore - diameter) / 2;
  return bore / 2 + Math.sqrt(radius ** 2 - (diameter / 2) ** 2) - diameter / 2;
}

/**
 * Three touching conductors, two of them in the bottom of the bore: D/2 − 1.366 d + (D − d)/2 × √(1 − r²), r = d/(D − d). in.
 * Source: TES-P-104.05 clause 5.4.1.
 *
 * @example triangularClearance(4.026, 1.55) // 0.86107
 */
export function triangularClearance(bore: number, diameter: number): number {
  const ratio = diameter / (bore - diameter);
  return bore / 2 - 1.366 * diameter + ((bore - diameter) / 2) * Math.sqrt(1 - ratio ** 2);
}

/**
 * Three side by side along the bottom of the bore, by geometry: D/2 − d/2 + (D − d)/2 × (1 − 2r²), r = d/(D − d). in.
 *
 * @example cradledClearance(3.356, 0.949) // 2.033
 */
function cradledClearance(bore: number, diameter: number): number {
  const ratio = diameter / (bore - diameter);
  return bore / 2 - diameter / 2 + ((bore - diameter) / 2) * (1 - 2 * ratio ** 2);
}
