import { analyzeRun } from '../../analyze-run';
import type { CompanySettings } from '../../contracts/settings';
import type { Finding, Fix, RunAnalysis, SectionAnalysis } from '../../contracts/run-analysis';
import { applyCommands } from '../../run/commands/apply-command';
import { CommandError } from '../../run/commands/command-error';
import { expandRun } from '../../run/expand-run';
import type { ExpandedRun } from '../../run/expanded-run';
import { InvalidRunError } from '../../run/invalid-run-error';
import type { RunCommand } from '../../run/run-command';
import type { RunDocument } from '../../run/run-document';
import type { FixValues } from './fix-values';

/** What the makers of candidates read: the run as it is. */
export interface FixContext {
  document: RunDocument;
  analysis: RunAnalysis;
  expanded: ExpandedRun;
  settings: CompanySettings;
}

/** The run as it would be, and its sections that came out of the one the finding is in. */
export interface Outcome {
  document: RunDocument;
  analysis: RunAnalysis;
  sections: SectionAnalysis[];
}

/** A change that may answer a finding; nobody has tried it yet. */
export interface Candidate<K extends Fix['kind'] = Fix['kind']> {
  kind: K;
  commands: RunCommand[];
  /** null: tried, and it is no answer after all. */
  values: (outcome: Outcome) => FixValues[K] | null;
}

export interface TriedFix {
  fix: Fix;
  /** What would still be wrong with the run. */
  stops: number;
  cautions: number;
}

/** Findings about a whole section; all others are about one piece. */
const OF_SECTION = /^(degrees|fill|jam|clearance|length|tension|sidewall|pull)-/;

/**
 * Carries a candidate out and analyses the run again. null unless the finding is gone and no stop came in its place; what
 * the fix says of itself is read from that second analysis.
 */
export function tryCandidate(
  context: FixContext,
  finding: Finding,
  candidate: Candidate,
): TriedFix | null {
  const outcome = carryOut(context, finding, candidate.commands);
  if (!outcome) return null;
  const before = places(context.analysis.findings, context, finding);
  const after = places(outcome.analysis.findings, context, finding);
  const isGone = !after.has(placeOf(finding, context, finding));
  const addsStop = [...after].some(([place, stops]) => stops > (before.get(place) ?? 0));
  if (!isGone || addsStop) return null;
  const values = candidate.values(outcome);
  if (!values) return null;
  const { findings } = outcome.analysis;
  return {
    fix: {
      kind: candidate.kind,
      commands: candidate.commands,
      values: { ...values },
      delta: deltaOf(context, finding, outcome),
    },
    stops: findings.filter(({ severity }) => severity === 'stop').length,
    cautions: findings.filter(({ severity }) => severity === 'caution').length,
  };
}

function carryOut(context: FixContext, finding: Finding, commands: RunCommand[]): Outcome | null {
  try {
    const document = applyCommands(context.document, commands);
    const analysis = analyzeRun(document, context.settings);
    const isOld = new Set(context.analysis.sections.map(({ id }) => id));
    const sections = analysis.sections.filter(
      ({ id }) => id === finding.at.sectionId || !isOld.has(id),
    );
    return { document, analysis, sections };
  } catch (error) {
    if (error instanceof CommandError || error instanceof InvalidRunError) return null;
    throw error;
  }
}

/**
 * How many stops there are at each place; a place without a stop but with another finding counts 0. A section that is cut
 * says the same of each part: that is one stop, not two.
 */
function places(
  findings: readonly Finding[],
  context: FixContext,
  origin: Finding,
): Map<string, number> {
  const counts = new Map<string, number>();
  for (const finding of findings) {
    const place = placeOf(finding, context, origin);
    const stops = (counts.get(place) ?? 0) + (finding.severity === 'stop' ? 1 : 0);
    counts.set(place, OF_SECTION.test(finding.code) ? Math.min(stops, 1) : stops);
  }
  return counts;
}

/** A section that a new pull point cut off still counts as the one it was cut from. */
function placeOf({ code, at }: Finding, { analysis }: FixContext, origin: Finding): string {
  if (!OF_SECTION.test(code)) return `${code} ${at.elementId ?? ''}`;
  const isOld = analysis.sections.some(({ id }) => id === at.sectionId);
  return `${code} ${(isOld ? at.sectionId : origin.at.sectionId) ?? ''}`;
}

function deltaOf({ analysis }: FixContext, { at }: Finding, outcome: Outcome): Fix['delta'] {
  const section = analysis.sections.find(({ id }) => id === at.sectionId);
  const worst = Math.max(...outcome.sections.map(({ degrees }) => degrees));
  const [pullBefore, pullAfter] = [worstPull(analysis), worstPull(outcome.analysis)];
  const [now, then] = [analysis.totals.length, outcome.analysis.totals.length];
  return {
    degrees: section && Number.isFinite(worst) ? worst - section.degrees : null,
    lbf: pullBefore === null || pullAfter === null ? null : pullAfter - pullBefore,
    inches: now === null || then === null ? null : then - now,
  };
}

/** Likely pull of the hardest pull that has an answer, lbf; null where none has. */
function worstPull({ pulls }: RunAnalysis): number | null {
  const answered = pulls.flatMap((pull) => pull[pull.planned].peak?.likely ?? []);
  return answered.length === 0 ? null : Math.max(...answered);
}

/** The run before a change, laid out. */
export function fixContext(
  document: RunDocument,
  analysis: RunAnalysis,
  settings: CompanySettings,
): FixContext {
  return { document, analysis, settings, expanded: expandRun(document, settings) };
}
