import { STOP_LIMITS } from '../contracts/run-analysis';
import type { Band, Governing, ProfilePoint, StopLimit } from '../contracts/run-analysis';
import { pullChain } from './pull-chain';
import type { PullPiece } from './pull-path';
import type { PullLimits } from './pulling-limits';
import type { PullSet } from './pull-set';

/** What one direction of a pull is reckoned from. */
export interface DirectionInput {
  pieces: readonly PullPiece[];
  /** By index of the section. */
  sets: readonly PullSet[];
  feed: number;
}

/** The most anything feels on the way, at one friction. */
export interface Peaks {
  tension: number;
  sidewall: number;
}

const LEVELS = ['low', 'likely', 'high'] as const;
const INCHES = 12;
/** The largest friction anybody reckons with. */
export const MOST_FRICTION = 1.2;
const MOST_STEPS = 60;
const CLOSE = 1e-4;
/** Stands for no tension at all where a logarithm is asked, lbf. */
const TINY = 1e-9;

const band = (of: (level: (typeof LEVELS)[number]) => number): Band => ({
  low: of('low'),
  likely: of('likely'),
  high: of('high'),
});

/** lb/ft on the worst conductor of a set leaving a bend: its share of the larger tension over the inside radius. */
export function sidewallOf(
  piece: PullPiece,
  set: PullSet,
  entering: number,
  leaving: number,
): number {
  if (piece.kind !== 'bend' || piece.bearsOn === 'unknown') return 0;
  const inside = piece.way.radius - (piece.bearsOn === 'wall' ? set.bore / 2 / INCHES : 0);
  return inside > 0 ? (set.sidewallShare * Math.max(entering, leaving)) / inside : 0;
}

function walk({ pieces, sets, feed }: DirectionInput, friction: number) {
  const chain = pullChain(pieces, sets, friction, feed);
  const { tensions } = chain;
  let entering = chain.feed;
  const sidewalls = pieces.map((piece, index) => {
    const leaving = tensions[index] as number;
    const set = sets[piece.section];
    const sidewall = set ? sidewallOf(piece, set, entering, leaving) : 0;
    entering = leaving;
    return sidewall;
  });
  return { feed: chain.feed, holdBack: chain.holdBack, tensions, sidewalls };
}

/** The peaks of a direction at any friction. */
export function peaksAt(input: DirectionInput, friction: number): Peaks {
  const { pieces, sets } = input;
  const { feed, tensions } = pullChain(pieces, sets, friction, input.feed);
  let tension = feed;
  let sidewall = 0;
  let entering = feed;
  for (let index = 0; index < pieces.length; index += 1) {
    const piece = pieces[index] as PullPiece;
    const leaving = tensions[index] as number;
    const set = sets[piece.section];
    if (leaving > tension) tension = leaving;
    if (set && piece.kind === 'bend') {
      sidewall = Math.max(sidewall, sidewallOf(piece, set, entering, leaving));
    }
    entering = leaving;
  }
  return { tension, sidewall };
}

export interface DirectionFigures {
  tension: Band;
  peak: Band;
  holdBack: Band;
  peakSidewall: Band;
  peakSidewallAt: string | null;
  profile: ProfilePoint[];
}

/** The figures of one direction over the friction band. */
export function directionFigures(
  input: DirectionInput,
  friction: Band,
  ropeFriction: number,
  feedAt: string,
): DirectionFigures {
  const { pieces } = input;
  const walks = {
    low: walk(input, friction.low),
    likely: walk(input, friction.likely),
    high: walk(input, friction.high),
  };
  let ahead = pieces.reduce((sum, piece) => sum + turnOf(piece), 0);
  const ropeFactor = () => Math.exp(ropeFriction * ahead);
  const start: ProfilePoint = {
    elementId: feedAt,
    station: pieces[0]?.from ?? 0,
    tension: band((level) => walks[level].feed),
    sidewall: null,
    ropeFactor: ropeFactor(),
  };
  const points = pieces.map((piece, index): ProfilePoint => {
    ahead = Math.max(0, ahead - turnOf(piece));
    return {
      elementId: piece.elementId,
      station: piece.to,
      tension: band((level) => walks[level].tensions[index] ?? 0),
      sidewall: hasSidewall(piece) ? band((level) => walks[level].sidewalls[index] ?? 0) : null,
      ropeFactor: ropeFactor(),
    };
  });
  const last = points[points.length - 1] ?? start;
  const worst = Math.max(0, ...walks.likely.sidewalls);
  return {
    tension: last.tension,
    peak: band((level) => Math.max(walks[level].feed, ...walks[level].tensions)),
    holdBack: band((level) => walks[level].holdBack),
    peakSidewall: band((level) => Math.max(0, ...walks[level].sidewalls)),
    peakSidewallAt:
      worst > 0 ? (pieces[walks.likely.sidewalls.indexOf(worst)]?.elementId ?? null) : null,
    profile: [start, ...points],
  };
}

const hasSidewall = (piece: PullPiece): boolean =>
  piece.kind === 'bend' && piece.bearsOn !== 'unknown';
const turnOf = (piece: PullPiece): number => (piece.kind === 'bend' ? piece.way.angle : 0);

/** The value of a peak that a stop limit is held against. */
const valueFor = (limit: StopLimit, peaks: Peaks): number =>
  limit === 'sidewall' ? peaks.sidewall : peaks.tension;

const allowedFor = (limit: StopLimit, limits: PullLimits): number | null =>
  limit === 'sidewall' ? limits.sidewall.stop : limits[limit];

/** The stop limit that gives first at likely friction, and the friction at which it does. */
export function governingLimit(
  input: DirectionInput,
  friction: Band,
  limits: PullLimits,
): Governing | null {
  const peaks = peaksAt(input, friction.likely);
  const candidates = STOP_LIMITS.flatMap((limit) => {
    const allowed = allowedFor(limit, limits);
    const value = valueFor(limit, peaks);
    return allowed === null || allowed <= 0
      ? []
      : [{ limit, value, allowed, ratio: value / allowed }];
  });
  const [worst] = candidates.sort((a, b) => b.ratio - a.ratio);
  if (!worst) return null;
  const reachedAt = frictionWhere((mu) => valueFor(worst.limit, peaksAt(input, mu)), worst.allowed);
  return { ...worst, reachedAt };
}

/**
 * The friction from `least` up at which a peak passes what is allowed, to 0.0001 of that peak, where it does not at `least` and
 * does by 1.2; else null. Peaks grow by powers of e, so their logarithms are interpolated (regula falsi after Anderson and
 * Björck, 1973).
 */
export function frictionWhere(
  peak: (friction: number) => number,
  allowed: number,
  least = 0,
): number | null {
  const over = (friction: number) => Math.log(Math.max(peak(friction), TINY) / allowed);
  let [low, high] = [least, MOST_FRICTION];
  let [below, above] = [over(low), over(high)];
  if (below > 0 || above <= 0) return null;
  for (let step = 0; step < MOST_STEPS && high - low > CLOSE; step += 1) {
    const friction = (low * above - high * below) / (above - below);
    const found = over(friction);
    if (Math.abs(found) < CLOSE) return friction;
    if (found > 0) {
      const slowed = 1 - found / above;
      [high, above] = [friction, found];
      below *= slowed > 0 ? slowed : 1 / 2;
    } else {
      const slowed = 1 - found / below;
      [low, below] = [friction, found];
      above *= slowed > 0 ? slowed : 1 / 2;
    }
  }
  return high;
}
