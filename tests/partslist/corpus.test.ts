import { describe, expect, it } from "vitest";
import { readCells } from "#src/partslist/cells.ts";
import { guessColumns, mappingOf } from "#src/partslist/columns.ts";
import type { DraftLine, Row, RowCounts } from "#src/partslist/draft.ts";
import { readList } from "#src/partslist/read-list.ts";
import { decodeUpload } from "#src/server/decode-upload.ts";
import { type CorpusLine, type CorpusList, corpusBytes, corpusLists } from "./corpus-facts.ts";

/**
 * Where we read otherwise than the recorded facts, on purpose. 074: the last row (crystal Y2) is a part
 * that the facts leave out. 013: "LIN10K … 10K" names the resistance of a potentiometer; the facts give none.
 */
const READ_OTHERWISE = ["074 line 28: a line too many", "013 line 10: value 10000 instead of none"];

const PASSIVE = ["ohm", "F", "H"];
const DUPLICATES = ["designator-in-two-rows", "designator-twice-in-row", "alternative-tables"];
const MISMATCHES = ["quantity-mismatch", "quantity-zero", "designator-unclear"];

function readCorpus(list: CorpusList): { rows: Row[]; counts: RowCounts } {
  const decoded = decodeUpload(corpusBytes(list));
  if (!decoded.ok) throw new Error(decoded.code);
  const { records } = readCells(decoded.text);
  const { rows, counts } = readList({ records, mapping: mappingOf(guessColumns(records)), answers: [] });
  return { rows, counts };
}

/** Rows that ask, also through the first of several rows that ask alike. */
function askingRows(rows: readonly Row[]): Set<number> {
  return new Set(
    rows.flatMap((row) => row.questions.flatMap((question) => [question.row, ...question.alsoRows])),
  );
}

function lineOf(row: Row | undefined): DraftLine | null {
  return row?.kind === "line" || row?.kind === "question" ? row.line : null;
}

function differences(fact: CorpusLine, line: DraftLine | null, asks: boolean): string[] {
  const open = asks && (fact.unsure !== undefined || fact.questionable === true);
  if (line === null) return open ? [] : ["not a line"];
  const found: string[] = [];
  const names = (fact.references ?? []).map((name) => name.replace(/\s+/g, ""));
  if (line.designators.join() !== names.join())
    found.push(`designators ${line.designators.join()} instead of ${names.join()}`);
  const quantity = line.quantityFrom === "designators" ? null : line.quantity;
  if (quantity !== fact.quantity && !asks) found.push(`quantity ${quantity} instead of ${fact.quantity}`);
  const si = line.reading && PASSIVE.includes(line.reading.unit) ? Number(line.reading.si) : null;
  const expected = fact.value?.si ?? null;
  if (
    si === null || expected === null ? si !== expected : Math.abs(si - expected) > 1e-9 * Math.abs(expected)
  )
    found.push(`value ${si ?? "none"} instead of ${expected ?? "none"}`);
  const notFitted = line.mark === "do-not-place";
  if (notFitted !== (fact.dnp !== undefined) && !(asks && fact.dnp_unsure !== undefined))
    found.push(`not fitted ${notFitted}`);
  return open ? [] : found;
}

function compare(list: CorpusList): string[] {
  const { rows } = readCorpus(list);
  const asking = askingRows(rows);
  const byRow = new Map(rows.map((row) => [row.row, row]));
  const known = new Set(list.lines.map((fact) => fact.line));
  const found = list.lines.flatMap((fact) =>
    differences(fact, lineOf(byRow.get(fact.line)), asking.has(fact.line)).map(
      (what) => `line ${fact.line}: ${what}`,
    ),
  );
  for (const row of rows)
    if (!known.has(row.row) && lineOf(row) !== null) found.push(`line ${row.row}: a line too many`);
  const asked = (codes: string[]) =>
    rows.filter((row) => row.questions.some((question) => codes.includes(question.code)));
  const mismatched = list.lines
    .filter((fact) => list.facts.mismatches.some(({ record }) => record === fact.record))
    .map((fact) => fact.line);
  for (const line of mismatched)
    if (!asked(MISMATCHES).some((row) => row.row === line)) found.push(`line ${line}: mismatch not asked`);
  for (const row of asked(["quantity-mismatch"]))
    if (!mismatched.includes(row.row)) found.push(`line ${row.row}: no mismatch`);
  const repeated = new Set(
    asked(DUPLICATES).flatMap((row) =>
      row.questions
        .filter(({ code }) => DUPLICATES.includes(code))
        .flatMap(({ facts }) => facts.designators as string[]),
    ),
  );
  const expected = [...list.facts.duplicate_designators].sort().join();
  if ([...repeated].sort().join() !== expected)
    found.push(`repeated ${[...repeated].sort().join()} instead of ${expected}`);
  return found.map((what) => `${list.id} ${what}`);
}

const LISTS = corpusLists();

describe("real lists, against what a careful reader found in them", () => {
  if (LISTS.length === 0)
    it("are not part of this copy, so nothing is compared", () => expect(LISTS).toEqual([]));
  for (const list of LISTS)
    it(list.file, () => {
      expect(compare(list).filter((what) => !READ_OTHERWISE.includes(what))).toEqual([]);
    });

  for (const list of LISTS)
    it(`${list.file}: every record is accounted for, and a second reading is the same`, () => {
      const { rows, counts } = readCorpus(list);
      expect(counts.rows).toBe(rows.length);
      expect(counts.lines + counts.skipped + counts.questions + counts.joined).toBe(rows.length);
      expect(readCorpus(list)).toEqual({ rows, counts });
    });
});
