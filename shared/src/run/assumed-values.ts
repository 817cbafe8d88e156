import type { Assumed } from '../contracts/run-analysis';
import type { CompanySettings } from '../contracts/settings';
import { bendRadiusSource } from '../tables/bend-radius';
import { bendFields, radiusInForce } from './bend-radius';
import { isBentPipe } from './expand/element-parts';
import { DEFAULT_HEADING } from './expand/headings';
import { FLEX_DEGREES } from './expand/path-items';
import { racewayPlaces } from './expand/raceway-changes';
import type { ExpandedRun } from './expanded-run';
import { BODY_TURN, isPullPoint, turnOf } from './pull-points';
import type { RunDocument } from './run-document';

const PRACTICE = 'common practice, no source';

/** Every value the analysis needed that nobody gave: what was taken instead, and on whose word. */
export function assumedValues(
  document: RunDocument,
  expanded: ExpandedRun,
  settings: CompanySettings,
): Assumed[] {
  const assumed = [...bendRadii(document, expanded, settings), ...pathDefaults(document)];
  if (document.rules?.code === undefined) {
    const source = 'company settings';
    assumed.unshift({ path: '/rules/code', value: settings.code, from: 'settings', source });
  }
  if (document.start?.heading === undefined && expanded.directions !== 'assumed-level') {
    const source = 'the way the drawing starts; any other turns the whole run';
    assumed.push({ path: '/start/heading', value: DEFAULT_HEADING, from: 'default', source });
  }
  return assumed;
}

/** Radii that came from a bender or a table: once for each place that could have given one. */
function bendRadii(
  document: RunDocument,
  expanded: ExpandedRun,
  settings: CompanySettings,
): Assumed[] {
  const places = racewayPlaces(document.path);
  const assumed = new Map<string, Assumed>();
  expanded.elements.forEach(({ element, raceway }, index) => {
    if (!isBentPipe(element)) return;
    const { radius, from } = radiusInForce(bendFields(element), raceway, settings);
    if (from !== 'settings' && from !== 'table') return;
    const place = places[index] ?? null;
    const path = `${place === null ? '' : `/path/${place}`}/raceway/bendRadius`;
    const source =
      from === 'settings'
        ? "the company's bender for this size"
        : `NEC ${bendRadiusSource(raceway.type)}`;
    assumed.set(`${path} ${from}`, { path, value: radius, from, source });
  });
  return [...assumed.values()];
}

function pathDefaults(document: RunDocument): Assumed[] {
  return document.path.flatMap((element, index): Assumed[] => {
    if (element.kind === 'flex' && element.degrees === undefined) {
      const path = `/path/${index}/degrees`;
      return [{ path, value: FLEX_DEGREES, from: 'default', source: PRACTICE }];
    }
    if (isPullPoint(element) && !element.turn && turnOf(element)) {
      const path = `/path/${index}/turn/angle`;
      return [{ path, value: BODY_TURN, from: 'default', source: PRACTICE }];
    }
    return [];
  });
}
