import type { PullReason } from '../contracts/run-analysis';
import { areaOf, countOf, sizedGroups } from '../checks/section-conductors';
import type { SectionConductors } from '../checks/section-conductors';
import { conductorWeight } from '../run/conductor-weight';
import { racewayDimensions } from '../tables/raceway-dimensions';
import { bundleOf } from './configuration';
import type { Bundle } from './configuration';
import type { SectionLoad } from './pull-chain';

/** What lies in one section while it is pulled. */
export interface PullSet extends SectionLoad, Bundle {
  /** in, of the smallest bore. */
  bore: number;
}

/** Weight and configuration of the set in one section, or why there is no figure. */
export function pullSet({ groups, raceway }: SectionConductors): PullSet | PullReason {
  if (groups.length === 0) return 'no-conductors';
  if (groups.some(({ use }) => use === 'existing')) return 'existing-conductors';
  const dimensions = racewayDimensions(raceway.type, raceway.tradeSize);
  const sized = sizedGroups(groups);
  const weights = groups.map(conductorWeight);
  if (!dimensions || sized.length < groups.length || weights.includes(null)) return 'no-dimensions';
  const { bore, area } = dimensions;
  const bundle = bundleOf(
    sized.map(({ diameter, count }) => ({ diameter, count })),
    bore,
  );
  if (!bundle.fits || areaOf(sized) > area || countOf(sized) === 0) return 'does-not-fit';
  const weight = groups.reduce(
    (sum, { count }, index) => sum + count * (weights[index]?.weight ?? 0),
    0,
  );
  return { ...bundle, bore, weight };
}
