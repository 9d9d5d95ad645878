import { type ReactNode, useState } from "react";
import { QuietButton } from "#src/components/islands/parts/QuietButton.tsx";
import { type Column, Table } from "#src/components/islands/parts/Table.tsx";
import { useWidth } from "#src/components/islands/parts/use-width.ts";
import { SaveChart } from "./SaveChart.tsx";

/** The rows behind a chart: a head, and every cell as text. */
export interface ChartTable {
  head: readonly string[];
  rows: readonly (readonly string[])[];
  /** Rows as they go into a file: plain decimals, every run size. */
  fileRows: readonly (readonly string[])[];
}

export interface ChartFrameProps {
  /** "What one kit costs, by run size": the caption of the table and the name of the files. */
  name: string;
  /** Of the files: "dew-lantern-cost". */
  file: string;
  table: () => ChartTable;
  /** The row of the table that is chosen, by its first cell. */
  chosen?: string;
  /** The reserved height, so that nothing jumps while the width is measured. */
  height: number;
  children: (width: number) => ReactNode;
}

/** A chart with what belongs to every chart: its table, and itself as PNG, SVG and CSV. */
export function ChartFrame({ name, file, table, chosen, height, children }: ChartFrameProps) {
  const [box, width] = useWidth<HTMLDivElement>();
  const [asTable, setAsTable] = useState(false);
  return (
    <figure className="m-0">
      <div ref={box} className="[&_svg:focus-visible]:outline-3" style={{ minHeight: height }}>
        {width > 0 && children(width)}
      </div>
      <figcaption className="mt-2 flex flex-wrap items-center gap-x-5 gap-y-1 type-label" data-screen-only>
        <span className="heard-only">{name}</span>
        <QuietButton aria-expanded={asTable} onClick={() => setAsTable(!asTable)}>
          {asTable ? "Hide the table" : "As a table"}
        </QuietButton>
        <SaveChart
          name={name}
          file={file}
          drawn={() => box.current?.querySelector<SVGSVGElement>("svg.recharts-surface")}
          rows={() => {
            const { head, fileRows } = table();
            return [head, ...fileRows];
          }}
        />
      </figcaption>
      {asTable && <PointTable name={name} table={table()} chosen={chosen} />}
    </figure>
  );
}

function PointTable({ name, table, chosen }: { name: string; table: ChartTable; chosen?: string }) {
  const columns: Column<readonly string[]>[] = table.head.map((head, place) => ({
    key: `${place} ${head}`,
    head,
    number: place > 0,
    names: place === 0,
    cell: (row) => row[place] ?? "",
  }));
  return (
    <div className="mt-4 max-h-[420px] overflow-y-auto">
      <Table
        caption={name}
        columns={columns}
        rows={table.rows}
        keyOf={(row) => row[0] ?? ""}
        chosen={(row) => row[0] === chosen}
        height="dense"
        scrolls
      />
    </div>
  );
}
