import type { CompanySettings } from '../contracts/settings';
import type { CodeEdition, RunDocument } from './run-document';

export type Profile = 'power' | 'telecom';

/** The edition a run is judged by: its own, else the company's. */
export function editionOf(document: RunDocument, settings: CompanySettings): CodeEdition {
  return document.rules?.code ?? settings.code;
}

export function profileOf(document: RunDocument): Profile {
  return document.rules?.profile ?? 'power';
}
