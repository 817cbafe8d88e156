import { useMemo } from 'react';
import { densityOf, themeOf, useDevice } from '../lib/device';

/** The theme and density in force on this device. */
export function useTheme() {
  const device = useDevice();
  return useMemo(
    () => ({
      ...themeOf(device),
      density: densityOf(device),
      choice: device.themeChoice,
      densityChoice: device.densityChoice,
    }),
    [device],
  );
}
