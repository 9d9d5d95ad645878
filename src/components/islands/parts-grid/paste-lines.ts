import type { PricedPartsList } from "#src/server/present.ts";
import type { ColumnKey } from "./cell-text.ts";
import { isCellColumn } from "./cell-text.ts";
import { type CellColumn, type DraftCells, lineFromCells, readCell } from "./read-cell.ts";
import { applySteps, joinSteps, type Step } from "./steps.ts";

/** A cell of a pasted block that cannot be taken, and why. */
export interface Misfit {
  /** Row and column of the block, counted from 1. */
  row: number;
  column: number;
  text: string;
  message: string;
}

export interface PasteTarget {
  /** Ids of the lines in view, in the order they are seen. */
  lines: readonly string[];
  /** The columns in view, in their order. */
  columns: readonly ColumnKey[];
  /** Where the block begins; a row past the last line begins a new one. */
  row: number;
  column: number;
  /** How many rows and columns are selected: a single cell fills them all. */
  rows: number;
  across: number;
}

export interface PastedBlock {
  steps: Step[];
  misfits: Misfit[];
  /** Lines that the block changes or adds. */
  lines: number;
}

/** One cell pasted on a selection fills it; so does one row or one column on a longer one. */
function spread(block: readonly (readonly string[])[], { rows, across }: PasteTarget): string[][] {
  const height = block.length === 1 ? Math.max(rows, 1) : block.length;
  const width = block.every((cells) => cells.length === 1) ? Math.max(across, 1) : 0;
  return Array.from({ length: height }, (_, down) => {
    const cells = block[block.length === 1 ? 0 : down] ?? [];
    return width > 0 ? Array.from({ length: width }, () => cells[0] ?? "") : [...cells];
  });
}

/** Lines further down than the last become new ones, from what the block says of them. */
function newLines(
  list: PricedPartsList,
  rows: { row: number; cells: DraftCells }[],
  newId: () => string,
): Pick<PastedBlock, "steps" | "misfits"> {
  const steps: Step[] = [];
  const misfits: Misfit[] = [];
  for (const { row, cells } of rows) {
    const read = lineFromCells(list, newId(), cells);
    if (read.ok) steps.push(...read.steps);
    else misfits.push({ row, column: 1, text: Object.values(cells).join(" "), message: read.message });
  }
  return { steps, misfits };
}

/**
 * A block of cells laid on the list with its first cell at the target. Every cell is read; where one cannot be
 * taken it is named, and the caller takes nothing of the block. Cells that fall on columns which are worked out
 * are misfits unless they say what stands there.
 */
export function pasteBlock(
  list: PricedPartsList,
  block: readonly (readonly string[])[],
  target: PasteTarget,
  textOf: (line: string, column: ColumnKey) => string,
  newId: () => string,
): PastedBlock {
  const steps: Step[] = [];
  const misfits: Misfit[] = [];
  const beyond: { row: number; cells: DraftCells }[] = [];
  const touched = new Set<string>();
  let now = list;
  for (const [down, cells] of spread(block, target).entries()) {
    const id = target.lines[target.row + down];
    const fresh: DraftCells = {};
    for (const [across, text] of cells.entries()) {
      const place = { row: down + 1, column: across + 1, text };
      const column = target.columns[target.column + across];
      const line = now.lines.find((one) => one.id === id);
      if (column === undefined) misfits.push({ ...place, message: "There is no column here." });
      else if (!isCellColumn(column)) {
        if (line && text !== "" && text !== textOf(line.id, column))
          misfits.push({ ...place, message: "This column is worked out and cannot be written in." });
      } else if (!line) fresh[column as CellColumn] = text;
      else {
        const read = readCell(now, line, column, text);
        if (!read.ok) misfits.push({ ...place, message: read.message });
        else if (read.steps.length > 0) {
          steps.push(...read.steps);
          now = applySteps(now, read.steps);
          touched.add(line.id);
        }
      }
    }
    if (id === undefined && Object.values(fresh).some((text) => text !== ""))
      beyond.push({ row: down + 1, cells: fresh });
  }
  const added = newLines(list, beyond, newId);
  return {
    steps: joinSteps([...steps, ...added.steps]),
    misfits: [...misfits, ...added.misfits],
    lines: touched.size + added.steps.length,
  };
}
