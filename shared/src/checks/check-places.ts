import type { CheckName, PullAnalysis, SectionAnalysis, Verdict } from '../contracts/run-analysis';
import type { CheckContext } from './check-context';
import { lowestLimit } from './pulls';
import { lengthLimit } from './section-length';

/** A place a check looked at, before its findings are read. */
export interface CheckPlace {
  /** null: the run as a whole. */
  sectionId: string | null;
  /** False where the run does not say what the check needs. */
  isAnswered: boolean;
  /** Among places of one status the largest is the worst. */
  badness: number;
  /** The figures the words need. */
  values: Verdict['values'];
}

type SectionPlace = (
  section: SectionAnalysis,
  context: CheckContext,
) => Omit<CheckPlace, 'sectionId'>;

/** Checks that answer for each section. */
const BY_SECTION: Partial<Record<CheckName, SectionPlace>> = {
  degrees: (section) => ({
    isAnswered: true,
    badness: -section.remainingDegrees,
    values: {
      degrees: section.degrees,
      limit: section.limitDegrees,
      remaining: section.remainingDegrees,
      strict: section.strictDegrees,
      limitFrom: section.limitFrom,
    },
  }),
  fill: ({ fill, noFill }) => ({
    isAnswered: fill !== null,
    badness: fill ? fill.percent - fill.limitPercent : 0,
    values: fill
      ? {
          percent: fill.percent,
          limitPercent: fill.limitPercent,
          conductors: fill.conductors,
          byRounding: fill.byRounding,
          nipple: fill.nipple,
        }
      : unanswered(noFill),
  }),
  jam: ({ jam, noFill }) => ({
    isAnswered: noFill === null,
    badness: jam ? 1 : 0,
    values: jam ? { ratio: jam.ratio, ratioWithOvality: jam.ratioWithOvality } : unanswered(noFill),
  }),
  clearance: ({ clearance, noFill }) => ({
    isAnswered: noFill === null,
    badness: -(clearance ?? 0),
    values: { clearance, reason: noFill },
  }),
  length: ({ length }, context) => {
    const limit = lengthLimit(context);
    return {
      isAnswered: limit === null || length !== null,
      badness: length ?? 0,
      values: {
        length,
        limit: limit?.length ?? null,
        limitFrom: limit?.from ?? null,
        source: limit?.source ?? null,
      },
    };
  },
};

/** Why a check of the conductors has nothing to say. */
function unanswered(reason: SectionAnalysis['noFill']): Verdict['values'] {
  return { reason };
}

/** What the other checks need to have an answer for the run as a whole. */
function isRunAnswered(check: CheckName, { expanded }: CheckContext): boolean {
  switch (check) {
    case 'radius':
      return expanded.bends.every(({ radius, planned }) => radius !== null || planned);
    case 'bend-fits-leg':
      return expanded.length !== null || expanded.legs.every(({ tangents }) => tangents === 0);
    case 'directions':
      return expanded.directionProblems.every(({ problem }) => problem !== 'missing');
    default:
      return true;
  }
}

type PullPlace = (pull: PullAnalysis) => Omit<CheckPlace, 'sectionId'>;

/** Checks that answer for each pull; a pull is told by the section it begins in. */
const BY_PULL: Partial<Record<CheckName, PullPlace>> = {
  tension: (pull) => {
    const { peak, governing, reason } = pull[pull.planned];
    const lowest = pull.limits && lowestLimit(pull.limits);
    return {
      isAnswered: peak !== null,
      badness: governing?.ratio ?? 0,
      values: peak
        ? {
            likely: peak.likely,
            high: peak.high,
            allowed: lowest?.allowed ?? null,
            limit: lowest?.limit ?? null,
            method: pull.method?.likely ?? null,
          }
        : because(reason),
    };
  },
  sidewall: (pull) => {
    const { peakSidewall, reason } = pull[pull.planned];
    return {
      isAnswered: peakSidewall !== null,
      badness: peakSidewall?.likely ?? 0,
      values: peakSidewall
        ? {
            likely: peakSidewall.likely,
            high: peakSidewall.high,
            caution: pull.limits?.sidewall.caution ?? null,
            stop: pull.limits?.sidewall.stop ?? null,
          }
        : because(reason),
    };
  },
};

/** Why a pull has no figures. */
function because(reason: PullAnalysis['forward']['reason']): Verdict['values'] {
  return { reason };
}

/** Where a check looked: each section, each pull, or the run as a whole. */
export function checkPlaces(
  check: CheckName,
  sections: readonly SectionAnalysis[],
  pulls: readonly PullAnalysis[],
  context: CheckContext,
): CheckPlace[] {
  const bySection = BY_SECTION[check];
  if (bySection) {
    return sections.map((section) => ({ sectionId: section.id, ...bySection(section, context) }));
  }
  const byPull = BY_PULL[check];
  if (byPull) {
    return pulls.map((pull) => ({ sectionId: pull.sectionIds[0] ?? null, ...byPull(pull) }));
  }
  const values: Verdict['values'] =
    check === 'directions' ? { directions: context.expanded.directions } : {};
  return [{ sectionId: null, isAnswered: isRunAnswered(check, context), badness: 0, values }];
}
