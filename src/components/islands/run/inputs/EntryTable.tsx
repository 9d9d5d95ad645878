import { type KeyboardEvent, type ReactNode, useState } from "react";
import { Button } from "#src/components/islands/parts/Button.tsx";
import { TextField } from "#src/components/islands/parts/TextField.tsx";
import { CELL, HEAD_CELL, HEAD_ROW, TABLE } from "#src/components/table-look.ts";

export interface EntryColumn<Row> {
  head: string;
  cell: (row: Row) => ReactNode;
  number?: boolean;
  /** Width on a wide page, as a class. */
  className?: string;
}

export interface EntryTableProps<Row extends { id: string; name: string }> {
  caption: string;
  columns: readonly EntryColumn<Row>[];
  rows: readonly Row[];
  /** Left out where this person may only look. */
  edit?: {
    /** "Add a task". */
    add: string;
    onAdd: (name: string) => Promise<unknown>;
    onRemove: (row: Row) => void;
  };
}

/** A ruled table whose cells are fields; on a phone each row becomes labels and fields. */
export function EntryTable<Row extends { id: string; name: string }>(props: EntryTableProps<Row>) {
  const { caption, columns, rows, edit } = props;
  return (
    <div>
      {rows.length > 0 && (
        <table className={`${TABLE} max-tablet:block`}>
          <caption className="heard-only">{caption}</caption>
          <thead className="max-tablet:hidden">
            <tr className={HEAD_ROW}>
              {columns.map(({ head, number, className }) => (
                <th
                  key={head}
                  scope="col"
                  className={`${HEAD_CELL} ${number ? "text-right" : ""} ${className ?? ""}`}
                >
                  {head}
                </th>
              ))}
              {edit && (
                <th scope="col" className={HEAD_CELL}>
                  <span className="heard-only">Remove</span>
                </th>
              )}
            </tr>
          </thead>
          <tbody className="max-tablet:block">
            {rows.map((row) => (
              <EntryRow key={row.id} row={row} columns={columns} onRemove={edit?.onRemove} />
            ))}
          </tbody>
        </table>
      )}
      {edit && <AddRow add={edit.add} onAdd={edit.onAdd} />}
      {!edit && rows.length === 0 && <p className="type-note text-ink-2">None.</p>}
    </div>
  );
}

interface EntryRowProps<Row> {
  row: Row;
  columns: readonly EntryColumn<Row>[];
  onRemove?: (row: Row) => void;
}

function EntryRow<Row extends { name: string }>({ row, columns, onRemove }: EntryRowProps<Row>) {
  return (
    <tr className="hairline-b align-top max-tablet:block max-tablet:py-3">
      {columns.map(({ head, cell }) => (
        <td
          key={head}
          className={`${CELL} py-1.5 max-tablet:flex max-tablet:items-start max-tablet:justify-between max-tablet:gap-4 max-tablet:px-0`}
        >
          <span aria-hidden="true" className="mt-2 shrink-0 text-ink-2 tablet:hidden">
            {head}
          </span>
          <span className="block min-w-0 max-tablet:w-[58%]">{cell(row)}</span>
        </td>
      ))}
      {onRemove && (
        <td className={`${CELL} py-1.5 text-right max-tablet:block max-tablet:px-0`}>
          <Button size="row" kind="refuse" onClick={() => onRemove(row)} aria-label={`Remove ${row.name}`}>
            Remove
          </Button>
        </td>
      )}
    </tr>
  );
}

/** The next row stands ready to type: its name, and Enter. */
function AddRow({ add, onAdd }: { add: string; onAdd: (name: string) => Promise<unknown> }) {
  const [name, setName] = useState("");
  const [busy, setBusy] = useState(false);
  async function put() {
    if (name.trim() === "" || busy) return;
    setBusy(true);
    await onAdd(name.trim());
    setBusy(false);
    setName("");
  }
  const onKey = (press: KeyboardEvent) => {
    if (press.key !== "Enter") return;
    press.preventDefault();
    void put();
  };
  return (
    <div className="mt-3 flex max-w-md items-end gap-3" data-screen-only>
      <TextField
        label={add}
        labelHidden
        row
        placeholder={add}
        maxLength={120}
        value={name}
        onChange={(change) => setName(change.currentTarget.value)}
        onKeyDown={onKey}
        className="grow"
      />
      <Button size="row" onClick={() => void put()} busy={busy} busyWord="Adding" offBecause={undefined}>
        Add
      </Button>
    </div>
  );
}
