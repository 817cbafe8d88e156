import type { CompanySettings } from './settings';

/** The shop somebody is signed in to. */
export interface Company {
  id: string;
  name: string;
  timeZone: string;
  settings: CompanySettings;
  /** Save counter of the settings. */
  version: number;
  can: { updateSettings: boolean };
}

export interface SaveCompanySettingsBody {
  baseVersion: number;
  settings: CompanySettings;
}
