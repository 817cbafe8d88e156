import type { Configuration, PullAnalysis } from '../contracts/run-analysis';
import { conductorDimensions } from '../run/conductor-dimensions';
import { conductorWeight } from '../run/conductor-weight';
import { conductorsInSection } from '../run/conductors-in-section';
import type { ExpandedRun } from '../run/expanded-run';
import type { ConductorGroup, RunDocument } from '../run/run-document';
import { racewayDimensions } from '../tables/raceway-dimensions';
import { plain } from './explanation';
import type { Explanation } from './explanation';

const FORMULAS: Record<Configuration, string> = {
  single: 'w = 1',
  two: 'w = 1/√(1 − r²)',
  triangular: 'w = 1/√(1 − r²)',
  cradled: 'w = 1 + 4/3·r²',
  diamond: 'w = max(1.4, 1 + 2r²)',
  complex: 'w = 1.4',
};

/** What the set of a pull weighs: its conductors by their published weights, added up. */
export function explainWeight(
  document: RunDocument,
  expanded: ExpandedRun,
  pull: PullAnalysis,
): Explanation | null {
  const set = setOf(document, expanded, pull);
  if (pull.weight === null || !set) return null;
  const parts = set.map((group) => ({ group, ...conductorWeight(group) }));
  return {
    title: 'weight',
    exact: `${plain(pull.weight, 5)} lb/ft`,
    shownTo: '0.001 lb/ft',
    formula: 'W = Σ n·w',
    worked: [
      `${parts.map(({ group, weight = 0 }) => `${group.count} × ${plain(weight, 5)}`).join(' + ')} = ${plain(pull.weight, 5)} lb/ft`,
    ],
    inputs: parts.map(({ group, weight = 0, isEstimated }) => ({
      what: 'conductorWeight',
      value: `${plain(weight, 5)} lb/ft`,
      source:
        'cable' in group
          ? group.cable.name
          : `${group.size} ${group.insulation}: ${isEstimated ? 'metal and insulation added up, estimated' : 'a US catalogue of building wire'}`,
    })),
  };
}

/** What the wall bears of the set, as a multiple of its weight: by how it lies. */
export function explainCorrection(
  document: RunDocument,
  expanded: ExpandedRun,
  pull: PullAnalysis,
): Explanation | null {
  const { configuration, weightCorrection } = pull;
  const found = setOf(document, expanded, pull);
  const span = expanded.sections.find(({ id }) => id === pull.sectionIds[0]);
  if (!found || !span || configuration === null || weightCorrection === null) return null;
  const bores = span.raceways.flatMap(
    ({ type, tradeSize }) => racewayDimensions(type, tradeSize)?.bore ?? [],
  );
  const bore = Math.min(...bores);
  const diameter = Math.max(...found.map((group) => conductorDimensions(group)?.diameter ?? 0));
  const r = diameter / (bore - diameter);
  const isByBore = !['single', 'complex'].includes(configuration);
  return {
    title: 'correction',
    exact: plain(weightCorrection, 6),
    shownTo: '0.0001',
    formula: FORMULAS[configuration],
    worked: isByBore ? [`r = d/(D − d) = ${plain(r, 5)}`, `w = ${plain(weightCorrection, 6)}`] : [],
    inputs: [
      ...(isByBore
        ? [
            { what: 'bore', value: `${plain(bore)} in`, source: 'NEC Chapter 9 Table 4' },
            { what: 'diameter', value: `${plain(diameter)} in`, source: 'NEC Chapter 9 Table 5' },
          ]
        : []),
      {
        what: 'form',
        value: '',
        source:
          configuration === 'complex'
            ? 'a convention for sets that cannot be derived'
            : 'statics of cylinders in a cylinder; TES-P-104.05 for three',
      },
    ],
  };
}

function setOf(
  document: RunDocument,
  { sections }: ExpandedRun,
  { sectionIds }: PullAnalysis,
): ConductorGroup[] | null {
  const span = sections.find(({ id }) => id === sectionIds[0]);
  const set = span && conductorsInSection(document.path, document.conductors ?? [], span);
  return set && set.length > 0 ? set : null;
}
