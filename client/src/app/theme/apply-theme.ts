import { densityOf, themeOf, useDevice } from '../../lib/device';

/** Writes the theme and density in force onto <html>, now and whenever they change: before the first paint. */
export function applyTheme(): () => void {
  const write = () => {
    const device = useDevice.getState();
    const { scheme, sun } = themeOf(device);
    const root = document.documentElement;
    root.dataset.mantineColorScheme = scheme;
    root.toggleAttribute('data-sun', sun);
    root.dataset.density = densityOf(device);
  };
  write();
  return useDevice.subscribe(write);
}
