import { checkContext } from '../checks/check-context';
import type { PullAnalysis } from '../contracts/run-analysis';
import type { CompanySettings } from '../contracts/settings';
import { degrees } from '../geometry/angles';
import { analyzePull } from '../pull/analyze-pulls';
import { plannedPulls } from '../pull/planned-pulls';
import { pullChain } from '../pull/pull-chain';
import type { DirectionInput } from '../pull/pull-direction';
import type { PullPiece } from '../pull/pull-path';
import { expandRun } from '../run/expand-run';
import type { RunDocument } from '../run/run-document';
import { formatLength } from '../units/format-length';
import { plain } from './explanation';
import type { Explanation, ExplanationInput } from './explanation';

export type Way = 'forward' | 'reverse';
export type Level = 'low' | 'likely' | 'high';

/** What an explanation of a pull is asked about. */
export interface PullQuestion {
  document: RunDocument;
  settings: CompanySettings;
  pull: PullAnalysis;
  way: Way;
  level: Level;
}

const STRAIGHT = 'T₂ = T₁ + W·L·(sin α + f·cos α)';
const LEVEL_BEND = 'T₂ = T₁·cosh fθ + √(T₁² + (W·R)²)·sinh fθ';
const ANY_BEND = 'dT/dψ = W·R·sin α + f·|W·R·z⊥ − T·n|';
const CORNER = 'T₂ = T₁·e^(fθ)';

/**
 * The tension at the puller, piece by piece: the formula of each kind of piece, its numbers, and what it leaves.
 * null where the pull has no figures.
 */
export function explainTension(question: PullQuestion): Explanation | null {
  const asked = inputOf(question);
  if (!asked) return null;
  const { input, friction } = asked;
  const chain = pullChain(input.pieces, input.sets, friction, input.feed);
  const worked = input.pieces.map((piece, index) => {
    const entering = index === 0 ? chain.feed : (chain.tensions[index - 1] ?? 0);
    return workedPiece(piece, input, friction, entering, chain.tensions[index] ?? 0);
  });
  const kinds = new Set(input.pieces.map(formulaOf));
  return {
    title: 'tension',
    exact: `${plain(chain.tensions[chain.tensions.length - 1] ?? chain.feed, 2)} lbf`,
    formula: [...kinds].join('\n'),
    worked: [`T₀ = ${plain(chain.feed, 2)} lbf`, ...worked],
    inputs: inputsOf(question),
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
    formula: `${STRAIGHT}\nT ≥ 0`,
    worked: [`T₀ = ${plain(feed, 2)} lbf ≥ ${plain(input.feed, 2)} lbf`],
    inputs: inputsOf(question),
  };
}

/** The pressure on the worst conductor in the bend of the largest: its share of the tension over the inside radius. */
export function explainSidewall(question: PullQuestion): Explanation | null {
  const asked = inputOf(question);
  if (!asked) return null;
  const { input, friction } = asked;
  const direction = question.pull[question.way];
  const at = direction.peakSidewallAt;
  const { feed, tensions } = pullChain(input.pieces, input.sets, friction, input.feed);
  const index = input.pieces.findIndex(
    ({ elementId, kind }) => elementId === at && kind === 'bend',
  );
  const piece = input.pieces[index];
  const set = piece && input.sets[piece.section];
  if (!piece || piece.kind !== 'bend' || !set) return null;
  const tension = Math.max(index === 0 ? feed : (tensions[index - 1] ?? 0), tensions[index] ?? 0);
  const inside = piece.way.radius - (piece.bearsOn === 'wall' ? set.bore / 24 : 0);
  const pressure = (set.sidewallShare * tension) / inside;
  return {
    title: 'sidewall',
    exact: `${plain(pressure, 2)} lb/ft`,
    formula: `P = ${SHARES[set.configuration]}·T / (R − D/2)`,
    worked: [
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

function inputOf({ document, settings, pull, way, level }: PullQuestion) {
  const context = checkContext(document, expandRun(document, settings), settings);
  const span = plannedPulls(document, context.expanded).find((each) => each.pull.id === pull.id);
  const inputs = span && analyzePull(context, span).inputs;
  return inputs ? { input: inputs[way], friction: pull.friction[level] } : null;
}

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
    return `${from} + ${plain(weight)} × ${plain(length, 2)} × (${plain(rise)} + ${f} × ${cos}) = ${to}`;
  }
  const { angle, radius } = piece.way;
  return `${plain(degrees(angle), 2)}°, R ${formatLength(radius * 12, { to: 16 })}, f ${f}: ${from} → ${to}`;
}

const GIVEN = 'given on the run';

function inputsOf({ document, pull, way, level }: PullQuestion): ExplanationInput[] {
  const { conditions = {} } = document;
  const given = (key: keyof typeof conditions, otherwise: string) =>
    conditions[key] === undefined ? otherwise : GIVEN;
  return [
    {
      what: 'weight',
      value: `${plain(pull.weight ?? 0)} lb/ft`,
      source: 'published weights of building wire, added up',
    },
    {
      what: 'weightCorrection',
      value: plain(pull.weightCorrection ?? 1),
      source: 'from D and d, NEC Chapter 9 Tables 4 and 5',
    },
    {
      what: 'friction',
      value: plain(pull.friction[level]),
      source: given('friction', 'judgement from published ranges'),
    },
    {
      what: 'feed',
      value: `${plain(pull[way].feed, 2)} lbf`,
      source: given('feedTension', 'judgement, no source'),
    },
  ];
}
