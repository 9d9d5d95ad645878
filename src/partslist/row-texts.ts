import { type ListColumns, textAt } from "./list-columns.ts";

/** The free texts of a row, by the column they stand in. */
export interface Texts {
  value: string | null;
  description: string | null;
  partNumber: string | null;
  package: string | null;
  kind: string | null;
  note: string | null;
}

function joined(
  cells: readonly string[],
  columns: ListColumns,
  meaning: "description" | "note",
): string | null {
  let text: string | null = null;
  for (const { column } of columns.all(meaning)) {
    const one = textAt(cells, column);
    if (one !== null && one !== text) text = text === null ? one : `${text}, ${one}`;
  }
  return text;
}

export function textsOf(cells: readonly string[], columns: ListColumns): Texts {
  return {
    value: textAt(cells, columns.first("value")),
    description: joined(cells, columns, "description"),
    partNumber: textAt(cells, columns.first("part-number")),
    package: textAt(cells, columns.first("package")),
    kind: textAt(cells, columns.first("class")),
    note: joined(cells, columns, "note"),
  };
}

/** The texts of a row in one, parted so that no word runs over from one into the next. */
export function wordsOf(texts: Texts): string {
  let words = "";
  for (const text of [texts.kind, texts.description, texts.value, texts.package])
    if (text !== null) words = words === "" ? text : `${words} ; ${text}`;
  return words;
}
