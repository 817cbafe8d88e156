import type { RunCommand } from '../../run/run-command';
import type { Raceway } from '../../run/run-document';
import { sameRaceway } from '../../run/expand/raceway-changes';
import type { FixContext } from './candidate';

/** Where a section's raceway is written down: on the run (null) or on a piece. */
type Source = string | null;

/**
 * The places in the document that give a section its raceway of this type and size: the run, the pull point or transition
 * that changed it last, a flexible piece.
 */
export function racewaySources(
  { document, expanded }: FixContext,
  sectionId: string,
  raceway: Raceway,
): Source[] {
  const section = expanded.sections.find(({ id }) => id === sectionId);
  if (!section) return [];
  const found = new Set<Source>();
  let current: { raceway: Raceway; source: Source } = { raceway: document.raceway, source: null };
  document.path.forEach((element, index) => {
    const own = 'raceway' in element ? element.raceway : undefined;
    const here = own ? { raceway: own, source: element.id } : current;
    if (element.kind !== 'flex') current = here;
    const isInside = index >= section.firstElement && index < section.lastElement;
    if (isInside && sameRaceway(here.raceway, raceway)) found.add(here.source);
  });
  return [...found];
}

export function setRaceway(source: Source, raceway: Raceway): RunCommand {
  return source === null
    ? { command: 'set-raceway', args: { raceway } }
    : { command: 'set-element', args: { elementId: source, patch: { raceway } } };
}
