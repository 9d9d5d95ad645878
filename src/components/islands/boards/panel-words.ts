import { countText } from "#src/components/amount-text.ts";
import type { Block } from "#src/costing/panels/arrangement.ts";
import type { Panel } from "#src/costing/panels/lay-out-panel.ts";
import { millimetres, type Rect, type Size } from "#src/costing/panels/micrometres.ts";
import { roundedText } from "#src/costing/rounded-text.ts";

const NO_BREAK = "\u00a0";

/** Whole micrometres as "21.5 mm". */
export function mmText(micrometres: number): string {
  return `${millimetres(micrometres)}${NO_BREAK}mm`;
}

/** "238 × 144 mm". */
export function sizeText({ width, height }: Size): string {
  return [millimetres(width), "×", millimetres(height), "mm"].join(NO_BREAK);
}

/** An area in square centimetres: "292 cm²", below ten with one decimal. */
export function areaText(squareCentimetres: string): string {
  const places = Number(squareCentimetres) < 10 ? 1 : 0;
  const rounded = roundedText(squareCentimetres, places);
  return `${places === 0 ? countText(rounded) : rounded}${NO_BREAK}cm²`;
}

/** "12 boards", "1 board". */
export function boardsText(count: number): string {
  return `${countText(count)} ${count === 1 ? "board" : "boards"}`;
}

/** How the boards lie: "4 × 3", "2 × 4 and 3 × 3 turned". */
export function layoutWords({ first, second }: Panel["arrangement"]): string {
  const grid = ({ columns, rows, turned }: Block) => `${columns} × ${rows}${turned ? " turned" : ""}`;
  return second ? `${grid(first)} and ${grid(second)}` : grid(first);
}

/** "two rails, 5 mm"; null without rails. */
export function railWords({ rails, measures }: Panel): string | null {
  if (rails.length === 0) return null;
  return `${rails.length === 4 ? "four" : "two"} rails, ${mmText(measures.rail)}`;
}

/** What lies between the boards: "routed gaps, 2 mm", or the corners a score leaves. */
export function gapWords({ measures, arrangement }: Panel): string {
  if (!measures.routed) return "left between";
  const gaps = `routed gaps, ${mmText(measures.gap)}`;
  return arrangement.second ? `${gaps}, and what is left` : gaps;
}

/** How wide a tab is: the side that does not bridge the gap. */
function tabLength({ width, height }: Rect, gap: number): number {
  return width === gap ? height : width;
}

/** "70 of 5 mm", or "18 of at most 5 mm" where short sides have narrower ones. */
export function tabsWords({ tabs, measures }: Panel): string {
  const lengths = new Set(tabs.map((tab) => tabLength(tab, measures.gap)));
  if (lengths.size === 0) return "none";
  return `${countText(tabs.length)} of ${lengths.size > 1 ? "at most " : ""}${mmText(Math.max(...lengths))}`;
}

/** Names at the ends of the leaders. */
export const LEADER_WORDS = {
  gap: ({ measures }: Panel) => `routed gap, ${mmText(measures.gap)}`,
  tab: (tab: Rect, { measures }: Panel) => `breaking tab, ${mmText(tabLength(tab, measures.gap))}`,
  score: () => "V-score, edge to edge",
  rail: ({ measures }: Panel) => `rail, ${mmText(measures.rail)}`,
};

/** The drawing in one sentence. */
export function panelSentenceOf(panel: Panel): string {
  const { arrangement, outer, measures } = panel;
  const parted = measures.routed
    ? `routed with gaps of ${mmText(measures.gap)} and breaking tabs`
    : "V-scored";
  const rails = railWords(panel);
  return `A panel of ${boardsText(arrangement.count)}, ${layoutWords(arrangement)}, ${sizeText(outer)}, ${parted}${rails ? `, with ${rails.replace(",", " of")}` : ", without rails"}.`;
}
