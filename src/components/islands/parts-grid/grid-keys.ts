import type { GridApi } from "ag-grid-community";
import { type CellPlace, type CellRange, grownRange, rectangleOf } from "./cell-range.ts";
import { type ColumnKey, cellText } from "./cell-text.ts";
import type { GridRow, LineRow } from "./grid-rows.ts";

/** What a key can bring about; the grid does the rest itself (arrows, Tab, Enter, Escape, F2). */
export interface KeyDeeds {
  setRange: (range: CellRange | null) => void;
  clear: (lines: LineRow[], columns: ColumnKey[]) => void;
  fillDown: (lines: LineRow[], columns: ColumnKey[]) => void;
  move: (line: LineRow, by: 1 | -1) => void;
  insertAt: (line: LineRow | null) => void;
  open: (line: LineRow, column: ColumnKey) => boolean;
  undo: () => void;
  redo: () => void;
}

/** What the grid shows now: rows and columns as they are seen. */
export interface GridView {
  api: GridApi<GridRow>;
  columns: readonly ColumnKey[];
  range: CellRange | null;
}

export function focusedPlace({ api, columns }: Pick<GridView, "api" | "columns">): CellPlace | null {
  const cell = api.getFocusedCell();
  if (!cell || cell.rowPinned) return null;
  const column = columns.indexOf(cell.column.getColId() as ColumnKey);
  return column < 0 ? null : { row: cell.rowIndex, column };
}

export function rowAt(api: GridApi<GridRow>, row: number): GridRow | undefined {
  return api.getDisplayedRowAtIndex(row)?.data;
}

/** The selected cells, or the one that has the focus: lines and columns. */
export function selectedCells(
  view: GridView,
): { lines: LineRow[]; columns: ColumnKey[]; at: CellPlace } | null {
  const focus = focusedPlace(view);
  if (!focus) return null;
  const { top, bottom, left, right } = rectangleOf(view.range ?? { anchor: focus, head: focus });
  const lines: LineRow[] = [];
  for (let row = top; row <= bottom; row += 1) {
    const data = rowAt(view.api, row);
    if (data?.kind === "line") lines.push(data);
  }
  return { lines, columns: view.columns.slice(left, right + 1), at: { row: top, column: left } };
}

/** The selected cells as they read, with units. A text that a spreadsheet would take for a formula is quoted. */
export function selectedBlock(view: GridView): string[][] | null {
  const cells = selectedCells(view);
  if (!cells || cells.lines.length === 0) return null;
  return cells.lines.map((line) => cells.columns.map((column) => harmless(cellText(line, column))));
}

function harmless(text: string): string {
  return /^[=+\-@\t\r]/.test(text) && !/^[+-]?[\d.]+$/.test(text) ? `'${text}` : text;
}

function grow(view: GridView, key: string, deeds: KeyDeeds): boolean {
  const from = focusedPlace(view);
  if (!from) return false;
  const size = { rows: view.api.getDisplayedRowCount(), columns: view.columns.length };
  const range = grownRange(view.range, from, key, size);
  if (!range) return false;
  deeds.setRange(range);
  view.api.ensureIndexVisible(range.head.row);
  const column = view.columns[range.head.column];
  if (column) view.api.ensureColumnVisible(column);
  return true;
}

function withControl(press: KeyboardEvent, view: GridView, deeds: KeyDeeds): boolean {
  const key = press.key.toLowerCase();
  if (key === "z" && !press.shiftKey) deeds.undo();
  else if (key === "y" || key === "z") deeds.redo();
  else if (key === "d") {
    const cells = selectedCells(view);
    if (cells) deeds.fillDown(cells.lines, cells.columns);
  } else return false;
  return true;
}

function plainKey(press: KeyboardEvent, view: GridView, deeds: KeyDeeds): boolean {
  const cells = selectedCells(view);
  const line = cells?.lines[0];
  switch (press.key) {
    case "Delete":
    case "Backspace":
      if (!cells || !line) return false;
      deeds.clear(cells.lines, cells.columns);
      return true;
    case "Insert":
      deeds.insertAt(line ?? null);
      return true;
    case "Enter":
      return line !== undefined && cells !== null && deeds.open(line, cells.columns[0] as ColumnKey);
    case "Escape":
      if (!view.range) return false;
      deeds.setRange(null);
      return true;
    default:
      if (press.key.startsWith("Arrow") || press.key === "Tab") deeds.setRange(null);
      return false;
  }
}

/** Whether the key was ours; the grid then does not see it. */
export function handleKey(press: KeyboardEvent, view: GridView, deeds: KeyDeeds): boolean {
  if (press.ctrlKey || press.metaKey) return withControl(press, view, deeds);
  if (press.shiftKey && press.key.startsWith("Arrow")) return grow(view, press.key, deeds);
  if (press.altKey) {
    const line = selectedCells(view)?.lines[0];
    if (!line || (press.key !== "ArrowUp" && press.key !== "ArrowDown")) return false;
    deeds.move(line, press.key === "ArrowDown" ? 1 : -1);
    return true;
  }
  return plainKey(press, view, deeds);
}
