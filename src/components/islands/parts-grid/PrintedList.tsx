import { cellText } from "./cell-text.ts";
import { columnHead } from "./column-defs.ts";
import type { GridRow, LineRow, TotalRow } from "./grid-rows.ts";

export interface PrintedListProps {
  label: string;
  rows: readonly GridRow[];
  total: TotalRow;
  editions: readonly { id: string; name: string }[];
  /** With what it costs, for those who may see it. */
  money: boolean;
}

const CELL = "px-1.5 py-1 align-top first:pl-0 last:pr-0";
const HEAD_ROW = "sheet-head text-left *:align-bottom";
const NUMBER = `${CELL} text-right whitespace-nowrap`;

/** Two lines of a cell: what it is called, then the rest. */
function Stacked({ first, then }: { first: string; then: readonly (string | undefined)[] }) {
  return (
    <>
      <b className="font-semibold">{first}</b>
      {then.filter(Boolean).map((words) => (
        <span key={words} className="block">
          {words}
        </span>
      ))}
    </>
  );
}

/** The parts list on paper: every row that is shown, as a table that goes on from sheet to sheet. Colours are written. */
export function PrintedList({ label, rows, total, editions, money }: PrintedListProps) {
  const quantities = editions.map(({ id }) => `quantity:${id}` as const);
  const lines = rows.filter((row): row is LineRow => row.kind === "line");
  return (
    <table className="sheet-small w-full border-collapse">
      <caption className="heard-only">{label}</caption>
      <thead>
        <tr className={HEAD_ROW}>
          <th className={NUMBER}>Line</th>
          <th className={CELL}>Designators</th>
          {quantities.map((key) => (
            <th key={key} className={`${CELL} w-[14mm] text-right`}>
              {columnHead(key, editions)}
            </th>
          ))}
          <th className={`${CELL} w-[44mm]`}>Part</th>
          <th className={`${CELL} w-[26mm]`}>Body and holes</th>
          <th className={CELL}>Drawer</th>
          {money && (
            <>
              <th className={CELL}>Supplier and order code</th>
              <th className={NUMBER}>Buy</th>
              <th className={NUMBER}>Per kit</th>
            </>
          )}
        </tr>
      </thead>
      <tbody>
        {lines.map((row) => (
          <tr key={row.id} className="sheet-hairline">
            <td className={NUMBER}>{row.place}</td>
            <td className={`${CELL} font-semibold`}>{row.designators}</td>
            {quantities.map((key) => (
              <td key={key} className={NUMBER}>
                {cellText(row, key) || "–"}
              </td>
            ))}
            <td className={CELL}>
              <Stacked
                first={row.line.part.name}
                then={[row.line.part.spec, row.bands?.colours.join(", ")]}
              />
            </td>
            <td className={CELL}>{row.line.part.package}</td>
            <td className={CELL}>{row.line.part.drawer}</td>
            {money && (
              <>
                <td className={CELL}>
                  <Stacked first={row.money?.supplier ?? ""} then={[row.money?.orderCode]} />
                </td>
                <td className={NUMBER}>{cellText(row, "buy")}</td>
                <td className={NUMBER}>{cellText(row, "perKit")}</td>
              </>
            )}
          </tr>
        ))}
      </tbody>
      <tfoot className="table-row-group">
        <tr className="font-semibold [border-top:1.25pt_solid_#000]">
          <td className={CELL} />
          <td className={CELL}>{total.cells.designators}</td>
          {quantities.map((key) => (
            <td key={key} className={NUMBER}>
              {total.cells[key]}
            </td>
          ))}
          <td className={`${CELL} text-right`} colSpan={money ? 5 : 3}>
            {money && total.cells.supplier}
          </td>
          {money && <td className={NUMBER}>{total.cells.perKit}</td>}
        </tr>
      </tfoot>
    </table>
  );
}
