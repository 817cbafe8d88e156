import type { PullAnalysis, PullDirection, PullReason } from '../contracts/run-analysis';
import type { CheckContext } from '../checks/check-context';
import { conductorsOfSection } from '../checks/conductors-of-section';
import { isPullPoint } from '../run/pull-points';
import type { ConductorGroup } from '../run/run-document';
import { conditionsInForce } from './conditions-in-force';
import type { ConditionsInForce } from './conditions-in-force';
import { plannedPulls } from './planned-pulls';
import type { PullSpan } from './planned-pulls';
import { directionFigures, governingLimit } from './pull-direction';
import type { DirectionInput } from './pull-direction';
import { pullMethod } from './pull-method';
import { pullPath, reversePath } from './pull-path';
import { pullSet } from './pull-set';
import type { PullSet } from './pull-set';
import { pullLimits } from './pulling-limits';
import type { PullLimits } from './pulling-limits';
import { refusalOf } from './refusal';

/** A pull with what its checks ask again at other frictions. */
export interface CheckedPull {
  answer: PullAnalysis;
  /** Both directions, where they have figures. */
  inputs: Record<'forward' | 'reverse', DirectionInput> | null;
}

/** Every pull of a run: those planned, and one for each section else. */
export function analyzePulls(context: CheckContext): CheckedPull[] {
  return plannedPulls(context.document, context.expanded).map((span) => analyzePull(context, span));
}

/** One pull through the sections of a span, from both ends. */
export function analyzePull(context: CheckContext, span: PullSpan): CheckedPull {
  const { document, expanded, settings } = context;
  const { pull } = span;
  const sections = expanded.sections.slice(Math.max(0, span.first), span.last + 1);
  const conductors = sections.map((section) => conductorsOfSection(context, section));
  const set: readonly ConductorGroup[] = conductors[0]?.groups ?? [];
  const conditions = conditionsInForce(document, settings, set);
  const limits = set.length > 0 ? pullLimits(set, conditions) : null;
  const sets: (PullSet | PullReason)[] = conductors.map(pullSet);
  const refusal = refusalOf(document, expanded, span);
  const known = sets.filter((each): each is PullSet => typeof each !== 'string');
  const heaviest = [...known].sort((a, b) => b.weightCorrection - a.weightCorrection)[0];
  const noSet = sets.find((each): each is PullReason => typeof each === 'string');
  const way = refusal || noSet ? null : pullPath(expanded, span.first, span.last);
  const reason = refusal?.reason ?? noSet ?? (typeof way === 'string' ? way : null);
  const at = refusal?.at ?? null;

  const bySection = expanded.sections.map((_, index) => known[index - span.first]) as PullSet[];
  const inputs =
    reason === null && way !== null && typeof way !== 'string'
      ? {
          forward: { pieces: way, sets: bySection, feed: conditions.feedTension.from },
          reverse: { pieces: reversePath(way), sets: bySection, feed: conditions.feedTension.to },
        }
      : null;
  const direction = (name: 'forward' | 'reverse'): PullDirection => {
    const [feedAt, pullAt] = name === 'forward' ? [pull.from, pull.to] : [pull.to, pull.from];
    const feed = name === 'forward' ? conditions.feedTension.from : conditions.feedTension.to;
    return inputs && limits
      ? answered(inputs[name], conditions, limits, feedAt, pullAt)
      : unanswered(reason ?? 'no-conductors', at, feedAt, pullAt, feed);
  };
  const forward = direction('forward');
  const reverse = direction('reverse');
  const { recommended, noneBecause } = recommend(context, forward, reverse);
  const asked = pull.feedAt === undefined ? null : pull.feedAt === 'from' ? 'forward' : 'reverse';
  const planned = asked ?? recommended ?? easier(forward, reverse);
  const input = inputs?.[planned] ?? null;
  return {
    inputs,
    answer: {
      id: pull.id,
      from: pull.from,
      to: pull.to,
      through: sections.slice(1).map(({ id }) => id),
      sectionIds: sections.map(({ id }) => id),
      configuration: heaviest?.configuration ?? null,
      weightCorrection: heaviest?.weightCorrection ?? null,
      weight: heaviest?.weight ?? null,
      forward,
      reverse,
      recommended,
      noneBecause,
      planned,
      method: input && limits ? pullMethod(input, conditions.friction, limits) : null,
      limits,
      attachment: conditions.attachment,
      friction: conditions.friction,
      ropeFriction: conditions.ropeFriction,
    },
  };
}

function answered(
  input: DirectionInput,
  conditions: ConditionsInForce,
  limits: PullLimits,
  feedAt: string,
  pullAt: string,
): PullDirection {
  const { friction, ropeFriction } = conditions;
  return {
    status: 'ok',
    reason: null,
    reasonAt: null,
    feedAt,
    pullAt,
    feed: input.feed,
    ...directionFigures(input, friction, ropeFriction, feedAt),
    governing: governingLimit(input, friction, limits),
  };
}

const REFUSED: readonly PullReason[] = [
  'does-not-fit',
  'not-accessible',
  'set-changes',
  'turns-without-sheave',
];

function unanswered(
  reason: PullReason,
  reasonAt: string | null,
  feedAt: string,
  pullAt: string,
  feed: number,
): PullDirection {
  return {
    status: REFUSED.includes(reason) ? 'refused' : 'unknown',
    reason,
    reasonAt,
    feedAt,
    pullAt,
    feed,
    tension: null,
    peak: null,
    holdBack: null,
    peakSidewall: null,
    peakSidewallAt: null,
    governing: null,
    profile: [],
  };
}

/** What is compared, in this order: the next figure decides only where the one before is the same from both ends. */
const COMPARED: readonly ((direction: PullDirection) => number | undefined)[] = [
  ({ tension }) => tension?.likely,
  ({ tension }) => tension?.low,
  ({ tension }) => tension?.high,
  ({ peakSidewall }) => peakSidewall?.likely,
  ({ peakSidewall }) => peakSidewall?.high,
];
/** Figures closer than this share are the same. */
const SAME = 1e-8;

/** By tension, then by sidewall; the first direction where everything is equal. */
function easier(forward: PullDirection, reverse: PullDirection): 'forward' | 'reverse' {
  for (const figure of COMPARED) {
    const [one, other] = [figure(forward) ?? Infinity, figure(reverse) ?? Infinity];
    if (one === other || Math.abs(one - other) <= SAME * Math.max(one, other)) continue;
    return other < one ? 'reverse' : 'forward';
  }
  return 'forward';
}

/**
 * The easier of the directions that can be recommended: one whose cable would run away at low friction never is, nor one with
 * an end where neither people nor the reel can work.
 */
function recommend(
  { document }: CheckContext,
  forward: PullDirection,
  reverse: PullDirection,
): Pick<PullAnalysis, 'recommended' | 'noneBecause'> {
  if (forward.status !== 'ok') return { recommended: null, noneBecause: 'no-answer' };
  const ends = [forward.feedAt, forward.pullAt];
  const isReached = document.path.every(
    (element) => !isPullPoint(element) || !ends.includes(element.id) || element.reach !== false,
  );
  if (!isReached) return { recommended: null, noneBecause: 'no-reach' };
  const holds = ({ holdBack }: PullDirection) => (holdBack?.low ?? 0) > 0;
  if (holds(forward) && holds(reverse)) return { recommended: null, noneBecause: 'hold-back' };
  if (holds(forward)) return { recommended: 'reverse', noneBecause: null };
  if (holds(reverse)) return { recommended: 'forward', noneBecause: null };
  return { recommended: easier(forward, reverse), noneBecause: null };
}
