import { DEFAULT_SETTINGS } from '../../contracts/settings';
import type { CompanySettings } from '../../contracts/settings';
import type { FindingCode } from '../../contracts/finding-codes';
import type { Finding, Fix, RunAnalysis } from '../../contracts/run-analysis';
import type { RunDocument } from '../../run/run-document';
import { fixContext, tryCandidate } from './candidate';
import type { Candidate, FixContext, TriedFix } from './candidate';
import { fixAccess } from './fix-access';
import { fixClearance } from './fix-clearance';
import { fixDegrees } from './fix-degrees';
import { fixFill } from './fix-fill';
import { fixJam } from './fix-jam';
import { fixLeg } from './fix-leg';
import { fixLength } from './fix-length';
import { fixPull } from './fix-pull';
import { fixRadius } from './fix-radius';
import { fixSaddle } from './fix-saddle';

const MAKERS: Partial<Record<FindingCode, (context: FixContext, finding: Finding) => Candidate[]>> =
  {
    'degrees-over': fixDegrees,
    'degrees-over-own-limit': fixDegrees,
    'degrees-mixed-raceways': fixDegrees,
    'access-not-allowed': fixAccess,
    'fill-over': fixFill,
    'fill-seal-over': fixFill,
    'jam-possible': fixJam,
    'clearance-tight': fixClearance,
    'clearance-negative': fixClearance,
    'pull-in-two': fixPull,
    'pull-set-changes': fixPull,
    'pull-turns-without-sheave': fixPull,
    'tension-over': fixPull,
    'tension-over-if-dry': fixPull,
    'radius-too-tight': fixRadius,
    'leg-too-short': fixLeg,
    'saddle-too-low': fixSaddle,
    'length-over': fixLength,
  };

const MOST_FIXES = 4;
/** Angles are alike; past this many, another kind of answer comes before the next one. */
const ANGLES_FIRST = 2;

/**
 * The findings of an analysis, each with up to four changes that answer it, best first. Every one was carried out on a
 * copy and analysed again: it removes its finding, brings no new stop, and its figures are those of that second analysis.
 * Example: 90, 90, 90, offset 45, box offset 10 is 380 of 360; "offset at 22.5" gives 335, "at 30" 350.
 */
export function suggestFixes(
  document: RunDocument,
  analysis: RunAnalysis,
  settings: CompanySettings = DEFAULT_SETTINGS,
): Finding[] {
  const steps = suggestFixesInSteps(document, analysis, settings);
  let step = steps.next();
  while (!step.done) step = steps.next();
  return step.value;
}

/** The same, pausing after each change that was tried, so that a screen can answer in between. */
export function* suggestFixesInSteps(
  document: RunDocument,
  analysis: RunAnalysis,
  settings: CompanySettings = DEFAULT_SETTINGS,
): Generator<undefined, Finding[]> {
  const context = fixContext(document, analysis, settings);
  const findings: Finding[] = [];
  for (const finding of analysis.findings) {
    const tried: TriedFix[] = [];
    for (const candidate of MAKERS[finding.code]?.(context, finding) ?? []) {
      const fix = tryCandidate(context, finding, candidate);
      if (fix) tried.push(fix);
      yield;
    }
    findings.push(tried.length === 0 ? finding : { ...finding, fixes: bestOf(tried) });
  }
  return findings;
}

/** Fewest things left wrong first; among equals the order in which they were thought of. */
function bestOf(tried: readonly TriedFix[]): Fix[] {
  const sorted = [...tried].sort((a, b) => a.stops - b.stops || a.cautions - b.cautions);
  const fixes = sorted.map(({ fix }) => fix);
  const angles = fixes.filter(({ kind }) => kind === 'change-angle');
  const late = new Set(angles.slice(ANGLES_FIRST));
  return [...fixes.filter((fix) => !late.has(fix)), ...late].slice(0, MOST_FIXES);
}
