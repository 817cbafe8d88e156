import type { Mark } from './display-list';
import { line } from './display-list';

const STEP = 6;

/** 45° lines over a rectangle, rising to the right: the pattern of Watch, which paper shows without colour. px. */
export function hatchRect(x: number, y: number, width: number, height: number): Mark[] {
  const count = Math.max(0, Math.floor((width + height) / STEP));
  return Array.from({ length: count }, (_, index) => {
    // Along the lower edge and then up the right one; from there up to the left until an edge ends it.
    const along = (index + 0.5) * STEP;
    const start = Math.max(0, along - height);
    const end = Math.min(width, along);
    return line(x + start, y + along - start, x + end, y + along - end, {
      stroke: 'ink',
      strokeWidth: 1.5,
    });
  });
}
