import type { ExpandedRun, RunAnalysis, SectionAnalysis } from '@fairlead/shared';

/** The section a place lies in; a pull point that starts one belongs to it. */
export function sectionOf(
  analysis: Pick<RunAnalysis, 'sections'>,
  expanded: Pick<ExpandedRun, 'elements'>,
  elementId: string | null,
): SectionAnalysis | null {
  const placed = expanded.elements.find(({ element }) => element.id === elementId);
  return (placed && analysis.sections[placed.section]) ?? null;
}
