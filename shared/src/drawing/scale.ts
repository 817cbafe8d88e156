/** Something that stands at one place of the distance axis: a pull point, a bend, an end of a flexible piece. */
export interface Stop {
  station: number;
  /** Half of what it takes of the width, px. */
  halfWidth: number;
  elementId: string;
  isPullPoint: boolean;
}

/** The least room between stops, px. */
export interface Spacing {
  /** Between the bends of one offset or saddle. */
  inside: number;
  /** Between two pieces. */
  between: number;
  /** Between the side of a pull point and what stands next to it. */
  beside: number;
}

export interface StationScale {
  /** From the first stop to the last, px. */
  width: number;
  /** px per unit of station where nothing is drawn longer. */
  perUnit: number;
  /** Where each stop stands, px from the first. */
  stops: number[];
  /** Gaps shorter than this are drawn longer; null when all are to scale. Units of station. */
  stretchedUnder: number | null;
  xAt: (station: number) => number;
  /** The other way: station at px from the first stop. */
  stationAt: (x: number) => number;
}

/** Above this share of the width the least gaps leave no room to show distances: the drawing becomes wider. */
const MOST_SHARE = 0.78;
const BISECTIONS = 60;
/** A gap drawn this much longer than its share still counts as to scale, px. */
const UNSEEN = 0.5;
/** Two things closer than this stand at one place: no leg between them is drawn longer. */
const SHORTEST = 1;

function leastGap(a: Stop, b: Stop, spacing: Spacing): number {
  if (a.isPullPoint || b.isPullPoint) return a.halfWidth + b.halfWidth + spacing.beside;
  return a.elementId === b.elementId ? spacing.inside : spacing.between;
}

/**
 * Lays the stops of a run along a width: each gap is max(m, k × distance), with k found by bisection so that the gaps
 * fill the width. Where the least gaps m alone pass 78 % of it, the drawing becomes Σm / 0.78 wide instead.
 * `stops` are in order of station; px.
 *
 * @example two stops 10 units apart on 500 px: k = 50 px per unit, to scale
 */
export function stationScale(
  stops: readonly Stop[],
  width: number,
  spacing: Spacing,
): StationScale {
  const gaps = stops.slice(1).map((stop, index) => {
    const before = stops[index] ?? stop;
    return {
      distance: Math.max(0, stop.station - before.station),
      least: leastGap(before, stop, spacing),
    };
  });
  const least = gaps.reduce((sum, gap) => sum + gap.least, 0);
  const distance = gaps.reduce((sum, gap) => sum + gap.distance, 0);
  const full = least > width * MOST_SHARE ? least / MOST_SHARE : width;
  const perUnit = distance > 0 ? fillWidth(gaps, full, full / distance) : 0;
  const drawn = gaps.map((gap) => Math.max(gap.least, perUnit * gap.distance));
  const sum = drawn.reduce((total, gap) => total + gap, 0);
  // Without any distance the gaps share the width evenly.
  const share = distance > 0 || sum === 0 ? 1 : full / sum;
  const xs = [0];
  for (const gap of drawn) xs.push((xs[xs.length - 1] ?? 0) + gap * share);
  const stretched = gaps.filter(
    ({ distance: own, least: m }) => own >= SHORTEST && m > perUnit * own + UNSEEN,
  );
  const stations = stops.map(({ station }) => station);
  return {
    width: full,
    perUnit,
    stops: xs,
    stretchedUnder:
      stretched.length === 0 ? null : Math.max(...stretched.map((gap) => gap.distance)),
    xAt: interpolator(stations, xs),
    stationAt: interpolator(xs, stations),
  };
}

interface Gap {
  distance: number;
  least: number;
}

/** k with Σ max(m, k × distance) = width. The sum grows with k, is at most the width at 0 and at least it at `most`. */
function fillWidth(gaps: readonly Gap[], width: number, most: number): number {
  let low = 0;
  let high = most;
  for (let step = 0; step < BISECTIONS; step += 1) {
    const middle = (low + high) / 2;
    const sum = gaps.reduce((total, gap) => total + Math.max(gap.least, middle * gap.distance), 0);
    if (sum > width) high = middle;
    else low = middle;
  }
  return low;
}

/** Piecewise linear from what grows along the stops to what grows with it; held at both ends. */
function interpolator(from: readonly number[], to: readonly number[]) {
  return (value: number): number => {
    let low = 0;
    let high = from.length - 1;
    while (low < high) {
      const middle = (low + high) >> 1;
      if ((from[middle] ?? 0) < value) low = middle + 1;
      else high = middle;
    }
    const after = from[low] ?? 0;
    const toAfter = to[low] ?? 0;
    if (low === 0 || value >= after) return toAfter;
    const before = from[low - 1] ?? 0;
    const toBefore = to[low - 1] ?? 0;
    return toBefore + ((value - before) / (after - before)) * (toAfter - toBefore);
  };
}
