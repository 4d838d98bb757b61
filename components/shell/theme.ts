export const THEMES = { system: 'As the system', light: 'Light', dark: 'Dark' } as const;
export type Theme = keyof typeof THEMES;
export const THEME_COOKIE = 'plumbrow-theme';

export function parseTheme(value: string | undefined): Theme {
  return value === 'light' || value === 'dark' ? value : 'system';
}

/** Shows a theme at once and keeps it for a year in this browser. */
export function applyTheme(theme: Theme): void {
  const age = theme === 'system' ? 0 : 60 * 60 * 24 * 365;
  document.cookie = `${THEME_COOKIE}=${theme}; path=/; max-age=${String(age)}; samesite=lax`;
  if (theme === 'system') delete document.documentElement.dataset.theme;
  else document.documentElement.dataset.theme = theme;
}
