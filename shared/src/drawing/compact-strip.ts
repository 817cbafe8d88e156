import { isOver } from '../checks/degree-limit';
import type { StripSummary } from '../contracts/run-analysis';
import type { DisplayList, Mark } from './display-list';
import { line } from './display-list';
import { drawDegreesLane } from './lanes/degrees-lane';
import { stationScale } from './scale';
import type { Stop } from './scale';
import { pastLimit } from './strip-steps';

const SIDE = 5;
const HALF_BOX = 4;
const WALL = { top: 10, bottom: 14 };
const TICK = { base: 16, highest: 12 };
const DEGREES = { top: 20, height: 19, pen: 1.25, leastOver: 4, dash: [4, 3] as [number, number] };
const SPACING = { inside: 2, between: 3, beside: 2 };

/**
 * A run in one row of a list: the conduit with its bends and pull points, the degrees under it. `scaleTo` is the length
 * (in) that fills the width, so that several runs can be compared; absent, this run fills it.
 */
export function drawCompactStrip(
  strip: StripSummary,
  { width, height = 40, scaleTo }: { width: number; height?: number; scaleTo?: number },
): DisplayList {
  const share = scaleTo && strip.length !== null ? Math.min(1, strip.length / scaleTo) : 1;
  const room = Math.max(1, (width - 2 * SIDE) * share);
  const stops = stopsOf(strip);
  const scale = stationScale(stops, room, SPACING);
  // A row of a list never scrolls: what would need more room is drawn closer.
  const squeeze = scale.width > 0 ? Math.min(1, room / scale.width) : 1;
  const xAt = (station: number) => SIDE + scale.xAt(station) * squeeze;
  const marks: Mark[] = [
    ...drawDegreesLane(
      strip.sections.map(({ from, to, degrees, limit, status }) => {
        const inside = strip.bends.filter(({ station }) => station >= from && station < to);
        let total = 0;
        const steps = inside.map(({ station, angle }) => {
          total = Math.min(degrees, total + angle);
          return { x: xAt(station), total };
        });
        return {
          fromX: xAt(from),
          toX: xAt(to),
          steps,
          limit,
          past: pastLimit(isOver(degrees, limit), status),
        };
      }),
      DEGREES,
    ).marks,
    ...[WALL.top, WALL.bottom].map((y) =>
      line(SIDE, y, xAt(lastStation(stops)), y, { stroke: 'ink', strokeWidth: 1 }),
    ),
    ...strip.bends.map(({ station, angle }) => {
      const x = xAt(station);
      const top = WALL.top - (Math.min(angle, 90) / 90) * (TICK.highest - 2);
      return line(x, top, x, TICK.base, { stroke: 'petrol', strokeWidth: 1.75 });
    }),
    ...strip.pullPoints.map(({ station, accessible }): Mark => ({
      kind: 'rect',
      x: xAt(station) - HALF_BOX,
      y: (WALL.top + WALL.bottom) / 2 - HALF_BOX,
      width: HALF_BOX * 2,
      height: HALF_BOX * 2,
      fill: 'surface',
      stroke: 'ink',
      strokeWidth: 1.5,
      ...(accessible ? {} : { dash: [2, 2] as [number, number] }),
    })),
  ];
  return { width, height, marks };
}

function stopsOf({ pullPoints, bends }: StripSummary): Stop[] {
  const points = pullPoints.map(({ station }, index) => ({
    station,
    halfWidth: HALF_BOX,
    elementId: `pull-point ${index}`,
    isPullPoint: true,
  }));
  const ticks = bends.map(({ station }, index) => ({
    station,
    halfWidth: 1,
    elementId: `bend ${index}`,
    isPullPoint: false,
  }));
  return [...points, ...ticks].sort((a, b) => a.station - b.station);
}

const lastStation = (stops: readonly Stop[]): number => stops[stops.length - 1]?.station ?? 0;
