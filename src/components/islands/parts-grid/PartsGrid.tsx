import {
  CellApiModule,
  type CellClickedEvent,
  type CellEditRequestEvent,
  type CellFocusedEvent,
  CellStyleModule,
  ClientSideRowModelApiModule,
  ClientSideRowModelModule,
  ColumnApiModule,
  ColumnAutoSizeModule,
  CustomEditorModule,
  type GridApi,
  PinnedRowModule,
  RenderApiModule,
  RowApiModule,
  RowAutoHeightModule,
  RowSelectionModule,
  ScrollApiModule,
  TextEditorModule,
  TooltipModule,
} from "ag-grid-community";
import { AgGridReact } from "ag-grid-react";
import { type ClipboardEvent, type KeyboardEvent, useEffect, useMemo, useRef, useState } from "react";
import { readBlock, writeBlock } from "#src/components/islands/cells/block.ts";
import { gridTheme } from "#src/components/islands/grid-theme.ts";
import { GroupCell } from "./CellRenderers.tsx";
import { type CellRange, rectangleOf } from "./cell-range.ts";
import type { ColumnKey } from "./cell-text.ts";
import { columnDefs } from "./column-defs.ts";
import type { GridContext } from "./grid-context.ts";
import { focusedPlace, handleKey, type KeyDeeds, rowAt, selectedBlock } from "./grid-keys.ts";
import { CHECK_BOX, type GridLayout } from "./grid-layout.ts";
import type { GridRow, LineRow, TotalRow } from "./grid-rows.ts";
import { PrintedList } from "./PrintedList.tsx";
import { usePrinting } from "./use-printing.ts";

const MODULES = [
  ClientSideRowModelModule,
  ClientSideRowModelApiModule,
  CellApiModule,
  CellStyleModule,
  ColumnApiModule,
  ColumnAutoSizeModule,
  CustomEditorModule,
  PinnedRowModule,
  RenderApiModule,
  RowApiModule,
  RowAutoHeightModule,
  RowSelectionModule,
  ScrollApiModule,
  TextEditorModule,
  TooltipModule,
];

/** Up to so many rows stand on the page as a table does; more scroll inside the grid, which draws only those in view. */
const ROWS_IN_FULL = 60;
const ROW = 37;
const ROW_OF_TWO = 54;

/** As every grid, but for the marks between heads: the columns here are many and narrow. */
const theme = gridTheme.withParams({
  headerColumnResizeHandleColor: "transparent",
  cellHorizontalPadding: 7,
});
const phoneTheme = theme.withParams({ cellHorizontalPadding: 6 });

/** Where a block is to be pasted, as the grid is seen. */
export interface PastePlace {
  row: number;
  column: number;
  rows: number;
  across: number;
}

export type GridDeeds = Omit<KeyDeeds, "setRange"> & {
  edit: (row: LineRow, column: ColumnKey, text: string) => void;
  writeDraft: (column: ColumnKey, text: string) => void;
  /** The empty line is left: it is added if it says what its part is. */
  leaveDraft: () => void;
  /** Enter, or Tab in its last cell: it is added, and the next one begins. */
  nextDraft: () => void;
  paste: (block: string[][], place: PastePlace) => void;
  select: (lines: string[]) => void;
};

export interface PartsGridProps {
  label: string;
  rows: readonly GridRow[];
  total: TotalRow;
  layout: GridLayout;
  editions: readonly { id: string; name: string }[];
  context: Omit<GridContext, "range">;
  grouped: boolean;
  phone: boolean;
  styleNonce: string;
  deeds: GridDeeds;
  onReady: (api: GridApi<GridRow>) => void;
}

function inField(target: EventTarget): boolean {
  return target instanceof HTMLElement && target.closest("input, select, textarea") !== null;
}

/** The parts list as a grid of cells. It holds nothing itself: what is done goes out, what is shown comes in. */
export default function PartsGrid(props: PartsGridProps) {
  const { rows, layout, editions, grouped, phone, deeds, styleNonce } = props;
  const { keys: columns, folded } = layout;
  const [range, setRange] = useState<CellRange | null>(null);
  const api = useRef<GridApi<GridRow> | null>(null);
  const context = useRef<GridContext>({ ...props.context, range });
  Object.assign(context.current, props.context, { range });
  const definitions = useMemo(
    () => columnDefs({ ...layout, editions, phone, sortable: !grouped }),
    [layout, editions, phone, grouped],
  );
  // biome-ignore lint/correctness/useExhaustiveDependencies: the cells read these through the context.
  useEffect(() => {
    api.current?.refreshCells({ force: true });
  }, [props.context.faults, props.context.draft, range]);
  const current = () => api.current && { api: api.current, columns, range: context.current.range };

  /** Enter and the last Tab in the empty line end it; the grid alone would stay in the cell, or leave. */
  function pressedInDraft(press: KeyboardEvent, grid: GridApi<GridRow>) {
    const cell = grid.getFocusedCell();
    if (!cell || rowAt(grid, cell.rowIndex)?.kind !== "draft") return;
    const last = cell.column.getColId() === "drawer" && press.key === "Tab" && !press.shiftKey;
    if (press.key !== "Enter" && !last) return;
    press.preventDefault();
    press.stopPropagation();
    grid.stopEditing();
    // The grid hands over what was typed in a task of its own.
    setTimeout(() => deeds.nextDraft());
  }

  function pressed(press: KeyboardEvent) {
    const view = current();
    if (view && inField(press.target)) pressedInDraft(press, view.api);
    if (!view || inField(press.target)) return;
    if (!handleKey(press.nativeEvent, view, { ...deeds, setRange })) return;
    press.preventDefault();
    press.stopPropagation();
  }

  function copy(event: ClipboardEvent) {
    const view = current();
    const block = view && !inField(event.target) ? selectedBlock(view) : null;
    if (!block) return;
    event.preventDefault();
    event.clipboardData.setData("text/plain", writeBlock(block));
  }

  function paste(event: ClipboardEvent) {
    const view = current();
    const focus = view && !inField(event.target) ? focusedPlace(view) : null;
    if (!view || !focus) return;
    event.preventDefault();
    const { top, bottom, left, right } = rectangleOf(view.range ?? { anchor: focus, head: focus });
    const place = { row: top, column: left, rows: bottom - top + 1, across: right - left + 1 };
    deeds.paste(readBlock(event.clipboardData.getData("text/plain")), place);
  }

  function edited({ data, colDef, newValue }: CellEditRequestEvent<GridRow, string>) {
    const column = colDef.colId as ColumnKey;
    setRange(null);
    if (data.kind === "draft") deeds.writeDraft(column, String(newValue ?? ""));
    else if (data.kind === "line") deeds.edit(data, column, String(newValue ?? ""));
  }

  function focused({ rowIndex, api: grid }: CellFocusedEvent<GridRow>) {
    if (rowIndex === null || rowAt(grid, rowIndex)?.kind !== "draft") deeds.leaveDraft();
  }

  function clicked({ data, event, rowIndex, column }: CellClickedEvent<GridRow>) {
    if (phone && data?.kind === "line") deeds.open(data, "place");
    const place = { row: rowIndex ?? 0, column: columns.indexOf(column.getColId() as ColumnKey) };
    if (place.column < 0) return;
    const grown = (event as MouseEvent | null)?.shiftKey && context.current.range;
    setRange(grown ? { anchor: grown.anchor, head: place } : { anchor: place, head: place });
  }

  const printing = usePrinting();
  const whole = rows.length <= ROWS_IN_FULL;
  return (
    <>
      {printing && (
        <PrintedList
          label={props.label}
          rows={rows}
          total={props.total}
          editions={editions}
          money={props.context.canOpen}
        />
      )}
      <div
        onKeyDownCapture={pressed}
        onCopy={copy}
        onPaste={paste}
        className={`print:hidden ${whole ? "" : "h-[max(480px,calc(100vh-250px))]"}`}
      >
        <AgGridReact<GridRow>
          key={folded ? "folded" : "flat"}
          theme={phone ? phoneTheme : theme}
          modules={MODULES}
          styleNonce={styleNonce}
          rowData={rows as GridRow[]}
          pinnedBottomRowData={phone ? undefined : [props.total]}
          columnDefs={definitions}
          context={context.current}
          getRowId={({ data }) => data.id}
          defaultColDef={{
            resizable: true,
            suppressHeaderMenuButton: true,
            wrapHeaderText: true,
            autoHeaderHeight: true,
          }}
          domLayout={whole ? "autoHeight" : "normal"}
          rowHeight={folded && !phone ? ROW_OF_TWO : ROW}
          isFullWidthRow={({ rowNode }) => rowNode.data?.kind === "group"}
          fullWidthCellRenderer={GroupCell}
          rowSelection={
            props.context.canEdit && !phone
              ? {
                  mode: "multiRow",
                  enableClickSelection: false,
                  isRowSelectable: ({ data }) => data?.kind === "line",
                  hideDisabledCheckboxes: true,
                }
              : undefined
          }
          selectionColumnDef={{ pinned: "left", width: CHECK_BOX, suppressMovable: true }}
          onSelectionChanged={({ api: grid }) => deeds.select(grid.getSelectedRows().map(({ id }) => id))}
          animateRows={false}
          readOnlyEdit
          stopEditingWhenCellsLoseFocus
          enterNavigatesVerticallyAfterEdit
          suppressNoRowsOverlay
          tooltipShowDelay={400}
          onCellEditRequest={edited}
          onCellFocused={focused}
          onCellClicked={clicked}
          onGridReady={({ api: grid }) => {
            api.current = grid;
            grid.setGridAriaProperty("label", props.label);
            props.onReady(grid);
          }}
        />
      </div>
    </>
  );
}
