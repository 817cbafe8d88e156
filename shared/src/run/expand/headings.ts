import { directionVector } from '../../geometry/directions';
import { across, turn } from '../../geometry/turn';
import type { Vector } from '../../geometry/vector';
import type { ExpandedRun } from '../expanded-run';
import { turnOf } from '../pull-points';
import type { Direction, PathElement, RunDocument } from '../run-document';

/** The way a run starts where nobody said. */
export const DEFAULT_HEADING: Direction = 'east';
const LEVEL = 1e-9;

export interface Headings {
  directions: ExpandedRun['directions'];
  problems: ExpandedRun['directionProblems'];
  /** Per element: the unit heading entering it, leaving it, and the way it bends, across the pipe; null where unknown. */
  of: { before: Vector | null; after: Vector | null; sideways: Vector | null }[];
}

interface Turning {
  toward: Direction | undefined;
  /** Degrees by which the heading differs afterwards; 0 for what leaves it parallel. */
  angle: number;
}

/** Follows the heading along the path: h′ = cos θ · h + sin θ · p at each bend, with p across the pipe. */
export function followHeadings(document: RunDocument): Headings {
  const { path } = document;
  const start = directionVector(document.start?.heading ?? DEFAULT_HEADING);
  const turnings = path.map(turningOf);
  const needed = turnings.filter((turning) => turning !== null);
  const noneGiven = needed.length > 0 && needed.every(({ toward }) => toward === undefined);
  if (noneGiven && Math.abs(start.z) < LEVEL) {
    const unknown = path.map(() => ({ before: null, after: null, sideways: null }));
    return { directions: 'assumed-level', problems: [], of: unknown };
  }

  const problems: ExpandedRun['directionProblems'] = [];
  let heading: Vector | null = start;
  const of = path.map((element, index): Headings['of'][number] => {
    const before = heading;
    const turning = turnings[index] ?? null;
    if (!turning) return { before, after: before, sideways: null };
    const { toward, angle } = turning;
    if (toward === undefined) problems.push({ elementId: element.id, problem: 'missing' });
    const sideways =
      before && toward !== undefined ? across(before, directionVector(toward)) : null;
    if (before && toward !== undefined && !sideways) {
      problems.push({ elementId: element.id, problem: 'parallel' });
    }
    // An offset or saddle leaves the pipe parallel, whichever way it goes.
    if (angle > 0) heading = before && sideways && turn(before, sideways, angle);
    return { before, after: heading, sideways };
  });
  return { directions: problems.length > 0 ? 'partial' : 'given', problems, of };
}

function turningOf(element: PathElement): Turning | null {
  switch (element.kind) {
    case 'bend':
      return { toward: element.toward, angle: element.angle };
    case 'offset':
    case 'saddle-3':
    case 'saddle-4':
      return { toward: element.toward, angle: 0 };
    case 'pull-point': {
      const bodyTurn = turnOf(element);
      return bodyTurn && { toward: bodyTurn.toward, angle: bodyTurn.angle };
    }
    default:
      return null;
  }
}
