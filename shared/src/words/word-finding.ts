import type { CodeEdition } from '../run/run-document';
import type { Finding, RuleCitation } from '../contracts/run-analysis';
import { checkOf } from '../checks/verdicts';
import { pullLimitName, shownFigures } from './figures';
import type { WordingContext } from './figures';
import type { Say } from './create-words';
import type { WordKey } from './word-key';

export interface FindingWords {
  title: string;
  body: string;
  /** The rule behind it, "NEC 2023, 358.24(B)"; empty where no rule stands behind it. */
  rule: string;
}

/** "NEC-2023" → "2023". */
export const yearOf = (edition: CodeEdition): string => edition.slice(-4);

/** Findings that read otherwise where one of their figures says so. */
function variantOf({ code, values }: Finding): string {
  if (code === 'fill-over' && values.limitFrom === 'count') return 'fill-over-count';
  if (code === 'leg-too-short' && values.inside === true) return 'leg-too-short-inside';
  return code;
}

/**
 * A finding in words.
 *
 * @example 380 of 360 → { title: "380° since JB-4, 20° over", body: "Limit 360° between …", rule: "NEC 2023, 358.24(B)" }
 */
export function wordFinding(finding: Finding, context: WordingContext): FindingWords {
  const { say, labelOf } = context;
  const { at, values } = finding;
  const place = at.elementId ?? at.sectionId;
  const words = {
    ...shownFigures(values, checkOf(finding.code)),
    place: place === undefined ? '' : labelOf(place),
    ...pullEnds(finding, labelOf),
    section: at.sectionId === undefined ? '' : labelOf(at.sectionId),
    limitName: limitName(finding, say),
    minimumName: minimumName(finding, say),
    ...years(finding),
  };
  const variant = variantOf(finding);
  return {
    title: say(`findings.title.${variant}` as WordKey, words),
    body: say(`findings.body.${variant}` as WordKey, words),
    rule: finding.rule ? wordRule(finding.rule, say) : '',
  };
}

function pullEnds(
  { values: { pullFrom, pullTo } }: Finding,
  labelOf: WordingContext['labelOf'],
): Record<string, string> {
  return typeof pullFrom === 'string' && typeof pullTo === 'string'
    ? { from: labelOf(pullFrom), to: labelOf(pullTo) }
    : {};
}

export function wordRule({ cite, edition, source }: RuleCitation, say: Say): string {
  if (edition === null) return `${source} ${cite}`.trim();
  return say('findings.rule', { year: yearOf(edition), cite });
}

/** A limit by its own name: a specification's section where one was given. */
function limitName({ values }: Finding, say: Say): string {
  const { source, limitFrom } = values;
  if (typeof source === 'string' && source !== '') return source;
  return typeof limitFrom === 'string' && limitFrom !== 'count'
    ? say(`findings.limitFrom.${limitFrom}` as WordKey)
    : pullLimitName(values, say);
}

function minimumName({ values }: Finding, say: Say): string {
  const { minimumFrom, source } = values;
  if (typeof source === 'string' && source !== '') return source;
  return typeof minimumFrom === 'string'
    ? say(`findings.minimumFrom.${minimumFrom}` as WordKey)
    : '';
}

function years({ values }: Finding): Record<string, string> {
  const { edition, read } = values;
  return {
    ...(typeof edition === 'string' && { year: yearOf(edition as CodeEdition) }),
    ...(typeof read === 'string' && { readYear: yearOf(read as CodeEdition) }),
  };
}
