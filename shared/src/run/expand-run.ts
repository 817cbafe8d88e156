import { DEFAULT_SETTINGS } from '../contracts/settings';
import type { CompanySettings } from '../contracts/settings';
import { bendFields, radiusInForce } from './bend-radius';
import { centreLine } from './expand/centre-line';
import { equalSteps } from './expand/equal-steps';
import { followHeadings } from './expand/headings';
import { layOut } from './expand/lay-out';
import { hasLengths, takeApart } from './expand/path-items';
import { racewayOfEach, racewaysBetween } from './expand/raceway-changes';
import { sectionOfEach, sectionSpans } from './expand/section-spans';
import type { ExpandedRun, PlacedElement } from './expanded-run';
import { profileOf } from './rules-in-force';
import type { RunDocument } from './run-document';

/**
 * Lays a run out along its centre line: stations, bends with their radii, legs with their tangents, sections, headings
 * and, where every direction and some length is given, the line in 3-D. For a document the parser accepted.
 */
export function expandRun(
  document: RunDocument,
  settings: CompanySettings = DEFAULT_SETTINGS,
): ExpandedRun {
  const { path } = document;
  const raceways = racewayOfEach(document);
  const spans = sectionSpans(path, profileOf(document));
  const sections = sectionOfEach(path, spans);
  const ends = new Set(
    spans.flatMap(({ firstElement, lastElement }) => [firstElement, lastElement]),
  );
  const inputs = path.map((element, index) => {
    const raceway = raceways[index] ?? document.raceway;
    const { radius } = radiusInForce(bendFields(element), raceway, settings);
    return {
      element,
      section: sections[index] ?? 0,
      raceway,
      radius,
      endsSection: ends.has(index),
    };
  });

  const { items, bends: unplaced } = takeApart(inputs);
  const { bends, legs, stretches, extents, length } = hasLengths(path)
    ? layOut(inputs, items, unplaced)
    : equalSteps(inputs, items, unplaced);
  const headings = followHeadings(document);

  const bendsOf: number[][] = path.map(() => []);
  bends.forEach(({ elementIndex }, place) => bendsOf[elementIndex]?.push(place));
  const elements = inputs.map(({ element, section, raceway }, index): PlacedElement => {
    const { before: headingBefore = null, after: heading = null } = headings.of[index] ?? {};
    const extent = extents[index] ?? { from: 0, to: 0 };
    const own = bendsOf[index] ?? [];
    const { from, to } = extent;
    return { element, index, from, to, section, bends: own, raceway, heading, headingBefore };
  });
  const isKnown = stretches && headings.directions === 'given';
  return {
    elements,
    bends,
    legs,
    sections: spans.map(({ firstElement, lastElement, from, to }) => ({
      id: from.id,
      from,
      to,
      fromStation: elements[firstElement]?.from ?? 0,
      toStation: elements[lastElement]?.from ?? 0,
      firstElement,
      lastElement,
      raceways: racewaysBetween(path, raceways, firstElement, lastElement),
    })),
    length,
    end: length ?? Math.max(0, path.length - 1),
    directions: headings.directions,
    directionProblems: headings.problems,
    centreLine: isKnown ? centreLine(path, stretches, bends, headings) : null,
  };
}
