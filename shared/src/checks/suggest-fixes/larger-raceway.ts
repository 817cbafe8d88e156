import type { Finding } from '../../contracts/run-analysis';
import { racewayDimensions } from '../../tables/raceway-dimensions';
import { TRADE_SIZES } from '../../run/run-document';
import type { Raceway, RacewayType } from '../../run/run-document';
import type { Candidate, FixContext, Outcome } from './candidate';
import { racewaySources, setRaceway } from './raceway-sources';

/** Stiff types that can stand in for each other, the thin-walled first. Our order, no source. */
const STIFF: readonly RacewayType[] = ['EMT', 'IMC', 'RMC', 'PVC-40', 'PVC-80'];
/** How many sizes up are tried. */
const SIZES_UP = 3;

/**
 * Conductors that don't fit: the next sizes of the same raceway, then another stiff raceway of the same size with a larger
 * bore. A bend radius given for the old size is not carried over: it belonged to that size's bender.
 */
export function largerRaceway(
  context: FixContext,
  { at }: Finding,
  otherTypes: boolean,
): Candidate<'larger-raceway'>[] {
  const section = context.analysis.sections.find(({ id }) => id === at.sectionId);
  const raceway = section?.fill?.raceway;
  if (!section || !raceway) return [];
  const sources = racewaySources(context, section.id, raceway);
  if (sources.length === 0) return [];
  const others = [...largerSizes(raceway), ...(otherTypes ? largerTypes(raceway) : [])];
  return others.map((other) => ({
    kind: 'larger-raceway',
    commands: sources.map((source) => setRaceway(source, other)),
    values: (outcome) => valuesOf(raceway, other, section.id, outcome),
  }));
}

function largerSizes({ type, tradeSize }: Raceway): Raceway[] {
  return TRADE_SIZES.slice(TRADE_SIZES.indexOf(tradeSize) + 1)
    .filter((larger) => racewayDimensions(type, larger))
    .slice(0, SIZES_UP)
    .map((larger) => ({ type, tradeSize: larger }));
}

function largerTypes({ type, tradeSize }: Raceway): Raceway[] {
  const area = racewayDimensions(type, tradeSize)?.area ?? Infinity;
  const isLarger = (other: RacewayType) => (racewayDimensions(other, tradeSize)?.area ?? 0) > area;
  return STIFF.includes(type)
    ? STIFF.filter(isLarger).map((other) => ({ type: other, tradeSize }))
    : [];
}

/** A section whose fill or clearance would still stop it is not helped, whichever of the two was asked about. */
function valuesOf(from: Raceway, to: Raceway, sectionId: string, { analysis }: Outcome) {
  const section = analysis.sections.find(({ id }) => id === sectionId);
  const isStopped = analysis.findings.some(
    ({ severity, code, at }) =>
      severity === 'stop' && at.sectionId === sectionId && /^(fill|clearance)-/.test(code),
  );
  if (!section?.fill || isStopped) return null;
  return {
    type: to.type,
    tradeSize: to.tradeSize,
    fromType: from.type,
    fromTradeSize: from.tradeSize,
    percent: section.fill.percent,
    limitPercent: section.fill.limitPercent,
    jamRatio: section.jam?.ratio ?? null,
    clearance: section.clearance,
  };
}
