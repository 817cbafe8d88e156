import type { Profile } from './rules-in-force';
import type { PathElement, PullPoint, Turn } from './run-document';

/** Degrees an angle body turns the conductors where nothing else is given. Common practice, no source. */
export const BODY_TURN = 90;
const ANGLE_BODIES: readonly unknown[] = ['LB', 'LL', 'LR'];

export function isPullPoint(element: PathElement): element is PullPoint {
  return element.kind === 'pull-point';
}

export function isAccessible(pullPoint: PullPoint): boolean {
  return pullPoint.accessible !== false;
}

/** How the conductors turn inside a box or body; null where they go straight through. */
export function turnOf(pullPoint: PullPoint): Turn | null {
  if (pullPoint.turn) return pullPoint.turn;
  const turns = pullPoint.device === 'conduit-body' && ANGLE_BODIES.includes(pullPoint.body);
  return turns ? { angle: BODY_TURN } : null;
}

/**
 * Whether the count of degrees starts again here. A place nobody can reach never ends a section (NEC 314.29); under the
 * telecom profile a conduit body doesn't either (owner standards: Washington State University 27 05 33), unless
 * the run itself ends there.
 */
export function endsSection(pullPoint: PullPoint, profile: Profile, isEnd: boolean): boolean {
  if (!isAccessible(pullPoint)) return false;
  return isEnd || profile === 'power' || pullPoint.device !== 'conduit-body';
}
