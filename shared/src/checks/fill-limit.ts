import { FILL_PERCENT, NIPPLE, SEAL } from '../tables/fill-limits';
import type { RacewayDimensions } from '../tables/raceway-dimensions';
import { isNipple } from './maximum-count';
import type { SectionConductors } from './section-conductors';

export interface FillLimit {
  percent: number;
  /** in². */
  area: number;
  from: 'code' | 'nipple' | 'seal' | 'job' | 'telecom';
}

/** Owner standards for telecom hold 40 % whatever the count; the code's Table 1 is for power. */
const TELECOM_PERCENT = 40;

/** Table 1 by count, or the nipple's 60 %. The columns of Table 4 are taken as printed. */
export function codeFillLimit(
  raceway: RacewayDimensions,
  conductors: number,
  { length, betweenEnclosures, profile }: SectionConductors,
): FillLimit {
  if (isNipple(length, betweenEnclosures)) {
    return { percent: NIPPLE.percent, area: raceway.a60, from: 'nipple' };
  }
  if (profile === 'telecom') {
    return { percent: TELECOM_PERCENT, area: raceway.a40, from: 'telecom' };
  }
  if (conductors === 1) return { percent: FILL_PERCENT.one, area: raceway.a53, from: 'code' };
  if (conductors === 2) return { percent: FILL_PERCENT.two, area: raceway.a31, from: 'code' };
  return { percent: FILL_PERCENT.overTwo, area: raceway.a40, from: 'code' };
}

/** The tightest of the code's limit, a seal's and the job's own, by name. */
export function tightestFillLimit(
  raceway: RacewayDimensions,
  conductors: number,
  context: SectionConductors,
): FillLimit {
  const limits = [codeFillLimit(raceway, conductors, context)];
  const share = (percent: number) => (raceway.area * percent) / 100;
  if (context.hasSeal) {
    limits.push({ percent: SEAL.percent, area: share(SEAL.percent), from: 'seal' });
  }
  if (context.maxFillPercent !== null) {
    const { maxFillPercent: percent } = context;
    limits.push({ percent, area: share(percent), from: 'job' });
  }
  return limits.reduce((tightest, limit) => (limit.percent < tightest.percent ? limit : tightest));
}
