import { describe, expect, it } from "vitest";
import { themeAttributes, themeFromCookie } from "#src/components/theme.ts";

describe("the theme a person chose", () => {
  it("reads its cookie, and follows the system when there is none or it is unknown", () => {
    expect(themeFromCookie("dark")).toBe("dark");
    expect(themeFromCookie("light")).toBe("light");
    expect(themeFromCookie(undefined)).toBe("system");
    expect(themeFromCookie('"><script>')).toBe("system");
  });

  it("names the grid's mode except where only the browser knows it", () => {
    expect(themeAttributes("dark")).toEqual({ "data-theme": "dark", "data-ag-theme-mode": "dark" });
    expect(themeAttributes("system")["data-ag-theme-mode"]).toBeUndefined();
  });
});
