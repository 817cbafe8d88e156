import type { RuleCitation, SectionAnalysis } from '../contracts/run-analysis';
import type { CodeEdition } from '../run/run-document';
import {
  BEND_SECTIONS,
  CODE_LIMIT_DEGREES,
  COMBINED_LIMIT_FROM,
  COMBINED_SECTION,
  TELECOM_LIMIT_DEGREES,
  TELECOM_SOURCE,
} from '../tables/bend-limits';
import type { CheckContext } from './check-context';

export interface DegreeLimit {
  degrees: number;
  from: SectionAnalysis['limitFrom'];
  /** What a limit of our own comes from, where somebody said so. */
  source: string | null;
}

/** The tightest limit between pull points wins and is named; between equals the code's. */
export function degreeLimit({ profile, overrides, settings }: CheckContext): DegreeLimit {
  const limits: DegreeLimit[] = [{ degrees: CODE_LIMIT_DEGREES, from: 'code', source: null }];
  if (profile === 'telecom') {
    limits.push({ degrees: TELECOM_LIMIT_DEGREES, from: 'telecom', source: TELECOM_SOURCE });
  }
  if (typeof overrides.maxDegrees === 'number') {
    limits.push({ degrees: overrides.maxDegrees, from: 'job', source: overrides.source ?? null });
  }
  if (settings.maxDegrees !== null) {
    limits.push({ degrees: settings.maxDegrees, from: 'company', source: null });
  }
  return limits.reduce((tightest, limit) => (limit.degrees < tightest.degrees ? limit : tightest));
}

/**
 * Degrees are compared to a tenth: exactly the limit passes.
 * Example: 360.04 of 360 passes, 360.06 does not.
 */
export function isOver(degrees: number, limit: number): boolean {
  return Math.round(degrees * 10) > Math.round(limit * 10);
}

/** Where the code limits one article's bends, in the last edition that was read for it. */
export function articleRule(article: string, edition: CodeEdition): RuleCitation {
  const { section, read } = BEND_SECTIONS[edition];
  return { cite: `${article}.${section}`, edition: read, source: 'NEC' };
}

/** Where the code limits all raceway types of a section together. */
export function combinedRule(): RuleCitation {
  return { cite: COMBINED_SECTION, edition: COMBINED_LIMIT_FROM, source: 'NEC' };
}

/** True where the edition limits all raceway types of a section together. Editions compare as text: the year decides. */
export function limitsCombined(edition: CodeEdition): boolean {
  return edition >= COMBINED_LIMIT_FROM;
}
