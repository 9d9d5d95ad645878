import { describe, expect, it } from "vitest";
import { readCells } from "#src/partslist/cells.ts";
import { mappingOf } from "#src/partslist/columns.ts";
import type { Answer } from "#src/partslist/draft.ts";
import { readLeadTime } from "#src/partslist/lead-time.ts";
import type { KnownPart, PriceDraft, PriceRow } from "#src/partslist/price-draft.ts";
import { readMoney } from "#src/partslist/prices.ts";
import { choiceLabel, questionSentence } from "#src/partslist/questions.ts";
import { guessPriceColumns, readPrices } from "#src/partslist/read-prices.ts";

const part = (over: Partial<KnownPart> & { id: string }): KnownPart => ({
  name: over.id,
  class: "resistor",
  value: null,
  package: null,
  manufacturer: null,
  partNumber: null,
  orderCodes: [],
  ...over,
});

const PARTS = [
  part({ id: "r10k", name: "10 kΩ", value: "10k", package: "0207", orderCodes: ["EB-1003"] }),
  part({ id: "r1k", name: "1 kΩ", value: "1k", package: "0207" }),
  part({
    id: "c100n",
    name: "100 nF",
    class: "capacitor",
    value: "100n",
    package: "RM 5",
    partNumber: "KP-104",
  }),
  part({ id: "chip", name: "4093", class: "integrated-circuit", value: "CD4093", package: "DIP-14" }),
];

function read(text: string, answers: Answer[] = []) {
  const { records } = readCells(text);
  return readPrices({
    records,
    mapping: mappingOf(guessPriceColumns(records)),
    answers,
    parts: PARTS,
    supplier: "Tamsin",
  });
}

const offers = (rows: readonly PriceRow[]): PriceDraft[] =>
  rows.flatMap((row) => ((row.kind === "offer" || row.kind === "question") && row.offer ? [row.offer] : []));
const ladder = (offer: PriceDraft | undefined) =>
  offer?.breaks.map((step) => `${step.quantity}:${step.amount}`).join(" ");

describe("price lists", () => {
  it("with breaks in columns, matched by order code, part number, value and package", () => {
    const { rows, counts } = read(
      "Best.-Nr.;Herstellernummer;Bezeichnung;1+;10+;100+;VPE;Lieferzeit\nEB 1003;;Widerstand 10k 0207;0,04;0,02;0,008;10;3 Tage\nT-9;KP104;Keramik;0,10;0,08;;1;2-3 Wochen\nT-1;;Widerstand 1k 0207;0,04;0,02;0,01;;\n",
    );
    expect(offers(rows).map((offer) => [offer.part, offer.matchedBy, ladder(offer)])).toEqual([
      ["r10k", "order-code", "1:0.04 10:0.02 100:0.008"],
      ["c100n", "part-number", "1:0.1 10:0.08"],
      ["r1k", "value-and-package", "1:0.04 10:0.02 100:0.01"],
    ]);
    expect(offers(rows)[0]).toMatchObject({ supplier: "Tamsin", orderMultiple: 10, leadTimeDays: 3 });
    expect(offers(rows)[1]?.leadTimeDays).toBe(21);
    expect(counts).toEqual({ rows: 4, offers: 3, breaks: 0, skipped: 1, questions: 0, must: 0, look: 0 });
  });

  it("with one row to a break, the name repeated or left out", () => {
    const { rows, counts } = read(
      "Order code,MPN,Qty,Price (EUR),MOQ,Stock\nT1,KP-104,1,0.10,10,1200\nT1,KP-104,25,0.08,10,1200\n,,100,0.05,,\nT2,CD4093,1,0.55,1,> 500\n",
    );
    expect(offers(rows).map(ladder)).toEqual(["1:0.1 25:0.08 100:0.05", "1:0.55"]);
    expect(offers(rows)[0]).toMatchObject({
      rows: [2, 3, 4],
      currency: "EUR",
      minimumOrder: 10,
      stockShown: 1200,
    });
    expect(offers(rows)[1]).toMatchObject({ part: "chip", stockShown: 500 });
    expect(counts).toMatchObject({ offers: 2, breaks: 2, skipped: 1 });
  });

  it("pasted from a spreadsheet", () =>
    expect(offers(read("Artikel\tab 1\tab 10\nKP-104\t0,10 €\t0,08 €").rows)[0]).toMatchObject({
      part: "c100n",
      currency: "EUR",
    }));

  it("asks for the part of what it cannot match, and takes any part of the workshop for an answer", () => {
    const text = "Order code,Description,Price\nT7,Resistor 10k axial,0.02\nT8,Pliers,12.50\n";
    const open = read(text).rows;
    const question = open[1]?.questions[0];
    expect(question && questionSentence(question)).toBe("No part of the workshop is known by “T7”.");
    expect(question?.alternatives.map((choice) => choiceLabel("part-not-found", choice))).toEqual([
      "It is 10 kΩ",
    ]);
    const settled = read(text, [
      { row: 2, code: "part-not-found", choice: "take-part:r10k" },
      { row: 3, code: "part-not-found", choice: "take-part:chip" },
    ]);
    expect(offers(settled.rows).map((offer) => [offer.part, offer.matchedBy])).toEqual([
      ["r10k", "answer"],
      ["chip", "answer"],
    ]);
  });

  it("asks about a ladder that contradicts itself", () => {
    const text = "Order code,Qty,Price\nEB-1003,1,0.05\nEB-1003,10,0.04\nEB-1003,10,0.03\n";
    const [, row] = read(text).rows;
    expect(row?.questions[0]).toMatchObject({ code: "ladder-not-rising", level: "must" });
    expect(row?.questions[0] && questionSentence(row.questions[0])).toBe(
      "Two prices hold from 10 up: 0.04 and 0.03.",
    );
    expect(ladder(offers(read(text).rows)[0])).toBe("1:0.05 10:0.03");
    expect(
      ladder(offers(read(text, [{ row: 2, code: "ladder-not-rising", choice: "keep-higher" }]).rows)[0]),
    ).toBe("1:0.05 10:0.04");
  });

  it("points at a price that rises, and keeps it", () => {
    const { rows } = read("Order code;1;10;100\nEB-1003;0,05;0,06;0,03");
    expect(rows[1]?.questions[0]).toMatchObject({
      code: "price-rises",
      level: "look",
      suggested: { choice: "keep-prices" },
    });
    expect(ladder(offers(rows)[0])).toBe("1:0.05 10:0.06 100:0.03");
  });

  it("takes a price for a hundred as such where it would be dearer than one", () =>
    expect(ladder(offers(read("Artikel;ab 1;ab 100\nKP-104;0,10;4,50/100").rows)[0])).toBe(
      "1:0.1 100:0.045",
    ));
});

describe("prices of a cell", () => {
  it.each([
    ["$2.25", "2.25", "USD"],
    [" 0.93 € ", "0.93", "EUR"],
    ["1.234,56", "1234.56", null],
    ["1,234.56", "1234.56", null],
    ["0,05 zł", "0.05", "PLN"],
    ["CHF 3.50", "3.5", "CHF"],
    ["0.10 each", "0.1", null],
    ["12,-", "12", null],
  ])("%s", (text, amount, currency) => expect(readMoney(text)).toEqual({ kind: "price", amount, currency }));

  it.each(["", "???", "-", "on request", "n/a"])("%j is not known", (text) =>
    expect(readMoney(text)).toEqual({ kind: "empty" }),
  );

  it("reads a price for many both ways", () => {
    expect(readMoney("0,66/100", "comma")).toMatchObject({
      kind: "per",
      amount: "0.66",
      per: 100,
      each: "0.0066",
    });
    expect(readMoney("10 for 5.00")).toMatchObject({ kind: "per", amount: "5", per: 10, each: "0.5" });
  });
});

describe("lead times", () => {
  it.each([
    ["5 days", false, 5],
    ["2-3 Wochen", false, 21],
    ["4", true, 28],
    ["on request", false, null],
  ])("%s", (text, inWeeks, days) => expect(readLeadTime(text, inWeeks)).toBe(days));
});
