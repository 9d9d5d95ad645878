import { describe, expect, it } from "vitest";
import { whoWords } from "#src/components/islands/price/AskedPrice.tsx";
import { aimOf, FIRST_AIMS } from "#src/components/islands/price/aim-draft.ts";
import { freeName } from "#src/components/islands/price/channel-entry.ts";
import { CHANNEL_ROWS, rowLabel } from "#src/components/islands/price/channel-rows.ts";
import { offText, priceText } from "#src/components/islands/price/price-words.ts";
import { withOwnPrice } from "#src/components/islands/price/with-own-price.ts";
import { channel, FOUR } from "#tests/costing/price/channels.ts";

const known = (value: string) => ({ known: true, value }) as const;

describe("words of the price page", () => {
  it("name who sets the price and who sees it", () => {
    expect(whoWords({ setters: ["Tom"], seers: ["Ines", "Ruth"] })).toBe(
      "Tom sets the price. Ines and Ruth see it.",
    );
    expect(whoWords({ setters: ["Ines", "Tom"], seers: [] })).toBe("Ines and Tom set the price.");
  });

  it("write what goes off with a minus, and what does not apply as a dash", () => {
    expect(offText(known("6.76"), "EUR")).toBe("−€6.76");
    expect(offText(known("0"), "EUR")).toBe("–");
    expect([priceText("34.00", "EUR"), priceText("20.5", "EUR")]).toEqual(["€34", "€20.50"]);
  });

  it("put the one tax rate and the one other cost into the names of their rows", () => {
    const row = (key: string) => CHANNEL_ROWS.find((one) => one.key === key) as (typeof CHANNEL_ROWS)[number];
    expect(rowLabel(row("tax"), FOUR)).toBe("Tax inside, 21\u00a0%");
    expect(rowLabel(row("tax"), [...FOUR, channel({ taxRate: "0.19" })])).toBe("Tax inside");
    expect(rowLabel(row("other"), FOUR)).toBe("Stall hire");
    expect(rowLabel(row("other"), [channel()])).toBe("Other costs of selling");
  });
});

describe("what is typed there", () => {
  it("becomes an aim, a rate from hundredths; an empty target is none", () => {
    expect(aimOf("margin", { ...FIRST_AIMS, margin: "32.5" })).toEqual({ aim: "margin", rate: "0.325" });
    expect(aimOf("profit", { ...FIRST_AIMS, profit: "600.00", taxed: "40" })).toEqual({
      aim: "profit",
      amount: "600.00",
      taxRate: "0.4",
    });
    expect(aimOf("hour", { ...FIRST_AIMS, hour: "" })).toBeNull();
  });

  it("keeps own prices in one order, each edition once", () => {
    const prices = withOwnPrice([{ edition: "b", price: "2" }], "a", "1");
    expect(prices).toEqual([
      { edition: "a", price: "1" },
      { edition: "b", price: "2" },
    ]);
    expect(withOwnPrice(prices, "b", null)).toEqual([{ edition: "a", price: "1" }]);
  });

  it("gives a new channel a name that is free", () => {
    const taken = [{ name: "New channel" }, { name: "New channel 2" }];
    expect(freeName("New channel", taken)).toBe("New channel 3");
  });
});
