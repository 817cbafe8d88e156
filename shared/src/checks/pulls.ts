import type { Finding, PullAnalysis, StopLimit } from '../contracts/run-analysis';
import { conductorWeight } from '../run/conductor-weight';
import { analyzePull } from '../pull/analyze-pulls';
import type { CheckedPull } from '../pull/analyze-pulls';
import { frictionWhere, peaksAt } from '../pull/pull-direction';
import { isHarder } from '../pull/pull-method';
import type { CheckContext } from './check-context';

/** Everything there is to say of one pull. */
export function checkPull(context: CheckContext, checked: CheckedPull): Finding[] {
  return [
    ...refused(checked.answer),
    ...inTwo(context, checked.answer),
    ...tension(checked),
    ...sidewall(checked),
    ...ends(checked.answer),
    ...rope(checked.answer),
    ...assumptions(context, checked.answer),
  ];
}

const found = (
  { id, from, to, sectionIds }: PullAnalysis,
  code: Finding['code'],
  severity: Finding['severity'],
  values: Finding['values'],
  elementId?: string,
): Finding => ({
  code,
  severity,
  at: { pullId: id, sectionId: sectionIds[0], ...(elementId !== undefined && { elementId }) },
  values: { ...values, pullFrom: from, pullTo: to },
  rule: null,
});

/** A plan that goes where no pull can go: the place to break it is named. */
function refused(answer: PullAnalysis): Finding[] {
  const { reason, reasonAt } = answer.forward;
  if (reason !== 'set-changes' && reason !== 'turns-without-sheave') return [];
  return [found(answer, `pull-${reason}`, 'stop', {}, reasonAt ?? undefined)];
}

/** The lowest limit on the pull itself, by name. */
export function lowestLimit(limits: NonNullable<PullAnalysis['limits']>): {
  limit: Exclude<StopLimit, 'sidewall'>;
  allowed: number;
} {
  const named = (['conductor', 'attachment', 'puller', 'rope'] as const).flatMap((limit) => {
    const allowed = limits[limit];
    return allowed === null ? [] : [{ limit, allowed }];
  });
  return named.reduce((least, each) => (each.allowed < least.allowed ? each : least));
}

function tension({ answer, inputs }: CheckedPull): Finding[] {
  const { limits, planned } = answer;
  const input = inputs?.[planned];
  const { peak } = answer[planned];
  if (!limits || !peak || !input) return [];
  const { limit, allowed } = lowestLimit(limits);
  const values = { likely: peak.likely, high: peak.high, allowed, limit };
  if (peak.likely > allowed) return [found(answer, 'tension-over', 'stop', values)];
  if (peak.high <= allowed) return [];
  const friction = frictionWhere((mu) => peaksAt(input, mu).tension, allowed);
  return [found(answer, 'tension-over-if-dry', 'caution', { ...values, friction })];
}

/** Past the stop at likely friction; past the caution at likely, or past the stop if dry. */
function sidewall({ answer }: CheckedPull): Finding[] {
  const { limits, planned } = answer;
  const { peakSidewall, peakSidewallAt } = answer[planned];
  if (!limits || !peakSidewall) return [];
  const { caution, stop } = limits.sidewall;
  const values = { likely: peakSidewall.likely, high: peakSidewall.high, caution, stop };
  const at = peakSidewallAt ?? undefined;
  if (peakSidewall.likely > stop) return [found(answer, 'sidewall-over', 'stop', values, at)];
  if (peakSidewall.likely > caution || peakSidewall.high > stop) {
    return [found(answer, 'sidewall-past-caution', 'caution', values, at)];
  }
  return [];
}

/** A pull straight through a box that needs more than its parts would. */
function inTwo(context: CheckContext, answer: PullAnalysis): Finding[] {
  if (answer.through.length === 0 || !answer.method) return [];
  const { sections } = context.expanded;
  const parts = answer.sectionIds.flatMap((id) => {
    const index = sections.findIndex((section) => section.id === id);
    const span = sections[index];
    if (!span) return [];
    const pull = { id, from: span.from.id, to: span.to.id };
    return [analyzePull(context, { pull, first: index, last: index }).answer];
  });
  const methods = parts.flatMap(({ method }) => (method ? [method] : []));
  const { likely, high } = answer.method;
  const harder = (level: 'likely' | 'high', whole: typeof likely) =>
    methods.every((part) => isHarder(whole, part[level]));
  if (methods.length < parts.length || !(harder('likely', likely) || harder('high', high))) {
    return [];
  }
  const worst = parts.reduce((a, b) => (likelyOf(b) > likelyOf(a) ? b : a));
  return [
    found(
      answer,
      'pull-in-two',
      'caution',
      { likely: likelyOf(answer), part: likelyOf(worst), method: worst.method?.likely ?? null },
      answer.through[0],
    ),
  ];
}

const likelyOf = (answer: PullAnalysis): number => answer[answer.planned].peak?.likely ?? 0;

/** No end to feed at, or a feed end that must be held. */
function ends(answer: PullAnalysis): Finding[] {
  if (answer.noneBecause === 'no-reach') return [found(answer, 'pull-no-reach', 'caution', {})];
  const { holdBack, feedAt } = answer[answer.planned];
  if (!holdBack || holdBack.low <= 0) return [];
  return [
    found(
      answer,
      'pull-hold-back',
      'caution',
      { holdBack: holdBack.likely, most: holdBack.low },
      feedAt,
    ),
  ];
}

/** What the figures rest on that nobody gave: the level, and weights no maker publishes. */
function assumptions({ document, expanded }: CheckContext, answer: PullAnalysis): Finding[] {
  if (answer.forward.status !== 'ok') return [];
  const level = expanded.directions === 'assumed-level';
  const estimated = (document.conductors ?? []).filter(
    (group) => conductorWeight(group)?.isEstimated,
  );
  return [
    ...(level ? [found(answer, 'pull-level-assumed', 'note', {})] : []),
    ...(estimated.length > 0
      ? [found(answer, 'weight-estimated', 'note', { weight: answer.weight })]
      : []),
  ];
}

/** A rope breaks before its puller stalls: it should hold four times the puller's rating (a rope maker's guide). */
const ROPE_FACTOR = 4;

function rope(answer: PullAnalysis): Finding[] {
  const { puller, rope: strength } = answer.limits ?? { puller: null, rope: null };
  if (puller === null || strength === null || strength >= ROPE_FACTOR * puller) return [];
  return [
    found(answer, 'rope-too-weak', 'caution', { strength, needed: ROPE_FACTOR * puller, puller }),
  ];
}
