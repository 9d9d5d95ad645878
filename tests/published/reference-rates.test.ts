import { describe, expect, it } from "vitest";
import { crossRate } from "#src/costing/cross-rate.ts";
import { readReferenceRates } from "#src/server/read-reference-rates.ts";

/**
 * European Central Bank, euro foreign exchange reference rates, daily file of 3 October 2022 as quoted in a public
 * test file; units of each currency for one euro.
 */
const ON_3_OCTOBER_2022: Record<string, string> = {
  USD: "0.9764",
  JPY: "141.49",
  BGN: "1.9558",
  CZK: "24.527",
  DKK: "7.4366",
  GBP: "0.87070",
  HUF: "424.86",
  PLN: "4.8320",
  SEK: "10.8743",
  CHF: "0.9658",
  IDR: "14969.79",
  ZAR: "17.5871",
};

/** The published form: single quotes, a prefix on the envelope, a namespace of its own for the cubes. */
function file(days: Record<string, Record<string, string>>): string {
  const cubes = Object.entries(days).map(
    ([day, rates]) =>
      `<Cube time='${day}'>${Object.entries(rates)
        .map(([currency, rate]) => `<Cube currency='${currency}' rate='${rate}'/>`)
        .join("")}</Cube>`,
  );
  return `<?xml version="1.0" encoding="UTF-8"?>
<gesmes:Envelope xmlns:gesmes="http://www.gesmes.org/xml/2002-08-01" xmlns="http://www.ecb.int/vocabulary/2002-08-01/eurofxref">
	<gesmes:subject>Reference rates</gesmes:subject>
	<gesmes:Sender><gesmes:name>European Central Bank</gesmes:name></gesmes:Sender>
	<Cube>${cubes.join("")}</Cube>
</gesmes:Envelope>`;
}

function read(text: string) {
  const found = readReferenceRates(text);
  if (!found.ok) throw new Error(found.code);
  return found.newest;
}

describe("the reference-rate file of the European Central Bank", () => {
  it("is read as published, digit by digit", () => {
    const { day, rates, unread } = read(file({ "2022-10-03": ON_3_OCTOBER_2022 }));
    expect(day).toBe("2022-10-03");
    expect(Object.fromEntries(rates.map(({ currency, perEuro }) => [currency, perEuro]))).toEqual(
      ON_3_OCTOBER_2022,
    );
    expect(unread).toEqual([]);
  });

  it("gives the newest of several days, wherever it stands", () => {
    const days = {
      "2022-09-30": { USD: "0.9748" },
      "2022-10-03": { USD: "0.9764" },
      "2022-09-29": { USD: "0.9706" },
    };
    expect(read(file(days))).toEqual({
      day: "2022-10-03",
      rates: [{ currency: "USD", perEuro: "0.9764" }],
      unread: [],
    });
  });

  it("hands entries back that are no rate", () => {
    const odd = { USD: "1.1367", GBP: "abc", jpy: "180", CHF: "-1", SEKX: "11", DKK: "0", NOK: "10.7895" };
    const { rates, unread } = read(file({ "2026-09-24": odd }));
    expect(rates.map(({ currency }) => currency)).toEqual(["USD", "NOK"]);
    expect(unread).toEqual(["GBP abc", "jpy 180", "CHF -1", "SEKX 11", "DKK 0"]);
  });

  it.each([
    ["another file", "Ref,Qty\nR1,1\n"],
    ["a page that says sorry", "<!doctype html><html><body><p>Not found</p></body></html>"],
    ["a day that the calendar lacks", file({ "2026-13-45": ON_3_OCTOBER_2022 })],
    ["no day", file({})],
    ["a file that breaks off", file({ "2022-10-03": ON_3_OCTOBER_2022 }).slice(0, 500)],
    [
      "an entity that would grow",
      `<!DOCTYPE x [<!ENTITY a "b">]><Envelope><Cube><Cube time='2026-01-02'><Cube currency='USD' rate='&a;'/></Cube></Cube></Envelope>`,
    ],
  ])("is refused: %s", (_, text) => {
    expect(readReferenceRates(text)).toEqual({ ok: false, code: "rates-file-unreadable" });
  });
});

describe("a cross rate", () => {
  // From the same day's file: 0.87070 ÷ 0.9764 and 141.49 ÷ 0.9764, divided by hand to ten decimals.
  it.each([
    ["USD", "GBP", "0.8917451864"],
    ["USD", "JPY", "144.9098730029"],
  ])("from %s to %s follows from the two euro rates", (foreign, reporting, rate) => {
    expect(crossRate(ON_3_OCTOBER_2022[reporting] ?? "", ON_3_OCTOBER_2022[foreign] ?? "")).toBe(rate);
  });

  it("into euro is one over the published rate", () => {
    expect(crossRate("1", "1.25")).toBe("0.8");
    expect(crossRate("1", "3")).toBe("0.3333333333");
    expect(crossRate("1.6", "1")).toBe("1.6");
  });

  it("that ten decimals cannot hold is not known rather than 0", () => {
    expect(crossRate("1", "99999999999999")).toBeNull();
  });
});
