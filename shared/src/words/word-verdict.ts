import type { CheckName, Verdict } from '../contracts/run-analysis';
import { formatAngle } from '../units/format-angle';
import { pullLimitName, shownFigures } from './figures';
import type { WordingContext } from './figures';
import type { WordKey } from './word-key';

type VerdictKey = Extract<WordKey, `findings.verdict.${string}`>;

/** Which sentence a verdict takes, by its check, status and figures. */
const KEY: Record<CheckName, (verdict: Verdict) => VerdictKey> = {
  degrees: ({ values }) => {
    const remaining = Math.round(Number(values.remaining) * 10);
    if (remaining === 0) return 'findings.verdict.degrees-none';
    return remaining > 0 ? 'findings.verdict.degrees-left' : 'findings.verdict.degrees-over';
  },
  access: ({ status }) =>
    status === 'over' ? 'findings.verdict.access-over' : 'findings.verdict.access-ok',
  fill: ({ values }) => {
    if (typeof values.percent !== 'number') return noConductors(values);
    if (values.limitFrom === 'count') return 'findings.verdict.fill-count';
    return values.byRounding === true ? 'findings.verdict.fill-rounding' : 'findings.verdict.fill';
  },
  jam: ({ status, values }) => {
    if (status === 'no-answer') return noConductors(values);
    return status === 'watch' ? 'findings.verdict.jam-possible' : 'findings.verdict.jam-clear';
  },
  clearance: ({ status, values }) => {
    if (status === 'no-answer') return noConductors(values);
    if (status === 'over') return 'findings.verdict.clearance-over';
    if (typeof values.clearance !== 'number') return 'findings.verdict.clearance-many';
    return status === 'watch' ? 'findings.verdict.clearance-tight' : 'findings.verdict.clearance';
  },
  tension: ({ status, values }) => {
    if (values.reason) return noPull(values);
    if (values.finding === 'pull-in-two') return 'findings.verdict.pull-in-two';
    if (values.finding === 'pull-no-reach') return 'findings.verdict.pull-no-reach';
    if (values.finding === 'pull-hold-back') return 'findings.verdict.pull-hold-back';
    if (values.finding === 'rope-too-weak') return 'findings.verdict.rope-too-weak';
    if (status === 'over') return 'findings.verdict.tension-over';
    return status === 'watch' ? 'findings.verdict.tension-watch' : 'findings.verdict.tension-ok';
  },
  sidewall: ({ status, values }) => {
    if (values.reason) return 'findings.verdict.sidewall-none';
    if (status === 'over') return 'findings.verdict.sidewall-over';
    if (status !== 'watch') return 'findings.verdict.sidewall-ok';
    return Number(values.likely) > Number(values.caution)
      ? 'findings.verdict.sidewall-watch'
      : 'findings.verdict.sidewall-dry';
  },
  radius: ({ status }) => {
    if (status === 'over') return 'findings.verdict.radius-over';
    return status === 'no-answer'
      ? 'findings.verdict.radius-no-answer'
      : 'findings.verdict.radius-ok';
  },
  'bend-fits-leg': ({ status, values }) => {
    if (status === 'over') {
      return values.finding === 'saddle-too-low'
        ? 'findings.verdict.saddle-over'
        : 'findings.verdict.bend-fits-leg-over';
    }
    return status === 'no-answer'
      ? 'findings.verdict.bend-fits-leg-no-answer'
      : 'findings.verdict.bend-fits-leg-ok';
  },
  length: ({ status, values }) => {
    if (status === 'no-answer') return 'findings.verdict.length-no-answer';
    if (typeof values.limit !== 'number') return 'findings.verdict.length-ok';
    return status === 'over' ? 'findings.verdict.length-over' : 'findings.verdict.length-within';
  },
  directions: ({ status, values }) => {
    if (status === 'over') return 'findings.verdict.directions-over';
    if (status === 'no-answer') return 'findings.verdict.directions-no-answer';
    return values.directions === 'assumed-level'
      ? 'findings.verdict.directions-level'
      : 'findings.verdict.directions-ok';
  },
};

const noPull = (values: Verdict['values']): VerdictKey =>
  `findings.verdict.no-pull.${String(values.reason)}` as VerdictKey;

function noConductors(values: Verdict['values']): VerdictKey {
  return values.reason === 'no-size'
    ? 'findings.verdict.no-size'
    : 'findings.verdict.no-conductors';
}

/** Beside the word "Degrees" the figures go without their sign. */
const bare = (angle: string | number): string => String(angle).replace('°', '');

/**
 * One check of the verdict row in words, without its name and status.
 *
 * @example degrees 350 of 360 // "350 of 360, 10 left"
 */
export function wordVerdict(verdict: Verdict, { say, labelOf }: WordingContext): string {
  const place = verdict.elementId ?? verdict.sectionId;
  const words = {
    ...shownFigures(verdict.values, verdict.check),
    place: place === null ? '' : labelOf(place),
    limitName: pullLimitName(verdict.values, say),
  };
  const key = KEY[verdict.check](verdict);
  return verdict.check === 'degrees' ? say(key, degreeFigures(verdict)) : say(key, words);
}

function degreeFigures({ values }: Verdict): Record<string, string> {
  const [degrees, limit, remaining] = [values.degrees, values.limit, values.remaining].map(Number);
  const text = (value = 0) => bare(formatAngle(value));
  return {
    degrees: text(degrees),
    limit: text(limit),
    left: text(Math.max(0, remaining ?? 0)),
    over: text(Math.max(0, -(remaining ?? 0))),
  };
}
