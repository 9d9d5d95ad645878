// @vitest-environment happy-dom
import { cleanup, fireEvent, render, screen } from "@testing-library/react";
import { afterEach, describe, expect, it } from "vitest";
import ThemeChoice from "#src/components/islands/parts/ThemeChoice.tsx";
import { themeFromCookie } from "#src/components/theme.ts";

afterEach(cleanup);

function cookie(): string | undefined {
  return /(?:^|; )theme=([^;]*)/.exec(document.cookie)?.[1];
}

describe("choosing a theme", () => {
  it("takes it at once, and leaves a cookie that the server reads back", () => {
    render(<ThemeChoice start="system" />);
    fireEvent.click(screen.getByRole("radio", { name: "Dark" }));
    expect(document.documentElement.dataset.theme).toBe("dark");
    expect(document.documentElement.dataset.agThemeMode).toBe("dark");
    expect(themeFromCookie(cookie())).toBe("dark");
    expect(screen.getByRole<HTMLInputElement>("radio", { name: "Dark" }).checked).toBe(true);
  });

  it("goes back to the system", () => {
    render(<ThemeChoice start="dark" />);
    fireEvent.click(screen.getByRole("radio", { name: "As this device is set" }));
    expect(document.documentElement.dataset.theme).toBe("system");
    expect(themeFromCookie(cookie())).toBe("system");
  });
});
