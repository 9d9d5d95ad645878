import { readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";

/** The grid cannot read CSS variables for every parameter, so its colours are written twice: they must agree. */
const TOKENS = readFileSync(new URL("../../src/styles/tokens.css", import.meta.url), "utf8");
const GRID = readFileSync(new URL("../../src/components/islands/grid-theme.ts", import.meta.url), "utf8");

const PAIRS = [
  ["paper", "paper"],
  ["sheet", "sheet"],
  ["ink", "ink"],
  ["ink2", "ink-2"],
  ["rule", "rule"],
  ["rule2", "rule-2"],
  ["petrol", "petrol"],
  ["petrolWash", "petrol-wash"],
  ["bad", "bad"],
] as const;

describe("colours of the grid", () => {
  it.each(PAIRS)("%s is the token %s in both themes", (name, token) => {
    const inGrid = [...GRID.matchAll(new RegExp(`\\b${name}: "(#[0-9A-F]{6})"`, "g"))].map(([, hex]) =>
      hex?.toLowerCase(),
    );
    const pair = new RegExp(`--color-${token}: light-dark\\((#[0-9a-f]{6}), (#[0-9a-f]{6})\\)`).exec(TOKENS);
    expect(inGrid).toEqual([pair?.[1], pair?.[2]]);
  });
});
