import type { CellColumn, CellEdit, CellFault, CellRow, RowChange } from "./cell-column.ts";

/** Entries as they were read: one change for each row, and what could not be read. */
export interface ReadEdits<Fields> {
  changes: RowChange<Fields>[];
  faults: CellFault[];
}

/**
 * Reads the entries of one action, such as a pasted block. Entries of one row build on each other, so that a
 * block may set quantity and price together. An entry that changes nothing is left out.
 */
export function readEdits<Row extends CellRow, Fields>(
  edits: readonly CellEdit[],
  rows: readonly Row[],
  columns: readonly CellColumn<Row, Fields>[],
): ReadEdits<Fields> {
  const faults: CellFault[] = [];
  const changes = new Map<string, RowChange<Fields>>();
  for (const edit of edits) {
    const row = rows.find(({ id }) => id === edit.row);
    const column = columns.find(({ key }) => key === edit.column);
    if (!row || !column?.read) continue;
    const before = changes.get(row.id) ?? { id: row.id, version: row.version, change: {}, columns: [] };
    const now = { ...row, ...before.change };
    if (column.text(now) === edit.entry) continue;
    const read = column.read(edit.entry, now);
    if (!read.ok) faults.push({ ...edit, sentence: read.sentence });
    else
      changes.set(row.id, {
        ...before,
        change: { ...before.change, ...read.change },
        columns: [...before.columns, column.key],
      });
  }
  return { changes: [...changes.values()], faults };
}

/** The change that takes a change back: the same fields with what stands there now. */
export function takenBack<Row extends CellRow, Fields>(
  { id, change, columns }: RowChange<Fields>,
  rows: readonly Row[],
): Omit<RowChange<Fields>, "version"> {
  const row = rows.find((one) => one.id === id) as Record<string, unknown> | undefined;
  const fields = Object.keys(change).map((name) => [name, row?.[name]]);
  return { id, change: Object.fromEntries(fields) as Partial<Fields>, columns };
}

/** A refusal of the server as a fault of a cell: the edited column that sets the field, or the first edited one. */
export function faultOf<Row extends CellRow, Fields>(
  { at, message }: { at: string; message: string },
  change: RowChange<Fields>,
  columns: readonly CellColumn<Row, Fields>[],
  rows: readonly Row[],
): CellFault {
  const sets = ({ fields = [] }: CellColumn<Row, Fields>) =>
    fields.some((field) => at === field || at.startsWith(`${field}.`));
  const edited = columns.filter(({ key }) => change.columns.includes(key));
  const column = edited.find(sets) ?? edited[0] ?? columns[0];
  const row = rows.find(({ id }) => id === change.id);
  const entry = row && column ? column.text({ ...row, ...change.change }) : "";
  return { row: change.id, column: column?.key ?? "", entry, sentence: message };
}
