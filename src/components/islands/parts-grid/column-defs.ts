import type { CellClassParams, ColDef, EditableCallbackParams, ICellEditorParams } from "ag-grid-community";
import { CLASS_WORDS, CLASSES_IN_ORDER, MARK_WORDS, MARKS_IN_ORDER } from "#src/components/part-words.ts";
import { compareDesignators } from "#src/partslist/designators.ts";
import {
  BandsCell,
  ChoiceEditor,
  type EditorChoice,
  PartCell,
  PerKitCell,
  PlaceCell,
  StateCell,
  SupplierCell,
  WordsCell,
} from "./CellRenderers.tsx";
import { isInRange } from "./cell-range.ts";
import { type ColumnKey, cellText, isCellColumn } from "./cell-text.ts";
import { faultKey, type GridContext } from "./grid-context.ts";
import type { GridLayout } from "./grid-layout.ts";
import type { GridRow, LineRow } from "./grid-rows.ts";
import type { CellColumn, DraftCells } from "./read-cell.ts";

type Def = ColDef<GridRow, string>;

const HEADS: Partial<Record<ColumnKey, string>> = {
  place: "Line",
  designators: "Designators",
  part: "Part",
  bands: "Colour code",
  package: "Body and holes",
  drawer: "Drawer",
  supplier: "Supplier and order code",
  buy: "Buy",
  each: "Each",
  perKit: "Per kit",
  state: "State",
  mark: "Mark",
  class: "Kind",
  note: "Note",
  partNumber: "Maker’s part number",
  stock: "On the shelf",
};

/** What the first empty line shows in its cells, as examples. */
const EXAMPLES: DraftCells = {
  designators: "R1, R2",
  part: "10 kΩ, 5 %, 0.25 W",
  package: "axial, 10 mm",
  drawer: "A1",
};

/** The name of a column, as its head says it; with several editions each has a column under its own name. */
export function columnHead(key: ColumnKey, editions: readonly { id: string; name: string }[]): string {
  if (!key.startsWith("quantity:")) return HEADS[key] ?? "";
  if (editions.length < 2) return "Qty";
  return editions.find(({ id }) => id === key.slice(9))?.name ?? "";
}

const RENDERERS: Partial<Record<ColumnKey, Def["cellRenderer"]>> = {
  place: PlaceCell,
  designators: WordsCell,
  package: WordsCell,
  part: PartCell,
  bands: BandsCell,
  supplier: SupplierCell,
  perKit: PerKitCell,
  state: StateCell,
};

const NUMBERS: readonly string[] = ["place", "buy", "each", "perKit", "stock"];

function isNumber(key: ColumnKey): boolean {
  return key.startsWith("quantity:") || NUMBERS.includes(key);
}

const words = (one: Readonly<Record<string, string>>, order: readonly string[]): EditorChoice[] =>
  order.map((value) => ({ value: one[value] ?? value, words: one[value] ?? value }));
const KINDS = words(
  Object.fromEntries(CLASSES_IN_ORDER.map((kind) => [kind, CLASS_WORDS[kind].one])),
  CLASSES_IN_ORDER,
);
const MARKS = words(MARK_WORDS, MARKS_IN_ORDER);

/** The value of "buy wherever it is cheapest", in the list of a part's offers. */
export const CHEAPEST = "cheapest";

function offerChoices({ data, context }: ICellEditorParams<GridRow, string, GridContext>): EditorChoice[] {
  const offers = data?.kind === "line" ? context.offersFor(data.line.part.id) : [];
  return [
    { value: CHEAPEST, words: "The cheapest" },
    ...offers.map((offer) => ({ value: offer.id, words: offer.words })),
  ];
}

function editorOf(key: ColumnKey): Partial<Def> {
  if (key === "class") return { cellEditor: ChoiceEditor, cellEditorParams: { choices: KINDS } };
  if (key === "mark") return { cellEditor: ChoiceEditor, cellEditorParams: { choices: MARKS } };
  if (key === "supplier")
    return {
      cellEditor: ChoiceEditor,
      cellEditorParams: (params: ICellEditorParams<GridRow, string, GridContext>) => ({
        choices: offerChoices(params),
        value:
          params.data?.kind === "line"
            ? (params.context.pinnedFor(params.data.line.part.id) ?? CHEAPEST)
            : "",
      }),
    };
  return { cellEditor: "agTextCellEditor" };
}

function isEditable(
  key: ColumnKey,
  { data, node, context }: EditableCallbackParams<GridRow, string, GridContext>,
) {
  if (node.rowPinned) return false;
  if (data?.kind === "draft") return isCellColumn(key) && key !== "class" && key !== "mark";
  if (data?.kind !== "line") return false;
  if (key === "supplier")
    return context.canChoose && data.money !== null && context.offersFor(data.line.part.id).length > 0;
  return context.canEdit && isCellColumn(key);
}

function draftText(key: ColumnKey, draft: DraftCells): string {
  const cells = draft as Partial<Record<ColumnKey, string>>;
  if (key === "state") return Object.values(draft).some(Boolean) && !draft.part ? "Needs its part" : "";
  return cells[key] ?? "";
}

function shownValue(key: ColumnKey, row: GridRow | undefined, context: GridContext): string {
  if (row?.kind === "draft") return draftText(key, context.draft);
  if (row?.kind === "total") return row.cells[key] ?? "";
  if (row?.kind !== "line") return "";
  return context.faults.get(faultKey(row.id, key))?.text ?? cellText(row, key);
}

/** In the empty line an example stands, more quietly, until something is written; an edition without a line has a dash. */
function shownText(key: ColumnKey, row: GridRow | undefined, value: string): string {
  if (row?.kind === "line" && key.startsWith("quantity:")) return value === "" ? "–" : value;
  if (row?.kind !== "draft" || value !== "") return value;
  return EXAMPLES[key as CellColumn] ?? "";
}

function classesOf(key: ColumnKey, columnAt: (key: string) => number): NonNullable<Def["cellClassRules"]> {
  type Params = CellClassParams<GridRow, string>;
  return {
    "bg-bad-wash": ({ data, context }: Params) =>
      data?.kind === "line" && (context as GridContext).faults.has(faultKey(data.id, key)),
    "bg-petrol-wash!": ({ rowIndex, node, context }: Params) =>
      !node.rowPinned && isInRange((context as GridContext).range, { row: rowIndex, column: columnAt(key) }),
    "text-ink-3": ({ data, value }: Params) => data?.kind === "draft" && !value,
    "text-ink-2": () => key === "package" || key === "state",
    "font-semibold": () => key === "designators",
  };
}

function comparatorOf(key: ColumnKey): Pick<Def, "comparator"> {
  const place = (row: GridRow | undefined) => (row?.kind === "line" ? row.place : Number.MAX_SAFE_INTEGER);
  if (key === "place") return { comparator: (_a, _b, one, other) => place(one.data) - place(other.data) };
  if (key === "designators") return { comparator: (a, b) => compareDesignators(a ?? "", b ?? "") };
  if (key === "buy") return { comparator: (_a, _b, one, other) => boughtOf(one.data) - boughtOf(other.data) };
  if (isNumber(key))
    return {
      comparator: (a, b) =>
        Number((a ?? "").replace(/[^\d.]/g, "") || -1) - Number((b ?? "").replace(/[^\d.]/g, "") || -1),
    };
  return {};
}

function boughtOf(row: GridRow | undefined): number {
  return row?.kind === "line" ? ((row as LineRow).money?.buy ?? -1) : -1;
}

/** On a phone: who it is, how many, what, and what it costs; a line is opened to be edited. */
const PHONE_WIDTHS: Partial<Record<ColumnKey, Partial<Def>>> = {
  designators: { width: 92, wrapText: true },
  part: { flex: 1, minWidth: 96, autoHeight: true },
  bands: { width: 64 },
  perKit: { width: 64 },
  state: { width: 110 },
};

export interface ColumnsWanted extends GridLayout {
  editions: readonly { id: string; name: string }[];
  phone: boolean;
  sortable: boolean;
}

function sizeOf(key: ColumnKey, phone: boolean, { width, folded }: GridLayout): Partial<Def> {
  if (phone) return PHONE_WIDTHS[key] ?? { width: 42 };
  const autoHeight = folded && (key === "part" || key === "supplier");
  return key === "part" ? { flex: 1, minWidth: width(key), autoHeight } : { width: width(key), autoHeight };
}

/** The grid's columns. */
export function columnDefs({ keys, width, folded, editions, phone, sortable }: ColumnsWanted): Def[] {
  const at = new Map<string, number>(keys.map((key, place) => [key, place]));
  return keys.map((key): Def => {
    const head = columnHead(key, phone ? [] : editions);
    const ofEdition = key.startsWith("quantity:");
    return {
      colId: key,
      headerName: head,
      headerTooltip: ofEdition && editions.length > 1 ? `Pieces in one ${head}` : undefined,
      ...sizeOf(key, phone, { keys, width, folded }),
      ...(ofEdition && {
        cellClass: "ag-right-aligned-cell px-1!",
        headerClass: "ag-right-aligned-header px-1!",
      }),
      sortable: sortable && !phone,
      ...comparatorOf(key),
      pinned: !phone && (key === "place" || key === "designators") ? "left" : undefined,
      lockPinned: true,
      suppressMovable: true,
      type: isNumber(key) ? "rightAligned" : undefined,
      valueGetter: ({ data, context }) => shownValue(key, data, context as GridContext),
      valueFormatter: ({ data, value }) => shownText(key, data, value ?? ""),
      valueParser: ({ newValue }) => newValue,
      editable: (params) => !phone && isEditable(key, params),
      ...editorOf(key),
      cellRenderer: RENDERERS[key],
      cellClassRules: classesOf(key, (colId) => at.get(colId) ?? -1),
      colSpan: ({ data }) => spanOf(key, data?.kind === "total", keys),
    };
  });
}

/** In the total row the words for the whole run take the room of the columns before "Per kit". */
function spanOf(key: ColumnKey, total: boolean, keys: readonly ColumnKey[]): number {
  const perKit = keys.indexOf("perKit");
  return total && key === "supplier" && perKit >= 0 ? perKit - keys.indexOf("supplier") : 1;
}
