import { analyzeRun, expandRun } from '@fairlead/shared';
import type { CompanySettings, RunDocument } from '@fairlead/shared';
import type { RunEditorData } from './run-editor-state';

export type AnalysedDocument = Pick<
  RunEditorData,
  'document' | 'analysis' | 'expanded' | 'findings' | 'fixesReady'
>;

/** A document with its answers, worked out anew; throws an `InvalidRunError` where the parser refuses it. */
export function analysedDocument(
  document: RunDocument,
  settings: CompanySettings,
): AnalysedDocument {
  const analysis = analyzeRun(document, settings);
  const expanded = expandRun(document, settings);
  return { document, analysis, expanded, findings: analysis.findings, fixesReady: false };
}
