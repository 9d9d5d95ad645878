import { readdirSync, readFileSync } from "node:fs";
import { fileURLToPath } from "node:url";
import { describe, expect, it } from "vitest";
import { readCells } from "#src/partslist/cells.ts";
import { guessColumns, mappingOf } from "#src/partslist/columns.ts";
import type { Question, Row } from "#src/partslist/draft.ts";
import type { KnownPart, PriceRow } from "#src/partslist/price-draft.ts";
import { readList } from "#src/partslist/read-list.ts";
import { guessPriceColumns, readPrices } from "#src/partslist/read-prices.ts";
import { decodeUpload } from "#src/server/decode-upload.ts";

/** Invented lists, offered for download where lists are brought in, each beside what a person reads in it. */
const FOLDER = fileURLToPath(new URL("../../samples/", import.meta.url));

interface Sample {
  file: string;
  kind: "parts-list" | "price-list";
  title: string;
  shows: string;
}
const json = (name: string): unknown => JSON.parse(readFileSync(`${FOLDER}${name}`, "utf8"));
const SAMPLES = json("samples.json") as Sample[];

function open(file: string) {
  const decoded = decodeUpload(readFileSync(`${FOLDER}${file}`));
  if (!decoded.ok) throw new Error(decoded.code);
  return { encoding: decoded.encoding, ...readCells(decoded.text) };
}

function asked(rows: readonly { questions: readonly Question[] }[]) {
  return rows.flatMap((row) =>
    row.questions.map(({ row: at, code, level, suggested, alsoRows }) => ({
      row: at,
      code,
      level,
      suggested: suggested.choice,
      ...(alsoRows.length > 0 ? { alsoRows } : {}),
    })),
  );
}

function lineFacts(row: Row) {
  if ((row.kind !== "line" && row.kind !== "question") || row.line === null) return [];
  const { designators, quantity, value, reading, mark } = row.line;
  return [
    [
      row.row,
      designators.join(" "),
      quantity,
      value,
      reading ? `${reading.si} ${reading.unit}` : null,
      row.line.class,
      mark,
    ],
  ];
}

function offerFacts(row: PriceRow) {
  if ((row.kind !== "offer" && row.kind !== "question") || row.offer === null) return [];
  const { orderCode, part, matchedBy, breaks, minimumOrder, orderMultiple, stockShown, leadTimeDays } =
    row.offer;
  const ladder = breaks.map((step) => [step.quantity, step.amount, step.currency]);
  return [
    {
      row: row.row,
      orderCode,
      part,
      matchedBy,
      breaks: ladder,
      minimumOrder,
      orderMultiple,
      stockShown,
      leadTimeDays,
    },
  ];
}

function partsFacts({ encoding, records, dialect }: ReturnType<typeof open>) {
  const guesses = guessColumns(records);
  const { rows, counts, joinOffers } = readList({ records, mapping: mappingOf(guesses), answers: [] });
  return {
    encoding,
    delimiter: dialect.delimiter,
    decimalMark: dialect.decimalMark,
    heading: guesses.headerRecord,
    columns: guesses.columns.map((column) => column.meaning),
    lines: rows.flatMap(lineFacts),
    skipped: rows.flatMap((row) => (row.kind === "skipped" ? [[row.row, row.reason]] : [])),
    questions: asked(rows),
    counts,
    join: joinOffers.map((offer) => offer.designators.join(" ")),
  };
}

function priceFacts({ encoding, records, dialect }: ReturnType<typeof open>, parts: KnownPart[]) {
  const guesses = guessPriceColumns(records);
  const { rows, counts } = readPrices({
    records,
    mapping: mappingOf(guesses),
    answers: [],
    parts,
    supplier: null,
  });
  return {
    encoding,
    delimiter: dialect.delimiter,
    decimalMark: dialect.decimalMark,
    heading: guesses.headerRecord,
    columns: guesses.columns.map((column) => column.meaning),
    parts,
    offers: rows.flatMap(offerFacts),
    questions: asked(rows),
    counts,
  };
}

describe("samples", () => {
  it.each(SAMPLES)("$file: $title", ({ file, kind }) => {
    const expected = json(file.replace(/\.\w+$/, ".expected.json")) as { parts?: KnownPart[] };
    const sheet = open(file);
    expect(kind === "price-list" ? priceFacts(sheet, expected.parts ?? []) : partsFacts(sheet)).toEqual(
      expected,
    );
  });

  it("are all in the catalogue", () => {
    const files = readdirSync(FOLDER).filter((name) => /\.(?:csv|txt)$/.test(name));
    expect(SAMPLES.map((sample) => sample.file).sort()).toEqual(files.sort());
  });
});
