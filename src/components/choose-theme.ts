import { writeGridMode } from "./follow-system-theme.ts";
import { THEME_COOKIE, type ThemeChoice } from "./theme.ts";

const YEAR_SECONDS = 365 * 24 * 60 * 60;

/** Takes a theme at once in this page, and for a year in this browser: the server reads the cookie. */
export function chooseTheme(choice: ThemeChoice, page: Document, dark: MediaQueryList): void {
  const secure = page.location.protocol === "https:" ? "; secure" : "";
  page.cookie = `${THEME_COOKIE}=${choice}; path=/; max-age=${YEAR_SECONDS}; samesite=lax${secure}`;
  page.documentElement.dataset.theme = choice;
  writeGridMode(page.documentElement, dark);
}
