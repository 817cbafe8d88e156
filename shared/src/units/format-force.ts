const grouped = new Intl.NumberFormat('en-US', { maximumFractionDigits: 2 });

/** How coarse a predicted force is told, lbf: what it is known to is coarser still. */
function stepFor(force: number): number {
  if (force < 30) return 1;
  if (force < 300) return 5;
  return force < 1000 ? 10 : 50;
}

/**
 * A predicted pull in lbf, or a sidewall pressure in lb/ft: to 1 under 30, 5 to 300, 10 to 1,000, 50 above, and never rounded
 * onto a limit it is not at, nor across it.
 *
 * @example formatForce(1866.5) // "1,850"
 * @example formatForce(248, 249) // "248"
 */
export function formatForce(force: number, limit: number | null = null): string {
  const step = forceStep(force, limit);
  return grouped.format(Math.round(force / step) * step);
}

/**
 * To what `formatForce` rounds a figure, in its own unit.
 *
 * @example forceStep(1866.5) // 50
 */
export function forceStep(force: number, limit: number | null = null): number {
  const keepsSide = (step: number) => {
    const shown = Math.round(force / step) * step;
    return (
      limit === null || force === limit || (shown !== limit && shown > limit === force > limit)
    );
  };
  return [stepFor(force), 1, 0.1].find(keepsSide) ?? 0.01;
}

/** A limit, exactly as it is. `formatLimit(156.72)` is "157": to the pound, as nobody sets one finer. */
export function formatLimit(limit: number): string {
  return grouped.format(Math.round(limit));
}
