import { type ReactNode, type RefObject, useState } from "react";
import { BusyIcon } from "#src/components/islands/parts/Icons.tsx";
import { QuietButton } from "#src/components/islands/parts/QuietButton.tsx";
import { type Column, Table } from "#src/components/islands/parts/Table.tsx";
import { showToast } from "#src/components/islands/parts/toasts.ts";
import { writeList } from "#src/partslist/write-list.ts";
import { chartSvg, giveFile, svgPng } from "./chart-files.ts";
import { useWidth } from "./use-width.ts";

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
  /** The reserved height, so that nothing jumps while the width is measured. */
  height: number;
  children: (width: number) => ReactNode;
}

/** A chart with what belongs to every chart: its table, and itself as PNG, SVG and CSV. */
export function ChartFrame({ name, file, table, height, children }: ChartFrameProps) {
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
        <span className="text-ink-2">Save as</span>
        <SaveKeys chart={box} name={name} file={file} table={table} />
      </figcaption>
      {asTable && <PointTable name={name} table={table()} />}
    </figure>
  );
}

type SaveProps = Pick<ChartFrameProps, "name" | "file" | "table"> & {
  chart: RefObject<HTMLDivElement | null>;
};

function SaveKeys({ chart, name, file, table }: SaveProps) {
  const [busy, setBusy] = useState(false);
  async function save(kind: "png" | "svg" | "csv") {
    setBusy(true);
    try {
      giveFile(await content(kind), `${file}.${kind}`);
    } catch {
      showToast({ kind: "fault", text: `The ${kind.toUpperCase()} could not be made. Try another kind.` });
    } finally {
      setBusy(false);
    }
  }
  async function content(kind: "png" | "svg" | "csv"): Promise<Blob> {
    if (kind === "csv") {
      const { head, fileRows } = table();
      return new Blob([writeList([head, ...fileRows], { byteOrderMark: true })], { type: "text/csv" });
    }
    const drawn = chart.current?.querySelector<SVGSVGElement>("svg.recharts-surface");
    if (!drawn) throw new Error("No chart is drawn.");
    const svg = await chartSvg(drawn, name);
    return kind === "png" ? svgPng(svg) : new Blob([svg], { type: "image/svg+xml" });
  }
  return (
    <>
      {(["png", "svg", "csv"] as const).map((kind) => (
        <QuietButton
          key={kind}
          onClick={() => void save(kind)}
          aria-label={`Save as ${kind.toUpperCase()}: ${name}`}
        >
          {kind.toUpperCase()}
        </QuietButton>
      ))}
      {busy && <BusyIcon className="size-4" />}
    </>
  );
}

function PointTable({ name, table }: { name: string; table: ChartTable }) {
  const columns: Column<readonly string[]>[] = table.head.map((head, place) => ({
    key: head,
    head,
    number: true,
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
        height="dense"
        scrolls
      />
    </div>
  );
}
