import type { Profile } from '../run/rules-in-force';
import type { CodeEdition, ConductorGroup, Raceway } from '../run/run-document';
import { conductorDimensions } from '../run/conductor-dimensions';
import type { ConductorDimensions } from '../run/conductor-dimensions';

/** What the checks of the conductors in one section read. */
export interface SectionConductors {
  sectionId: string;
  /** The groups that lie in the section. */
  groups: readonly ConductorGroup[];
  /** The smallest bore the section holds. */
  raceway: Raceway;
  /** Developed length, in; null where not given. */
  length: number | null;
  /** Both ends are enclosures, so a short section is a nipple. */
  betweenEnclosures: boolean;
  hasBend: boolean;
  hasSeal: boolean;
  profile: Profile;
  edition: CodeEdition;
  /** A job's own limit, percent, and where it stands. */
  maxFillPercent: number | null;
  maxFillSource: string | null;
}

/** One entry a group that the tables know. */
export interface SizedGroup extends ConductorDimensions {
  group: ConductorGroup;
  count: number;
}

export function sizedGroups(groups: readonly ConductorGroup[]): SizedGroup[] {
  const sized: SizedGroup[] = [];
  for (const group of groups) {
    const dimensions = conductorDimensions(group);
    if (dimensions === null) continue;
    const { diameter, area } = dimensions;
    sized.push({ diameter, area, group, count: group.count });
  }
  return sized;
}

export const countOf = (sized: readonly SizedGroup[]): number =>
  sized.reduce((total, { count }) => total + count, 0);

export const areaOf = (sized: readonly SizedGroup[]): number =>
  sized.reduce((total, { count, area }) => total + count * area, 0);
