import type { Status } from '../contracts/run-analysis';
import type { Mark, Point } from './display-list';

/** Points of a regular polygon, the first one turned by `turn` degrees from straight up. */
function polygon(x: number, y: number, radius: number, corners: number, turn: number): Point[] {
  return Array.from({ length: corners }, (_, corner) => {
    const angle = ((turn + (360 * corner) / corners - 90) * Math.PI) / 180;
    return { x: x + radius * Math.cos(angle), y: y + radius * Math.sin(angle) };
  });
}

/**
 * The glyph of a status, told apart by shape alone: ring with tick, triangle with !, octagon with ×, dashed ring
 * with ?. `x` and `y` are its centre, `size` its width, px.
 */
export function statusMarks(status: Status, x: number, y: number, size: number): Mark[] {
  const unit = size / 20;
  const at = (dx: number, dy: number): Point => ({ x: x + dx * unit, y: y + dy * unit });
  const pen = { stroke: 'ink', strokeWidth: 1.7 * unit } as const;
  const dot = (dy: number): Mark => ({
    kind: 'circle',
    ...at(0, dy),
    radius: 1.15 * unit,
    fill: 'ink',
  });
  switch (status) {
    case 'ok':
      return [
        { kind: 'circle', x, y, radius: 8.6 * unit, fill: 'fill-ok', ...pen },
        { kind: 'polyline', points: [at(-4, 0.3), at(-1.2, 3.1), at(4.2, -3)], ...pen },
      ];
    case 'watch':
      return [
        {
          kind: 'polyline',
          points: [at(0, -8.4), at(9, 7.6), at(-9, 7.6)],
          closed: true,
          fill: 'fill-watch',
          ...pen,
        },
        { kind: 'polyline', points: [at(0, -3.4), at(0, 2.2)], ...pen },
        dot(5),
      ];
    case 'over':
      return [
        {
          kind: 'polyline',
          points: polygon(x, y, 9.6 * unit, 8, 22.5),
          closed: true,
          fill: 'fill-over',
          ...pen,
          strokeWidth: unit,
        },
        ...[1, -1].map((slant): Mark => ({
          kind: 'polyline',
          points: [at(-3.2, -3.2 * slant), at(3.2, 3.2 * slant)],
          stroke: 'on-over',
          strokeWidth: 2 * unit,
        })),
      ];
    case 'no-answer':
      return [
        { kind: 'circle', x, y, radius: 8.6 * unit, dash: [3 * unit, 2.4 * unit], ...pen },
        {
          kind: 'polyline',
          points: [
            at(-2.8, -2),
            at(-2, -4.3),
            at(0, -5.1),
            at(2, -4.3),
            at(2.8, -2.4),
            at(1.9, -0.6),
            at(0, 0.8),
            at(0, 2.4),
          ],
          ...pen,
        },
        dot(5.2),
      ];
  }
}
