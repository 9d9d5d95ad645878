import fc from "fast-check";
import { expect, test } from "vitest";
import { minorReaching, toMinor } from "#src/costing/money.ts";

test("a threshold between two minor units is reached by the upper one only", () => {
  expect(minorReaching("4.10", "JPY")).toBe(5n);
  expect(minorReaching("4", "JPY")).toBe(4n);
  expect(minorReaching("75", "EUR")).toBe(7500n);
  expect(minorReaching("0.000001", "KWD")).toBe(1n);
});

test("goods reach a threshold just when they are at least as much, whatever the currency's decimals", () => {
  const threshold = fc
    .tuple(fc.nat(999), fc.nat(999_999))
    .map(([whole, part]) => `${whole}.${String(part).padStart(6, "0")}`);
  fc.assert(
    fc.property(
      threshold,
      fc.nat(10_000_000),
      fc.constantFrom("JPY", "EUR", "KWD"),
      (text, goods, currency) => {
        const unit = 10n ** BigInt({ JPY: 6, EUR: 4, KWD: 3 }[currency] ?? 0);
        const exact = BigInt(text.replace(".", ""));
        expect(BigInt(goods) >= minorReaching(text, currency)).toBe(BigInt(goods) * unit >= exact);
      },
    ),
  );
});

test("what is charged is rounded, not raised", () => {
  expect(toMinor("6.16", "JPY")).toBe(6n);
  expect(toMinor("4.905", "EUR")).toBe(491n);
});
