import { isPullPoint } from '../../run/pull-points';
import { axisLabel } from '../axis';
import type { ExpandedRun } from '../../run/expanded-run';
import type { TextMark } from '../display-list';
import type { Say } from '../../words/create-words';
import type { StripLook } from '../strip-look';
import type { StripPlaces } from '../strip-places';
import { fitText, textExtent, textWidth } from '../text-width';
import type { SteepStretch } from './steep-stretches';

const GAP = 8;

/** The names of the pull points and, where there is room between them, how far the run climbs. */
export function drawNamesRow(
  expanded: ExpandedRun,
  places: StripPlaces,
  steep: readonly SteepStretch[],
  look: StripLook,
  y: number,
  say: Say,
): TextMark[] {
  const row = { kind: 'text', y, size: look.text, weight: look.weight, row: 'names' } as const;
  const points = expanded.elements.flatMap(({ element, index }) => {
    const place = places.elements[index];
    return place && isPullPoint(element) ? [{ x: place.from, label: element.label ?? '' }] : [];
  });
  const names = points.flatMap(({ x, label }, index): TextMark[] => {
    const before = points[index - 1];
    const after = points[index + 1];
    const left = before ? (before.x + x) / 2 + GAP / 2 : look.edge;
    const right = after ? (x + after.x) / 2 - GAP / 2 : places.width - look.edge;
    const text = label === '' ? null : fitText(label, right - left, look.text, look.weight);
    if (text === null) return [];
    const half = textWidth(text, look.text, look.weight) / 2;
    const middle = Math.min(Math.max(x, left + half), right - half);
    return [{ ...row, x: middle, text, anchor: 'middle', fill: 'ink' }];
  });
  const taken = names.map(textExtent);
  const climbs = steep.flatMap(({ from, to, rise }): TextMark[] => {
    const height = axisLabel(Math.abs(rise));
    const text = say(rise > 0 ? 'strip.up' : 'strip.down', { height });
    const mark: TextMark = { ...row, x: (from + to) / 2, text, anchor: 'middle', fill: 'ink2' };
    const { left, right } = textExtent(mark);
    const isFree =
      left >= look.edge &&
      right <= places.width - look.edge &&
      taken.every((each) => right + GAP <= each.left || each.right + GAP <= left);
    if (!isFree) return [];
    taken.push({ left, right });
    return [mark];
  });
  return [...names, ...climbs];
}
