import type { Finding } from '../contracts/run-analysis';
import { lowestOffset } from '../geometry/offset-geometry';
import type { ExpandedRun, PlacedBend, PlacedLeg } from '../run/expanded-run';
import type { CheckContext } from './check-context';

/** Shorter by less than this is rounding, not shortage. in. */
const TOLERANCE = 1e-6;

/**
 * Every leg must be at least as long as the tangent lengths it holds, T = R tan(θ/2) of the bend at each end; a piece
 * whose own bends overlap can't be bent at any leg length. Without lengths there is nothing to hold it against.
 * Example: two 90s at R 4.5 need 9 in corner to corner; 6 in is 3 in short.
 */
export function checkBendFitsLeg({ expanded }: CheckContext): Finding[] {
  if (expanded.length === null) return [];
  const findings = expanded.legs.flatMap((leg): Finding[] => {
    const short = leg.tangents - (leg.length ?? 0);
    const before = bendAt(expanded, leg.before);
    const after = bendAt(expanded, leg.after);
    const bend = after ?? before;
    if (short <= TOLERANCE || !bend) return [];
    const sectionId = expanded.sections[leg.section]?.id;
    const at = { elementId: bend.elementId, sectionId };
    const inside = before && after && before.elementIndex === after.elementIndex;
    return [
      (inside && saddleTooLow(expanded, bend, at)) || tooShort(leg, before, after, short, at),
    ];
  });
  return onePerSaddle(findings);
}

function bendAt(expanded: ExpandedRun, index: number | null): PlacedBend | undefined {
  return index === null ? undefined : expanded.bends[index];
}

function tooShort(
  leg: PlacedLeg,
  before: PlacedBend | undefined,
  after: PlacedBend | undefined,
  short: number,
  at: Finding['at'],
): Finding {
  const values = {
    leg: leg.length,
    needed: leg.tangents,
    short,
    straightId: leg.elementIds[0] ?? null,
    beforeId: before?.elementId ?? null,
    afterId: after?.elementId ?? null,
    // An offset whose two bends overlap: only a higher rise, a flatter angle or a smaller radius helps.
    inside: before !== undefined && before.elementId === after?.elementId,
  };
  return { code: 'leg-too-short', severity: 'stop', at, values, rule: null };
}

/**
 * The bends on a saddle's slope overlap below h = 2R(1 − cos θ): the height at which h csc θ = 2R tan(θ/2) for four
 * bends, and at which h′ csc θ = R tan(θ/2) + R tan θ for three; both solve to the same.
 */
function saddleTooLow(expanded: ExpandedRun, bend: PlacedBend, at: Finding['at']): Finding | null {
  const element = expanded.elements[bend.elementIndex]?.element;
  if (element?.kind !== 'saddle-3' && element?.kind !== 'saddle-4') return null;
  const { height, angle } = element;
  const lowest = lowestOffset(bend.radius ?? 0, angle);
  const values = { height, angle, lowest, short: lowest - height };
  return { code: 'saddle-too-low', severity: 'stop', at, values, rule: null };
}

/** Both slopes of a saddle say the same: once is enough. */
function onePerSaddle(findings: readonly Finding[]): Finding[] {
  const said = new Set<string | undefined>();
  return findings.filter(({ code, at }) => {
    if (code !== 'saddle-too-low') return true;
    const isNew = !said.has(at.elementId);
    said.add(at.elementId);
    return isNew;
  });
}
