import { DEFAULT_SETTINGS } from '@fairlead/shared';
import type { CompanySettings } from '@fairlead/shared';
import { createContext, useContext } from 'react';

/** What the company has set; the same the open run is analysed with. */
export const SettingsContext = createContext<CompanySettings>(DEFAULT_SETTINGS);

export const useSettings = () => useContext(SettingsContext);
