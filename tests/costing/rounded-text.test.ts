import fc from "fast-check";
import { expect, test } from "vitest";
import { Exact, exact } from "#src/costing/decimal.ts";
import { roundedText } from "#src/costing/rounded-text.ts";

/** Decimal text of any sign, up to 20 digits before the point and 24 after it. */
const decimalText = fc
  .tuple(fc.boolean(), fc.bigInt(0n, 10n ** 20n), fc.stringMatching(/^\d{0,24}$/))
  .map(([negative, whole, decimals]) => `${negative ? "-" : ""}${whole}${decimals && `.${decimals}`}`);

test("rounding in whole numbers is rounding by decimal.js, for any text and any places", () => {
  fc.assert(
    fc.property(decimalText, fc.integer({ min: 0, max: 30 }), (value, places) => {
      const rounded = new Exact(value).toDecimalPlaces(places, Exact.ROUND_HALF_UP);
      expect(roundedText(value, places)).toBe((rounded.isZero() ? exact(0) : rounded).toFixed(places));
    }),
  );
});

// By hand: 2.5 cents are 3, a hundredth of a cent below nothing is nothing.
test.each([
  ["0.025", 2, "0.03"],
  ["-0.025", 2, "-0.03"],
  ["-0.0001", 2, "0.00"],
  ["999.995", 2, "1000.00"],
  ["7", 0, "7"],
  ["7", 3, "7.000"],
])("%s to %i places is %s", (value, places, expected) => {
  expect(roundedText(value, places)).toBe(expected);
});
