import { racewayOfEach } from '../src/run/expand/raceway-changes';
import { isPullPoint } from '../src/run/pull-points';
import type { PathElement, Raceway, RunDocument } from '../src/run/run-document';

/** The same pipe described from its other end: what a change of raceway leads to becomes what it came from. */
export function reverseRun(document: RunDocument): RunDocument {
  const { path } = document;
  const leaving = racewayOfEach(document);
  /** The raceway in force, flexible pieces apart, on arriving at each element. */
  const arriving: Raceway[] = [];
  let current = document.raceway;
  path.forEach((element, index) => {
    arriving.push(current);
    if (element.kind !== 'flex') current = leaving[index] ?? current;
  });
  const reversed = path
    .map((element, index): PathElement => {
      if (element.kind === 'transition') return { ...element, raceway: arriving[index] ?? current };
      if (!isPullPoint(element)) return element;
      const rest = { ...element };
      delete rest.raceway;
      const changes = element.raceway && index > 0;
      return changes ? { ...rest, raceway: arriving[index] } : rest;
    })
    .reverse();
  // The raceway that arrives at the old end is the one the new run starts with.
  const conductors = document.conductors?.map(({ from, to, ...group }) => ({
    ...group,
    ...(to !== undefined && { from: to }),
    ...(from !== undefined && { to: from }),
  }));
  return {
    ...document,
    raceway: arriving[path.length - 1] ?? document.raceway,
    path: reversed,
    ...(conductors && { conductors }),
  };
}
