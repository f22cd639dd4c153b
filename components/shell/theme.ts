/** The theme is a cookie so that the server draws the right one at once, with no script in the page. */
export const THEME_COOKIE = 'leeside-theme';

export const themes = ['system', 'light', 'dark'] as const;
export type Theme = (typeof themes)[number];

export const toTheme = (value: string | undefined): Theme =>
  themes.find((theme) => theme === value) ?? 'system';

/** Puts a theme on the page and keeps it for a year. */
export function applyTheme(theme: Theme): void {
  if (theme === 'system') delete document.documentElement.dataset.theme;
  else document.documentElement.dataset.theme = theme;
  // biome-ignore lint/suspicious/noDocumentCookie: the Cookie Store API is not in every browser crews carry.
  document.cookie = `${THEME_COOKIE}=${theme}; path=/; max-age=31536000; samesite=lax`;
  // The sheet is drawn on a canvas and reads its colours once: tell it that they changed.
  window.dispatchEvent(new Event('leeside:theme'));
}
