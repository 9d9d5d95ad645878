import { useState } from "react";
import { BusyIcon } from "#src/components/islands/parts/Icons.tsx";
import { QuietButton } from "#src/components/islands/parts/QuietButton.tsx";
import { showToast } from "#src/components/islands/parts/toasts.ts";

const KINDS = ["png", "svg", "csv"] as const;
export type ChartKind = (typeof KINDS)[number];

export interface SaveChartProps {
  /** "What one kit costs, by run size". */
  name: string;
  /** Of the files: "dew-lantern-cost". */
  file: string;
  drawn: () => SVGSVGElement | null | undefined;
  /** Rows of the CSV, its head first: plain decimals. */
  rows: () => readonly (readonly string[])[];
}

const saving = () => import("./save-chart.ts");

/** A drawing as PNG, SVG and CSV. */
export function SaveChart(props: SaveChartProps) {
  const { name } = props;
  const [busy, setBusy] = useState(false);
  async function save(kind: ChartKind) {
    setBusy(true);
    try {
      await (await saving()).saveChart(kind, props);
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
          onPointerEnter={() => void saving().catch(() => {})}
          aria-label={`Save as ${kind.toUpperCase()}: ${name}`}
        >
          {kind.toUpperCase()}
        </QuietButton>
      ))}
      {busy && <BusyIcon className="size-4" />}
    </>
  );
}
