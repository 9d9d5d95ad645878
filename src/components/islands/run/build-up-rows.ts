import { roundStep } from "#src/components/islands/charts/round-ticks.ts";
import type { Figure } from "#src/costing/figure.ts";
import type { HeadId, RunResult } from "#src/costing/run-result.ts";
import type { FigureId } from "#src/costing/working-tree.ts";

export type BarKind = "part" | "cost" | "brings" | "left";

/** One row of the build-up: where its bar begins and ends, in hundredths of the common scale. */
export interface BuildUpRow {
  key: string;
  label: string;
  figure: Figure;
  opens: FigureId;
  kind: BarKind;
  /** Null while the figure is not known. */
  bar: { from: number; to: number } | null;
  /** Share of the kit's cost, exact; only of parts that are known. */
  share: string | null;
}

export interface BuildUp {
  rows: BuildUpRow[];
  /** Thin lines of the scale, in hundredths, and the money between two. */
  lines: number[];
  step: number;
}

function headLabel(run: RunResult, id: HeadId): string {
  const kinds = run.parts.filter(({ required }) => required > 0).length;
  const ordered = run.boards.quotes.find(({ chosen }) => chosen)?.ordered ?? null;
  const labels: Record<HeadId, string> = {
    parts: `Parts, ${kinds} ${kinds === 1 ? "kind" : "kinds"}`,
    boards: ordered === null ? "Boards" : `Boards, ${ordered} ordered`,
    freight: `Freight and duty, ${run.parcels} ${run.parcels === 1 ? "parcel" : "parcels"}`,
    packing: "Packing material",
    work: "Work, programming and test",
    "one-off": `Once-only costs, shared by ${run.kits}`,
    replacements: "Replacements",
  };
  return labels[id];
}

/** Pixels only: what a figure is, or what is known of it. */
function drawn(figure: Figure): number | null {
  if (figure.known) return Number(figure.value);
  return figure.without === null ? null : Number(figure.without);
}

/** The build-up of one kit: its heads one after the other, their sum, what it brings in and what is left. */
export function buildUp(run: RunResult): BuildUp {
  const heads = run.heads.filter(({ perKit }) => drawn(perKit.used) !== 0);
  const cost = drawn(run.perKit.used) ?? 0;
  const brings = drawn(run.bringsPerKit);
  const end = Math.max(cost, brings ?? 0, 0.01);
  const step = roundStep(end, 6);
  const at = (money: number) => (Math.max(0, money) / end) * 100;
  let before = 0;
  const parts = heads.map((head): BuildUpRow => {
    const value = drawn(head.perKit.used) ?? 0;
    const from = before;
    before += value;
    return {
      key: head.id,
      label: headLabel(run, head.id),
      figure: head.perKit.used,
      opens: `head:${head.id}`,
      kind: "part",
      bar: { from: at(from), to: at(before) },
      share: head.share.known ? head.share.value : null,
    };
  });
  const row = (
    key: string,
    label: string,
    figure: Figure,
    opens: FigureId,
    kind: BarKind,
    bar: BuildUpRow["bar"],
  ) => ({
    key,
    label,
    figure,
    opens,
    kind,
    bar,
    share: null,
  });
  const left = brings === null ? null : { from: at(Math.min(cost, brings)), to: at(Math.max(cost, brings)) };
  const lost = brings !== null && brings < cost;
  const rows = [
    ...parts,
    row("cost", "Cost of one kit, used", run.perKit.used, "per-kit-used", "cost", { from: 0, to: at(cost) }),
    row(
      "brings",
      "One kit brings in",
      run.bringsPerKit,
      "brings-per-kit",
      "brings",
      brings === null ? null : { from: 0, to: at(brings) },
    ),
    row("left", lost ? "Lost on each" : "Left for you", run.earnsPerKit, "earns-per-kit", "left", left),
  ];
  const lines = Array.from({ length: Math.floor(end / step) + 1 }, (_, place) => at(place * step));
  return { rows, lines, step };
}

/** The build-up as rows of a file: exact amounts, empty where not known. */
export function buildUpList({ rows }: BuildUp): string[][] {
  const head = ["Of one kit", "Amount", "Share of the cost"];
  const row = ({ label, figure, share }: BuildUpRow) => [
    label,
    figure.known ? figure.value : "",
    share ?? "",
  ];
  return [head, ...rows.map(row)];
}
