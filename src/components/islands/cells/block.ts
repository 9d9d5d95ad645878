import type { CellEdit, PastedRow } from "./cell-column.ts";

/**
 * Cells copied from a spreadsheet: tabs between cells, a line for each row, quotes round a cell that holds
 * either. Line breaks inside a cell become spaces.
 */
export function readBlock(text: string): string[][] {
  const rows: string[][] = [[]];
  let cell = "";
  let quoted = false;
  const plain = text.replace(/\r\n?/g, "\n").replace(/\n$/, "");
  const endCell = () => {
    rows[rows.length - 1]?.push(cell.trim());
    cell = "";
  };
  for (let place = 0; place < plain.length; place += 1) {
    const sign = plain.charAt(place);
    if (quoted && sign === '"' && plain[place + 1] === '"') {
      cell += sign;
      place += 1;
    } else if (sign === '"' && (quoted || cell === "")) quoted = !quoted;
    else if (quoted) cell += sign === "\n" ? " " : sign;
    else if (sign === "\t") endCell();
    else if (sign === "\n") {
      endCell();
      rows.push([]);
    } else cell += sign;
  }
  endCell();
  return rows;
}

/** Cells as a spreadsheet takes them. */
export function writeBlock(rows: readonly (readonly string[])[]): string {
  return rows.map((cells) => cells.map(written).join("\t")).join("\n");
}

function written(cell: string): string {
  return /[\t\n"]/.test(cell) ? `"${cell.replaceAll('"', '""')}"` : cell;
}

/**
 * A block laid on a sheet with its first cell at `row`, `column`. A single cell fills everything that is
 * selected; what reaches past the last row or column is counted, not dropped in silence.
 */
export function layBlock(
  block: readonly (readonly string[])[],
  rows: readonly string[],
  columns: readonly string[],
  at: { row: string; column: string },
): { edits: CellEdit[]; past: number } {
  const edits: CellEdit[] = [];
  let past = 0;
  const [top, left] = [rows.indexOf(at.row), columns.indexOf(at.column)];
  for (const [down, cells] of block.entries())
    for (const [across, entry] of cells.entries()) {
      const [row, column] = [rows[top + down], columns[left + across]];
      if (row !== undefined && column !== undefined) edits.push({ row, column, entry });
      else past += 1;
    }
  return { edits, past };
}

/** A block as new rows, its first cell in `column`; empty rows are none, and what reaches past the last column is left out. */
export function newRows(
  block: readonly (readonly string[])[],
  columns: readonly string[],
  column: string,
): PastedRow[] {
  const left = columns.indexOf(column);
  return block
    .filter((cells) => cells.some((cell) => cell !== ""))
    .map((cells) =>
      Object.fromEntries(
        cells.flatMap((entry, across) => {
          const key = columns[left + across];
          return key === undefined ? [] : [[key, entry]];
        }),
      ),
    );
}
