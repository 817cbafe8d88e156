import { checkAccess } from './checks/access';
import { checkBendFitsLeg } from './checks/bend-fits-leg';
import { checkContext } from './checks/check-context';
import type { CheckContext } from './checks/check-context';
import { checkSection } from './checks/check-section';
import { checkDirections } from './checks/directions';
import { checkPull } from './checks/pulls';
import { checkRadius } from './checks/radius';
import { makeVerdicts, worstStatus } from './checks/verdicts';
import type {
  Assumed,
  Finding,
  RunAnalysis,
  SectionAnalysis,
  Severity,
} from './contracts/run-analysis';
import { DEFAULT_SETTINGS } from './contracts/settings';
import type { CompanySettings } from './contracts/settings';
import { analyzePulls } from './pull/analyze-pulls';
import { assumedConditions, conditionsInForce } from './pull/conditions-in-force';
import { assumedValues } from './run/assumed-values';
import { expandRun } from './run/expand-run';
import { InvalidRunError } from './run/invalid-run-error';
import { parseRunDocument } from './run/parse-run-document';
import { isAccessible, isPullPoint } from './run/pull-points';
import type { RunDocument } from './run/run-document';

/** Changes whenever any run could be answered differently; drafts analysed by another version are analysed again. */
export const ENGINE_VERSION = '2.0';

/**
 * Whether a run passes: every check over the expanded run, the sections, and one verdict for each check.
 *
 * It works on its own parsed copy, so nothing but a valid document is ever analysed.
 *
 * @throws InvalidRunError with every problem, for anything that is no valid run document
 */
export function analyzeRun(
  input: RunDocument,
  settings: CompanySettings = DEFAULT_SETTINGS,
): RunAnalysis {
  const context = contextOf(input, settings);
  const { document, expanded } = context;
  const checked = expanded.sections.map((span) => checkSection(context, span));
  const sections = checked.map(({ section }) => section);
  const pulls = analyzePulls(context);
  const findings = worstFirst([
    ...checked.flatMap((each) => each.findings),
    ...pulls.flatMap((pull) => checkPull(context, pull)),
    ...checkAccess(context),
    ...checkRadius(context),
    ...checkBendFitsLeg(context),
    ...checkDirections(context),
  ]);
  const verdicts = makeVerdicts(
    context,
    sections,
    pulls.map(({ answer }) => answer),
    findings,
  );
  return {
    engineVersion: ENGINE_VERSION,
    totals: {
      length: expanded.length,
      degrees: sections.reduce((sum, { degrees }) => sum + degrees, 0),
      sections: sections.length,
      pullPoints: document.path.filter((each) => isPullPoint(each) && isAccessible(each)).length,
    },
    sections,
    pulls: pulls.map(({ answer }) => answer),
    verdicts,
    status: worstStatus(verdicts.map(({ status }) => status)),
    findings,
    assumed: [
      ...assumedValues(document, expanded, settings),
      ...assumedOfPulls(document, settings),
    ],
  };
}

/**
 * The sections of a run as `analyzeRun` answers them, without the pulls: for asking many variants of a run at once.
 *
 * @throws InvalidRunError with every problem, for anything that is no valid run document
 */
export function analyzeSections(
  input: RunDocument,
  settings: CompanySettings = DEFAULT_SETTINGS,
): SectionAnalysis[] {
  const context = contextOf(input, settings);
  return context.expanded.sections.map((span) => checkSection(context, span).section);
}

function contextOf(input: RunDocument, settings: CompanySettings): CheckContext {
  const parsed = parseRunDocument(input);
  if (!parsed.ok) throw new InvalidRunError(parsed.problems);
  const { document } = parsed;
  return checkContext(document, expandRun(document, settings), settings);
}

/** Conditions matter once there is something to pull. */
function assumedOfPulls(document: RunDocument, settings: CompanySettings): Assumed[] {
  const { conductors = [] } = document;
  if (conductors.length === 0) return [];
  return assumedConditions(document, settings, conditionsInForce(document, settings, conductors));
}

const WORST_FIRST: readonly Severity[] = ['stop', 'caution', 'note'];

/** Stops, then cautions, then notes; among equals in the order the checks found them. */
function worstFirst(findings: readonly Finding[]): Finding[] {
  return WORST_FIRST.flatMap((severity) => findings.filter((each) => each.severity === severity));
}
