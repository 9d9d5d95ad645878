// @vitest-environment happy-dom
import { cleanup, fireEvent, render, screen } from "@testing-library/react";
import { afterEach, describe, expect, it } from "vitest";
import { Rates } from "#src/components/islands/supply/Rates.tsx";
import type { RateView } from "#src/server/currency-rate-changes.ts";

afterEach(cleanup);

const rate = (currency: string, dated: string, perForeignUnit: string): RateView => ({
  ...{ currency, dated, perForeignUnit, setAt: 0, version: 1 },
});

function show(canChange: boolean, canFetch = false) {
  const rates = [
    rate("GBP", "2026-03-06", "1.25"),
    rate("USD", "2026-03-06", "0.8"),
    rate("USD", "2026-02-02", "0.9"),
    rate("USD", "2026-01-05", "0.85"),
  ];
  render(
    <Rates
      {...{ workshop: "w", reporting: "EUR", rates, canChange, canFetch }}
      used={["CHF", "EUR", "USD"]}
      today="2026-03-09"
    />,
  );
}

const lines = () =>
  screen
    .getAllByRole("row")
    .slice(1)
    .map((row) => row.textContent ?? "");

describe("the table of currency rates", () => {
  it("shows what lacks a rate first, then the newest of each currency", () => {
    show(false);
    const rows = lines();
    expect(rows).toHaveLength(3);
    expect(rows[0]).toContain("CHF");
    expect(rows[0]).toContain("No rate");
    expect(rows[1]).toContain("GBP");
    expect(rows[2]).toContain("0.8");
    expect(rows[2]).toContain("2 earlier");
  });

  it("unfolds the earlier ones, the newest first", () => {
    show(false);
    const button = screen.getByRole("button", { name: "2 earlier rates of USD" });
    expect(button.getAttribute("aria-expanded")).toBe("false");
    fireEvent.click(button);
    expect(lines()).toHaveLength(5);
    expect(lines()[3]).toContain("0.9");
    expect(lines()[4]).toContain("0.85");
    expect(button.getAttribute("aria-expanded")).toBe("true");
  });

  it("gives ways to change them to those who may, and fetches only where an address is set", () => {
    const button = (name: RegExp) => screen.queryByRole("button", { name });
    show(true);
    expect(button(/^Set the rate of CHF/)?.textContent).toBe("Set it");
    expect(button(/^Bring in reference rates/)).not.toBeNull();
    expect(button(/^Fetch today’s/)).toBeNull();
    cleanup();
    show(true, true);
    expect(button(/^Fetch today’s/)).not.toBeNull();
    cleanup();
    show(false, true);
    expect(button(/^Set|^Remove|^Bring in|^Fetch|^Add/)).toBeNull();
  });
});
