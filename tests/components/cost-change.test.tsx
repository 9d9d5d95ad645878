// @vitest-environment happy-dom
import { cleanup, render } from "@testing-library/react";
import { afterEach, expect, it } from "vitest";
import { CostChange } from "#src/components/islands/parts/CostChange.tsx";
import type { CostEffect } from "#src/server/bring-in/cost-effect.ts";

afterEach(cleanup);

const known = (value: string) => ({ known: true as const, value });
const unpriced = {
  known: false as const,
  needs: [{ code: "unpriced-part" as const, at: [{ part: "a" }, { part: "b" }], page: "offers" as const }],
  without: null,
};

function written(over: Partial<CostEffect>): string {
  const effect = {
    kits: 120,
    currency: "EUR",
    before: known("14.95"),
    after: known("15.07"),
    change: "0.12",
  };
  const when = { after: "now", before: "with rev A" };
  return render(<CostChange effect={{ ...effect, ...over }} when={when} />).container.textContent ?? "";
}

it("says what a kit costs, by how much more or less, and what it cost", () => {
  expect(written({})).toBe("One kit of 120 costs €15.07 now +€0.12, worse; with rev A €14.95");
  expect(written({ after: known("14.90"), change: "-0.05" })).toContain("−€0.05, better");
  expect(written({ after: known("14.95"), change: "0" })).toContain("now +€0.00; with rev A");
});

it("says what is not known and what it needs, without a change", () => {
  expect(written({ after: unpriced, change: null })).toBe(
    "What one kit of 120 costs now is not known, needs 2 prices; with rev A €14.95",
  );
  expect(written({ before: unpriced, change: null })).toBe(
    "One kit of 120 costs €15.07 now; with rev A not known, needs 2 prices",
  );
});
