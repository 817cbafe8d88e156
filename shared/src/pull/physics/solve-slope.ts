interface Options {
  /** Largest error of one step, in units of y. */
  tolerance: number;
  /** The rest of the way is not walked once y has passed this. */
  enough?: number;
}

const MOST_STEPS = 10_000;
/** A long step may pass over a sharp turn of the slope unseen. */
const LEAST_STEPS = 24;
const SAFETY = 0.9;

/**
 * Solves dy/dx = slope(x, y) from 0 to `end` by the embedded 5(4) pair of Dormand and Prince (J. Comput. Appl. Math. 6,
 * 1980), the step halved or grown so that each keeps its error within `tolerance`.
 *
 * @example solveSlope((_, y) => y, 1, 1, { tolerance: 1e-10 }) // 2.718281828
 */
export function solveSlope(
  slope: (x: number, y: number) => number,
  start: number,
  end: number,
  { tolerance, enough = Infinity }: Options,
): number {
  let x = 0;
  let y = start;
  const longest = end / LEAST_STEPS;
  let step = longest;
  for (let count = 0; x < end && y < enough && count < MOST_STEPS; count += 1) {
    const h = Math.min(step, end - x);
    const k1 = slope(x, y);
    const k2 = slope(x + h / 5, y + h * (k1 / 5));
    const k3 = slope(x + (3 * h) / 10, y + h * ((3 / 40) * k1 + (9 / 40) * k2));
    const k4 = slope(x + (4 * h) / 5, y + h * ((44 / 45) * k1 - (56 / 15) * k2 + (32 / 9) * k3));
    const k5 = slope(
      x + (8 * h) / 9,
      y + h * ((19372 / 6561) * k1 - (25360 / 2187) * k2 + (64448 / 6561) * k3 - (212 / 729) * k4),
    );
    const k6 = slope(
      x + h,
      y +
        h *
          ((9017 / 3168) * k1 -
            (355 / 33) * k2 +
            (46732 / 5247) * k3 +
            (49 / 176) * k4 -
            (5103 / 18656) * k5),
    );
    const next =
      y +
      h *
        ((35 / 384) * k1 +
          (500 / 1113) * k3 +
          (125 / 192) * k4 -
          (2187 / 6784) * k5 +
          (11 / 84) * k6);
    const k7 = slope(x + h, next);
    const error = Math.abs(
      h *
        ((71 / 57600) * k1 -
          (71 / 16695) * k3 +
          (71 / 1920) * k4 -
          (17253 / 339200) * k5 +
          (22 / 525) * k6 -
          (1 / 40) * k7),
    );
    const isLast = h <= end * 1e-12;
    if (error <= tolerance || isLast) {
      x += h;
      y = next;
    }
    const growth = error === 0 ? 4 : SAFETY * (tolerance / error) ** 0.2;
    step = Math.min(longest, h * Math.min(4, Math.max(0.2, growth)));
  }
  return y;
}
