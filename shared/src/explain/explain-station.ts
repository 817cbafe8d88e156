import { radians } from '../geometry/angles';
import type { ExpandedRun, PlacedElement } from '../run/expanded-run';
import { plain } from './explanation';
import type { Explanation } from './explanation';

/**
 * How far along the pipe a piece begins: the straights and arcs before it, one after the other. null where the run has no
 * lengths. The last pull point answers for the length of the whole run.
 *
 * @example 10 ft corner to corner into a 90 of R 4: 0 + 116 = 116 in
 */
export function explainStation(expanded: ExpandedRun, elementId: string): Explanation | null {
  const placed = expanded.elements.find(({ element }) => element.id === elementId);
  if (expanded.length === null || !placed) return null;
  const before = expanded.elements.slice(0, placed.index).filter(({ from, to }) => to > from);
  const radii = new Set(
    before.flatMap(({ bends }) => bends.map((bend) => expanded.bends[bend]?.radius ?? 0)),
  );
  return {
    title: 'station',
    exact: `${plain(placed.from)} in`,
    shownTo: '1″',
    formula: 'Σ L + Σ θ·R',
    worked: before.map((each) => workedPiece(expanded, each)),
    inputs: [
      { what: 'straight', value: '', source: 'given on the run, less the tangents of its bends' },
      ...[...radii]
        .filter((radius) => radius > 0)
        .map((radius) => ({
          what: 'radius',
          value: `${plain(radius)} in`,
          source: 'to the centre line; given on the run, by the bender, or NEC Chapter 9 Table 2',
        })),
    ],
  };
}

function workedPiece({ bends }: ExpandedRun, { from, to, bends: own }: PlacedElement): string {
  const arcs = own.flatMap((bend) => {
    const { angle, radius } = bends[bend] ?? { angle: 0, radius: 0 };
    return radius ? [{ angle, radius }] : [];
  });
  const straight = to - from - arcs.reduce((sum, arc) => sum + radians(arc.angle) * arc.radius, 0);
  const parts = [
    ...(Math.abs(straight) > 5e-5 || arcs.length === 0 ? [plain(straight)] : []),
    ...arcs.map(({ angle, radius }) => `${plain(angle)} × π / 180 × ${plain(radius)}`),
  ];
  return `${plain(from)} + ${parts.join(' + ')} = ${plain(to)} in`;
}
