import fc from "fast-check";
import { afterEach, beforeEach, expect, vi } from "vitest";

/**
 * Random cases are the same in every run, so that a red run can be had again and a green one stays green.
 * `TINPENNY_SEED=4711 npx vitest run` looks elsewhere; what it finds becomes an example of its own.
 */
fc.configureGlobal({ seed: Number(process.env.TINPENNY_SEED ?? 20_261_201) });

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
