import { describe, expect, it } from "vitest";
import {
  changeText,
  countText,
  currencySign,
  moneyText,
  roundMoneyText,
  shareText,
  unitPriceText,
} from "#src/components/amount-text.ts";

/** Forms are those of the design's page on writing; the space is U+00A0 and the minus U+2212. */
describe("amounts as they are written", () => {
  it.each([
    ["1793.647", "EUR", "€1\u00a0793.65"],
    ["0.005", "EUR", "€0.01"],
    ["-2.144", "EUR", "\u2212€2.14"],
    ["-0.001", "EUR", "€0.00"],
    ["1234567", "JPY", "¥1\u00a0234\u00a0567"],
    ["12.3455", "KWD", "KWD\u00a012.346"],
    ["12", "CHF", "CHF\u00a012.00"],
  ])("money %s %s", (value, currency, written) => {
    expect(moneyText(value, currency)).toBe(written);
  });

  it("axes without cents, changes always with their sign", () => {
    expect(roundMoneyText("1499.5", "EUR")).toBe("€1\u00a0500");
    expect(changeText("0.11", "EUR")).toBe("+€0.11");
    expect(changeText("-13.2", "EUR")).toBe("\u2212€13.20");
  });

  it.each([
    ["0.062", "€0.062"],
    ["0.1", "€0.100"],
    ["3", "€3.000"],
    ["0.004321", "€0.004321"],
    ["0.0620", "€0.062"],
  ])("a unit price keeps what was quoted: %s", (value, written) => {
    expect(unitPriceText(value, "EUR")).toBe(written);
  });

  it("counts, shares, signs", () => {
    expect(countText(999)).toBe("999");
    expect(countText(1000)).toBe("1\u00a0000");
    expect(shareText("0.975")).toBe("97.5\u00a0%");
    expect(shareText("1")).toBe("100\u00a0%");
    expect(shareText("0.02")).toBe("2\u00a0%");
    expect(shareText("0")).toBe("0\u00a0%");
    expect(currencySign("EUR")).toBe("€");
    expect(currencySign("CHF")).toBe("CHF");
  });
});
