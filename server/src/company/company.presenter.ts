import type { Company as CompanyAnswer, CompanySettings } from '@fairlead/shared';
import type { Viewer } from '../common/viewer';
import type { Company } from '../people/models/company.model';
import { canUpdateSettings } from './company.policy';

export function presentCompany(
  company: Company,
  settings: CompanySettings,
  viewer: Viewer,
): CompanyAnswer {
  return {
    id: company.id,
    name: company.name,
    timeZone: company.timeZone,
    settings,
    version: company.settingsVersion,
    can: { updateSettings: canUpdateSettings(viewer) },
  };
}
