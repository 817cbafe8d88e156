import type { Problem } from '../../contracts/errors';
import { asList, asText } from './loose';
import type { Loose } from './loose';
import { pointerOf, shownFound } from './problem-text';

/** Ids are unique across the path and the conductor groups; pulls have their own. */
export function duplicateIds(document: Loose): Problem[] {
  return [
    ...repeated([...idsOf('path', document.path), ...idsOf('conductors', document.conductors)]),
    ...repeated(idsOf('pulls', document.pulls)),
  ];
}

interface IdPlace {
  id: string;
  key: string;
  index: number;
}

function idsOf(key: string, list: unknown): IdPlace[] {
  const places: IdPlace[] = [];
  asList(list).forEach((part, index) => {
    const id = asText(part.id);
    if (id !== null) places.push({ id, key, index });
  });
  return places;
}

function repeated(places: readonly IdPlace[]): Problem[] {
  const first = new Map<string, IdPlace>();
  const pointer = ({ key, index }: IdPlace) => pointerOf([key, index, 'id']);
  const problems: Problem[] = [];
  for (const place of places) {
    const { id } = place;
    const before = first.get(id);
    if (before === undefined) first.set(id, place);
    else {
      const allowed = { usedAt: pointer(before) };
      const found = shownFound(id);
      problems.push({ pointer: pointer(place), code: 'duplicate-id', found, allowed });
    }
  }
  return problems;
}

/** `from` and `to` of groups and pulls name pull points, the first before the second. */
export function stretches(document: Loose): Problem[] {
  const places = new Map<string, number>();
  asList(document.path).forEach((element, index) => {
    const id = asText(element.id);
    if (id !== null && element.kind === 'pull-point') places.set(id, index);
  });
  const last = asList(document.path).length - 1;
  if (last < 1) return [];
  const check = (key: string, list: unknown): Problem[] =>
    asList(list).flatMap((part, index) => stretch(part, [key, index], places, last));
  return [...check('conductors', document.conductors), ...check('pulls', document.pulls)];
}

function stretch(
  part: Loose,
  path: PropertyKey[],
  places: ReadonlyMap<string, number>,
  last: number,
): Problem[] {
  const problems: Problem[] = [];
  const placeOf = (end: 'from' | 'to', absent: number): number | null => {
    const id = asText(part[end]);
    if (id === null) return part[end] === undefined ? absent : null;
    const place = places.get(id);
    if (place !== undefined) return place;
    const pointer = pointerOf([...path, end]);
    problems.push({
      pointer,
      code: 'no-such-pull-point',
      found: shownFound(id),
      allowed: 'id of a pull point',
    });
    return null;
  };
  const from = placeOf('from', 0);
  const to = placeOf('to', last);
  if (from !== null && to !== null && from >= to) {
    const end = part.to === undefined ? 'from' : 'to';
    problems.push({
      pointer: pointerOf([...path, end]),
      code: 'not-in-order',
      found: shownFound(part[end]),
      allowed: end === 'to' ? 'a pull point after from' : 'a pull point before the last',
    });
  }
  return problems;
}
