import type { Finding, JamAnswer } from '../contracts/run-analysis';
import { JAM_BAND } from '../tables/fill-limits';
import { racewayDimensions } from '../tables/raceway-dimensions';
import { countOf, sizedGroups } from './section-conductors';
import type { SectionConductors, SizedGroup } from './section-conductors';

/** A bend leaves the bore up to 5 % wider across its plane; a trade convention that makers of cable publish. */
const OVALITY = 1.05;

/** Others no larger than this share of the three's diameter ride along. Our judgement, no source. */
const RIDES_ALONG = 0.6;

export interface JamCheck {
  answer: JamAnswer | null;
  findings: Finding[];
}

/**
 * Three equal conductors can line up and wedge in a bend where bore over diameter lies between 2.8 and 3.2. Both readings
 * are given: the plain ratio, and with the bore 5 % wider as a bend leaves it. It is a caution, never a stop.
 * Source: NEC Chapter 9 Table 1 Informational Note 2 (2.8 to 3.2); ovality by cable makers' pulling guides.
 *
 * @example 3×250 THHN in 2 EMT: 2.067 / 0.711 = 2.91 (3.05) → possible
 */
export function checkJam(context: SectionConductors): JamCheck {
  const bore = racewayDimensions(context.raceway.type, context.raceway.tradeSize)?.bore;
  const diameter = threeEqual(sizedGroups(context.groups));
  if (!bore || diameter === null || !context.hasBend) return { answer: null, findings: [] };
  const ratio = bore / diameter;
  const ratioWithOvality = ratio * OVALITY;
  const inside = (value: number) => value >= JAM_BAND.from && value <= JAM_BAND.to;
  const risk = inside(ratio) || inside(ratioWithOvality) ? 'possible' : 'clear';
  const answer: JamAnswer = { ratio, ratioWithOvality, risk };
  if (risk === 'clear') return { answer, findings: [] };
  return {
    answer,
    findings: [
      {
        code: 'jam-possible',
        severity: 'caution',
        at: { sectionId: context.sectionId },
        values: { ratio, ratioWithOvality, from: JAM_BAND.from, to: JAM_BAND.to, diameter, bore },
        rule: { cite: JAM_BAND.cite, edition: context.edition, source: 'NEC' },
      },
    ],
  };
}

/**
 * The diameter of three equal single conductors, where everything else in the section is small beside them; null where the
 * set is anything else.
 */
export function threeEqual(sized: readonly SizedGroup[]): number | null {
  const largest = Math.max(0, ...sized.map(({ diameter }) => diameter));
  const three = sized.filter(({ diameter }) => diameter === largest);
  const singles = three.every(
    ({ group }) => !('cable' in group) || (group.cable.conductors ?? 1) === 1,
  );
  const others = sized.filter(({ diameter }) => diameter < largest);
  const ride = others.every(({ diameter }) => diameter <= RIDES_ALONG * largest);
  return countOf(three) === 3 && singles && ride ? largest : null;
}
