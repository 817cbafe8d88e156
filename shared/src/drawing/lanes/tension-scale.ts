/** How a tension lane is drawn up: what stands at its top, and whether the limit is in sight. */
export interface TensionScale {
  /** lbf at the top of the lane. */
  top: number;
  isLimitAbove: boolean;
}

/** A limit this many times the typical peak stands above the drawing, so that a small pull does not look flat. */
const FAR = 2.6;
/** A small pull never fills the lane, lbf. */
const LEAST = 25;

/**
 * The lbf a tension lane shows at its top. Limit far above: max(25, 1.35 × typical peak); else max(1.12 × limit, min(dry
 * peak, 1.55 × limit)).
 *
 * @example tensionScale({ limit: 249, likely: 11, high: 30 }) // { top: 25, isLimitAbove: true }
 */
export function tensionScale({
  limit,
  likely,
  high,
}: {
  limit: number;
  likely: number;
  high: number;
}): TensionScale {
  if (limit > FAR * likely) return { top: Math.max(LEAST, 1.35 * likely), isLimitAbove: true };
  return { top: Math.max(1.12 * limit, Math.min(high, 1.55 * limit)), isLimitAbove: false };
}
