import { holds } from '../common/access/rights';
import type { Viewer } from '../common/viewer';

/** Limits, frictions and the edition of the whole shop. */
export function canUpdateSettings({ role }: Pick<Viewer, 'role'>): boolean {
  return holds(role, 'company.settings');
}
