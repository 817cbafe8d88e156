import type { PullAnalysis, StopLimit } from '../contracts/run-analysis';
import { conductorsInSection } from '../run/conductors-in-section';
import { bareConductor } from '../tables/bare-conductors';
import type { ExpandedRun } from '../run/expanded-run';
import type { ConductorGroup, RunDocument } from '../run/run-document';
import { conductorLimit } from '../pull/pulling-limits';
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
    formula: 'T = S·n·A, × 0.8 for more than three, ≤ 10,000',
    worked: set.map(worked),
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

function worked(group: ConductorGroup): string {
  if ('cable' in group) return `${group.count} × ${plain(group.cable.maxTension)} lbf`;
  const { circularMils } = bareConductor(group.size, false);
  const each = group.material === 'Cu' ? 0.008 : 0.006;
  return `${group.count} × ${circularMils} × ${each} = ${plain(group.count * circularMils * each, 2)} lbf`;
}

function own(title: string, exact: string, source: string): Explanation {
  return {
    title,
    exact,
    formula: '',
    worked: [],
    inputs: [{ what: 'limit', value: exact, source }],
  };
}
