import type { Problem } from '../../contracts/errors';
import { conductorDimensions } from '../conductor-dimensions';
import { racewayDimensions, tradeSizesOf } from '../../tables/raceway-dimensions';
import { RACEWAY_TYPES, TRADE_SIZES } from '../run-document';
import type { WireGroup } from '../run-document';
import { wireGroup } from './conductors';
import { duplicateIds, stretches } from './id-rules';
import { asList, asNumber, asObject } from './loose';
import type { Loose } from './loose';
import { pointerOf, shownFound } from './problem-text';

/** What one field says about another: read from whatever is readable, so that it is reported beside the rest. */
export function documentRules(value: unknown): Problem[] {
  const document = asObject(value);
  return [
    ...pathEnds(document),
    ...duplicateIds(document),
    ...stretches(document),
    ...raceways(document),
    ...wires(document),
    ...frictionOrder(document),
    ...parallelSet(document),
  ];
}

/** A run begins and ends where people can reach the conductors. */
function pathEnds(document: Loose): Problem[] {
  const path = asList(document.path);
  const ends = path.length < 2 ? [] : [0, path.length - 1];
  return ends.flatMap((index): Problem[] => {
    const { kind, accessible } = path[index] ?? {};
    if (typeof kind === 'string' && kind !== 'pull-point') {
      const pointer = pointerOf(['path', index, 'kind']);
      return [
        { pointer, code: 'end-not-pull-point', found: shownFound(kind), allowed: ['pull-point'] },
      ];
    }
    if (accessible !== false) return [];
    const pointer = pointerOf(['path', index, 'accessible']);
    return [{ pointer, code: 'end-not-accessible', found: false, allowed: [true] }];
  });
}

function raceways(document: Loose): Problem[] {
  const places: [Loose, PropertyKey[]][] = [[asObject(document.raceway), ['raceway']]];
  asList(document.path).forEach((element, index) => {
    places.push([asObject(element.raceway), ['path', index, 'raceway']]);
  });
  return places.flatMap(([raceway, path]) => {
    const type = RACEWAY_TYPES.find((known) => known === raceway.type);
    const tradeSize = TRADE_SIZES.find((known) => known === raceway.tradeSize);
    if (!type || !tradeSize || racewayDimensions(type, tradeSize)) return [];
    const pointer = pointerOf([...path, 'tradeSize']);
    return [{ pointer, code: 'no-such-size', found: tradeSize, allowed: tradeSizesOf(type) }];
  });
}

/** A wire group is in the tables, or it is a cable with its own figures. */
function wires(document: Loose): Problem[] {
  return asList(document.conductors).flatMap((group, index) => {
    const { data } = wireGroup.safeParse({
      ...group,
      id: 'w',
      count: 1,
      from: undefined,
      to: undefined,
    });
    if (!data || conductorDimensions(data satisfies WireGroup)) return [];
    const pointer = pointerOf(['conductors', index, 'size']);
    const allowed =
      'a size the tables list for this insulation, material and stranding, or a cable';
    return [{ pointer, code: 'no-table-row', found: data.size, allowed }];
  });
}

function frictionOrder(document: Loose): Problem[] {
  const friction = asObject(asObject(document.conditions).friction);
  const at = (key: string, least: string): Problem[] => {
    const value = asNumber(friction[key]);
    const bound = asNumber(friction[least]);
    if (value === null || bound === null || value >= bound) return [];
    const pointer = pointerOf(['conditions', 'friction', key]);
    return [{ pointer, code: 'not-in-order', found: value, allowed: { atLeast: bound } }];
  };
  return [...at('likely', 'low'), ...at('high', 'likely')];
}

function parallelSet(document: Loose): Problem[] {
  const { set, of } = asObject(document.parallel);
  const number = asNumber(set);
  const count = asNumber(of);
  if (number === null || count === null || number <= count) return [];
  const pointer = pointerOf(['parallel', 'set']);
  return [{ pointer, code: 'not-in-order', found: number, allowed: { atMost: count } }];
}
