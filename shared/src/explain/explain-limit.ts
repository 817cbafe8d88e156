import type { PullAnalysis, StopLimit } from '../contracts/run-analysis';
import { conductorsInSection } from '../run/conductors-in-section';
import type { ExpandedRun } from '../run/expanded-run';
import type { ConductorGroup, RunDocument } from '../run/run-document';
import { carryingGroups, conductorLimit } from '../pull/pulling-limits';
import { plain } from './explanation';
import type { Explanation } from './explanation';

/** Where a limit of a pull comes from. */
export function explainLimit(
  document: RunDocument,
  expanded: ExpandedRun,
  pull: PullAnalysis,
  limit: StopLimit,
): Explanation | null {
  const { limits } = pull;
  const span = expanded.sections.find(({ id }) => id === pull.sectionIds[0]);
  if (!limits || !span) return null;
  if (limit === 'sidewall') {
    return own(
      'sidewallLimit',
      `${plain(limits.sidewall.stop)} lb/ft`,
      'General Cable, January 2011',
    );
  }
  if (limit === 'puller' || limit === 'rope') {
    return own(
      'ownLimit',
      `${plain(limits[limit] ?? 0)} lbf`,
      'given on the run or by the company',
    );
  }
  const set = conductorsInSection(document.path, document.conductors ?? [], span);
  const conductor = conductorLimit(set);
  if (limit === 'attachment' && limits.attachment < conductor) {
    return {
      title: 'attachment',
      exact: `${plain(limits.attachment, 2)} lbf`,
      shownTo: '1 lb',
      formula: 'min(1,000, T of the conductors)',
      worked: [`min(1000, ${plain(conductor, 2)}) = ${plain(limits.attachment, 2)} lbf`],
      inputs: [
        {
          what: 'attachment',
          value: '1000 lbf',
          source: 'ICEA style sheet; TES-P-104.05: 4.45 kN',
        },
      ],
    };
  }
  return {
    title: 'conductor',
    exact: `${plain(conductor, 2)} lbf`,
    shownTo: '1 lb',
    formula: 'T = S·n·A, × 0.8 for more than three, ≤ 10,000',
    worked: workedLimit(set, conductor),
    inputs: [
      {
        what: 'perCircularMil',
        value: '0.008 Cu, 0.006 Al',
        source: "a US maker's installation table",
      },
      { what: 'circularMils', value: '', source: 'NEC Chapter 9 Table 8' },
    ],
  };
}

/** Those of the largest size carry it; the others ride along. */
function workedLimit(set: readonly ConductorGroup[], limit: number): string[] {
  const carrying = carryingGroups(set);
  const whole = carrying.reduce((sum, { count, each }) => sum + count * each, 0);
  const lines = carrying.map(({ count, each, size }) =>
    size === 0
      ? `${count} × ${plain(each)} = ${plain(count * each, 2)} lbf`
      : `${count} × ${size} × ${plain(each / size)} = ${plain(count * each, 2)} lbf`,
  );
  const shared = carrying.reduce((sum, { count }) => sum + count, 0) > 3;
  if (shared) lines.push(`${plain(whole, 2)} × 0.8 = ${plain(whole * 0.8, 2)} lbf`);
  if (limit < (shared ? whole * 0.8 : whole)) lines.push(`≤ ${plain(limit)} lbf`);
  return lines;
}

function own(title: string, exact: string, source: string): Explanation {
  return {
    title,
    exact,
    shownTo: null,
    formula: '',
    worked: [],
    inputs: [{ what: 'limit', value: exact, source }],
  };
}
