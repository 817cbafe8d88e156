import type { PullPoint, RunDocument } from '@fairlead/shared';

/** Nothing but the two ends and pipe between them. */
export function isEmptyRun({ path }: Pick<RunDocument, 'path'>): boolean {
  return path.length <= 3 && path.slice(1, -1).every(({ kind }) => kind === 'straight');
}

/** Whether somebody has said what the run leaves from. */
export function hasStart({ path }: Pick<RunDocument, 'path'>): boolean {
  const start = path[0] as PullPoint | undefined;
  return start !== undefined && (start.device !== 'open-end' || Boolean(start.label));
}
