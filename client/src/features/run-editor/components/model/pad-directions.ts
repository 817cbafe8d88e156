import { across, directionVector, dot, vectorDirection } from '@fairlead/shared';
import type { Direction, Vector } from '@fairlead/shared';

/** A key of the direction pad, in the pipe's own words or, on a riser, in those of the plan. */
export const PAD_KEYS = {
  level: ['left', 'right', 'up', 'down'],
  riser: ['north', 'east', 'south', 'west'],
} as const;
export type PadKey = (typeof PAD_KEYS)[keyof typeof PAD_KEYS][number];

export interface PadWay {
  key: PadKey;
  direction: Direction;
  isChosen: boolean;
}

/** Steeper than this the pipe counts as a riser and left and right mean nothing. */
const RISER = Math.cos((30 * Math.PI) / 180);
const SAME = 1e-6;

function samePlace(a: Vector, b: Vector): boolean {
  return Math.abs(dot(a, b) - 1) < SAME;
}

/**
 * The four ways a piece can go, seen along the pipe from the start: left and right are level, up and down plumb. On a
 * riser: the four of the plan. Example: heading east, left is north and right is south.
 */
export function padWays(heading: Vector | null, chosen: Direction | undefined): PadWay[] {
  const isRiser = heading !== null && Math.abs(heading.z) > RISER;
  const target = chosen === undefined ? null : directionVector(chosen);
  const way = (key: PadKey, vector: Vector): PadWay[] => {
    const direction = vectorDirection(vector);
    if (!direction) return [];
    return [
      {
        key,
        direction,
        isChosen: target !== null && samePlace(target, directionVector(direction)),
      },
    ];
  };
  if (isRiser || heading === null) {
    const plan = PAD_KEYS.riser.flatMap((key) => way(key, directionVector(key)));
    const plumb = (['up', 'down'] as const).flatMap((key) => way(key, directionVector(key)));
    return heading === null ? [...plan, ...plumb] : plan;
  }
  return [
    ...way('left', { x: -heading.y, y: heading.x, z: 0 }),
    ...way('right', { x: heading.y, y: -heading.x, z: 0 }),
    ...way('up', { x: 0, y: 0, z: 1 }),
    ...way('down', { x: 0, y: 0, z: -1 }),
  ];
}

/** Whether a direction runs along the pipe, so that nothing can bend that way. */
export function isAlongPipe(heading: Vector | null, direction: Direction): boolean {
  return heading !== null && across(heading, directionVector(direction)) === null;
}

/** Degrees from north clockwise, and above level. Straight up and down count as from north. */
export function anglesOf(direction: Direction): { azimuth: number; elevation: number } {
  if (typeof direction !== 'string') return direction;
  const { x, y, z } = directionVector(direction);
  const azimuth = ((Math.atan2(x, y) * 180) / Math.PI + 360) % 360;
  return { azimuth: Math.round(azimuth), elevation: Math.round(z) * 90 };
}
