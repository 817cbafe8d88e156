import type { Mark, TextMark } from '../display-list';
import { line } from '../display-list';
import type { Say } from '../../words/create-words';
import type { WordKey } from '../../words/word-key';
import { formatForce } from '../../units/format-force';
import type { StripLook } from '../strip-look';
import type { StripPull } from '../strip-pulls';
import { textExtent, textWidth } from '../text-width';

const CIRCLE = 5;
const ARROW = 8;
const GAP = 8;

/** One bar a pull: open circle at the feed, arrowhead at the puller, dashed circle at a box pulled straight through. */
export function drawPullsRow(
  pulls: readonly StripPull[],
  width: number,
  look: StripLook,
  rows: { text: number; bar: number },
  words: { say: Say; labelOf: (id: string) => string },
): Mark[] {
  const pen = { stroke: 'ink', strokeWidth: look.pen } as const;
  const bars = pulls.flatMap(({ feedX, pullX, through }): Mark[] => {
    const way = pullX >= feedX ? 1 : -1;
    const y = rows.bar;
    return [
      line(feedX + way * CIRCLE, y, pullX - way * ARROW, y, pen),
      { kind: 'circle', x: feedX, y, radius: CIRCLE, fill: 'surface', ...pen },
      {
        kind: 'polyline',
        points: [
          { x: pullX, y },
          { x: pullX - way * ARROW, y: y - CIRCLE },
          { x: pullX - way * ARROW, y: y + CIRCLE },
        ],
        closed: true,
        fill: 'ink',
      },
      ...through.map(({ x }): Mark => ({
        kind: 'circle',
        x,
        y,
        radius: CIRCLE,
        fill: 'surface',
        dash: [3, 2],
        ...pen,
      })),
    ];
  });
  const taken: { left: number; right: number }[] = [];
  const texts = pulls.flatMap((pull): TextMark[] => {
    for (const text of wordsOf(pull, words)) {
      const half = textWidth(text, look.text, 600) / 2;
      const middle = Math.min(
        Math.max((pull.fromX + pull.toX) / 2, look.edge + half),
        width - look.edge - half,
      );
      const mark: TextMark = {
        kind: 'text',
        x: middle,
        y: rows.text,
        text,
        size: look.text,
        weight: 600,
        anchor: 'middle',
        fill: 'ink',
        row: 'pulls',
      };
      const { left, right } = textExtent(mark);
      const isFree = taken.every((each) => right + GAP <= each.left || each.right + GAP <= left);
      const fits = left >= look.edge - 0.01 && right <= width - look.edge + 0.01;
      const isOwn = 2 * half <= Math.abs(pull.toX - pull.fromX) || pulls.length === 1;
      if (!isFree || !fits || !isOwn) continue;
      taken.push({ left, right });
      return [mark];
    }
    return [];
  });
  return [...bars, ...texts];
}

/** What may be said of a pull, longest first. */
function wordsOf(
  pull: StripPull,
  { say, labelOf }: { say: Say; labelOf: (id: string) => string },
): string[] {
  const feed = labelOf(pull.feedAt);
  const end = pull.points[pull.points.length - 1];
  if (!end) {
    const reason = say(`findings.verdict.no-pull.${pull.reason ?? 'no-conductors'}` as WordKey);
    return [say('strip.noAnswer', { reason }), say('strip.noAnswerShort')];
  }
  const pounds = formatForce(end.likely, pull.limit?.lbf ?? null);
  const held =
    pull.holdBack > 0 ? say('strip.holdBack', { pounds: formatForce(pull.holdBack) }) : '';
  const ends = say('strip.pullEnds', { feed, pull: labelOf(pull.pullAt) });
  const typical = say('strip.typical', { pounds });
  const short = say('strip.pounds', { pounds });
  return [
    [ends, held, typical].filter(Boolean).join(' · '),
    [held, typical].filter(Boolean).join(' · '),
    ...(held ? [held] : []),
    typical,
    short,
  ];
}
