import type { GridApi } from "ag-grid-community";
import { type RefObject, useEffect, useRef, useState } from "react";
import type { GridRow, LineRow } from "./grid-rows.ts";
import type { GridDeeds } from "./PartsGrid.tsx";
import type { PartsDeeds } from "./use-parts-work.ts";

/** Goes to the empty line and opens its first cell. */
function focusDraft(grid: GridApi<GridRow> | null): void {
  const node = grid?.getRowNode("draft");
  if (!grid || node?.rowIndex == null) return;
  grid.ensureIndexVisible(node.rowIndex);
  grid.setFocusedCell(node.rowIndex, "designators");
  grid.startEditingCell({ rowIndex: node.rowIndex, colKey: "designators" });
}

interface Following {
  grid: RefObject<GridApi<GridRow> | null>;
  deeds: PartsDeeds;
  /** Every line, and the rows as they are shown now. */
  all: readonly LineRow[];
  shown: readonly GridRow[];
  /** Counts up when the page's own button asks for a line. */
  asked: number;
}

/** The focus follows what is done in the grid: to the next empty line, along with a line that is moved. */
export function useDraftLine({ grid, deeds, all, shown, asked }: Following) {
  /** The empty line moves as lines are added; it is gone to when the grid shows it at its new place. */
  const [wish, setWish] = useState(0);
  useEffect(() => {
    if (asked + wish === 0) return;
    const frame = requestAnimationFrame(() => focusDraft(grid.current));
    return () => cancelAnimationFrame(frame);
  }, [asked, wish, grid]);

  /** So many lines must stand in the grid before the empty line has its new place and can be gone to. */
  const awaited = useRef<number | null>(null);
  useEffect(() => {
    if (awaited.current === null || all.length < awaited.current) return;
    awaited.current = null;
    setWish((count) => count + 1);
  }, [all]);

  /** A line that was moved keeps the focus, so that the same key moves it on. */
  const follow = useRef<{ line: string; column: string } | null>(null);
  // biome-ignore lint/correctness/useExhaustiveDependencies: the line is gone after when the rows have changed.
  useEffect(() => {
    const node = follow.current && grid.current?.getRowNode(follow.current.line);
    if (node?.rowIndex == null || !follow.current) return;
    grid.current?.setFocusedCell(node.rowIndex, follow.current.column);
    follow.current = null;
  }, [shown]);

  const wishForLine = () => setWish((count) => count + 1);
  return {
    move: (row, by) => {
      const column = grid.current?.getFocusedCell()?.column.getColId() ?? "designators";
      follow.current = { line: row.id, column };
      deeds.move(row, by);
    },
    leaveDraft: () => void deeds.commitDraft(),
    nextDraft: () => {
      if (deeds.commitDraft()) awaited.current = all.length + 1;
      else wishForLine();
    },
    insertAt: (row) => {
      deeds.insertAt(row);
      wishForLine();
    },
  } satisfies Partial<GridDeeds>;
}
