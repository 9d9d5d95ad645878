import type { DraftLine } from "./draft.ts";
import { cellAt, type ListColumns } from "./list-columns.ts";
import { maySayNotFitted, readDoNotPlace, readPlace, saysNotFitted } from "./marks.ts";
import type { Texts } from "./row-texts.ts";

export interface ReadMark extends Pick<DraftLine, "mark" | "markFrom"> {
  /** A cell that may or may not mean "not fitted", and whether it stands in a column for fitted parts. */
  maybeMark: { text: string; column: number; fromColumn: boolean } | null;
}

/** Whether the part of a row is fitted, from columns for that and from marks in its texts. */
export function markOf(cells: readonly string[], columns: ListColumns, texts: Texts): ReadMark {
  const notPlaced = columns.first("do-not-place");
  const placed = columns.first("place");
  const notPlacedText = cellAt(cells, notPlaced);
  const placedText = cellAt(cells, placed);
  const notFitted = readDoNotPlace(notPlacedText);
  if (notFitted === true) return { mark: "do-not-place", markFrom: notPlacedText, maybeMark: null };
  for (const text of [texts.value, texts.description, texts.note, texts.partNumber, texts.package])
    if (text !== null && saysNotFitted(text))
      return { mark: "do-not-place", markFrom: text, maybeMark: null };
  if (placed !== null && readPlace(placedText) === false) {
    if (/^place/i.test(columns.all("place")[0]?.heading ?? ""))
      return {
        mark: "in-kit",
        markFrom: null,
        maybeMark: { text: placedText, column: placed, fromColumn: true },
      };
    return { mark: "do-not-place", markFrom: placedText, maybeMark: null };
  }
  if (notFitted === null && notPlaced !== null)
    return {
      mark: "in-kit",
      markFrom: null,
      maybeMark: { text: notPlacedText, column: notPlaced, fromColumn: false },
    };
  const value = columns.first("value");
  const raw = cellAt(cells, value);
  const maybe =
    value !== null && raw !== "" && maySayNotFitted(raw)
      ? { text: raw, column: value, fromColumn: false }
      : null;
  return { mark: "in-kit", markFrom: null, maybeMark: maybe };
}
