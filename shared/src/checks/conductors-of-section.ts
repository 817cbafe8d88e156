import { conductorsInSection } from '../run/conductors-in-section';
import type { SectionSpan } from '../run/expanded-run';
import type { PullPoint, Raceway } from '../run/run-document';
import { racewayDimensions } from '../tables/raceway-dimensions';
import { bendsIn } from './check-context';
import type { CheckContext } from './check-context';
import type { SectionConductors } from './section-conductors';

/** What the checks of fill, jam and clearance read of one section: its own conductors, in its smallest bore. */
export function conductorsOfSection(context: CheckContext, span: SectionSpan): SectionConductors {
  const { document, expanded, overrides } = context;
  const { path, conductors = [] } = document;
  const inside = path.slice(span.firstElement, span.lastElement + 1);
  return {
    sectionId: span.id,
    groups: conductorsInSection(path, conductors, span),
    raceway: smallestBore(span.raceways) ?? document.raceway,
    length: expanded.length === null ? null : span.toStation - span.fromStation,
    betweenEnclosures: isEnclosure(span.from) && isEnclosure(span.to),
    hasBend: bendsIn(context, span).length > 0,
    hasSeal: inside.some((element) => element.kind === 'fitting' && element.fitting === 'seal'),
    profile: context.profile,
    edition: context.edition,
    maxFillPercent: overrides.maxFillPercent ?? null,
    maxFillSource: overrides.source ?? null,
  };
}

function smallestBore(raceways: readonly Raceway[]): Raceway | undefined {
  const area = ({ type, tradeSize }: Raceway) => racewayDimensions(type, tradeSize)?.area ?? 0;
  return [...raceways].sort((a, b) => area(a) - area(b))[0];
}

/**
 * Whether a short section that ends here may be a nipple (NEC Chapter 9 Note 4: between boxes, cabinets and similar
 * enclosures). Whether a conduit body is one is for the inspector to say; the stricter reading is taken.
 */
function isEnclosure({ device }: PullPoint): boolean {
  return device !== 'open-end' && device !== 'conduit-body';
}
