import { isOver } from '../checks/degree-limit';
import { degreesStatus } from '../checks/verdicts';
import type { RunAnalysis, Status } from '../contracts/run-analysis';
import type { ExpandedRun } from '../run/expanded-run';
import type { DegreeSteps } from './lanes/degrees-lane';
import type { StripPlaces } from './strip-places';

export interface SectionSteps extends DegreeSteps {
  id: string;
  degrees: number;
  /** The piece with which the total passes the limit. */
  crossing: string | null;
}

/** The total since the pull point, bend by bend, for every section. */
export function sectionSteps(
  expanded: ExpandedRun,
  analysis: RunAnalysis,
  places: StripPlaces,
): SectionSteps[] {
  const steps = expanded.sections.map((): { x: number; total: number; elementId: string }[] => []);
  expanded.bends.forEach(({ section, angle, counts, elementId }, index) => {
    const own = steps[section];
    if (!own || !counts) return;
    const total = (own[own.length - 1]?.total ?? 0) + angle;
    own.push({ x: places.bends[index] ?? places.start, total, elementId });
  });
  return expanded.sections.map((span, index) => {
    const status = degreesStatus(analysis, span.id);
    const { degrees = 0, limitDegrees: limit = 0 } = analysis.sections[index] ?? {};
    const own = steps[index] ?? [];
    return {
      id: span.id,
      fromX: places.elements[span.firstElement]?.from ?? places.start,
      toX: places.elements[span.lastElement]?.from ?? places.end,
      steps: own.map(({ x, total }) => ({ x, total })),
      degrees,
      limit,
      past: pastLimit(isOver(degrees, limit), status),
      crossing: own.find(({ total }) => isOver(total, limit))?.elementId ?? null,
    };
  });
}

/**
 * What degrees past the limit count as. A single thing that decides (planned flex, for one) makes them a warning, as in
 * the verdict.
 */
export function pastLimit(isPast: boolean, status: Status): DegreeSteps['past'] {
  if (!isPast) return null;
  return status === 'over' ? 'over' : 'watch';
}
