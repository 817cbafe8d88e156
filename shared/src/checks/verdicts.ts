import { CHECKS } from '../contracts/run-analysis';
import type {
  CheckName,
  Finding,
  PullAnalysis,
  RunAnalysis,
  SectionAnalysis,
  Severity,
  Status,
  Verdict,
} from '../contracts/run-analysis';
import type { FindingCode } from '../contracts/finding-codes';
import type { CheckContext } from './check-context';
import { checkPlaces } from './check-places';
import type { CheckPlace } from './check-places';

/** Worst first: what the headline of a run counts. */
const WORST_FIRST: readonly Status[] = ['over', 'watch', 'no-answer', 'ok'];
const STATUS: Record<Severity, Status> = { stop: 'over', caution: 'watch', note: 'ok' };

const CHECK_OF: Record<FindingCode, CheckName> = {
  'degrees-over': 'degrees',
  'degrees-over-own-limit': 'degrees',
  'degrees-past-270': 'degrees',
  'degrees-strict-over': 'degrees',
  'degrees-flex-decides': 'degrees',
  'degrees-sweep-decides': 'degrees',
  'degrees-mixed-raceways': 'degrees',
  'degrees-edition-not-read': 'degrees',
  'access-not-allowed': 'access',
  'fill-over': 'fill',
  'fill-by-rounding': 'fill',
  'fill-nipple': 'fill',
  'fill-seal-over': 'fill',
  'jam-possible': 'jam',
  'clearance-tight': 'clearance',
  'clearance-negative': 'clearance',
  'tension-over': 'tension',
  'tension-over-if-dry': 'tension',
  'sidewall-over': 'sidewall',
  'sidewall-past-caution': 'sidewall',
  'pull-in-two': 'tension',
  'pull-set-changes': 'tension',
  'pull-turns-without-sheave': 'tension',
  'pull-no-reach': 'tension',
  'pull-hold-back': 'tension',
  'pull-level-assumed': 'tension',
  'rope-too-weak': 'tension',
  'weight-estimated': 'tension',
  'radius-too-tight': 'radius',
  'radius-unknown': 'radius',
  'leg-too-short': 'bend-fits-leg',
  'saddle-too-low': 'bend-fits-leg',
  'length-over': 'length',
  'direction-missing': 'directions',
  'direction-parallel': 'directions',
};

/** The check a finding belongs to. */
export function checkOf(code: FindingCode): CheckName {
  return CHECK_OF[code];
}

export function worstStatus(statuses: readonly Status[]): Status {
  return WORST_FIRST.find((status) => statuses.includes(status)) ?? 'ok';
}

/** The status findings give a place: a stop is over, a caution is to watch, a note leaves it OK. */
/** What the degrees of one section count as. */
export function degreesStatus(
  { findings }: Pick<RunAnalysis, 'findings'>,
  sectionId: string,
): Status {
  return statusOf(
    findings.filter(({ code, at }) => checkOf(code) === 'degrees' && at.sectionId === sectionId),
  );
}

export function statusOf(findings: readonly Finding[]): Status {
  return worstStatus(findings.map(({ severity }) => STATUS[severity]));
}

/** One verdict for each check, in the order the row shows them: its worst place. */
export function makeVerdicts(
  context: CheckContext,
  sections: readonly SectionAnalysis[],
  pulls: readonly PullAnalysis[],
  findings: readonly Finding[],
): Verdict[] {
  return CHECKS.map((check) => {
    const own = findings.filter(({ code }) => CHECK_OF[code] === check);
    const [worst] = checkPlaces(check, sections, pulls, context)
      .map((place) => judge(place, own))
      .sort(worseFirst);
    const said = worst?.said;
    return {
      check,
      status: worst?.status ?? 'ok',
      sectionId: worst?.place.sectionId ?? said?.at.sectionId ?? null,
      elementId: said?.at.elementId ?? null,
      values: {
        ...worst?.place.values,
        ...said?.values,
        finding: said?.code ?? null,
        count: own.length,
      },
    };
  });
}

interface Judged {
  place: CheckPlace;
  status: Status;
  /** The finding that speaks for the place. */
  said: Finding | undefined;
}

function judge(place: CheckPlace, findings: readonly Finding[]): Judged {
  const here = findings.filter(
    ({ at }) => place.sectionId === null || at.sectionId === place.sectionId,
  );
  const status = worstStatus([statusOf(here), place.isAnswered ? 'ok' : 'no-answer']);
  const said =
    here.find(({ severity }) => STATUS[severity] === status) ??
    here.find(({ severity }) => severity === 'note');
  return { place, status, said };
}

function worseFirst(a: Judged, b: Judged): number {
  const rank = WORST_FIRST.indexOf(a.status) - WORST_FIRST.indexOf(b.status);
  return rank !== 0 ? rank : b.place.badness - a.place.badness;
}
