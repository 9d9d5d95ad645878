import { useState } from "react";
import { BusyIcon } from "#src/components/islands/parts/Icons.tsx";
import { QuietButton } from "#src/components/islands/parts/QuietButton.tsx";
import { showToast } from "#src/components/islands/parts/toasts.ts";
import { writeList } from "#src/partslist/write-list.ts";

const KINDS = ["png", "svg", "csv"] as const;
type Kind = (typeof KINDS)[number];

export interface SaveChartProps {
  /** "What one kit costs, by run size". */
  name: string;
  /** Of the files: "dew-lantern-cost". */
  file: string;
  drawn: () => SVGSVGElement | null | undefined;
  /** Rows of the CSV, its head first: plain decimals. */
  rows: () => readonly (readonly string[])[];
}

/** Fetched when somebody comes to the buttons. */
const files = () => import("./chart-files.ts");

async function content(kind: Kind, { name, drawn, rows }: SaveChartProps): Promise<Blob> {
  if (kind === "csv") return new Blob([writeList(rows(), { byteOrderMark: true })], { type: "text/csv" });
  const drawing = drawn();
  if (!drawing) throw new Error("No chart is drawn.");
  const { chartSvg, svgPng } = await files();
  const svg = await chartSvg(drawing, name);
  return kind === "png" ? svgPng(svg) : new Blob([svg], { type: "image/svg+xml" });
}

/** A drawing as PNG, SVG and CSV. */
export function SaveChart(props: SaveChartProps) {
  const { name, file } = props;
  const [busy, setBusy] = useState(false);
  async function save(kind: Kind) {
    setBusy(true);
    try {
      const blob = await content(kind, props);
      (await files()).giveFile(blob, `${file}.${kind}`);
    } catch {
      showToast({ kind: "fault", text: `The ${kind.toUpperCase()} could not be made. Try another kind.` });
    } finally {
      setBusy(false);
    }
  }
  return (
    <>
      <span className="text-ink-2">Save as</span>
      {KINDS.map((kind) => (
        <QuietButton
          key={kind}
          onClick={() => void save(kind)}
          onPointerEnter={() => void files().catch(() => {})}
          aria-label={`Save as ${kind.toUpperCase()}: ${name}`}
        >
          {kind.toUpperCase()}
        </QuietButton>
      ))}
      {busy && <BusyIcon className="size-4" />}
    </>
  );
}
