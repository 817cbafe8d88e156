import { formatAngle } from '../../units/format-angle';
import type { Mark, TextMark } from '../display-list';
import type { Say } from '../../words/create-words';
import { statusMarks } from '../status-shapes';
import type { StripLook } from '../strip-look';
import { textWidth } from '../text-width';

/** The sum of one section, and where it stands, px. */
export interface SectionTotal {
  from: number;
  to: number;
  degrees: number;
  limit: number;
  past: 'over' | 'watch' | null;
}

const GAP = 6;
const GLYPH_GAP = 5;

/**
 * The degrees of every section under its steps: "260°", and "380°, 20° over" after the glyph of its status. Sections past the limit
 * take their room first; a text without room is shortened, then left out.
 */
export function drawTotalsRow(
  totals: readonly SectionTotal[],
  width: number,
  look: StripLook,
  y: number,
  say: Say,
): Mark[] {
  const taken: { left: number; right: number }[] = [];
  const glyph = look.text + 2;
  const order = [...totals].sort((a, b) => Number(b.past !== null) - Number(a.past !== null));
  return order.flatMap((total): Mark[] => {
    const degrees = formatAngle(total.degrees);
    const values = { degrees, over: formatAngle(total.degrees - total.limit) };
    const lead = total.past ? glyph + GLYPH_GAP : 0;
    for (const text of total.past ? [say('strip.over', values), degrees] : [degrees]) {
      const room = lead + textWidth(text, look.text, 600);
      const left = Math.min(
        Math.max((total.from + total.to - room) / 2, look.edge),
        width - look.edge - room,
      );
      const right = left + room;
      const isFree = taken.every((each) => right + GAP <= each.left || each.right + GAP <= left);
      if (left < look.edge || !isFree) continue;
      taken.push({ left, right });
      const mark: TextMark = {
        kind: 'text',
        x: left + lead,
        y,
        text,
        size: look.text,
        weight: 600,
        anchor: 'start',
        fill: 'ink',
        row: 'totals',
      };
      const middle = y - look.text * 0.36;
      return total.past
        ? [...statusMarks(total.past, left + glyph / 2, middle, glyph), mark]
        : [mark];
    }
    return [];
  });
}
