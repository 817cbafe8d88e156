import type { PullAnalysis } from '@fairlead/shared';

/** The lowest stop limit on the pull, lbf; null where there are no wires. */
export function lowestAllowed({ limits }: PullAnalysis): number | null {
  if (!limits) return null;
  const { conductor, attachment, puller, rope } = limits;
  return Math.min(conductor, attachment, puller ?? Infinity, rope ?? Infinity);
}
