import type { RunDocument } from '../run/run-document';
import type { RunAnalysis, RunSummary, Status } from './run-analysis';
import type { CompanySettings } from './settings';

export const REVISION_STATES = ['draft', 'checked', 'released', 'pulled', 'superseded'] as const;
export type RevisionState = (typeof REVISION_STATES)[number];
export const RUN_SORTS = ['updatedAt', 'tag', 'status', 'length', 'degrees', 'fill'] as const;
export type RunSort = (typeof RUN_SORTS)[number];

export interface RunCan {
  update: boolean;
  delete: boolean;
}

/** One row of a job's runs table. */
export interface RunListItem {
  id: string;
  jobId: string;
  tag: string;
  title: string;
  area: string;
  system: string;
  revision: { number: number; letter: string; state: RevisionState };
  summary: RunSummary;
  updatedAt: string;
  updatedBy: string;
  can: RunCan;
}

export interface Run {
  id: string;
  jobId: string;
  job: { id: string; number: string; name: string };
  area: string;
  system: string;
  revision: {
    id: string;
    number: number;
    /** Shown: A, B … */
    letter: string;
    state: RevisionState;
    /** The save counter behind `baseVersion`; never shown. */
    version: number;
    document: RunDocument;
    savedAt: string;
    savedBy: string;
  };
  analysis: RunAnalysis;
  /** What the analysis was made with; an editor analyses with the same. */
  settings: CompanySettings;
  can: RunCan;
}

export interface CreateRunBody {
  id: string;
  document: RunDocument;
  area?: string;
  system?: string;
}

export interface SaveRunBody {
  baseVersion: number;
  document: RunDocument;
}

export interface UpdateRunBody {
  area?: string;
  system?: string;
}

export interface RunListFilter {
  status?: Status;
  search?: string;
}

/** A run judged for somebody who is not signed in. */
export interface AnalyzeBody {
  document: RunDocument;
}

export interface AnalysisAnswer {
  analysis: RunAnalysis;
}
