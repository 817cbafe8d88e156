import { formatAngle } from '../units/format-angle';
import { axisLabel } from './axis';
import type { DisplayList, TextMark } from './display-list';
import type { DegreesLane } from './lanes/degrees-lane';
import { formatLimit } from '../units/format-force';
import type { Heights } from './lanes/height-lane';
import type { TensionLane } from './lanes/tension-lane';
import type { Say } from '../words/create-words';
import type { WordKey } from '../words/word-key';
import type { StripLook } from './strip-look';
import type { StripRows } from './strip-rows';

const RIGHT = 4;
/** Between the baselines of two lines of text, px. */
const LINE = 14;

/** Names and limits of the lanes, to the left of the drawing. */
export function drawGutter(options: {
  look: StripLook;
  rows: StripRows;
  lane: DegreesLane;
  limit: number;
  heights: Heights | null;
  /** null: no pull has an answer. */
  tension: TensionLane | null;
  say: Say;
}): DisplayList {
  const { look, rows, lane, limit, heights, tension, say } = options;
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
  const tensionTexts = ({ limit: named, hands }: TensionLane): TextMark[] => {
    const laneBottom = rows.tension + look.tension;
    const pounds = (lbf: number) => say('strip.pounds', { pounds: formatLimit(lbf) });
    const taken = named ? [named.y + half, named.y + half + LINE] : [];
    const free = (y: number) => taken.every((each) => Math.abs(each - y) >= LINE);
    const texts = named
      ? [
          text(named.y + half, pounds(named.lbf), true),
          text(named.y + half + LINE, say(`findings.pullLimit.${named.name}` as WordKey)),
        ]
      : [];
    for (const hand of hands) {
      const y = hand.y + half;
      if (!free(y) || y > laneBottom - LINE) continue;
      taken.push(y);
      texts.push(text(y, pounds(hand.lbf)));
    }
    if (free(laneBottom)) texts.push(text(laneBottom, say('strip.tension')));
    return [text(rows.pullsBar + half, say('strip.pulls')), ...texts];
  };
  const bottom = rows.degrees + look.degrees;
  return {
    width: look.gutter,
    height: rows.bottom,
    marks: [
      ...(tension ? tensionTexts(tension) : []),
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
