import { existsSync, readFileSync } from "node:fs";
import { fileURLToPath } from "node:url";
import { describe, expect, test } from "vitest";
import { CURRENCY_DECIMALS, currencyDecimals } from "#src/costing/currencies.ts";
import { minorText, toMinor } from "#src/costing/money.ts";

/** ISO 4217 list one, published 2024-06-25 by the maintenance agency (SIX): minor units of every code. */
const LIST = fileURLToPath(new URL("../../../shared/checks/iso4217_list.json", import.meta.url));
const here = existsSync(LIST);

describe("currencies: ISO 4217, list one of 2024-06-25", () => {
  test("179 codes less 13 without minor unit: 17 with none, 140 with two, 7 with three, 2 with four decimals", () => {
    const of = (decimals: number) =>
      [...CURRENCY_DECIMALS.values()].filter((value) => value === decimals).length;
    expect([CURRENCY_DECIMALS.size, of(0), of(2), of(3), of(4)]).toEqual([166, 17, 140, 7, 2]);
  });

  test("the exceptions from two decimals", () => {
    const of = (decimals: number) =>
      [...CURRENCY_DECIMALS].filter(([, value]) => value === decimals).map(([code]) => code);
    expect(of(0).sort().join(" ")).toBe(
      "BIF CLP DJF GNF ISK JPY KMF KRW PYG RWF UGX UYI VND VUV XAF XOF XPF",
    );
    expect(of(3).sort().join(" ")).toBe("BHD IQD JOD KWD LYD OMR TND");
    expect(of(4).sort().join(" ")).toBe("CLF UYW");
  });

  test("metals, testing and units of account are no currencies", () => {
    for (const code of "XAG XAU XBA XBB XBC XBD XDR XPD XPT XSU XTS XUA XXX".split(" ")) {
      expect(currencyDecimals(code), code).toBeNull();
    }
  });

  test("an amount is charged in its currency's minor unit", () => {
    expect([toMinor("1234.5", "JPY"), minorText(1235, "JPY")]).toEqual([1235n, "1235"]);
    expect([toMinor("1.2345", "KWD"), minorText(1235, "KWD")]).toEqual([1235n, "1.235"]);
    expect([toMinor("1234.505", "USD"), minorText(5, "USD")]).toEqual([123451n, "0.05"]);
  });

  test(
    here
      ? "every code of the full list"
      : "every code of the full list: not run, the folder of lists is absent",
    () => {
      const { currencies } = here ? JSON.parse(readFileSync(LIST, "utf8")) : { currencies: {} };
      for (const [code, { minor_units: decimals }] of Object.entries<{ minor_units: string }>(currencies)) {
        expect(currencyDecimals(code)?.toString() ?? "N.A.", code).toBe(decimals);
      }
    },
  );
});
