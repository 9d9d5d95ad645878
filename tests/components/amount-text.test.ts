import { describe, expect, it } from "vitest";
import {
  axisMoneyText,
  changeText,
  countText,
  currencySign,
  moneyText,
  rateText,
  roundMoneyText,
  shareText,
  unitPriceText,
} from "#src/components/amount-text.ts";

/** Forms are those of DESIGN section 8; the space is U+00A0 and the minus U+2212. */
describe("amounts as they are written", () => {
  it.each([
    ["1793.647", "EUR", "€1\u00a0793.65"],
    ["14.947083", "EUR", "€14.95"],
    ["0.005", "EUR", "€0.01"],
    ["-2.144", "EUR", "\u2212€2.14"],
    ["-0.001", "EUR", "€0.00"],
    ["1234567", "JPY", "¥1\u00a0234\u00a0567"],
    ["1234.4", "JPY", "¥1\u00a0234"],
    ["12.3455", "KWD", "KWD\u00a012.346"],
    ["1234567.5", "CHF", "CHF\u00a01\u00a0234\u00a0567.50"],
  ])("money %s %s", (value, currency, written) => {
    expect(moneyText(value, currency)).toBe(written);
  });

  it("axes without cents unless they count in less, changes always with their sign", () => {
    expect(roundMoneyText("1499.5", "EUR")).toBe("€1\u00a0500");
    expect(axisMoneyText(5, [0, 5, 10], "EUR")).toBe("€5");
    expect(axisMoneyText(0.5, [0, 0.5, 1], "EUR")).toBe("€0.50");
    expect(changeText("84.94", "EUR")).toBe("+€84.94");
    expect(changeText("-13.2", "EUR")).toBe("\u2212€13.20");
  });

  it.each([
    ["0.062", "€0.062"],
    ["0.1", "€0.100"],
    ["3", "€3.000"],
    ["0.0043", "€0.0043"],
    ["0.004321", "€0.004321"],
    ["0.0620", "€0.062"],
  ])("a unit price keeps what was quoted: %s", (value, written) => {
    expect(unitPriceText(value, "EUR")).toBe(written);
  });

  it("counts, shares in whole hundredths, rates as they were entered, signs", () => {
    expect(countText(999)).toBe("999");
    expect(countText(1000)).toBe("1\u00a0000");
    expect(shareText("0.4285714")).toBe("43\u00a0%");
    expect(shareText("1")).toBe("100\u00a0%");
    expect(shareText("0")).toBe("0\u00a0%");
    expect(rateText("0.975")).toBe("97.5\u00a0%");
    expect(rateText("0.00125")).toBe("0.125\u00a0%");
    expect(rateText("1.5")).toBe("150\u00a0%");
    expect(rateText("0")).toBe("0\u00a0%");
    expect(currencySign("EUR")).toBe("€");
    expect(currencySign("CHF")).toBe("CHF");
  });
});
