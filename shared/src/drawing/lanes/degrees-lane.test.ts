import { describe, expect, it } from 'vitest';
import type { PolylineMark } from '../display-list';
import { degreesScale, drawDegreesLane } from './degrees-lane';

const BOX = { top: 100, height: 66, pen: 2, leastOver: 11, dash: [7, 4] as [number, number] };
const section = (...totals: number[]) => ({
  fromX: 0,
  toX: 400,
  steps: totals.map((total, index) => ({ x: 50 + index * 50, total })),
  limit: 360,
  past: totals.some((total) => total > 360) ? ('over' as const) : null,
});
const overOf = (...totals: number[]) =>
  drawDegreesLane([section(...totals)], BOX).marks.find(
    (mark): mark is PolylineMark => mark.kind === 'polyline' && mark.fill === 'fill-over',
  );

describe('degreesScale', () => {
  it.each([
    [360, 110, 410.4],
    [360, 380, 418],
    [360, 500, 550],
    [360, 2000, 576],
  ])('limit %d, worst %d: %d at the top', (limit, worst, top) => {
    expect(degreesScale(limit, worst)).toBeCloseTo(top, 9);
  });
});

describe('drawDegreesLane', () => {
  it('shows nothing over the limit while there is nothing', () => {
    expect(overOf(90, 180, 360)).toBeUndefined();
  });

  it.each([361, 380, 450, 720, 10_000])('shows %d° at least 11 px over the limit', (worst) => {
    const ys = (overOf(180, worst)?.points ?? []).map(({ y }) => y);
    const { limitY } = drawDegreesLane([section(180, worst)], BOX);
    expect(limitY - Math.min(...ys)).toBeGreaterThanOrEqual(BOX.leastOver - 1e-9);
    expect(Math.min(...ys)).toBeGreaterThanOrEqual(BOX.top - 1e-9);
  });

  it('starts the part over the limit at the bend that crosses it', () => {
    expect(overOf(180, 380, 400)?.points[0]?.x).toBe(100);
  });
});
