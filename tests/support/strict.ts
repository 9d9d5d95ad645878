import { afterEach, beforeEach, expect, vi } from "vitest";

/** A stray warning or error on the console fails the test that caused it: nobody reads a green run's noise. */
const seen: string[] = [];

beforeEach(() => {
  seen.length = 0;
  for (const level of ["error", "warn"] as const)
    vi.spyOn(console, level).mockImplementation((...words: unknown[]) => {
      seen.push(`console.${level}: ${words.map(String).join(" ")}`);
    });
});

afterEach(() => {
  vi.restoreAllMocks();
  expect(seen).toEqual([]);
});
