import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { readCells } from "#src/partslist/cells.ts";
import { guessColumns, mappingOf } from "#src/partslist/columns.ts";
import { MEANINGS } from "#src/partslist/meanings.ts";
import { pasteBlock } from "#src/partslist/paste-block.ts";
import { choiceLabel, questionSentence } from "#src/partslist/questions.ts";
import { readList } from "#src/partslist/read-list.ts";
import { guessPriceColumns, readPrices } from "#src/partslist/read-prices.ts";
import { unsafeCell, writeList } from "#src/partslist/write-list.ts";

/** Texts made of what lists are made of, and of anything else. */
const piece = fc.oneof(
  fc.constantFrom(
    "R1",
    "R1-R4",
    "C1,C2",
    "10k",
    "100n",
    "4,7",
    "0.5",
    "Qty",
    "Ref",
    "Wert",
    "Total",
    "Summe",
    "DNP",
    "x",
    "€",
    "1/4W",
    "//",
    "#",
    "---",
    "+--+",
    "|",
    "REF**",
    "2 of 100",
    "0,66/100",
    " ",
    "",
  ),
  fc.string({ unit: "grapheme", maxLength: 8 }),
);
const parting = fc.constantFrom(",", ";", "\t", "|", "\n", "\r\n", '"', "  ", " ");
const anyText = fc.array(fc.tuple(piece, parting), { maxLength: 60 }).map((parts) => parts.flat().join(""));

describe("any text", () => {
  it("is read without failing, and every record is accounted for once", () => {
    fc.assert(
      fc.property(anyText, (text) => {
        const { records } = readCells(text);
        const { rows, counts } = readList({
          records,
          mapping: mappingOf(guessColumns(records)),
          answers: [],
        });
        expect(rows.map((row) => row.record)).toEqual(records.map((record) => record.record));
        expect(counts.lines + counts.skipped + counts.questions + counts.joined).toBe(records.length);
      }),
      { numRuns: 150 },
    );
  });

  it("raises only questions that have words for every choice", () => {
    fc.assert(
      fc.property(anyText, (text) => {
        const { records } = readCells(text);
        const { rows } = readList({ records, mapping: mappingOf(guessColumns(records)), answers: [] });
        for (const question of rows.flatMap((row) => row.questions)) {
          expect(questionSentence(question)).toMatch(/[.]$/);
          for (const choice of [question.suggested, ...question.alternatives])
            expect(choiceLabel(question.code, choice)).not.toBe(choice.choice);
        }
      }),
      { numRuns: 100 },
    );
  });

  it("is read under any meaning a person may give its columns, with all suggestions taken", () => {
    fc.assert(
      fc.property(
        anyText,
        fc.array(fc.constantFrom(...MEANINGS), { minLength: 30, maxLength: 30 }),
        (text, given) => {
          const { records } = readCells(text);
          const mapping = mappingOf(guessColumns(records));
          mapping.columns = mapping.columns.map((column, at) => ({
            ...column,
            meaning: given[at % given.length] ?? "leave-out",
          }));
          const open = readList({ records, mapping, answers: [] });
          const answers = open.rows.flatMap((row) =>
            row.questions.map(({ code, suggested }) => ({ row: row.row, code, choice: suggested.choice })),
          );
          const settled = readList({ records, mapping, answers });
          expect(settled.counts.questions).toBe(0);
          expect(settled.counts.lines).toBe(open.counts.linesWithSuggestions);
        },
      ),
      { numRuns: 120 },
    );
  });

  it("is read as a price list, and every record is accounted for once", () => {
    fc.assert(
      fc.property(anyText, (text) => {
        const { records } = readCells(text);
        const { rows, counts } = readPrices({
          records,
          mapping: mappingOf(guessPriceColumns(records)),
          answers: [],
          parts: [],
          supplier: null,
        });
        expect(rows).toHaveLength(records.length);
        expect(counts.offers + counts.breaks + counts.skipped + counts.questions).toBe(records.length);
      }),
      { numRuns: 120 },
    );
  });

  it("is not changed by reading: the same records give the same rows", () => {
    fc.assert(
      fc.property(anyText, (text) => {
        const { records } = readCells(text);
        const before = JSON.stringify(records);
        const once = readList({ records, mapping: mappingOf(guessColumns(records)), answers: [] });
        expect(readList({ records, mapping: mappingOf(guessColumns(records)), answers: [] })).toEqual(once);
        expect(JSON.stringify(records)).toBe(before);
      }),
      { numRuns: 100 },
    );
  });
});

describe("cells that are written", () => {
  const cell = fc
    .string({ unit: "grapheme", maxLength: 12 })
    .filter((text) => !text.includes("\u0000") && !text.includes("\r") && !text.startsWith("\uFEFF"));
  const grid = fc
    .integer({ min: 3, max: 5 })
    .chain((width) =>
      fc.array(fc.array(cell, { minLength: width, maxLength: width }), { minLength: 2, maxLength: 6 }),
    );

  it("read back as they were", () => {
    fc.assert(
      fc.property(grid, (rows) => {
        const text = writeList(rows, { delimiter: "\t" });
        expect(pasteBlock(text).map((row) => row.map(unsafeCell))).toEqual(
          rows.map((row) => row.map(unsafeCell)),
        );
      }),
    );
  });
});
