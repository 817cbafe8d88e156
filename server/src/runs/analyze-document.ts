import { analyzeRun, expandRun, parseRunDocument, summarizeRun } from '@fairlead/shared';
import type {
  CompanySettings,
  Problem,
  RunAnalysis,
  RunDocument,
  RunSummary,
} from '@fairlead/shared';
import { invalid } from '../common/api-exception';

export interface AnalyzedDocument {
  document: RunDocument;
  analysis: RunAnalysis;
  summary: RunSummary;
  /** What it was judged by. */
  settings: CompanySettings;
}

/** What was sent, read by the parser and worked out here: nobody else's totals are stored. */
export function readDocument(sent: unknown, settings: CompanySettings): AnalyzedDocument {
  const parsed = parseRunDocument(sent);
  if (!parsed.ok) throw invalid('invalid-document', parsed.problems.map(below('/document')));
  return analyzeDocument(parsed.document, settings);
}

export function analyzeDocument(
  document: RunDocument,
  settings: CompanySettings,
): AnalyzedDocument {
  const analysis = analyzeRun(document, settings);
  const summary = summarizeRun(document, analysis, expandRun(document, settings));
  return { document, analysis, summary, settings };
}

const below = (parent: string) => (problem: Problem) => ({
  ...problem,
  pointer: parent + problem.pointer,
});
