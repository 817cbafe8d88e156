import type { Point, TextMark } from './display-list';
import { fitText, textExtent } from './text-width';

const AWAY = 12;
const GAP = 4;

interface Area {
  left: number;
  right: number;
  top: number;
  bottom: number;
}

const overlap = (a: Area, b: Area) =>
  a.left < b.right + GAP && b.left < a.right + GAP && a.top < b.bottom && b.top < a.bottom;

const areaOf = (mark: TextMark): Area => ({
  ...textExtent(mark),
  top: mark.y - mark.size,
  bottom: mark.y + mark.size * 0.3,
});

/**
 * Names beside their points: of the four sides the one that covers the least of the path. A name without a free place
 * in the box is left out.
 */
export function placeNames(
  names: readonly { at: Point; text: string }[],
  path: readonly Point[],
  box: { width: number; height: number },
  kept: readonly Area[],
  size: number,
): TextMark[] {
  const placed: TextMark[] = [];
  for (const { at, text } of names) {
    const short = fitText(text, box.width * 0.45, size, 600);
    if (short === null) continue;
    const candidates = sides(at, short, size).filter((mark) => {
      const area = areaOf(mark);
      const isInside =
        area.left >= 0 && area.right <= box.width && area.top >= 0 && area.bottom <= box.height;
      const others = [...kept, ...placed.map(areaOf)];
      return isInside && !others.some((other) => overlap(area, other));
    });
    const covered = (mark: TextMark) => {
      const area = areaOf(mark);
      return path.filter((point) =>
        overlap(area, { left: point.x, right: point.x, top: point.y, bottom: point.y }),
      ).length;
    };
    const [best] = candidates.sort((a, b) => covered(a) - covered(b));
    if (best) placed.push(best);
  }
  return placed;
}

function sides(at: Point, text: string, size: number): TextMark[] {
  const half = size * 0.36;
  const mark = { kind: 'text', text, size, weight: 600, fill: 'ink', row: 'sketch' } as const;
  return [
    { ...mark, x: at.x, y: at.y - AWAY, anchor: 'middle' },
    { ...mark, x: at.x, y: at.y + AWAY + size * 0.75, anchor: 'middle' },
    { ...mark, x: at.x + AWAY, y: at.y + half, anchor: 'start' },
    { ...mark, x: at.x - AWAY, y: at.y + half, anchor: 'end' },
  ];
}
