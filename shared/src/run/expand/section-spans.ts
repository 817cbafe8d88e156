import { endsSection, isPullPoint } from '../pull-points';
import type { Profile } from '../rules-in-force';
import type { PathElement, PullPoint } from '../run-document';

/** A stretch of the path from one section-ending pull point to the next. */
export interface Span {
  from: PullPoint;
  to: PullPoint;
  firstElement: number;
  lastElement: number;
}

/** The sections of a path whose ends are accessible pull points. */
export function sectionSpans(path: readonly PathElement[], profile: Profile): Span[] {
  const spans: Span[] = [];
  let from: { point: PullPoint; index: number } | null = null;
  path.forEach((element, index) => {
    if (!isPullPoint(element)) return;
    const isEnd = index === 0 || index === path.length - 1;
    if (!endsSection(element, profile, isEnd)) return;
    if (from) {
      spans.push({ from: from.point, to: element, firstElement: from.index, lastElement: index });
    }
    from = { point: element, index };
  });
  return spans;
}

/** For each element, the section it stands in; a pull point between two belongs to the one that starts there. */
export function sectionOfEach(path: readonly PathElement[], spans: readonly Span[]): number[] {
  let section = 0;
  return path.map((_, index) => {
    const next = spans[section + 1];
    if (next && index >= next.firstElement) section += 1;
    return section;
  });
}
