import type { PathElement, Raceway, RunDocument } from '../run-document';
import { hasLengths } from './path-items';

/**
 * Who names the raceway in force on each element: the index of a pull point, transition or flexible piece, or null for
 * the run itself. A flexible piece has its own raceway and hands the old one on; a pull point or transition carries what
 * leaves it.
 */
export function racewayPlaces(path: readonly PathElement[]): (number | null)[] {
  let current: number | null = null;
  return path.map((element, index) => {
    if (element.kind === 'flex') return index;
    if (element.kind === 'transition') current = index;
    if (element.kind === 'pull-point' && element.raceway) current = index;
    return current;
  });
}

/** The raceway in force on each element. */
export function racewayOfEach(document: RunDocument): Raceway[] {
  return racewayPlaces(document.path).map((place) => {
    const element = place === null ? undefined : document.path[place];
    return (element && 'raceway' in element && element.raceway) || document.raceway;
  });
}

interface Stretch {
  raceway: Raceway;
  hasPipe: boolean;
}

/**
 * The raceways a section holds, in order, without repeats. Where lengths are given, one that a pull point or transition
 * names and nothing is made of is not there; where none are, the pipe between pieces goes without saying.
 */
export function racewaysBetween(
  path: readonly PathElement[],
  raceways: readonly Raceway[],
  first: number,
  last: number,
): Raceway[] {
  const stretches: Stretch[] = [];
  let current: Stretch | null = null;
  for (let index = first; index < last; index += 1) {
    const kind = path[index]?.kind;
    const raceway = raceways[index];
    if (!raceway || kind === 'fitting') continue;
    if (kind === 'flex') {
      stretches.push({ raceway, hasPipe: true });
    } else if (kind === 'pull-point' || kind === 'transition') {
      current = { raceway, hasPipe: false };
      stretches.push(current);
    } else if (current) {
      current.hasPipe = true;
    }
  }
  const made = hasLengths(path) ? stretches.filter(({ hasPipe }) => hasPipe) : stretches;
  const held = (made.length > 0 ? made : stretches).map(({ raceway }) => raceway);
  return held.filter((raceway, index) => {
    return held.findIndex((other) => sameRaceway(other, raceway)) === index;
  });
}

export function sameRaceway(a: Raceway, b: Raceway): boolean {
  return a.type === b.type && a.tradeSize === b.tradeSize;
}
