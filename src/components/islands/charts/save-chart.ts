import { writeList } from "#src/partslist/write-list.ts";
import { chartSvg, giveFile, svgPng } from "./chart-files.ts";
import type { ChartKind, SaveChartProps } from "./SaveChart.tsx";

async function content(kind: ChartKind, { name, drawn, rows }: SaveChartProps): Promise<Blob> {
  if (kind === "csv") return new Blob([writeList(rows(), { byteOrderMark: true })], { type: "text/csv" });
  const drawing = drawn();
  if (!drawing) throw new Error("No chart is drawn.");
  const svg = await chartSvg(drawing, name);
  return kind === "png" ? svgPng(svg) : new Blob([svg], { type: "image/svg+xml" });
}

/** Gives a drawing to the person as a file. Fetched when somebody comes to the buttons. */
export async function saveChart(kind: ChartKind, props: SaveChartProps): Promise<void> {
  giveFile(await content(kind, props), `${props.file}.${kind}`);
}
