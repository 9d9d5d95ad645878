/** Writes the grid's mode on `<html>`: the chosen theme, or the system's where the person chose none. */
export function writeGridMode(root: HTMLElement, dark: MediaQueryList): void {
  const { theme } = root.dataset;
  const system = dark.matches ? "dark" : "light";
  root.dataset.agThemeMode = theme === "light" || theme === "dark" ? theme : system;
}

/** Keeps `data-ag-theme-mode` of `<html>` right from the start and when the system changes. */
export function followSystemTheme(root: HTMLElement, dark: MediaQueryList): void {
  writeGridMode(root, dark);
  dark.addEventListener("change", () => writeGridMode(root, dark));
}
