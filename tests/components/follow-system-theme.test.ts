// @vitest-environment happy-dom
import { describe, expect, it } from "vitest";
import { followSystemTheme } from "#src/components/follow-system-theme.ts";

class Query extends EventTarget {
  constructor(public matches: boolean) {
    super();
  }
}

function pageWith(theme: string): HTMLElement {
  const root = document.createElement("html");
  root.dataset.theme = theme;
  return root;
}

describe("following the system's theme", () => {
  it("writes the grid's mode and keeps it in step", () => {
    const root = pageWith("system");
    const dark = new Query(true);
    followSystemTheme(root, dark as unknown as MediaQueryList);
    expect(root.dataset.agThemeMode).toBe("dark");
    dark.matches = false;
    dark.dispatchEvent(new Event("change"));
    expect(root.dataset.agThemeMode).toBe("light");
  });

  it("keeps a chosen theme whatever the system says", () => {
    const root = pageWith("light");
    const dark = new Query(true);
    followSystemTheme(root, dark as unknown as MediaQueryList);
    dark.dispatchEvent(new Event("change"));
    expect(root.dataset.agThemeMode).toBe("light");
  });
});
