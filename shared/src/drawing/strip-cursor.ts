import type { RunAnalysis } from '../contracts/run-analysis';
import { typicalPulls } from '../pull/typical-pulls';
import type { ExpandedRun, PlacedElement } from '../run/expanded-run';
import { isPullPoint } from '../run/pull-points';
import type { StripPlaces } from './strip-places';

/** A place along the run that a person points at. */
export interface CursorPlace {
  /** Along the strip's body, px. */
  x: number;
  /** Developed inches from the start: where a piece begins, to the foot between pieces. */
  station: number;
  /** The piece it stands on, or the one that the leg leads to. */
  elementId: string;
  isOnPiece: boolean;
}

/** What the run says at such a place. */
export interface CursorReading {
  /** Degrees since the pull point `fromId`; null on the point itself. */
  degrees: number | null;
  fromId: string | null;
  /** Typical pull, lbf; null where the pull has no answer. */
  pull: number | null;
}

/** This close the pointer is on a piece, px. */
const GRAB = 6;
const FOOT = 12;

/** The place under `x`, px along the body; null where the run has no lengths. */
export function cursorPlace(
  expanded: ExpandedRun,
  places: StripPlaces,
  x: number,
): CursorPlace | null {
  if (expanded.length === null) return null;
  const pieces = expanded.elements.filter(({ element }) => element.kind !== 'straight');
  const placeOf = ({ index }: PlacedElement) => places.elements[index] ?? { from: 0, to: 0 };
  const away = (piece: PlacedElement) => {
    const { from, to } = placeOf(piece);
    return Math.max(from - x, x - to, 0);
  };
  const nearest = pieces.reduce((best, piece) => (away(piece) < away(best) ? piece : best));
  if (away(nearest) <= GRAB) {
    const { from, to } = placeOf(nearest);
    return standing(nearest, (from + to) / 2, nearest.from, true);
  }
  const next = pieces.find((piece) => placeOf(piece).from > x);
  const before = pieces[pieces.indexOf(next ?? nearest) - 1];
  if (!next || !before) return standing(nearest, placeOf(nearest).from, nearest.from, true);
  const exact = places.scale.stationAt(x - places.start);
  const station = Math.min(next.from, Math.max(before.to, Math.round(exact / FOOT) * FOOT));
  return standing(next, places.start + places.scale.xAt(station), station, false);
}

const standing = (
  { element }: PlacedElement,
  x: number,
  station: number,
  isOnPiece: boolean,
): CursorPlace => ({ x, station, elementId: element.id, isOnPiece });

/**
 * Degrees and typical pull at a place: on a piece with that piece included, as the list has them; on a leg those of the
 * cable between its ends.
 */
export function readCursor(
  { analysis, expanded }: { analysis: RunAnalysis; expanded: ExpandedRun },
  { elementId, station, isOnPiece }: CursorPlace,
): CursorReading {
  const placed = expanded.elements.find(({ element }) => element.id === elementId);
  const pull = isOnPiece
    ? (typicalPulls(analysis, expanded).get(elementId) ?? null)
    : pullAt(analysis, station);
  if (!placed || (isOnPiece && isPullPoint(placed.element))) {
    return { degrees: null, fromId: null, pull };
  }
  const passed = expanded.elements[placed.index - (isOnPiece ? 0 : 1)] ?? placed;
  const section = analysis.sections[passed.section];
  const turned = new Set(
    expanded.elements.slice(0, passed.index + 1).map(({ element }) => element.id),
  );
  const bends = section?.bends.filter((bend) => turned.has(bend.elementId)) ?? [];
  const degrees = bends[bends.length - 1]?.cumulative ?? 0;
  return { degrees, fromId: section?.from ?? null, pull };
}

/** On a straight the tension grows with the length. */
function pullAt({ pulls }: RunAnalysis, station: number): number | null {
  for (const pull of pulls) {
    const { profile } = pull[pull.planned];
    for (let index = 1; index < profile.length; index += 1) {
      const [one, other] = [profile[index - 1], profile[index]];
      if (!one || !other || (station - one.station) * (station - other.station) > 0) continue;
      const span = other.station - one.station;
      const share = span === 0 ? 1 : (station - one.station) / span;
      return one.tension.likely + share * (other.tension.likely - one.tension.likely);
    }
  }
  return null;
}
