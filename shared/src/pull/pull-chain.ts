import { bendFeed, bendTension } from './physics/bend-tension';
import type { Load } from './physics/load';
import { straightFeed, straightTension } from './physics/straight-tension';
import type { PullPiece } from './pull-path';

/** What one section holds: weight of the set, lb/ft, and the weight correction w of its configuration. */
export interface SectionLoad {
  weight: number;
  weightCorrection: number;
}

/** Tensions are told up to here: nothing pulls harder, lbf. */
export const MOST_TENSION = 1e6;

const NO_LOAD: Load = { weight: 0, friction: 0 };

export interface PullChain {
  /** lbf at the feed: what was given, or the hold-back where that is more. */
  feed: number;
  /** lbf that must be held at the feed so that the cable stays taut everywhere; 0 where the given feed tension does. */
  holdBack: number;
  /** lbf leaving each piece. */
  tensions: number[];
}

/**
 * The tension along a way at one friction, from the feed to the puller. Where the cable would run by its own weight the feed
 * is raised to the least tension that keeps it taut: the load on the top bend of a riser is seen only so.
 *
 * @example one straight of 100 ft down at f 0.42, 5.149 lb/ft, feed 0: holdBack 514.9, tension at the foot 0
 */
export function pullChain(
  pieces: readonly PullPiece[],
  loads: readonly (SectionLoad | undefined)[],
  friction: number,
  given: number,
): PullChain {
  const atFriction = loads.map((load): Load => ({
    weight: load?.weight ?? 0,
    friction: friction * (load?.weightCorrection ?? 1),
  }));
  const loadOf = (piece: PullPiece): Load => atFriction[piece.section] ?? NO_LOAD;
  let needed = 0;
  for (let index = lastFall(pieces); index >= 0; index -= 1) {
    const piece = pieces[index] as PullPiece;
    needed =
      piece.kind === 'straight'
        ? straightFeed(needed, piece.way, loadOf(piece))
        : bendFeed(needed, piece.way, loadOf(piece));
  }
  const feed = Math.min(MOST_TENSION, Math.max(given, needed));
  const holdBack = feed > given ? feed : 0;
  let tension = feed;
  const tensions = pieces.map((piece) => {
    const next =
      piece.kind === 'straight'
        ? straightTension(tension, piece.way, loadOf(piece))
        : bendTension(tension, piece.way, loadOf(piece));
    // Held just taut, a rounding error may leave a hair below nothing.
    tension = Math.min(MOST_TENSION, Math.max(0, next));
    return tension;
  });
  return { feed, holdBack, tensions };
}

/** The last piece on which the cable can run by its own weight; behind it nothing asks to be held. −1: none. */
function lastFall(pieces: readonly PullPiece[]): number {
  for (let index = pieces.length - 1; index >= 0; index -= 1) {
    const piece = pieces[index] as PullPiece;
    const isLevel =
      piece.kind === 'straight'
        ? piece.way.rise >= 0
        : piece.way.headingUp === 0 && piece.way.normalUp === 0;
    if (!isLevel) return index;
  }
  return -1;
}
