import type { ExpandedRun, PullAnalysis, RunAnalysis } from '@fairlead/shared';

/** The pull a piece lies in; of a box between two pulls the one that ends there. */
export function pullHolding(
  { pulls }: Pick<RunAnalysis, 'pulls'>,
  { elements, sections }: Pick<ExpandedRun, 'elements' | 'sections'>,
  elementId: string,
): PullAnalysis | null {
  const ending = pulls.find((pull) => pull[pull.planned].pullAt === elementId);
  if (ending) return ending;
  const placed = elements.find(({ element }) => element.id === elementId);
  const sectionId = placed && sections[placed.section]?.id;
  const isIn = ({ from, to, sectionIds }: PullAnalysis) =>
    from === elementId || to === elementId || (sectionId && sectionIds.includes(sectionId));
  return pulls.find(isIn) ?? null;
}
