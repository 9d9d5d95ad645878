/** What a person wrote into a cell: the fields it changes, or what would be right. */
export type CellEntry<Fields> = { ok: true; change: Partial<Fields> } | { ok: false; sentence: string };

/** A row of a sheet that people edit; the version is the one a change must name. */
export interface CellRow {
  id: string;
  version: number;
}

/**
 * A column as text: what a cell says when it is opened, and what an entry means. One entry may set
 * several fields, as "4.90" in a column of freight does.
 */
export interface CellColumn<Row extends CellRow, Fields> {
  key: string;
  head: string;
  /** The text that is edited, copied and compared. */
  text: (row: Row) => string;
  /** As it is shown, where that differs: "€4.90" for "4.90". */
  shown?: (row: Row) => string;
  /** Left out: the column is for reading. */
  read?: (entry: string, row: Row) => CellEntry<Fields>;
  /** Fields the column sets, so that the server's refusal finds its cell: `breaks` or `breaks.2`. */
  fields?: readonly string[];
  /** The only entries there are, chosen from a list. */
  choices?: readonly string[];
  /** Where the cell leads. */
  href?: (row: Row) => string;
  width?: number;
  grows?: boolean;
  number?: boolean;
  held?: boolean;
}

/** An entry typed or pasted into one cell. */
export interface CellEdit {
  row: string;
  column: string;
  entry: string;
}

/** A row that is pasted below the last one: its entries by column. */
export type PastedRow = Readonly<Record<string, string>>;

/** An entry that cannot be taken; it stays in its cell until it is put right or dropped. */
export interface CellFault extends CellEdit {
  sentence: string;
}

/** The changes of one row. */
export interface RowChange<Fields> {
  id: string;
  version: number;
  change: Partial<Fields>;
  /** Columns that were edited. */
  columns: string[];
}

/** Names a cell in a map of faults. */
export function cellKey({ row, column }: Pick<CellEdit, "row" | "column">): string {
  return `${row} ${column}`;
}
