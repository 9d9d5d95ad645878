import { describe, expect, it } from "vitest";
import { readCells } from "#src/partslist/cells.ts";
import { guessColumns, mappingOf } from "#src/partslist/columns.ts";
import type { Row } from "#src/partslist/draft.ts";
import { readList } from "#src/partslist/read-list.ts";
import { type Fact, MESSY_LISTS } from "./messy-lists.ts";

function read(text: string) {
  const { records } = readCells(text);
  const guesses = guessColumns(records);
  return { guesses, result: readList({ records, mapping: mappingOf(guesses), answers: [] }) };
}

function factOf(row: Row): Fact[] {
  if (row.kind !== "line" && row.kind !== "question") return [];
  if (row.line === null) return [];
  const { designators, quantity, reading, mark } = row.line;
  const si = reading?.si ?? null;
  return [
    mark === "do-not-place"
      ? [designators.join(" "), quantity, si, "x"]
      : [designators.join(" "), quantity, si],
  ];
}

describe("lists as people write them", () => {
  for (const list of MESSY_LISTS)
    it(list.name, () => {
      const { guesses, result } = read(list.text);
      expect(guesses.headerRecord).toBe(list.heading);
      expect(result.rows.flatMap(factOf)).toEqual(list.lines);
      expect(result.rows.flatMap((row) => row.questions.map((question) => question.code))).toEqual(
        list.asks ?? [],
      );
      const skipped = result.rows.flatMap((row) =>
        row.kind === "skipped" && row.reason !== "blank" ? [row.reason] : [],
      );
      const usual = list.heading === null ? [] : ["heading"];
      expect(skipped).toEqual(list.skips ?? usual);
      const { counts } = result;
      expect(counts.lines + counts.skipped + counts.questions + counts.joined).toBe(counts.rows);
    });
});
