import {
  DEFAULT_SETTINGS,
  analyzeRun,
  expandRun,
  parseRunDocument,
  summarizeRun,
} from '@fairlead/shared';
import type { Problem, RunAnalysis, RunDocument, RunSummary } from '@fairlead/shared';
import { invalid } from '../common/api-exception';

export interface AnalyzedDocument {
  document: RunDocument;
  analysis: RunAnalysis;
  summary: RunSummary;
}

/** What was sent, read by the parser and worked out here: nobody else's totals are stored. */
export function readDocument(sent: unknown): AnalyzedDocument {
  const parsed = parseRunDocument(sent);
  if (!parsed.ok) throw invalid('invalid-document', parsed.problems.map(below('/document')));
  return analyzeDocument(parsed.document);
}

export function analyzeDocument(document: RunDocument): AnalyzedDocument {
  const analysis = analyzeRun(document, DEFAULT_SETTINGS);
  const summary = summarizeRun(document, analysis, expandRun(document, DEFAULT_SETTINGS));
  return { document, analysis, summary };
}

const below = (parent: string) => (problem: Problem) => ({
  ...problem,
  pointer: parent + problem.pointer,
});
