import type { PullAnalysis } from '../contracts/run-analysis';
import type { PlannedPull } from '../run/run-document';

/** What a plan is changed from: the pulls as analysed, in the order of the run. */
export type PullsNow = readonly Pick<PullAnalysis, 'id' | 'from' | 'to' | 'through'>[];
type Plan = readonly PlannedPull[];

const inPlan = (plan: Plan, id: string): PlannedPull | undefined =>
  plan.find((pull) => pull.id === id);

/** Joins a pull with the one after it: straight through the box between them. The way it is fed is asked anew. */
export function joinPulls(plan: Plan, now: PullsNow, pullId: string): PlannedPull[] {
  const index = now.findIndex(({ id }) => id === pullId);
  const [first, second] = [now[index], now[index + 1]];
  if (!first || !second) return [...plan];
  const rest = plan.filter(({ id }) => id !== first.id && id !== second.id);
  return [...rest, { id: first.id, from: first.from, to: second.to }];
}

/** Breaks a pull at a box it goes through; a part that goes through no other box needs no plan. */
export function breakPull(plan: Plan, now: PullsNow, pullId: string, at: string): PlannedPull[] {
  const pull = now.find(({ id }) => id === pullId);
  const place = pull ? pull.through.indexOf(at) : -1;
  if (!pull || place < 0) return [...plan];
  const rest = plan.filter(({ id }) => id !== pullId);
  const before = place > 0 ? [{ id: pull.id, from: pull.from, to: at }] : [];
  const after = place < pull.through.length - 1 ? [{ id: at, from: at, to: pull.to }] : [];
  return [...rest, ...before, ...after];
}

/** Says which end a pull is fed at; null: the recommended one. */
export function feedPullAt(
  plan: Plan,
  now: PullsNow,
  pullId: string,
  feedAt: 'from' | 'to' | null,
): PlannedPull[] {
  const pull = now.find(({ id }) => id === pullId);
  if (!pull) return [...plan];
  const { id, from, to } = inPlan(plan, pullId) ?? pull;
  const rest = plan.filter((each) => each.id !== pullId);
  if (feedAt !== null) return [...rest, { id, from, to, feedAt }];
  return pull.through.length > 0 ? [...rest, { id, from, to }] : rest;
}
