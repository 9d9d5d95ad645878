import { THEME_COOKIE, themeAttributes, themeFromCookie } from "#src/components/theme.ts";

const YEAR = 365 * 24 * 60 * 60;

/** Lets the radio buttons of `#theme-choice` set the theme at once, and keeps it in this browser for a year. */
export function chooseTheme(page: Document, followSystem: () => void): void {
  page.getElementById("theme-choice")?.addEventListener("change", (change) => {
    const choice = themeFromCookie((change.target as HTMLInputElement).value);
    const secure = page.location.protocol === "https:" ? "; secure" : "";
    page.cookie = `${THEME_COOKIE}=${choice}; path=/; max-age=${YEAR}; samesite=lax${secure}`;
    for (const [name, value] of Object.entries(themeAttributes(choice))) {
      if (value === undefined) page.documentElement.removeAttribute(name);
      else page.documentElement.setAttribute(name, value);
    }
    page
      .querySelector('meta[name="color-scheme"]')
      ?.setAttribute("content", choice === "system" ? "light dark" : choice);
    followSystem();
  });
}
