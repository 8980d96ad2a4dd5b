// Before the first paint, so that a theme set by hand does not flash. The name is the one in client/app/theme.ts.
try {
  const theme = localStorage.getItem("idlewright-theme");
  if (theme === "light" || theme === "dark") document.documentElement.dataset.theme = theme;
} catch {
  // No storage: the theme follows the system.
}
