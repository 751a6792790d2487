export const themes = ['auto', 'light', 'dark'] as const;
export type Theme = (typeof themes)[number];

const remembered = 'nilas.theme';

/** What the person chose on this device; `auto` follows the device. */
export function readTheme(): Theme {
  const chosen = localStorage.getItem(remembered);
  return themes.find((theme) => theme === chosen) ?? 'auto';
}

export function setTheme(theme: Theme) {
  if (theme === 'auto') localStorage.removeItem(remembered);
  else localStorage.setItem(remembered, theme);
  applyTheme();
}

/** Before the first paint: src/index.css reads the attribute. */
export function applyTheme() {
  const theme = readTheme();
  if (theme === 'auto') delete document.documentElement.dataset.theme;
  else document.documentElement.dataset.theme = theme;
}
