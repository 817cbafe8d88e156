import type { Assumed } from '../contracts/run-analysis';
import { DEFAULT_SETTINGS } from '../contracts/settings';
import type { CompanySettings, PullSettings } from '../contracts/settings';
import { WIRE_SIZES } from '../run/run-document';
import type { ConductorGroup, PullConditions, RunDocument, WireSize } from '../run/run-document';

export type Attachment = NonNullable<PullConditions['attachment']>;

/** What a pull reckons with, every value filled in. lbf. */
export interface ConditionsInForce {
  friction: PullSettings['friction'];
  ropeFriction: number;
  crew: PullSettings['crew'];
  /** By the end the cable is fed at. */
  feedTension: { from: number; to: number };
  attachment: Attachment;
  limits: PullSettings['limits'];
}

/** Feed tension, lbf: judgement, no source. */
export const FEED_TENSION = { slack: 1, alone: 5, reel: 50 };
/** From this size on cable comes off a reel. */
const REEL_FROM: WireSize = '1/0';
/** A cable this wide comes off a reel as well: 1/0 AWG THHN is 0.486 in. */
const REEL_FROM_OD = 0.486;
/** Conductors up to this size are tied on; larger ones go in a grip. */
const TIED_UP_TO: WireSize = '8';

const rank = (size: WireSize): number => WIRE_SIZES.indexOf(size);

/** The values of the run, of the company, else the defaults; of limits the tightest. */
export function conditionsInForce(
  { conditions = {} }: RunDocument,
  { pull }: CompanySettings,
  set: readonly ConductorGroup[],
): ConditionsInForce {
  const crew = conditions.crew ?? pull.crew;
  const feed = conditions.feedTension ?? pull.feedTension ?? usualFeed(crew.feeding, set);
  const own = conditions.limits ?? {};
  return {
    friction: conditions.friction ?? pull.friction,
    ropeFriction: conditions.ropeFriction ?? pull.ropeFriction,
    crew,
    feedTension: typeof feed === 'number' ? { from: feed, to: feed } : feed,
    attachment: conditions.attachment ?? pull.attachment ?? usualAttachment(set),
    limits: {
      handOne: tightest(own.handOne, pull.limits.handOne) ?? pull.limits.handOne,
      handTwo: tightest(own.handTwo, pull.limits.handTwo) ?? pull.limits.handTwo,
      puller: tightest(own.puller, pull.limits.puller),
      rope: tightest(own.rope, pull.limits.rope),
      sidewall: {
        caution:
          tightest(own.sidewall?.caution, pull.limits.sidewall.caution) ??
          pull.limits.sidewall.caution,
        stop: tightest(own.sidewall?.stop, pull.limits.sidewall.stop) ?? pull.limits.sidewall.stop,
      },
    },
  };
}

function tightest(...limits: (number | null | undefined)[]): number | null {
  const given = limits.filter((limit): limit is number => typeof limit === 'number');
  return given.length === 0 ? null : Math.min(...given);
}

/** 1 lbf with someone feeding slack, 5 off a cart with nobody feeding, 50 off a reel whoever feeds. */
function usualFeed(feeding: number, set: readonly ConductorGroup[]): number {
  const offReel = set.some((group) =>
    'cable' in group ? group.cable.od >= REEL_FROM_OD : rank(group.size) >= rank(REEL_FROM),
  );
  if (offReel) return FEED_TENSION.reel;
  return feeding > 0 ? FEED_TENSION.slack : FEED_TENSION.alone;
}

function usualAttachment(set: readonly ConductorGroup[]): Attachment {
  const tied = set.every((group) => !('cable' in group) && rank(group.size) <= rank(TIED_UP_TO));
  return tied ? 'tied-head' : 'basket-grip';
}

/** Where the value of a condition comes from when nobody gave one. */
const SOURCES = {
  friction: 'judgement from published ranges: good lubricant, typical, dry',
  ropeFriction: 'judgement, no source',
  crew: 'one feeding and one pulling: common practice, no source',
  feedTension: 'judgement, no source: 1 with someone feeding slack, 5 off a cart, 50 off a reel',
  attachment: 'tied head up to 8 AWG, basket grip above: common practice, no source',
  limits:
    'one person 50 lbf: Eastman Kodak, Ergonomic Design for People at Work; two people 110 lbf: judgement; sidewall 500 and 1000 lb/ft: General Cable, January 2011',
} as const satisfies Partial<Record<keyof ConditionsInForce, string>>;

/** Every condition of the pull nobody gave on the run, with what was taken instead. */
export function assumedConditions(
  { conditions = {} }: RunDocument,
  settings: CompanySettings,
  inForce: ConditionsInForce,
): Assumed[] {
  const keys = Object.keys(SOURCES) as (keyof typeof SOURCES)[];
  return keys
    .filter((key) => conditions[key] === undefined)
    .map((key): Assumed => {
      const isOwn =
        JSON.stringify(settings.pull[key]) !== JSON.stringify(DEFAULT_SETTINGS.pull[key]);
      return {
        path: `/conditions/${key}`,
        value: inForce[key],
        from: isOwn ? 'settings' : 'default',
        source: isOwn ? 'company settings' : SOURCES[key],
      };
    });
}
