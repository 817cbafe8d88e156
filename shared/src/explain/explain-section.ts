import type { SectionAnalysis } from '../contracts/run-analysis';
import { conductorDimensions } from '../run/conductor-dimensions';
import { conductorsInSection } from '../run/conductors-in-section';
import type { ExpandedRun } from '../run/expanded-run';
import type { CodeEdition, ConductorGroup, RunDocument } from '../run/run-document';
import { racewayDimensions } from '../tables/raceway-dimensions';
import { formatAngle } from '../units/format-angle';
import { plain } from './explanation';
import type { Explanation } from './explanation';

const TABLE_4 = 'NEC Chapter 9 Table 4, 2026 edition';
const TABLE_5 = 'NEC Chapter 9 Table 5, 2026 edition';

/** The degrees of a section: every bend that counts, in order. */
export function explainDegrees(section: SectionAnalysis, edition: CodeEdition): Explanation {
  const bends = section.bends.filter(({ angle }) => angle > 0);
  return {
    title: 'degrees',
    exact: formatAngle(section.degrees),
    formula: 'Σ θ ≤ limit',
    worked: [
      `${bends.map(({ angle }) => formatAngle(angle)).join(' + ') || '0°'} = ${formatAngle(section.degrees)}`,
    ],
    inputs: [
      {
        what: 'degreeLimit',
        value: formatAngle(section.limitDegrees),
        source: section.limitFrom === 'code' ? `NEC ${edition.slice(-4)}` : section.limitFrom,
      },
    ],
  };
}

/** Fill: the area of the conductors over the area of the bore. */
export function explainFill(
  document: RunDocument,
  expanded: ExpandedRun,
  section: SectionAnalysis,
): Explanation | null {
  const { fill } = section;
  const set = setOf(document, expanded, section);
  if (!fill || !set) return null;
  return {
    title: 'fill',
    exact: `${plain(fill.percent)} %`,
    formula: 'Σ n·a / A × 100',
    worked: [
      `${set.map(({ count, area }) => `${count} × ${plain(area)}`).join(' + ')} = ${plain(fill.conductorArea)} in²`,
      `${plain(fill.conductorArea)} / ${plain(fill.racewayArea)} × 100 = ${plain(fill.percent)} %`,
    ],
    inputs: [
      {
        what: 'racewayArea',
        value: `${plain(fill.racewayArea)} in²`,
        source: `${TABLE_4}: ${fill.raceway.tradeSize} ${fill.raceway.type}`,
      },
      ...set.map(({ group, area }) => ({
        what: 'conductorArea',
        value: `${plain(area)} in²`,
        source:
          'cable' in group ? group.cable.name : `${TABLE_5}: ${group.size} ${group.insulation}`,
      })),
      {
        what: 'fillLimit',
        value: `${plain(fill.limitPercent)} %`,
        source: 'NEC Chapter 9 Table 1',
      },
    ],
  };
}

/** The jam ratio: bore over the diameter of three equal conductors. */
export function explainJam({ jam, fill }: SectionAnalysis): Explanation | null {
  const bore = fill && racewayDimensions(fill.raceway.type, fill.raceway.tradeSize)?.bore;
  if (!jam || !bore) return null;
  const diameter = bore / jam.ratio;
  return {
    title: 'jam',
    exact: plain(jam.ratio),
    formula: 'D/d and 1.05·D/d, clear outside 2.8 to 3.2',
    worked: [
      `${plain(bore)} / ${plain(diameter)} = ${plain(jam.ratio)}`,
      `1.05 × ${plain(jam.ratio)} = ${plain(jam.ratioWithOvality)}`,
    ],
    inputs: [
      { what: 'bore', value: `${plain(bore)} in`, source: TABLE_4 },
      { what: 'diameter', value: `${plain(diameter)} in`, source: TABLE_5 },
    ],
  };
}

interface Sized {
  group: ConductorGroup;
  count: number;
  area: number;
}

function setOf(
  document: RunDocument,
  { sections }: ExpandedRun,
  { id }: SectionAnalysis,
): Sized[] | null {
  const span = sections.find((each) => each.id === id);
  if (!span) return null;
  return conductorsInSection(document.path, document.conductors ?? [], span).map((group) => ({
    group,
    count: group.count,
    area: conductorDimensions(group)?.area ?? 0,
  }));
}
