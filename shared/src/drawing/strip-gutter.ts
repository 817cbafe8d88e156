import { formatAngle } from '../units/format-angle';
import { axisLabel } from './axis';
import type { DisplayList, TextMark } from './display-list';
import type { DegreesLane } from './lanes/degrees-lane';
import type { Heights } from './lanes/height-lane';
import type { Say } from '../words/create-words';
import type { StripLook } from './strip-look';
import type { StripRows } from './strip-rows';

const RIGHT = 4;

/** Names and limits of the lanes, to the left of the drawing. */
export function drawGutter(options: {
  look: StripLook;
  rows: StripRows;
  lane: DegreesLane;
  limit: number;
  heights: Heights | null;
  say: Say;
}): DisplayList {
  const { look, rows, lane, limit, heights, say } = options;
  const text = (y: number, words: string, isLimit = false): TextMark => ({
    kind: 'text',
    x: look.gutter - RIGHT,
    y,
    text: words,
    size: look.text,
    weight: isLimit ? 600 : 400,
    anchor: 'end',
    fill: isLimit ? 'ink' : 'ink2',
    row: `gutter ${y}`,
  });
  const half = look.text * 0.36;
  const bottom = rows.degrees + look.degrees;
  return {
    width: look.gutter,
    height: rows.bottom,
    marks: [
      text(rows.run + half, say('strip.run')),
      ...(heights
        ? [
            text(rows.height + look.text, say('strip.height')),
            text(rows.height + look.text + 16, axisLabel(heights.highest - heights.lowest), true),
          ]
        : []),
      text(lane.limitY + half, formatAngle(limit), true),
      text(bottom - 17, say('strip.degrees')),
      text(bottom - 1, say('strip.since')),
    ],
  };
}
