import type { RunDocument, SectionAnalysis, Verdict } from '@fairlead/shared';

/**
 * Where a verdict points: its own piece, else the last bend of its section, else the pull point the section starts at.
 * null where it speaks of the run as a whole.
 */
export function placeOf(
  verdict: Pick<Verdict, 'elementId' | 'sectionId'>,
  sections: readonly SectionAnalysis[],
  document: Pick<RunDocument, 'path'>,
): string | null {
  const isThere = (id: string | null) => document.path.some((element) => element.id === id);
  if (verdict.elementId !== null && isThere(verdict.elementId)) return verdict.elementId;
  const section = sections.find(({ id }) => id === verdict.sectionId);
  if (!section) return null;
  return section.bends.at(-1)?.elementId ?? section.from;
}
