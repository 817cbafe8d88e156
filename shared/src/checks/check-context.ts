import type { CompanySettings } from '../contracts/settings';
import { editionOf, profileOf } from '../run/rules-in-force';
import type { Profile } from '../run/rules-in-force';
import type { ExpandedRun, PlacedBend, SectionSpan } from '../run/expanded-run';
import type { CodeEdition, RuleOverrides, RunDocument } from '../run/run-document';

/** What every check of one run reads. */
export interface CheckContext {
  document: RunDocument;
  expanded: ExpandedRun;
  settings: CompanySettings;
  edition: CodeEdition;
  profile: Profile;
  overrides: RuleOverrides;
}

export function checkContext(
  document: RunDocument,
  expanded: ExpandedRun,
  settings: CompanySettings,
): CheckContext {
  return {
    document,
    expanded,
    settings,
    edition: editionOf(document, settings),
    profile: profileOf(document),
    overrides: document.rules?.overrides ?? {},
  };
}

/** The bends of one section, in order. */
export function bendsIn({ expanded }: CheckContext, section: SectionSpan): PlacedBend[] {
  const index = expanded.sections.indexOf(section);
  return expanded.bends.filter((bend) => bend.section === index);
}
