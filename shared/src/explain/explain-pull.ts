import { degrees } from '../geometry/angles';
import { pullChain } from '../pull/pull-chain';
import { peaksAt, sidewallOf } from '../pull/pull-direction';
import type { DirectionInput } from '../pull/pull-direction';
import { EASY } from '../pull/pull-method';
import type { PullPiece } from '../pull/pull-path';
import { forceStep } from '../units/format-force';
import { formatLength } from '../units/format-length';
import { plain } from './explanation';
import type { Explanation } from './explanation';
import { givenOr, inputOf, inputsOf, walkOf } from './pull-question';
import type { PullQuestion, Until } from './pull-question';

const OWN = 'given on the run or by the company; judgement from published push and pull strengths';

const STRAIGHT = 'T₂ = T₁ + W·L·(sin α + f·cos α)';
const LEVEL_BEND = 'T₂ = T₁·cosh fθ + √(T₁² + (W·R)²)·sinh fθ';
const ANY_BEND = 'dT/dψ = W·R·sin α + f·|W·R·q − T·n|';
const CORNER = 'T₂ = T₁·e^(fθ)';

/**
 * The tension where the head leaves a piece, else at the puller, piece by piece: the formula of each kind of piece, its
 * numbers, and what it leaves. null where the pull has no figures.
 */
export function explainTension(question: PullQuestion, until?: Until): Explanation | null {
  const walked = walkOf(question, until);
  if (!walked) return null;
  const { input, friction, feed, tensions, pieces, tension } = walked;
  const worked = pieces.map((piece, index) =>
    workedPiece(piece, input, friction, tensions[index - 1] ?? feed, tensions[index] ?? 0),
  );
  return {
    title: until === undefined ? 'tension' : 'tensionHere',
    exact: `${plain(tension, 2)} lbf`,
    shownTo: `${forceStep(tension)} lb`,
    formula: [...new Set(pieces.map(formulaOf))].join('\n'),
    worked: [`T₀ = ${plain(feed, 2)} lbf`, ...worked],
    inputs: [...inputsOf(question), ...(pieces.some(isSolved) ? [AXES] : [])],
  };
}

/** What a gauge at the puller reads while the head leaves a piece: the rope drags in the bends still ahead. */
export function explainGauge(question: PullQuestion, until: Until): Explanation | null {
  const walked = walkOf(question, until);
  if (!walked) return null;
  const { input, pieces, tension } = walked;
  const ahead = input.pieces
    .slice(pieces.length)
    .reduce((sum, piece) => sum + (piece.kind === 'bend' ? piece.way.angle : 0), 0);
  const { ropeFriction } = question.pull;
  const reading = tension * Math.exp(ropeFriction * ahead);
  return {
    title: 'gauge',
    exact: `${plain(reading, 2)} lbf`,
    shownTo: `${forceStep(reading)} lb`,
    formula: 'G = T·e^(µθ), θ of the bends ahead',
    worked: [
      `${plain(tension, 4)} × e^(${plain(ropeFriction)} × ${plain(ahead)}) = ${plain(reading, 2)} lbf`,
    ],
    inputs: [
      {
        what: 'ropeFriction',
        value: plain(ropeFriction),
        source: givenOr(question, 'ropeFriction', 'judgement, no source'),
      },
    ],
  };
}

/** Who pulls: what the head feels at typical friction and if dry, against what one and two people pull and what gives first. */
export function explainMethod(question: PullQuestion): Explanation | null {
  const { pull, way } = question;
  const { limits, method } = pull;
  const peak = pull[way].peak;
  const asked = inputOf(question);
  if (!limits || !method || !peak || !asked) return null;
  const { conductor, attachment, puller, rope, handOne, handTwo } = limits;
  const lowest = Math.min(conductor, attachment, puller ?? Infinity, rope ?? Infinity);
  const at = (friction: number) =>
    `µ ${plain(friction)}: ${plain(peaksAt(asked.input, friction).tension, 2)} lbf`;
  return {
    title: 'method',
    exact: `${plain(peak.likely, 2)} lbf`,
    shownTo: `${forceStep(peak.likely, lowest)} lb`,
    formula: 'max T',
    worked: [
      at(pull.friction.likely),
      ...(method.flipsAt === null ? [] : [at(method.flipsAt)]),
      at(pull.friction.high),
    ],
    inputs: [
      { what: 'easy', value: `${EASY} lbf`, source: 'judgement, no source' },
      { what: 'handOne', value: `${plain(handOne)} lbf`, source: OWN },
      { what: 'handTwo', value: `${plain(handTwo)} lbf`, source: OWN },
      {
        what: 'limit',
        value: `${plain(lowest, 2)} lbf`,
        source: 'the lowest stop limit of the pull',
      },
      ...inputsOf(question),
    ],
  };
}

/** The force to hold at the feed so that the cable stays taut: walked back from the puller, never below nothing. */
export function explainHoldBack(question: PullQuestion): Explanation | null {
  const asked = inputOf(question);
  if (!asked) return null;
  const { input, friction } = asked;
  const { feed, holdBack } = pullChain(input.pieces, input.sets, friction, input.feed);
  return {
    title: 'holdBack',
    exact: `${plain(holdBack, 2)} lbf`,
    shownTo: `${forceStep(holdBack)} lb`,
    formula: `${STRAIGHT}\nT ≥ 0`,
    worked: [`T₀ = ${plain(feed, 2)} lbf ≥ ${plain(input.feed, 2)} lbf`],
    inputs: inputsOf(question),
  };
}

/**
 * The pressure on the worst conductor, in the bend of the largest or at a point of the profile: its share of the tension over
 * the inside radius.
 */
export function explainSidewall(question: PullQuestion, point?: number): Explanation | null {
  const asked = inputOf(question);
  if (!asked) return null;
  const { input, friction } = asked;
  const { profile, peakSidewall } = question.pull[question.way];
  const { feed, tensions } = pullChain(input.pieces, input.sets, friction, input.feed);
  // The profile has one point before the first piece.
  const worst = peakSidewall?.[question.level];
  const ofWorst = profile.findIndex(({ sidewall }) => sidewall?.[question.level] === worst);
  const index = (point ?? ofWorst) - 1;
  const piece = input.pieces[index];
  const set = piece && input.sets[piece.section];
  if (!piece || piece.kind !== 'bend' || !set) return null;
  const [entering, leaving] = [tensions[index - 1] ?? feed, tensions[index] ?? 0];
  const tension = Math.max(entering, leaving);
  const inside = piece.way.radius - (piece.bearsOn === 'wall' ? set.bore / 24 : 0);
  const pressure = sidewallOf(piece, set, entering, leaving);
  return {
    title: 'sidewall',
    exact: `${plain(pressure, 2)} lb/ft`,
    shownTo: `${forceStep(pressure, question.pull.limits?.sidewall.stop ?? null)} lb/ft`,
    formula: `P = ${SHARES[set.configuration]}·T / (R − D/2)`,
    // A radius within the bore is no bend; the check of the radius says so.
    worked:
      inside <= 0
        ? [`R − D/2 = ${plain(inside)} ft`]
        : [
            `P = ${plain(set.sidewallShare)} × ${plain(tension, 2)} / ${plain(inside)} = ${plain(pressure, 2)} lb/ft`,
          ],
    inputs: [
      ...inputsOf(question),
      {
        what: 'radius',
        value: `${plain(piece.way.radius * 12, 3)} in`,
        source: 'to the centre line',
      },
      { what: 'bore', value: `${plain(set.bore, 3)} in`, source: 'NEC Chapter 9 Table 4' },
    ],
  };
}

/** The part of T/R that presses on the worst conductor, by configuration. */
const SHARES = {
  single: '1',
  two: '(w/2)',
  triangular: '(w/2)',
  cradled: '(3w − 2)/3',
  diamond: 'max(w − 1, ½)',
  complex: '(w/2)',
} as const;

/** A bend in a plane of no closed form on the level: its equation is solved step by step. */
const isSolved = (piece: PullPiece): boolean => formulaOf(piece) === ANY_BEND;
const AXES = {
  what: 'axes',
  value: '',
  source: 'q upright across the pipe, n toward the centre of the bend; solved along ψ from 0 to θ',
};

function formulaOf(piece: PullPiece): string {
  if (piece.kind === 'straight') return STRAIGHT;
  if (piece.way.radius === 0) return CORNER;
  return piece.way.headingUp === 0 && piece.way.normalUp === 0 ? LEVEL_BEND : ANY_BEND;
}

/** "120 in straight: 0 + 5.149 × 10 × (0 + 0.4226 × 1) = 21.76 lbf". */
function workedPiece(
  piece: PullPiece,
  { sets }: DirectionInput,
  friction: number,
  entering: number,
  leaving: number,
): string {
  const set = sets[piece.section];
  const weight = set?.weight ?? 0;
  const f = plain(friction * (set?.weightCorrection ?? 1));
  const [from, to] = [plain(entering, 2), plain(leaving, 2)];
  if (piece.kind === 'straight') {
    const { length, rise, run } = piece.way;
    const cos = plain(run);
    return `${from} + ${plain(weight)} × ${plain(length)} × (${plain(rise)} + ${f} × ${cos}) = ${to}`;
  }
  const { angle, radius } = piece.way;
  return `${plain(degrees(angle), 2)}°, R ${formatLength(radius * 12, { to: 16 })}, f ${f}: ${from} → ${to}`;
}
