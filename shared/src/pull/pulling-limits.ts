import type { PullAnalysis } from '../contracts/run-analysis';
import { conductorDimensions } from '../run/conductor-dimensions';
import type { ConductorGroup } from '../run/run-document';
import { bareConductor } from '../tables/bare-conductors';
import type { ConditionsInForce } from './conditions-in-force';

/** What may not be passed, lbf; sidewall in lb/ft. null: nobody set one. */
export type PullLimits = NonNullable<PullAnalysis['limits']>;

/** lbf per circular mil. Copper: a US maker's installation table; aluminum of the AA-8000 series: the same. */
const PER_CIRCULAR_MIL = { Cu: 0.008, Al: 0.006 };
/** More than three share the load unevenly: a fifth less (ICEA practice, as a US maker and a style sheet print it). */
const SHARED = 0.8;
const MOST_SHARING_EVENLY = 3;
/** Whatever the conductors would bear (a US maker's installation table), lbf. */
const MOST = 10_000;
/** A basket grip over cable without a lead sheath (ICEA style sheet; TES-P-104.05: 4.45 kN), lbf. */
export const BASKET_GRIP = 1000;

/**
 * What a set may be pulled with, lbf, by its conductors: 0.008 per circular mil of copper, 0.006 of aluminum, summed over those
 * of the largest size alone (smaller ones ride along), four fifths of it for more than three, never over 10,000. Of
 * cables: their own limit times their number, with the same four fifths.
 *
 * @example conductorLimit(3×12 Cu) // 156.72
 */
export function conductorLimit(set: readonly ConductorGroup[]): number {
  const carrying = carryingGroups(set);
  const count = carrying.reduce((sum, each) => sum + each.count, 0);
  const sum = carrying.reduce((total, { count: own, each }) => total + own * each, 0);
  return Math.min(MOST, sum * (count > MOST_SHARING_EVENLY ? SHARED : 1));
}

/** The conductors of a set that carry its pull, with what each may, lbf. */
export function carryingGroups(
  set: readonly ConductorGroup[],
): { count: number; each: number; size: number }[] {
  const carried = set.map((group) => ({
    count: group.count,
    diameter: conductorDimensions(group)?.diameter ?? 0,
    size: 'cable' in group ? 0 : bareConductor(group.size, false).circularMils,
    each:
      'cable' in group
        ? group.cable.maxTension
        : bareConductor(group.size, false).circularMils * PER_CIRCULAR_MIL[group.material],
  }));
  const [largest] = [...carried].sort((a, b) => b.size - a.size || b.diameter - a.diameter);
  if (!largest) return [];
  // Cables have no size to compare: where there are any, the widest things in the set carry it.
  const hasCable = carried.some(({ size }) => size === 0);
  const widest = Math.max(...carried.map(({ diameter }) => diameter));
  return carried.filter(({ size, diameter }) =>
    hasCable ? diameter === widest : size === largest.size,
  );
}

/** Every limit of a pull: of its conductors, of how they are attached, and what the run or the company sets. */
export function pullLimits(
  set: readonly ConductorGroup[],
  { attachment, limits }: ConditionsInForce,
): PullLimits {
  const conductor = conductorLimit(set);
  const cables = set.flatMap((group) => ('cable' in group ? [group.cable.maxSidewall] : []));
  const stop = Math.min(limits.sidewall.stop, ...cables.map((limit) => limit ?? Infinity));
  return {
    conductor,
    attachment: attachment === 'basket-grip' ? Math.min(BASKET_GRIP, conductor) : conductor,
    sidewall: { caution: Math.min(limits.sidewall.caution, stop), stop },
    handOne: limits.handOne,
    handTwo: limits.handTwo,
    puller: limits.puller,
    rope: limits.rope,
  };
}
