import type { Finding } from '../contracts/run-analysis';
import { bendFields, radiusInForce } from '../run/bend-radius';
import { isBentPipe } from '../run/expand/element-parts';
import type { PlacedElement } from '../run/expanded-run';
import type { Raceway } from '../run/run-document';
import { bendRadiusFor, bendRadiusSource } from '../tables/bend-radius';
import { racewayDimensions } from '../tables/raceway-dimensions';
import type { CheckContext } from './check-context';

/** Smaller by less than this is rounding. in. */
const TOLERANCE = 1e-6;

interface Minimum {
  radius: number;
  from: 'table' | 'job' | 'bore';
}

/**
 * The centre-line radius of every bend against the least allowed: NEC Chapter 9 Table 2 (354.24 for HDPE), or the job's
 * own minimum where that is larger. Where no table has a row the radius must be given; it then only has to keep the
 * inside of the bend open. Example: 3/4 EMT needs 4.5 in; bends made at 4 in are too tight.
 */
export function checkRadius(context: CheckContext): Finding[] {
  return context.expanded.elements.flatMap((placed) => findingFor(context, placed) ?? []);
}

function findingFor(context: CheckContext, placed: PlacedElement): Finding | null {
  const { element, raceway, section } = placed;
  const isFlex = element.kind === 'flex';
  if (!isFlex && !isBentPipe(element)) return null;
  const { radius, from } = radiusInForce(bendFields(element), raceway, context.settings);
  // Planned flexible degrees are bent to no radius in particular: only a given one can be judged.
  if (isFlex && from !== 'raceway') return null;

  const { type, tradeSize } = raceway;
  const at = { elementId: element.id, sectionId: context.expanded.sections[section]?.id };
  if (radius === null) {
    const values = { type, tradeSize };
    return { code: 'radius-unknown', severity: 'note', at, values, rule: null };
  }
  const minimum = leastRadius(context, raceway);
  if (radius >= minimum.radius - TOLERANCE) return null;
  return {
    code: 'radius-too-tight',
    severity: 'stop',
    at,
    values: {
      type,
      tradeSize,
      radius,
      radiusFrom: from,
      minimum: minimum.radius,
      minimumFrom: minimum.from,
      source: minimum.from === 'job' ? (context.overrides.source ?? null) : null,
    },
    rule:
      minimum.from === 'table'
        ? { cite: bendRadiusSource(type), edition: context.edition, source: 'NEC' }
        : null,
  };
}

function leastRadius({ overrides }: CheckContext, { type, tradeSize }: Raceway): Minimum {
  const table = bendRadiusFor(type, tradeSize);
  const bore = racewayDimensions(type, tradeSize)?.bore ?? 0;
  // Without a row: the inside of the bend must keep a radius above zero, R > bore / 2.
  const least: Minimum =
    table === null ? { radius: bore / 2, from: 'bore' } : { radius: table, from: 'table' };
  const job = overrides.minBendRadius;
  return typeof job === 'number' && job > least.radius ? { radius: job, from: 'job' } : least;
}
