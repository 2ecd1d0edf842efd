/** Keeps the page in the theme that was chosen, or in the device's own. */
import { getSettings, subscribeSettings } from './settings.ts';

export function followTheme(): void {
  const device = matchMedia('(prefers-color-scheme: dark)');
  const apply = () => {
    const { theme } = getSettings();
    const dark = theme === 'dark' || (theme === 'system' && device.matches);
    document.documentElement.dataset.theme = dark ? 'dark' : 'light';
  };
  device.addEventListener('change', apply);
  subscribeSettings(apply);
  apply();
}
