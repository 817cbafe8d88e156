import type { SectionSpan } from './expanded-run';
import type { ConductorGroup, PathElement } from './run-document';

/**
 * The conductor groups that lie in a section: those whose stretch, `from` to `to`, shares any part of it. A group that ends
 * inside a section (at a box nobody can reach) still fills the part it lies in, so it counts.
 */
export function conductorsInSection(
  path: readonly PathElement[],
  groups: readonly ConductorGroup[],
  { firstElement, lastElement }: Pick<SectionSpan, 'firstElement' | 'lastElement'>,
): ConductorGroup[] {
  const placeOf = (id: string | undefined, absent: number): number =>
    id === undefined ? absent : path.findIndex((element) => element.id === id);
  return groups.filter(
    ({ from, to }) => placeOf(from, 0) < lastElement && placeOf(to, path.length - 1) > firstElement,
  );
}
