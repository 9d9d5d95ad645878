import { readDesignators } from "./designators.ts";
import { cellAt, type ListColumns } from "./list-columns.ts";
import type { SheetRecord } from "./sheet.ts";

/**
 * Rows that only carry on the designators of the row above, as lists do whose column was too narrow: nothing
 * else stands in them, and the row above ends in a comma or counts more than it names. Gives the records with
 * those designators moved up, and for each such row the row it was joined into.
 */
export function joinContinuations(
  records: readonly SheetRecord[],
  columns: ListColumns,
): { records: readonly SheetRecord[]; into: ReadonlyMap<number, number> } {
  const column = columns.first("designators");
  const into = new Map<number, number>();
  if (column === null) return { records, into };
  const joined: SheetRecord[] = [];
  let above = null as SheetRecord | null;
  for (const record of records) {
    const head = above;
    if (head !== null && continues(record, head, column, columns)) {
      const cells = [...head.cells];
      cells[column] = `${cellAt(cells, column).replace(/[,;\s]+$/, "")}, ${cellAt(record.cells, column)}`;
      above = { ...head, cells };
      joined[joined.findLastIndex((one) => one.record === head.record)] = above;
      into.set(record.record, head.row);
      joined.push(record);
      continue;
    }
    joined.push(record);
    above = cellAt(record.cells, column) === "" ? null : record;
  }
  return { records: into.size === 0 ? records : joined, into };
}

function continues(record: SheetRecord, above: SheetRecord, column: number, columns: ListColumns): boolean {
  const text = cellAt(record.cells, column);
  if (text === "" || record.cells.some((cell, at) => at !== column && cell.trim() !== "")) return false;
  const read = readDesignators(text);
  if (read.numbered === 0 || read.unclear.length > 0) return false;
  const before = cellAt(above.cells, column);
  const counted = Number(cellAt(above.cells, columns.first("quantity")));
  return /[,;]$/.test(before) || (counted > 0 && counted > readDesignators(before).designators.length);
}
