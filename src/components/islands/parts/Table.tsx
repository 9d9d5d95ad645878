import type { ReactNode } from "react";
import {
  CELL,
  HEAD_CELL,
  HEAD_ROW,
  NUMBER,
  type RowHeight,
  rowLook,
  TABLE,
  TOTAL_ROW,
} from "#src/components/table-look.ts";

export type Column<Row> = {
  key: string;
  head: ReactNode;
  cell: (row: Row) => ReactNode;
  /** Numbers stand right. */
  number?: boolean;
  /** The cell names its row: the first column, usually. */
  names?: boolean;
  /** Below its line in the total row. */
  total?: ReactNode;
  /** A final result: double rule under the total. */
  result?: boolean;
  /** Dropped on a phone. */
  wide?: boolean;
  className?: string;
};

export type TableProps<Row> = {
  /** What the table shows, heard before it: "Runs worth a look". */
  caption: string;
  columns: readonly Column<Row>[];
  rows: readonly Row[];
  keyOf: (row: Row) => string;
  chosen?: (row: Row) => boolean;
  height?: RowHeight;
  /** May be wider than a phone: scrolls sideways with its first column held. */
  scrolls?: boolean;
};

/** A ruled table. For editing in cells take the grid; this one is for reading. */
export function Table<Row>({ caption, columns, rows, keyOf, chosen, height, scrolls }: TableProps<Row>) {
  const table = (
    <table className={TABLE}>
      <caption className="heard-only">{caption}</caption>
      <thead>
        <tr className={HEAD_ROW}>
          {columns.map((column) => (
            <th key={column.key} scope="col" className={`${HEAD_CELL} ${alignment(column)}`}>
              {column.head}
            </th>
          ))}
        </tr>
      </thead>
      <tbody>
        {rows.map((row) => (
          <tr
            key={keyOf(row)}
            data-chosen={chosen?.(row) || undefined}
            className={rowLook(height, chosen?.(row))}
          >
            {columns.map((column) => (
              <BodyCell key={column.key} column={column} row={row} held={scrolls} />
            ))}
          </tr>
        ))}
      </tbody>
      {columns.some((column) => column.total !== undefined) && <TotalRow columns={columns} />}
    </table>
  );
  if (!scrolls) return table;
  return (
    // biome-ignore lint/a11y/noNoninteractiveTabindex: a region that scrolls must be reachable by keyboard.
    <section tabIndex={0} aria-label={caption} className="overflow-x-auto">
      {table}
    </section>
  );
}

function alignment<Row>(column: Column<Row>): string {
  return `${column.number ? "text-right" : "text-left"} ${column.wide ? "max-tablet:hidden" : ""} ${column.className ?? ""}`;
}

function BodyCell<Row>({ column, row, held }: { column: Column<Row>; row: Row; held?: boolean }) {
  const look = `${CELL} ${column.number ? NUMBER : ""} ${alignment(column)}`;
  if (!column.names) return <td className={look}>{column.cell(row)}</td>;
  return (
    <th scope="row" className={`${look} font-normal ${held ? "sticky left-0 bg-paper" : ""}`}>
      {column.cell(row)}
    </th>
  );
}

function TotalRow<Row>({ columns }: { columns: readonly Column<Row>[] }) {
  return (
    <tfoot>
      <tr className={TOTAL_ROW}>
        {columns.map((column) => (
          <td key={column.key} className={`${CELL} ${column.number ? NUMBER : ""} ${alignment(column)}`}>
            {column.result ? (
              <span className="rule-result inline-block pb-0.5 pl-4">{column.total}</span>
            ) : (
              column.total
            )}
          </td>
        ))}
      </tr>
    </tfoot>
  );
}
