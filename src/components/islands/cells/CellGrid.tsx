import {
  type CellEditRequestEvent,
  CellStyleModule,
  ClientSideRowModelModule,
  type ColDef,
  ColumnAutoSizeModule,
  type GridApi,
  RenderApiModule,
  RowApiModule,
  SelectEditorModule,
  TextEditorModule,
} from "ag-grid-community";
import { AgGridReact } from "ag-grid-react";
import { type ClipboardEvent, useEffect, useMemo, useRef } from "react";
import { gridTheme } from "#src/components/islands/grid-theme.ts";
import { usePhone } from "#src/components/islands/parts/phone.ts";
import { showToast } from "#src/components/islands/parts/toasts.ts";
import { layBlock, newRows, readBlock, writeBlock } from "./block.ts";
import {
  type CellColumn,
  type CellEdit,
  type CellFault,
  type CellRow,
  cellKey,
  type PastedRow,
} from "./cell-column.ts";

const MODULES = [
  ClientSideRowModelModule,
  ColumnAutoSizeModule,
  CellStyleModule,
  RenderApiModule,
  RowApiModule,
  TextEditorModule,
  SelectEditorModule,
];

/** Beyond so many rows the grid scrolls inside itself. */
const ROWS_IN_FULL = 18;
const ROW = 37;

/** A row that is not there yet. */
export interface NextRow<Row> {
  row: Row;
  /** What stands in it: "Paste new offers here". */
  words: string;
  onRows: (rows: PastedRow[]) => void;
}

export interface CellGridProps<Row extends CellRow, Fields> {
  /** What the sheet holds: "Suppliers". */
  label: string;
  rows: readonly Row[];
  columns: readonly CellColumn<Row, Fields>[];
  faults: ReadonlyMap<string, CellFault>;
  canEdit: boolean;
  styleNonce: string;
  onEdits: (edits: CellEdit[]) => void;
  onUndo: () => void;
  onRedo: () => void;
  /** The row that is not there yet, shown last and empty; a block pasted on it makes new rows. */
  next?: NextRow<Row>;
}

/** A sheet of cells: arrows move, Enter edits, Escape leaves as it was, Ctrl and C, V, Z, Y do what they do everywhere. */
export default function CellGrid<Row extends CellRow, Fields>(props: CellGridProps<Row, Fields>) {
  const { label, columns, faults, canEdit, styleNonce, onEdits, next } = props;
  const rows = useMemo(() => (next ? [...props.rows, next.row] : props.rows), [props.rows, next]);
  const grid = useRef<AgGridReact<Row>>(null);
  const shown = useRef(faults);
  shown.current = faults;
  const phone = usePhone();
  const definitions = useMemo(
    () => columns.map((column) => definition(column, canEdit, !phone, () => shown.current, next)),
    [columns, canEdit, phone, next],
  );
  // biome-ignore lint/correctness/useExhaustiveDependencies: the cells read faults through a ref.
  useEffect(() => grid.current?.api?.refreshCells({ force: true }), [faults]);

  const request = ({ data, colDef, newValue }: CellEditRequestEvent<Row>) =>
    onEdits([{ row: data.id, column: colDef.colId ?? "", entry: String(newValue ?? "").trim() }]);
  const keys = columns.map(({ key }) => key);

  function paste(event: ClipboardEvent) {
    const at = focusedCell(grid.current?.api, event);
    if (!at || !canEdit) return;
    event.preventDefault();
    const block = readBlock(event.clipboardData.getData("text/plain"));
    if (next && at.row === next.row.id) return next.onRows(newRows(block, keys, at.column));
    const ids = props.rows.map(({ id }) => id);
    const { edits, past } = layBlock(block, ids, keys, at);
    if (past > 0)
      showToast({ kind: "caution", text: `${past} cells reached past the end and were left out.` });
    onEdits(edits);
  }

  function copy(event: ClipboardEvent) {
    const at = focusedCell(grid.current?.api, event);
    const row = rows.find(({ id }) => id === at?.row);
    const column = columns.find(({ key }) => key === at?.column);
    if (!row || !column) return;
    event.preventDefault();
    event.clipboardData.setData("text/plain", writeBlock([[column.text(row)]]));
  }

  return (
    // biome-ignore lint/a11y/noStaticElementInteractions: the grid inside is the control; this hears its clipboard.
    <div
      onPaste={paste}
      onCopy={copy}
      onKeyDown={(press) => pressed(press, grid.current?.api, props)}
      // A scroll bar that lies over the grid would cover its last row.
      className="[&_.ag-grid-viewport]:pb-4"
      style={rows.length > ROWS_IN_FULL ? { height: ROW * ROWS_IN_FULL } : undefined}
    >
      <AgGridReact<Row>
        ref={grid}
        theme={gridTheme}
        modules={MODULES}
        styleNonce={styleNonce}
        rowData={rows as Row[]}
        columnDefs={definitions}
        getRowId={({ data }) => data.id}
        defaultColDef={{
          resizable: true,
          sortable: false,
          suppressHeaderMenuButton: true,
          wrapHeaderText: true,
        }}
        domLayout={rows.length > ROWS_IN_FULL ? "normal" : "autoHeight"}
        readOnlyEdit
        stopEditingWhenCellsLoseFocus
        enterNavigatesVerticallyAfterEdit
        suppressNoRowsOverlay
        onCellEditRequest={request}
        onGridReady={({ api }) => api.setGridAriaProperty("label", label)}
      />
    </div>
  );
}

function definition<Row extends CellRow, Fields>(
  column: CellColumn<Row, Fields>,
  canEdit: boolean,
  holds: boolean,
  faults: () => ReadonlyMap<string, CellFault>,
  next: NextRow<Row> | undefined,
): ColDef<Row> {
  const faultIn = (row: Row) => faults().get(cellKey({ row: row.id, column: column.key }));
  const isNext = (row: Row | undefined) => row !== undefined && row.id === next?.row.id;
  const invitation = column.held ? (next?.words ?? "") : "";
  const { choices } = column;
  return {
    colId: column.key,
    headerName: column.head,
    editable: ({ data }) => canEdit && column.read !== undefined && !isNext(data),
    valueGetter: ({ data }) =>
      data && (isNext(data) ? invitation : (faultIn(data)?.entry ?? column.text(data))),
    valueFormatter: ({ data, value }) =>
      data && !isNext(data) && !faultIn(data) ? (column.shown ?? column.text)(data) : value,
    // The entry is read by the column, not by the grid.
    valueParser: ({ newValue }) => newValue,
    cellEditor: choices ? "agSelectCellEditor" : "agTextCellEditor",
    cellEditorParams: choices ? { values: choices } : undefined,
    cellClassRules: {
      "bg-bad-wash": ({ data }) => data !== undefined && faultIn(data) !== undefined,
      "text-right": () => column.number === true,
      "font-semibold": ({ data }) => column.held === true && !isNext(data),
      "text-ink-2": ({ data }) => isNext(data),
    },
    headerClass: column.number ? "ag-right-aligned-header" : "",
    cellRenderer: column.href ? linkRenderer(column.href, isNext) : undefined,
    width: column.width ?? 120,
    flex: column.grows ? 1 : undefined,
    minWidth: column.grows ? column.width : undefined,
    pinned: column.held && holds ? "left" : null,
    lockPinned: true,
  };
}

function linkRenderer<Row>(href: (row: Row) => string, isNext: (row: Row) => boolean) {
  return ({ data, valueFormatted }: { data: Row; valueFormatted: string }) =>
    isNext(data) ? (
      valueFormatted
    ) : (
      <a href={href(data)} tabIndex={-1}>
        {valueFormatted}
      </a>
    );
}

/** The cell that has the focus, unless it is being edited: then the clipboard is the field's. */
function focusedCell<Row extends CellRow>(api: GridApi<Row> | undefined, event: ClipboardEvent) {
  if (!api || event.target instanceof HTMLInputElement) return null;
  const cell = api.getFocusedCell();
  const row = cell && api.getDisplayedRowAtIndex(cell.rowIndex)?.data;
  return row ? { row: row.id, column: cell.column.getColId() } : null;
}

function pressed<Row extends CellRow, Fields>(
  press: React.KeyboardEvent,
  api: GridApi<Row> | undefined,
  { onUndo, onRedo }: CellGridProps<Row, Fields>,
): void {
  if (!api || press.target instanceof HTMLInputElement) return;
  const key = press.key.toLowerCase();
  if (!(press.ctrlKey || press.metaKey) || (key !== "z" && key !== "y")) return;
  press.preventDefault();
  if (key === "y" || press.shiftKey) onRedo();
  else onUndo();
}
