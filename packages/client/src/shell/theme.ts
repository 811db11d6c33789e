export type Theme = 'system' | 'light' | 'dark';
const key = 'lydite.theme';

export const readTheme = (): Theme => {
  const kept = localStorage.getItem(key);
  return kept === 'light' || kept === 'dark' ? kept : 'system';
};

/** Shows a theme and keeps the choice on this device. Printing is always light: see the print styles. */
export function applyTheme(theme: Theme): void {
  if (theme === 'system') {
    localStorage.removeItem(key);
    delete document.documentElement.dataset.theme;
  } else {
    localStorage.setItem(key, theme);
    document.documentElement.dataset.theme = theme;
  }
}
