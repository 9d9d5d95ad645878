import { ensureBuilt } from "../../src/server/ready.mjs";
import type { BenchRow } from "./bench-row.ts";
import { run as importing } from "./import.ts";
import { run as pages } from "./page-weight.ts";
import { run as redrawing } from "./redraw.ts";
import { run as sourcing } from "./sourcing.ts";
import { run as sweeping } from "./sweep.ts";

/** `npm run bench`: every measurement, each against its named baseline in the same run. Nothing fails by it. */

function printed({ what, value, unit, aim, met, note }: BenchRow): string {
  return `${what}\n  ${value} ${unit}; aim: ${aim}; ${met ? "met" : "not met"}\n  ${note}\n`;
}

ensureBuilt();
for (const measure of [importing, sweeping, sourcing, pages, redrawing])
  for (const row of await measure()) console.log(printed(row));
