import { formatLength } from '../units/format-length';
import { textWidth } from './text-width';

export interface AxisTick {
  x: number;
  label: string;
}

/** The steps an axis may take, in: 3″ 6″ 1′ 2′ 5′ 10′ 20′ 25′ 50′ 100′ 200′ 500′. */
const STEPS = [3, 6, 12, 24, 60, 120, 240, 300, 600, 1200, 2400, 6000];
/** A tick closer to its neighbour than this share of the usual distance is left out. */
const TOO_CLOSE = 0.62;
const GAP = 8;

/** A station in feet, with inches only where there are some. `axisLabel(504)` is "42′". */
export function axisLabel(inches: number): string {
  if (inches < 0.5) return '0′';
  return formatLength(inches, { to: 1 }).replace(/′ 0″$/, '′');
}

/**
 * The ticks under a run: the smallest step that keeps them `apart` px where nothing is drawn longer, the end always
 * labelled, none closer than 0.62 of that. A run longer than the largest step allows takes whole multiples of it.
 */
export function axisTicks(options: {
  /** in. */
  length: number;
  /** px per in. */
  perUnit: number;
  xAt: (station: number) => number;
  apart: number;
  size: number;
  weight?: 400 | 600;
}): AxisTick[] {
  const { length, perUnit, xAt, apart, size, weight = 400 } = options;
  const end: AxisTick = { x: xAt(length), label: axisLabel(length) };
  const start: AxisTick = { x: xAt(0), label: axisLabel(0) };
  if (!(length > 0) || !(perUnit > 0)) return [start];
  const largest = STEPS[STEPS.length - 1] ?? 0;
  const step =
    STEPS.find((each) => each * perUnit >= apart) ??
    largest * Math.ceil(apart / (largest * perUnit));
  const half = (tick: AxisTick) => textWidth(tick.label, size, weight) / 2;
  const clear = (a: AxisTick, b: AxisTick) =>
    b.x - a.x >= Math.max(apart * TOO_CLOSE, half(a) + half(b) + GAP);
  // The labels at both ends are moved inside the drawing, so they take up to twice their half.
  const clearOfEnd = (tick: AxisTick) => end.x - tick.x >= half(end) + half(tick) + GAP + half(end);
  const ticks = [start];
  for (let station = step; station < length; station += step) {
    const tick = { x: xAt(station), label: axisLabel(station) };
    const last = ticks[ticks.length - 1] ?? start;
    if (clear(last, tick) && clear(tick, end) && clearOfEnd(tick)) ticks.push(tick);
  }
  const last = ticks[ticks.length - 1] ?? start;
  if (ticks.length === 1 && end.x - start.x < half(start) + half(end) * 2 + GAP) return [end];
  return clear(last, end) || ticks.length === 1 ? [...ticks, end] : [...ticks.slice(0, -1), end];
}
