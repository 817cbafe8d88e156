import type { RunAnalysis, RunSummary, StripSummary } from './contracts/run-analysis';
import { degreesStatus } from './checks/verdicts';
import type { ExpandedRun } from './run/expanded-run';
import { isAccessible, isPullPoint } from './run/pull-points';
import type { RunDocument } from './run/run-document';

/** The columns lists sort and filter by, and the small strip of a list row, from a run and its analysis. */
export function summarizeRun(
  document: RunDocument,
  analysis: RunAnalysis,
  expanded: ExpandedRun,
): RunSummary {
  const { sections, totals } = analysis;
  const fills = sections.flatMap(({ fill }) => fill ?? []);
  const [fullest] = fills.sort((a, b) => b.percent / b.limitPercent - a.percent / a.limitPercent);
  return {
    status: analysis.status,
    lengthInches: totals.length,
    degrees: totals.degrees,
    worstSectionDegrees: Math.max(...sections.map(({ degrees }) => degrees)),
    remainingDegrees: Math.min(...sections.map(({ remainingDegrees }) => remainingDegrees)),
    fillPercent: fullest?.percent ?? null,
    sections: totals.sections,
    pullPoints: totals.pullPoints,
    racewayType: document.raceway.type,
    tradeSize: document.raceway.tradeSize,
    from: expanded.sections[0]?.from.label ?? '',
    to: expanded.sections[expanded.sections.length - 1]?.to.label ?? '',
    strip: summarizeStrip(analysis, expanded),
  };
}

/** The strip shows the run and its degrees, so a section carries the status of its degrees alone. */
function summarizeStrip(analysis: RunAnalysis, expanded: ExpandedRun): StripSummary {
  return {
    length: expanded.length,
    pullPoints: expanded.elements.flatMap(({ element, from }) =>
      isPullPoint(element) ? [{ station: from, accessible: isAccessible(element) }] : [],
    ),
    bends: expanded.bends.map(({ from, to, angle }) => ({ station: (from + to) / 2, angle })),
    sections: expanded.sections.map(({ id, fromStation, toStation }, index) => ({
      from: fromStation,
      to: toStation,
      degrees: analysis.sections[index]?.degrees ?? 0,
      limit: analysis.sections[index]?.limitDegrees ?? 0,
      status: degreesStatus(analysis, id),
    })),
  };
}
