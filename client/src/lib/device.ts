import { create } from 'zustand';

export const THEME_CHOICES = ['system', 'light', 'dark', 'sun'] as const;
export type ThemeChoice = (typeof THEME_CHOICES)[number];
export const DENSITY_CHOICES = ['auto', 'office', 'field'] as const;
export type DensityChoice = (typeof DENSITY_CHOICES)[number];

const THEME_KEY = 'fairlead.theme';
const DENSITY_KEY = 'fairlead.density';

/** What this device asks for, kept on the device: nobody wants the phone's sun theme on the office screen. */
interface Device {
  themeChoice: ThemeChoice;
  densityChoice: DensityChoice;
  systemDark: boolean;
  moreContrast: boolean;
  coarsePointer: boolean;
}

export interface Theme {
  scheme: 'light' | 'dark';
  sun: boolean;
}

/** More contrast asked for by the system means the sun tokens, unless the reader chose a theme here. */
export function themeOf(
  device: Pick<Device, 'themeChoice' | 'systemDark' | 'moreContrast'>,
): Theme {
  const { themeChoice, systemDark, moreContrast } = device;
  if (themeChoice === 'sun') return { scheme: 'light', sun: true };
  if (themeChoice !== 'system') return { scheme: themeChoice, sun: false };
  if (moreContrast) return { scheme: 'light', sun: true };
  return { scheme: systemDark ? 'dark' : 'light', sun: false };
}

export function densityOf(
  device: Pick<Device, 'densityChoice' | 'coarsePointer'>,
): 'office' | 'field' {
  if (device.densityChoice !== 'auto') return device.densityChoice;
  return device.coarsePointer ? 'field' : 'office';
}

/** Storage can be switched off or full; the choice then lasts until the page closes. */
function read<T extends string>(key: string, allowed: readonly T[], otherwise: T): T {
  try {
    const kept = localStorage.getItem(key);
    return allowed.find((value) => value === kept) ?? otherwise;
  } catch {
    return otherwise;
  }
}

function keep(key: string, value: string): void {
  try {
    localStorage.setItem(key, value);
  } catch {
    // The choice holds for this page only.
  }
}

const MEDIA = {
  systemDark: '(prefers-color-scheme: dark)',
  moreContrast: '(prefers-contrast: more)',
  coarsePointer: '(pointer: coarse)',
} as const;
type MediaName = keyof typeof MEDIA;
const MEDIA_NAMES = Object.keys(MEDIA) as MediaName[];

export const useDevice = create<Device>(() => ({
  themeChoice: read(THEME_KEY, THEME_CHOICES, 'system'),
  densityChoice: read(DENSITY_KEY, DENSITY_CHOICES, 'auto'),
  systemDark: matchMedia(MEDIA.systemDark).matches,
  moreContrast: matchMedia(MEDIA.moreContrast).matches,
  coarsePointer: matchMedia(MEDIA.coarsePointer).matches,
}));

for (const name of MEDIA_NAMES) {
  matchMedia(MEDIA[name]).addEventListener('change', (event) =>
    useDevice.setState({ [name]: event.matches }),
  );
}

export function chooseTheme(themeChoice: ThemeChoice): void {
  keep(THEME_KEY, themeChoice);
  useDevice.setState({ themeChoice });
}

export function chooseDensity(densityChoice: DensityChoice): void {
  keep(DENSITY_KEY, densityChoice);
  useDevice.setState({ densityChoice });
}
