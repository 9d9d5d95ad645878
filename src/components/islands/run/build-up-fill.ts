import { hatchFill } from "#src/components/islands/chart-theme.ts";
import type { BuildUpRow } from "./build-up-rows.ts";

const FILLS: Record<BuildUpRow["kind"], string> = {
  part: "var(--color-copper-metal)",
  cost: "var(--color-ink)",
  brings: "var(--color-petrol)",
  left: hatchFill("left"),
};

/** How the bar of a row is drawn: what is left is hatched, what is not known whole is pale and dashed. */
export function buildUpFill({ kind, figure }: BuildUpRow) {
  const known = figure.known;
  return {
    fill: FILLS[kind],
    fillOpacity: known ? 1 : 0.45,
    stroke: kind === "left" ? "var(--color-petrol)" : known ? "none" : "var(--color-rule-2)",
    strokeWidth: kind === "left" ? 1.5 : 1,
    strokeDasharray: known ? undefined : "3 3",
  };
}
