import { DEFAULT_SETTINGS, analyzeRun, buildRun } from '@fairlead/shared';
import type { Run, RunDocument } from '@fairlead/shared';

/** A run as the server answers it: a draft at version 1 that may be edited, unless told otherwise. */
export function buildRunAnswer(
  document: RunDocument = buildRun(),
  revision: Partial<Run['revision']> = {},
  overrides: Partial<Run> = {},
): Run {
  return {
    id: 'run-1',
    jobId: 'job-1',
    job: { id: 'job-1', number: '2607', name: 'Clinic' },
    area: '',
    system: '',
    revision: {
      id: 'revision-1',
      number: 1,
      letter: 'A',
      state: 'draft',
      version: 1,
      document,
      savedAt: '2026-12-04T08:00:00.000Z',
      savedBy: 'Pat',
      ...revision,
    },
    analysis: analyzeRun(document),
    settings: DEFAULT_SETTINGS,
    can: { update: true, delete: true },
    ...overrides,
  };
}
