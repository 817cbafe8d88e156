import type { RunDocument, RunSummary, Status, StripSummary, TradeSize } from '@fairlead/shared';
import type { AnalyzedDocument } from './analyze-document';

/** The columns of a revision that follow from its document. */
export interface SummaryColumns {
  engineVersion: string;
  status: Status;
  lengthInches: number | null;
  degrees: number;
  worstSectionDegrees: number;
  remainingDegrees: number;
  fillPercent: number | null;
  sections: number;
  pullPoints: number;
  racewayType: string;
  tradeSize: TradeSize | null;
  fromLabel: string;
  toLabel: string;
  strip: StripSummary;
}

export interface DocumentColumns extends SummaryColumns {
  document: RunDocument;
  tag: string;
  title: string;
}

export function documentColumns(analyzed: AnalyzedDocument): DocumentColumns {
  const { document } = analyzed;
  return {
    document,
    tag: document.tag,
    title: document.title ?? '',
    ...summaryColumns(analyzed),
  };
}

export function summaryColumns({ analysis, summary }: AnalyzedDocument): SummaryColumns {
  const { from, to, ...columns } = summary;
  return {
    ...columns,
    engineVersion: analysis.engineVersion,
    fromLabel: from,
    toLabel: to,
  };
}

export function summaryOf(columns: Omit<SummaryColumns, 'engineVersion'>): RunSummary {
  return {
    status: columns.status,
    lengthInches: columns.lengthInches,
    degrees: columns.degrees,
    worstSectionDegrees: columns.worstSectionDegrees,
    remainingDegrees: columns.remainingDegrees,
    fillPercent: columns.fillPercent,
    sections: columns.sections,
    pullPoints: columns.pullPoints,
    racewayType: columns.racewayType,
    tradeSize: columns.tradeSize,
    from: columns.fromLabel,
    to: columns.toLabel,
    strip: columns.strip,
  };
}
