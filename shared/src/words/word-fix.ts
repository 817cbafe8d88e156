import type { Fix } from '../contracts/run-analysis';
import { formatAngle } from '../units/format-angle';
import { formatForce } from '../units/format-force';
import { formatLength } from '../units/format-length';
import { formatPercentBeside } from '../units/format-percent';
import type { FixValues } from '../checks/suggest-fixes/fix-values';
import { toInch } from './figures';
import type { WordingContext } from './figures';
import type { Say } from './create-words';

export interface FixWords {
  /** What to do. */
  act: string;
  /** What it gives. */
  result: string;
}

type Wording = {
  [Kind in Fix['kind']]: (values: FixValues[Kind], context: WordingContext) => FixWords;
};

/**
 * A fix in words: the act, and what the run would then read.
 *
 * @example { act: "Offset 9 at 22½°", result: "335°, 25° left" }
 */
export function wordFix(fix: Fix, context: WordingContext): FixWords {
  const word = WORDING[fix.kind] as (values: Fix['values'], context: WordingContext) => FixWords;
  return word(fix.values, context);
}

const WORDING: Wording = {
  'change-angle': (values, { say, labelOf }) => ({
    act: say('findings.fix.change-angle', {
      piece: capital(numbered(values.piece, values.number, values.elementId, say, labelOf)),
      angle: formatAngle(values.angle),
    }),
    result: degreesLeft(values.degrees, values.remaining, say),
  }),
  'add-pull-point': (values, { say }) => ({
    act: pullPointAct(values, say),
    result: two(values, say),
  }),
  'make-accessible': (values, { say, labelOf }) => ({
    act: say('findings.fix.make-accessible', { name: values.name ?? labelOf(values.elementId) }),
    result: say('findings.result.reach', halves(values)),
  }),
  'break-pull': ({ elementId, first, second }, { say, labelOf }) => ({
    act: say('findings.fix.break-pull', { place: labelOf(elementId) }),
    result:
      first === null || second === null
        ? say('findings.result.two-pulls')
        : say('findings.result.pounds', {
            first: formatForce(first),
            second: formatForce(second),
          }),
  }),
  'larger-raceway': (values, { say }) => ({
    act: say('findings.fix.larger-raceway', { tradeSize: values.tradeSize, raceway: values.type }),
    result: racewayResult(values, say),
  }),
  'longer-leg': ({ length, added }, { say }) => ({
    act: say('findings.fix.longer-leg', { length: formatLength(length, { to: 16 }) }),
    result: say('findings.result.longer', { added: formatLength(added, { to: 16 }) }),
  }),
  'larger-radius': ({ radius }, { say }) => ({
    act:
      radius === null
        ? say('findings.fix.larger-radius-table')
        : say('findings.fix.larger-radius', { radius: formatLength(radius, { to: 16 }) }),
    result: say('findings.result.fits'),
  }),
};

function numbered(
  piece: FixValues['change-angle']['piece'],
  number: number,
  elementId: string,
  say: Say,
  labelOf: (elementId: string) => string,
): string {
  if (!Number.isFinite(number)) return labelOf(elementId);
  return say('edits.numbered', { word: say(`edits.piece.${piece}`), number });
}

const capital = (text: string): string => text.charAt(0).toUpperCase() + text.slice(1);

function degreesLeft(degrees: number, remaining: number, say: Say): string {
  const shown = formatAngle(degrees);
  if (remaining === 0) return say('findings.result.none', { degrees: shown });
  return say('findings.result.left', { degrees: shown, left: formatAngle(remaining) });
}

/** Where the box may stand: a place along the pipe, or between two pieces where no lengths were given. */
function pullPointAct(values: FixValues['add-pull-point'], say: Say): string {
  const { lengths, from, to, afterNumber, beforeNumber } = values;
  if (!lengths && afterNumber !== null && beforeNumber !== null) {
    return say('findings.fix.add-pull-point-between', { after: afterNumber, before: beforeNumber });
  }
  const [first, last] = [toInch(from), toInch(to)];
  return say('findings.fix.add-pull-point', {
    station: first === last ? first : `${first} – ${last}`,
  });
}

const halves = ({
  degreesBefore,
  degreesAfter,
}: {
  degreesBefore: number;
  degreesAfter: number;
}) => ({
  first: formatAngle(degreesBefore),
  second: formatAngle(degreesAfter),
});

const two = (values: FixValues['add-pull-point'], say: Say): string =>
  say('findings.result.two', halves(values));

function racewayResult(values: FixValues['larger-raceway'], say: Say): string {
  const { percent, limitPercent, jamRatio } = values;
  if (jamRatio !== null) return say('findings.result.ratio', { ratio: jamRatio.toFixed(2) });
  if (percent === null || limitPercent === null) return say('findings.result.fits');
  return say('findings.result.fill', {
    percentOfLimit: formatPercentBeside(percent, limitPercent),
  });
}
