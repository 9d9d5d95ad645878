import { countText, moneyText } from "#src/components/amount-text.ts";
import type { ChartTable } from "#src/components/islands/charts/ChartFrame.tsx";
import { boardsByRun } from "#src/costing/boards-by-run.ts";
import { grains } from "#src/costing/grains.ts";
import type { QuoteResult } from "#src/costing/run-result.ts";
import type { Plan } from "#src/shapes/plan.ts";
import { quoteName } from "./board-words.ts";

/** A quote as a line of the chart. */
export interface QuoteLine {
  id: string;
  name: string;
  /** The name as it stands at the end of the line: "Kilnside × 12" for panels of 12. */
  label: string;
  /** Its boards are taken at the chosen run. */
  chosen: boolean;
}

/** One run size. Floating-point numbers are for pixels only; `exact` holds the figures themselves. */
export interface BoardsPoint {
  kits: number;
  /** Cost of a board in a kit by quote; null where not known. */
  each: Record<string, number | null>;
  exact: Record<string, string | null>;
  /** Quotes of which the next kit takes more: their line breaks here. */
  breaks: Record<string, boolean>;
  /** Id of the cheapest quote. */
  least: string | null;
}

export interface BoardsPoints {
  lines: readonly QuoteLine[];
  points: readonly BoardsPoint[];
}

/** A longer name at the end of a line is cut. */
const LABEL_MOST = 16;

function lineLabel({ boardHouse, boardsPerPiece }: QuoteResult): string {
  const tail = boardsPerPiece === 1 ? "" : ` × ${boardsPerPiece}`;
  const room = LABEL_MOST - tail.length;
  return `${boardHouse.length > room ? `${boardHouse.slice(0, room - 2)} …` : boardHouse}${tail}`;
}

/** A board that gets dearer by more than this share from one kit to the next steps up. */
const STEP = 0.03;

function leastOf(quotes: readonly QuoteResult[]): string | null {
  let least: { id: string; value: bigint } | null = null;
  for (const { id, perBoard } of quotes) {
    if (!perBoard.known) continue;
    const value = grains(perBoard.value);
    if (least === null || value < least.value) least = { id, value };
  }
  return least?.id ?? null;
}

/** Landed cost of one board in a kit at every board house, for every run size of a span. */
export function boardsPoints(plan: Plan, { from, to }: { from: number; to: number }): BoardsPoints {
  const runs = boardsByRun(plan, from, to);
  const [at] = boardsByRun(plan, plan.run.kits, plan.run.kits);
  const lines = (at?.boards.quotes ?? []).map((quote) => ({
    id: quote.id,
    name: quoteName(quote),
    label: lineLabel(quote),
    chosen: quote.chosen,
  }));
  const bare = runs.map(({ kits, boards: { quotes } }) => {
    const known = quotes.map(({ id, perBoard }) => [id, perBoard.known ? perBoard.value : null] as const);
    return {
      kits,
      exact: Object.fromEntries(known),
      each: Object.fromEntries(known.map(([id, value]) => [id, value === null ? null : Number(value)])),
      least: leastOf(quotes),
    };
  });
  const stepsUp = (now: number | null | undefined, next: number | null | undefined) =>
    typeof now === "number" && typeof next === "number" && next > now * (1 + STEP);
  const points = bare.map((point, place) => ({
    ...point,
    breaks: Object.fromEntries(
      lines.map(({ id }) => [id, stepsUp(point.each[id], bare[place + 1]?.each[id])]),
    ),
  }));
  return { lines, points: Object.freeze(points) };
}

/** The highest cost that is drawn: small runs cost many times the usual and leave at the top. */
export function boardsTop({ points, lines }: BoardsPoints, run: number): number {
  const at = points.find(({ kits }) => kits === run);
  const atRun = lines.flatMap(({ id }) => at?.each[id] ?? []);
  const all = points.flatMap(({ each }) => Object.values(each).flatMap((value) => value ?? []));
  const highest = Math.max(0.01, ...all);
  return atRun.length === 0 ? highest : Math.min(highest, Math.max(...atRun) * 2);
}

const ROUND = [10, 20, 30, 50, 75, 100, 150, 200, 300, 500];

/** The runs people compare and the chosen one, for reading; every size of the chart for a file. */
export function boardsTable(plan: Plan, { lines, points }: BoardsPoints): ChartTable {
  const shown = [...new Set([...ROUND, plan.run.kits])].sort((a, b) => a - b);
  const read = shown.flatMap((kits) => boardsPoints(plan, { from: kits, to: kits }).points);
  const written = (value: string | null | undefined) =>
    value === null || value === undefined ? "not known" : moneyText(value, plan.currency);
  return {
    head: ["Run", ...lines.map(({ name }) => name)],
    rows: read.map(({ kits, exact: of }) => [countText(kits), ...lines.map(({ id }) => written(of[id]))]),
    fileRows: points.map(({ kits, exact: of }) => [String(kits), ...lines.map(({ id }) => of[id] ?? "")]),
  };
}
