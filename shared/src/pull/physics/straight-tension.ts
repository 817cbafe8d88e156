import type { Load, StraightWay } from './load';

/**
 * Tension leaving a straight piece: T₂ = T₁ + W·L·(sin α + f·cos α), α the slope upward in the direction of the pull.
 * Tension entering in lbf, `length` ft, `rise` = sin α, `weight` lb/ft of the whole set, `friction` f = w·μ.
 *
 * Source: level form TES-P-104.05 (Saudi Electricity Co., 2007) Eq. 05-1; slope form a force balance on an incline.
 *
 * @example straightTension(200, { length: 100, rise: 0.5, run: 0.866025 }, { weight: 4, friction: 0.42 }) // 545.4923
 */
export function straightTension(
  tension: number,
  { length, rise, run }: StraightWay,
  { weight, friction }: Load,
): number {
  return tension + weight * length * (rise + friction * run);
}

/**
 * The least tension entering a straight piece that keeps the cable taut along it and leaves it with `tension`, lbf.
 *
 * @example straightFeed(0, { length: 100, rise: -1, run: 0 }, { weight: 5.149, friction: 0.42 }) // 514.9
 */
export function straightFeed(
  tension: number,
  { length, rise, run }: StraightWay,
  { weight, friction }: Load,
): number {
  return Math.max(0, tension - weight * length * (rise + friction * run));
}
