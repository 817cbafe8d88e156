import type { SectionBend } from '../contracts/run-analysis';
import type { PlacedBend } from '../run/expanded-run';
import type { PathElement } from '../run/run-document';
import { ARTICLES } from '../tables/bend-limits';

/** The strict reading counts any offset as a quarter bend and any saddle as two: a local practice, no source. */
const STRICT_OFFSET = 90;
const STRICT_SADDLE = 180;

export interface DegreeCount {
  /** Every bend as it was bent, planned flexible degrees with it, sweeps that don't count without. */
  degrees: number;
  /** An offset max(90, 2θ), a saddle max(180, 4θ), the rest as bent. */
  strictDegrees: number;
  /** Of `degrees`, how many are only planned in a flexible piece. */
  planned: number;
  /** Degrees of sweeps that were listed as not counting. */
  uncounted: number;
  /** The pipe's own bends, without the planned ones, article by article. */
  byArticle: Map<string, number>;
  /** Turns inside boxes and bodies nobody can open: of no raceway, so they count with each. */
  turns: number;
  bends: SectionBend[];
}

/**
 * Adds up one section. Example: 90, 90, 90, an offset at 30 and a box offset at 10 are 270 + 60 + 20 = 350 as bent and
 * 270 + 90 + 90 = 450 in the strict reading.
 */
export function countDegrees(
  bends: readonly PlacedBend[],
  elementOf: (bend: PlacedBend) => PathElement | undefined,
): DegreeCount {
  const count: DegreeCount = {
    degrees: 0,
    strictDegrees: 0,
    planned: 0,
    uncounted: 0,
    byArticle: new Map(),
    turns: 0,
    bends: [],
  };
  for (const [elementId, parts] of groupByElement(bends)) {
    const [first] = parts;
    if (!first) continue;
    const bent = parts.reduce((sum, { angle }) => sum + angle, 0);
    const counted = first.counts ? bent : 0;
    count.degrees += counted;
    count.uncounted += bent - counted;
    count.strictDegrees += Math.max(counted, strictOf(elementOf(first)));
    if (first.planned) {
      count.planned += counted;
    } else if (elementOf(first)?.kind === 'pull-point') {
      count.turns += counted;
    } else {
      const article = ARTICLES[first.raceway.type];
      count.byArticle.set(article, (count.byArticle.get(article) ?? 0) + counted);
    }
    count.bends.push({ elementId, angle: counted, cumulative: count.degrees });
  }
  return count;
}

function strictOf(element: PathElement | undefined): number {
  switch (element?.kind) {
    case 'offset':
      return STRICT_OFFSET;
    case 'saddle-3':
    case 'saddle-4':
      return STRICT_SADDLE;
    default:
      return 0;
  }
}

function groupByElement(bends: readonly PlacedBend[]): Map<string, PlacedBend[]> {
  const groups = new Map<string, PlacedBend[]>();
  for (const bend of bends) {
    const group = groups.get(bend.elementId);
    if (group) group.push(bend);
    else groups.set(bend.elementId, [bend]);
  }
  return groups;
}
