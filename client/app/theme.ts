export const themes = ["system", "light", "dark"] as const;
export type Theme = (typeof themes)[number];
/** The name under which client/public/theme.js finds it before the first paint. */
export const themeKey = "idlewright-theme";

export function storedTheme(): Theme {
  try {
    const stored = localStorage.getItem(themeKey);
    return stored === "light" || stored === "dark" ? stored : "system";
  } catch {
    return "system";
  }
}

/** Shows a theme now and keeps it; "system" forgets what was set. */
export function setTheme(theme: Theme): void {
  const { dataset } = document.documentElement;
  if (theme === "system") delete dataset.theme;
  else dataset.theme = theme;
  try {
    if (theme === "system") localStorage.removeItem(themeKey);
    else localStorage.setItem(themeKey, theme);
  } catch {
    // No storage: it lasts as long as the page.
  }
}
