import type { FillAnswer, Finding, NoFillReason, RuleCitation } from '../contracts/run-analysis';
import type { ConductorGroup, Insulation, WireSize } from '../run/run-document';
import { NIPPLE, ROUNDING, SEAL } from '../tables/fill-limits';
import { racewayDimensions } from '../tables/raceway-dimensions';
import type { RacewayDimensions } from '../tables/raceway-dimensions';
import { threeEighthsCount } from '../tables/three-eighths-flex';
import { tightestFillLimit } from './fill-limit';
import type { FillLimit } from './fill-limit';
import { isNipple, maximumCount } from './maximum-count';
import { roomLeft } from './room';
import { areaOf, countOf, sizedGroups } from './section-conductors';
import type { SectionConductors, SizedGroup } from './section-conductors';

export interface FillCheck {
  answer: FillAnswer | null;
  reason: NoFillReason | null;
  findings: Finding[];
}

/** Chapter 9 was read in the 2026 and 2023 texts; its percentages are the same in each edition offered. */
const chapter9 = (cite: string, { edition }: SectionConductors): RuleCitation => ({
  cite,
  edition,
  source: 'NEC',
});

/**
 * How full a raceway is: Σ conductor areas over its internal area, against 53, 31 or 40 % by count, 60 % for a nipple,
 * the job's own limit or a seal's, whichever is tightest. Every conductor counts: grounds, neutrals, spares. Conductors all
 * of one size may be as many as Note 7's rounding allows although the percent then reads a little over.
 * Source: NEC Chapter 9 Tables 1, 4, 5, 5A, 8 and Notes 3 to 8.
 *
 * @example 4×500 + 1×3 THHN in 3 EMT: (4 × 0.7073 + 0.0973) / 8.846 = 33.1 % of 40
 */
export function checkFill(context: SectionConductors): FillCheck {
  const { groups, raceway } = context;
  const sized = sizedGroups(groups);
  const conductors = countOf(sized);
  const dimensions = racewayDimensions(raceway.type, raceway.tradeSize);
  if (conductors === 0) return { answer: null, reason: 'no-conductors', findings: [] };
  if (!dimensions || sized.length < groups.length) {
    return { answer: null, reason: 'no-size', findings: [] };
  }
  const limit = tightestFillLimit(dimensions, conductors, context);
  const nipple = isNipple(context.length, context.betweenEnclosures);
  const rounding = allowedByRounding(dimensions, sized, limit, nipple);
  const answer: FillAnswer = {
    percent: (areaOf(sized) / dimensions.area) * 100,
    limitPercent: limit.percent,
    conductorArea: areaOf(sized),
    racewayArea: dimensions.area,
    raceway,
    nipple,
    conductors,
    byRounding: rounding,
    room: roomLeft(context, dimensions, sized),
  };
  return { answer, reason: null, findings: findingsOf(context, answer, limit, dimensions) };
}

/** Only same-size sets, only against the code's own columns, and only where the plain comparison fails. */
function allowedByRounding(
  raceway: RacewayDimensions,
  sized: readonly SizedGroup[],
  limit: FillLimit,
  nipple: boolean,
): boolean {
  const [first] = sized;
  if (!first || (limit.from !== 'code' && limit.from !== 'nipple')) return false;
  const sameSize = sized.every(({ area }) => area === first.area);
  return (
    sameSize &&
    areaOf(sized) > limit.area + 1e-9 &&
    countOf(sized) <= maximumCount(raceway, first.area, nipple)
  );
}

function findingsOf(
  context: SectionConductors,
  answer: FillAnswer,
  limit: FillLimit,
  dimensions: RacewayDimensions,
): Finding[] {
  const at = { sectionId: context.sectionId };
  const values = {
    percent: answer.percent,
    limitPercent: answer.limitPercent,
    conductors: answer.conductors,
    raceway: answer.raceway.type,
    tradeSize: answer.raceway.tradeSize,
    limitFrom: limit.from,
    source: limit.from === 'job' ? context.maxFillSource : null,
  };
  const byCount = threeEighthsFinding(context);
  if (byCount) return [byCount];
  if (answer.byRounding) {
    const rule = chapter9(ROUNDING.cite, context);
    return [{ code: 'fill-by-rounding', severity: 'note', at, values, rule }];
  }
  if (answer.conductorArea > limit.area + 1e-9) {
    if (limit.from === 'seal') {
      const rule = chapter9(SEAL.cite, context);
      return [{ code: 'fill-seal-over', severity: 'stop', at, values, rule }];
    }
    const cite = limit.from === 'nipple' ? NIPPLE.cite : 'Chapter 9 Table 1';
    const rule = limit.from === 'code' || limit.from === 'nipple' ? chapter9(cite, context) : null;
    return [{ code: 'fill-over', severity: 'stop', at, values, rule }];
  }
  if (answer.nipple && answer.conductorArea > dimensions.a40) {
    const rule = chapter9(NIPPLE.cite, context);
    return [{ code: 'fill-nipple', severity: 'note', at, values, rule }];
  }
  return [];
}

/** Trade size 3/8 flex goes by the counts of Table 348.22, with one equipment ground of the same size beside them. */
function threeEighthsFinding(context: SectionConductors): Finding | null {
  const { raceway, groups, sectionId } = context;
  const { type, tradeSize } = raceway;
  if (tradeSize !== '3/8' || (type !== 'FMC' && type !== 'LFMC')) return null;
  const kind = oneKind(groups);
  const allowed = kind && threeEighthsCount(type, kind.insulation, kind.size);
  if (typeof allowed !== 'number') return null;
  const grounds = Math.min(1, totalOf(groups.filter(({ use }) => use === 'ground')));
  const conductors = totalOf(groups) - grounds;
  if (conductors <= allowed) return null;
  const cite = type === 'FMC' ? '348.22' : '350.22(B)';
  return {
    code: 'fill-over',
    severity: 'stop',
    at: { sectionId },
    values: { conductors, allowed, limitFrom: 'count', raceway: type, tradeSize, source: null },
    rule: chapter9(cite, context),
  };
}

const totalOf = (groups: readonly ConductorGroup[]): number =>
  groups.reduce((total, { count }) => total + count, 0);

/** The one size and insulation of all groups; null where they differ. */
function oneKind(
  groups: readonly ConductorGroup[],
): { insulation: Insulation; size: WireSize } | null {
  const [first] = groups;
  if (!first || 'cable' in first) return null;
  const same = groups.every(
    (group) =>
      !('cable' in group) && group.size === first.size && group.insulation === first.insulation,
  );
  return same ? first : null;
}
