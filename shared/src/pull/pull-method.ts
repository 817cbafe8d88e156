import type { MethodAnswer, PullMethod } from '../contracts/run-analysis';
import { frictionWhere, peaksAt } from './pull-direction';
import type { DirectionInput, Peaks } from './pull-direction';
import type { PullLimits } from './pulling-limits';
import type { Band } from '../contracts/run-analysis';

/** Pulled with one hand, lbf: judgement from published push and pull strengths. */
export const EASY = 25;
/** Past a flip by this much the harder method shows. */
const JUST_PAST = 1e-4;

const HARDER: readonly PullMethod[] = ['easy', 'one', 'two', 'puller', 'not-as-drawn'];

/** True where the first needs more than the second. */
export function isHarder(one: PullMethod, other: PullMethod): boolean {
  return HARDER.indexOf(one) > HARDER.indexOf(other);
}

/**
 * Who pulls, by the most the head feels: to 25 lbf easy by hand, to `handOne` one person, to `handTwo` two people, else a
 * puller; where a stop limit is passed, not as drawn.
 *
 * @example methodFor({ tension: 116, sidewall: 0 }, three 12 AWG) // 'puller'
 */
export function methodFor({ tension, sidewall }: Peaks, limits: PullLimits): PullMethod {
  const { conductor, attachment, puller, rope, handOne, handTwo } = limits;
  const most = Math.min(conductor, attachment, puller ?? Infinity, rope ?? Infinity);
  if (tension > most || sidewall > limits.sidewall.stop) return 'not-as-drawn';
  if (tension <= EASY) return 'easy';
  if (tension <= handOne) return 'one';
  return tension <= handTwo ? 'two' : 'puller';
}

/** The method at likely and at high friction, and the friction that flips it. */
export function pullMethod(
  input: DirectionInput,
  friction: Band,
  limits: PullLimits,
): MethodAnswer {
  const peaks = peaksAt(input, friction.likely);
  const likely = methodFor(peaks, limits);
  const high = methodFor(peaksAt(input, friction.high), limits);
  if (likely === 'not-as-drawn') return { likely, high, flipsAt: null, flipsTo: null };
  const { conductor, attachment, puller, rope, handOne, handTwo, sidewall } = limits;
  const most = Math.min(conductor, attachment, puller ?? Infinity, rope ?? Infinity);
  const next = Math.min(
    ...[EASY, handOne, handTwo, most].filter((bound) => bound >= peaks.tension),
  );
  // From likely up: where the feed must hold back, less friction may pull harder.
  const flips = [
    frictionWhere((mu) => peaksAt(input, mu).tension, next, friction.likely),
    frictionWhere((mu) => peaksAt(input, mu).sidewall, sidewall.stop, friction.likely),
  ].filter((flip): flip is number => flip !== null);
  const flipsAt = flips.length === 0 ? null : Math.min(...flips);
  return {
    likely,
    high,
    flipsAt,
    flipsTo: flipsAt === null ? null : methodFor(peaksAt(input, flipsAt + JUST_PAST), limits),
  };
}
