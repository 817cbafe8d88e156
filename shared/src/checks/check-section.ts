import type { Finding, SectionAnalysis } from '../contracts/run-analysis';
import type { SectionSpan } from '../run/expanded-run';
import type { CheckContext } from './check-context';
import { checkClearance } from './clearance';
import { conductorsOfSection } from './conductors-of-section';
import { checkDegrees } from './degrees';
import { checkFill } from './fill';
import { checkJam } from './jam';
import { checkSectionLength } from './section-length';

export interface CheckedSection {
  section: SectionAnalysis;
  findings: Finding[];
}

/** Everything one section answers by itself, and what there is to say about it. */
export function checkSection(context: CheckContext, span: SectionSpan): CheckedSection {
  const conductors = conductorsOfSection(context, span);
  const degrees = checkDegrees(context, span);
  const fill = checkFill(conductors);
  const jam = checkJam(conductors);
  const clearance = checkClearance(conductors);
  return {
    section: {
      id: span.id,
      from: span.from.id,
      to: span.to.id,
      length: conductors.length,
      ...degrees.section,
      fill: fill.answer,
      noFill: fill.reason,
      jam: jam.answer,
      clearance: clearance.answer,
    },
    findings: [
      ...degrees.findings,
      ...fill.findings,
      ...jam.findings,
      ...clearance.findings,
      ...checkSectionLength(context, span),
    ],
  };
}
