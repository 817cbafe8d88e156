import { NIPPLE, ROUNDING } from '../tables/fill-limits';
import type { RacewayDimensions } from '../tables/raceway-dimensions';

/** Printed areas carry four digits at most; a millionth of one can only be the computer's. */
const SLACK = 1e-9;

/** Note 7: a decimal of 0.8 or more rounds up. */
function roundedCount(quotient: number): number {
  const whole = Math.floor(quotient + SLACK);
  return quotient - whole >= ROUNDING.from - SLACK ? whole + 1 : whole;
}

/**
 * The most conductors of one size a raceway may hold: the 40 % column with Note 7's rounding; two must meet the 31 %
 * column and one the 53 % column. A nipple takes the 60 % column instead. All columns as printed: they, and not unrounded
 * areas, reproduce Annex C.
 * Source: NEC Chapter 9 Table 1 and Notes 4 and 7, Table 4; checked against Annex C Table C.1.
 *
 * @example maximumCount(racewayDimensions('EMT', '3/4'), 0.0133, false) // 16
 */
export function maximumCount(
  raceway: RacewayDimensions,
  conductorArea: number,
  nipple: boolean,
): number {
  if (nipple) return roundedCount(raceway.a60 / conductorArea);
  const many = roundedCount(raceway.a40 / conductorArea);
  if (many > 2) return many;
  if (roundedCount(raceway.a31 / conductorArea) >= 2) return 2;
  return roundedCount(raceway.a53 / conductorArea) >= 1 ? 1 : 0;
}

/** Whether a section is a nipple: at most 24 in between enclosures, as Note 4 says. */
export function isNipple(length: number | null, betweenEnclosures: boolean): boolean {
  return length !== null && betweenEnclosures && length <= NIPPLE.maxLength + SLACK;
}
