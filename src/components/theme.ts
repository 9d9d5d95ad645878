/**
 * The theme a person chose. Stored in the cookie `theme`, read on the server so that the first paint is right;
 * `system` leaves the choice to the browser's own setting. `choose-theme.ts` writes it, `ThemeChoice.tsx` asks.
 */
export const THEME_COOKIE = "theme";
export const THEME_CHOICES = ["light", "dark", "system"] as const;
export type ThemeChoice = (typeof THEME_CHOICES)[number];

/** The choice a cookie's text stands for; anything unknown, or no cookie, is `system`. */
export function themeFromCookie(text: string | undefined): ThemeChoice {
  return THEME_CHOICES.find((choice) => choice === text) ?? "system";
}

export type ThemeAttributes = {
  "data-theme": ThemeChoice;
  "data-ag-theme-mode": "light" | "dark" | undefined;
};

/**
 * What `<html>` carries for a choice. The grid needs light or dark by name, which for `system` only the browser
 * knows; there `follow-system-theme.ts` writes it.
 */
export function themeAttributes(choice: ThemeChoice): ThemeAttributes {
  return { "data-theme": choice, "data-ag-theme-mode": choice === "system" ? undefined : choice };
}
