import type { Theme } from '#shared/api/units.ts';

const KEY = 'barmkin-theme';

/** Sets the theme and remembers it; `/theme.js` reads the same key before the first paint. */
export function applyTheme(theme: Theme) {
  try {
    localStorage.setItem(KEY, theme);
  } catch {
    // Storage may be shut off; the theme then lasts until the page is left.
  }
  document.documentElement.dataset.theme = theme;
}
