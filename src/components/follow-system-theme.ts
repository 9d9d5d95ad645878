/** Keeps `data-ag-theme-mode` of `<html>` in step with the system where the person chose no theme. */
export function followSystemTheme(root: HTMLElement, dark: MediaQueryList): void {
  if (root.dataset.theme !== "system") return;
  const write = () => {
    root.dataset.agThemeMode = dark.matches ? "dark" : "light";
  };
  write();
  dark.addEventListener("change", write);
}
