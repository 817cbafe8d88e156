import type { ExpandedRun, PlacedElement } from '../run/expanded-run';
import { stationScale } from './scale';
import type { StationScale, Stop } from './scale';
import type { StripLook } from './strip-look';

/** Where one element stands along the strip, px. */
export interface Place {
  elementId: string;
  from: number;
  to: number;
}

export interface StripPlaces {
  scale: StationScale;
  /** One per element, in the order of the path. */
  elements: Place[];
  /** One per bend of the expanded run. */
  bends: number[];
  start: number;
  end: number;
  /** Width of the whole drawing, the sides included. */
  width: number;
}

interface OwnedStop extends Stop {
  elementIndex: number;
  bendIndex: number | null;
}

/** Where everything of a run stands along its strip. */
export function placeRun(expanded: ExpandedRun, width: number, look: StripLook): StripPlaces {
  const stops = inOrder(expanded.elements.flatMap((placed) => stopsOf(placed, expanded, look)));
  const { side } = look;
  const scale = stationScale(stops, Math.max(1, width - 2 * side), look.spacing);
  const xOf = (stop: number) => side + (scale.stops[stop] ?? 0);
  const bends = expanded.bends.map(() => side);
  const own = expanded.elements.map((): number[] => []);
  stops.forEach((stop, index) => {
    own[stop.elementIndex]?.push(xOf(index));
    if (stop.bendIndex !== null) bends[stop.bendIndex] = xOf(index);
  });
  const elements = expanded.elements.map((placed, index): Place => {
    const xs = own[index] ?? [];
    const elementId = placed.element.id;
    if (xs.length > 0) return { elementId, from: Math.min(...xs), to: Math.max(...xs) };
    return { elementId, ...between(placed, index, stops, xOf) };
  });
  return {
    scale,
    elements,
    bends,
    start: side,
    end: side + (scale.stops[scale.stops.length - 1] ?? 0),
    width: scale.width + 2 * side,
  };
}

function stopsOf(placed: PlacedElement, expanded: ExpandedRun, look: StripLook): OwnedStop[] {
  const { element, index } = placed;
  const isPullPoint = element.kind === 'pull-point';
  const at = (station: number, bendIndex: number | null = null): OwnedStop => ({
    station,
    halfWidth: isPullPoint ? look.halfBox : look.tickPen / 2,
    elementId: element.id,
    isPullPoint,
    elementIndex: index,
    bendIndex,
  });
  const bends = placed.bends.flatMap((bendIndex) => {
    const bend = expanded.bends[bendIndex];
    return bend ? [at((bend.from + bend.to) / 2, bendIndex)] : [];
  });
  switch (element.kind) {
    case 'straight':
      return [];
    case 'flex':
      return [at(placed.from), ...bends, at(placed.to)];
    case 'pull-point':
      return [at(placed.from, placed.bends[0] ?? null)];
    default:
      return bends.length > 0 ? bends : [at((placed.from + placed.to) / 2)];
  }
}

/** Stations never fall back, even where a leg is too short for the bends at its ends. */
function inOrder(stops: OwnedStop[]): OwnedStop[] {
  let last = 0;
  return stops.map((stop) => {
    last = Math.max(last, stop.station);
    return { ...stop, station: last };
  });
}

/** A straight reaches from the stop before it to the one after it, or shares that with the straights beside it. */
function between(
  placed: PlacedElement,
  index: number,
  stops: readonly OwnedStop[],
  xOf: (stop: number) => number,
): { from: number; to: number } {
  const afterIndex = stops.findIndex((stop) => stop.elementIndex > index);
  const after = stops[afterIndex];
  const before = stops[afterIndex - 1];
  if (!after || !before) return { from: xOf(0), to: xOf(0) };
  const [left, right] = [xOf(afterIndex - 1), xOf(afterIndex)];
  const span = after.station - before.station;
  const xAt = (station: number) => {
    const share = span > 0 ? (station - before.station) / span : 0;
    return left + Math.min(1, Math.max(0, share)) * (right - left);
  };
  return { from: xAt(placed.from), to: span > 0 ? xAt(placed.to) : right };
}
