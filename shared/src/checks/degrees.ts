import type { Finding, RuleCitation, SectionAnalysis } from '../contracts/run-analysis';
import type { SectionSpan } from '../run/expanded-run';
import { ARTICLES, BEND_SECTIONS, CODE_LIMIT_DEGREES } from '../tables/bend-limits';
import { bendsIn } from './check-context';
import type { CheckContext } from './check-context';
import { countDegrees } from './count-degrees';
import type { DegreeCount } from './count-degrees';
import { articleRule, combinedRule, degreeLimit, isOver, limitsCombined } from './degree-limit';
import type { DegreeLimit } from './degree-limit';

/** Legal, and where many crews stop on big or long pulls. Common practice, no source. */
const CREWS_STOP_AT = 270;

export interface DegreesAnswer {
  section: Pick<
    SectionAnalysis,
    'degrees' | 'strictDegrees' | 'limitDegrees' | 'limitFrom' | 'remainingDegrees' | 'bends'
  >;
  findings: Finding[];
}

interface Judged {
  context: CheckContext;
  span: SectionSpan;
  count: DegreeCount;
  limit: DegreeLimit;
}

/**
 * Degrees of bend between two pull points against the tightest limit, degree by degree as bent. The strict reading
 * never decides. Where a single thing decides (planned flex, a sweep listed as not counting, raceway types
 * that only together pass 360 before the code limited them together) the answer is a caution, not a stop.
 * Example: 90, 90, 90, offset 30, box offset 10 is 350 of 360, 10 left; with the offset at 45 it is 380, 20 over.
 */
export function checkDegrees(context: CheckContext, span: SectionSpan): DegreesAnswer {
  const { elements } = context.expanded;
  const count = countDegrees(
    bendsIn(context, span),
    (bend) => elements[bend.elementIndex]?.element,
  );
  const limit = degreeLimit(context);
  return {
    section: {
      degrees: count.degrees,
      strictDegrees: count.strictDegrees,
      limitDegrees: limit.degrees,
      limitFrom: limit.from,
      remainingDegrees: limit.degrees - count.degrees,
      bends: count.bends,
    },
    findings: findingsFor({ context, span, count, limit }),
  };
}

function findingsFor(judged: Judged): Finding[] {
  const over = overFindings(judged);
  return over.length > 0
    ? [...over, ...editionNotRead(judged)]
    : [...sweepDecides(judged), ...strictOver(judged), ...past270(judged)];
}

/** What makes the count as bent pass the limit; empty where it doesn't. */
function overFindings(judged: Judged): Finding[] {
  const { context, count, limit } = judged;
  const made = count.degrees - count.planned;
  const code = codeReading(judged, made);
  if (code.reading === 'over') return [degreesOver(judged, 'degrees-over', code.rule)];
  const findings: Finding[] = [];
  if (limit.from !== 'code' && isOver(made, limit.degrees)) {
    findings.push(degreesOver(judged, 'degrees-over-own-limit', null));
  }
  if (code.reading === 'only-together') {
    const values = { ...figures(judged), edition: context.edition };
    findings.push(finding(judged, 'degrees-mixed-raceways', 'caution', values, code.rule));
  }
  if (findings.length === 0 && isOver(count.degrees, limit.degrees)) {
    const values = { ...figures(judged), without: made };
    const flex = elementIn(judged, ({ planned }) => planned);
    findings.push(finding(judged, 'degrees-flex-decides', 'caution', values, code.rule, flex));
  }
  return findings;
}

interface CodeReading {
  reading: 'met' | 'over' | 'only-together';
  rule: RuleCitation;
}

/** The code's own limit: each article's bends, and since 2026 all of them together. */
function codeReading({ context, span, count }: Judged, made: number): CodeReading {
  const { edition } = context;
  const [raceway = context.document.raceway] = span.raceways;
  const articles = [...count.byArticle].sort(([, a], [, b]) => b - a);
  const [article, most] = articles[0] ?? [ARTICLES[raceway.type], 0];
  const rule = articleRule(article, edition);
  if (isOver(most + count.turns, CODE_LIMIT_DEGREES)) return { reading: 'over', rule };
  if (!isOver(made, CODE_LIMIT_DEGREES)) return { reading: 'met', rule };
  return limitsCombined(edition)
    ? { reading: 'over', rule: combinedRule() }
    : { reading: 'only-together', rule };
}

function degreesOver(
  judged: Judged,
  code: 'degrees-over' | 'degrees-over-own-limit',
  rule: RuleCitation | null,
): Finding {
  const { count, limit } = judged;
  const crossing = count.bends.find(({ cumulative }) => isOver(cumulative, limit.degrees));
  const values = { ...figures(judged), strict: count.strictDegrees };
  return finding(judged, code, 'stop', values, rule, crossing?.elementId);
}

function sweepDecides(judged: Judged): Finding[] {
  const { count, limit } = judged;
  const withSweep = count.degrees + count.uncounted;
  if (!isOver(withSweep, limit.degrees)) return [];
  const sweep = elementIn(judged, ({ counts }) => !counts);
  const values = { ...figures(judged), with: withSweep };
  return [finding(judged, 'degrees-sweep-decides', 'caution', values, ownRule(judged), sweep)];
}

function strictOver(judged: Judged): Finding[] {
  const { context, count, limit } = judged;
  const { strictReading } = context.settings;
  if (strictReading === 'never' || !isOver(count.strictDegrees, limit.degrees)) return [];
  const severity = strictReading === 'warn' ? 'caution' : 'note';
  const values = { ...figures(judged), strict: count.strictDegrees };
  return [finding(judged, 'degrees-strict-over', severity, values, ownRule(judged))];
}

function past270(judged: Judged): Finding[] {
  if (!isOver(judged.count.degrees, CREWS_STOP_AT)) return [];
  const values = { ...figures(judged), practice: CREWS_STOP_AT };
  return [finding(judged, 'degrees-past-270', 'note', values, null)];
}

/** A rule is cited from the last edition that was read; where that is not the run's own, the answer says so. */
function editionNotRead(judged: Judged): Finding[] {
  const { edition } = judged.context;
  const { read } = BEND_SECTIONS[edition];
  if (read === edition) return [];
  return [finding(judged, 'degrees-edition-not-read', 'note', { edition, read }, null)];
}

function ownRule(judged: Judged): RuleCitation | null {
  const { count, limit } = judged;
  return limit.from === 'code' ? codeReading(judged, count.degrees - count.planned).rule : null;
}

function elementIn(
  { context, span }: Judged,
  isMeant: (bend: { planned: boolean; counts: boolean }) => boolean,
): string | undefined {
  return bendsIn(context, span).find(isMeant)?.elementId;
}

/** The figures every sentence about degrees may need. */
function figures({ count, limit }: Judged): Finding['values'] {
  return {
    degrees: count.degrees,
    limit: limit.degrees,
    over: count.degrees - limit.degrees,
    limitFrom: limit.from,
    source: limit.source,
    codeLimit: CODE_LIMIT_DEGREES,
  };
}

function finding(
  { span }: Judged,
  code: Finding['code'],
  severity: Finding['severity'],
  values: Finding['values'],
  rule: RuleCitation | null,
  elementId?: string,
): Finding {
  const at = { sectionId: span.id, ...(elementId !== undefined && { elementId }) };
  return { code, severity, at, values, rule };
}
