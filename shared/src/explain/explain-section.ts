import { clearanceOf } from '../checks/clearance';
import type { ClearanceForm } from '../checks/clearance';
import { sizedGroups } from '../checks/section-conductors';
import type { SizedGroup } from '../checks/section-conductors';
import type { FillAnswer, SectionAnalysis } from '../contracts/run-analysis';
import { conductorsInSection } from '../run/conductors-in-section';
import type { ExpandedRun } from '../run/expanded-run';
import type { CodeEdition, RunDocument } from '../run/run-document';
import { racewayDimensions } from '../tables/raceway-dimensions';
import { formatAngle } from '../units/format-angle';
import { plain } from './explanation';
import type { Explanation, ExplanationInput } from './explanation';

const TABLE_4 = 'NEC Chapter 9 Table 4, 2026 edition';
const TABLE_5 = 'NEC Chapter 9 Table 5, 2026 edition';

/** The degrees of a section, or of its way up to one of its pieces: every bend that counts, in order. */
export function explainDegrees(
  section: SectionAnalysis,
  edition: CodeEdition,
  until?: { path: readonly { id: string }[]; elementId: string },
): Explanation {
  const bends = section.bends.filter(({ angle }) => angle > 0);
  const passed = until ? passedBy(until.path, until.elementId) : null;
  const counted = passed ? bends.filter(({ elementId }) => passed.has(elementId)) : bends;
  const total = counted[counted.length - 1]?.cumulative ?? 0;
  return {
    title: 'degrees',
    exact: `${plain(total)}°`,
    shownTo: null,
    formula: 'Σ θ ≤ limit',
    worked: [`${counted.map(({ angle }) => plain(angle)).join(' + ') || '0'} = ${plain(total)}°`],
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
    shownTo: '0.1 %',
    formula: 'Σ n·a / A × 100',
    worked: [
      `${set.map(({ count, area }) => `${count} × ${plain(area, 6)}`).join(' + ')} = ${plain(fill.conductorArea, 6)} in²`,
      `${plain(fill.conductorArea, 6)} / ${plain(fill.racewayArea)} × 100 = ${plain(fill.percent)} %`,
    ],
    inputs: [
      racewayArea(fill),
      ...set.map(({ group, area }) => ({
        what: 'conductorArea',
        value: `${plain(area, 6)} in²`,
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
    shownTo: '0.01',
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

const racewayArea = ({ racewayArea: area, raceway }: FillAnswer): ExplanationInput => ({
  what: 'racewayArea',
  value: `${plain(area)} in²`,
  source: `${TABLE_4}: ${raceway.tradeSize} ${raceway.type}`,
});

/** Each form of clearance, D the bore, d the diameter of one, r = d/(D − d). */
const CLEARANCE_FORMULAS: Record<ClearanceForm, string> = {
  one: 'D − d',
  two: 'D/2 + √(((D − d)/2)² − (d/2)²) − d/2',
  'two-too-wide': 'D − 2d',
  triangular: 'D/2 − 1.366·d + (D − d)/2 · √(1 − r²)',
  cradled: 'D/2 − d/2 + (D − d)/2 · (1 − 2r²)',
  'three-too-wide': 'D − (1 + 2/√3)·d',
  four: 'D − (1 + √2)·d',
};

/** The room over the conductors: by how they lie in the bore. */
export function explainClearance(
  document: RunDocument,
  expanded: ExpandedRun,
  section: SectionAnalysis,
): Explanation | null {
  const { fill } = section;
  const set = setOf(document, expanded, section);
  const bore = fill && racewayDimensions(fill.raceway.type, fill.raceway.tradeSize)?.bore;
  const found = set && bore ? clearanceOf(bore, set) : null;
  if (!found || !bore) return null;
  const { form, diameter, clearance } = found;
  const derived = form === 'one' || form === 'triangular' ? 'TES-P-104.05, 5.4.1' : 'by geometry';
  return {
    title: 'clearance',
    exact: `${plain(clearance)} in`,
    shownTo: '0.01 in',
    formula: `c = ${CLEARANCE_FORMULAS[form]}`,
    worked: [
      `D = ${plain(bore)}, d = ${plain(diameter)}, r = ${plain(diameter / (bore - diameter))}`,
      `c = ${plain(clearance)} in`,
    ],
    inputs: [
      { what: 'bore', value: `${plain(bore)} in`, source: TABLE_4 },
      { what: 'diameter', value: `${plain(diameter)} in`, source: TABLE_5 },
      { what: 'form', value: '', source: derived },
    ],
  };
}

/** How many more go in: the most that pass, and one more, which does not. */
export function explainRoom(
  document: RunDocument,
  expanded: ExpandedRun,
  section: SectionAnalysis,
): Explanation | null {
  const { fill } = section;
  const set = setOf(document, expanded, section);
  if (!fill || !set) return null;
  const worked = set.flatMap(({ group, area }) => {
    if ('cable' in group) return [];
    const room = fill.room[group.size] ?? 0;
    return [room, room + 1].map((more) => {
      const total = fill.conductorArea + more * area;
      return `${group.size}: (${plain(fill.conductorArea, 6)} + ${more} × ${plain(area, 6)}) / ${plain(fill.racewayArea)} × 100 = ${plain((total / fill.racewayArea) * 100, 2)} %`;
    });
  });
  return {
    title: 'room',
    exact: set
      .flatMap(({ group }) =>
        'cable' in group ? [] : [`${fill.room[group.size] ?? 0} × ${group.size}`],
      )
      .join(', '),
    shownTo: null,
    formula: '(Σ n·a + m·a) / A ≤ limit',
    worked: [...new Set(worked)],
    inputs: [
      {
        what: 'fillLimit',
        value: fill.nipple ? '60 %' : '53, 31, 40 %',
        source: 'NEC Chapter 9 Table 1; Note 7 rounds up from 0.8 where all are of one size',
      },
      racewayArea(fill),
    ],
  };
}

function passedBy(path: readonly { id: string }[], elementId: string): Set<string> {
  const end = path.findIndex(({ id }) => id === elementId);
  return new Set(path.slice(0, end + 1).map(({ id }) => id));
}

function setOf(
  document: RunDocument,
  { sections }: ExpandedRun,
  { id }: SectionAnalysis,
): SizedGroup[] | null {
  const span = sections.find((each) => each.id === id);
  if (!span) return null;
  return sizedGroups(conductorsInSection(document.path, document.conductors ?? [], span));
}
