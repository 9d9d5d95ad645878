/**
 * What all charts share (DESIGN has no legend, no smoothing, no animation). Colours are our own CSS variables, so a
 * chart follows the theme by itself. Spread these into Recharts: `<XAxis {...X_AXIS} />`.
 */
export const INK = "var(--color-ink)";
export const INK_2 = "var(--color-ink-2)";
export const RULE = "var(--color-rule)";
export const RULE_2 = "var(--color-rule-2)";
export const PETROL = "var(--color-petrol)";
export const PETROL_WASH = "var(--color-petrol-wash)";
export const COPPER_METAL = "var(--color-copper-metal)";
export const COPPER_WASH = "var(--color-copper-wash)";
export const BAD = "var(--color-bad)";
export const BAD_WASH = "var(--color-bad-wash)";
export const PAPER = "var(--color-paper)";
export const SHEET = "var(--color-sheet)";
export const LOGO_TIN = "var(--color-logo-tin)";

/** Fixed heights in px; the width is the container's. */
export const CHART_HEIGHT = { cost: 430, breakEven: 500, rings: 340, profit: 430, spend: 330 } as const;

export const TICK = { fontSize: 15, fill: INK_2, fontFamily: "var(--font-sans)" } as const;

export const X_AXIS = {
  tick: TICK,
  tickSize: 7,
  tickLine: { stroke: INK, strokeWidth: 1.5 },
  axisLine: { stroke: INK, strokeWidth: 1.5 },
  tickMargin: 6,
  height: 58,
  type: "number",
} as const;

export const Y_AXIS = { tick: TICK, tickLine: false, axisLine: false, tickMargin: 8, width: 64 } as const;

/** Horizontal hairlines only. */
export const GRID = { vertical: false, stroke: RULE, strokeWidth: 1 } as const;

/** The axis title at its right end, below: "kits in the run". */
export function axisTitle(words: string) {
  return {
    value: words,
    position: "insideBottomRight",
    offset: 0,
    style: { ...TICK, textAnchor: "end" },
  } as const;
}

const LINE = {
  type: "linear",
  dot: false,
  activeDot: false,
  isAnimationActive: false,
  connectNulls: false,
} as const;
export const COST_LINE = { ...LINE, stroke: INK, strokeWidth: 2.25 } as const;
export const TAKINGS_LINE = { ...LINE, stroke: PETROL, strokeWidth: 2.75 } as const;
export const NET_LINE = { ...LINE, stroke: PETROL, strokeWidth: 1.75, strokeDasharray: "7 4" } as const;
/** An area between two lines: loss hatched, profit plain. */
const AREA = {
  type: "linear",
  stroke: "none",
  fillOpacity: 1,
  activeDot: false,
  isAnimationActive: false,
} as const;
export const LOSS_AREA = { ...AREA, fill: "url(#hatch-loss)" } as const;
export const PROFIT_AREA = { ...AREA, fill: PETROL_WASH } as const;
export const SAVINGS_AREA = { ...AREA, fill: "url(#hatch-savings)" } as const;
/** Joins the two ends of a step in cost. */
export const STEP_SEGMENT = { stroke: RULE_2, strokeWidth: 1.25, strokeDasharray: "2 3" } as const;
/** A step in money larger than this breaks the line. */
export const STEP_BREAK = 40;

/** Upright at the chosen run, with its ring; other sweet spots are smaller and open. */
export const RUN_LINE = { stroke: PETROL, strokeWidth: 1.5 } as const;
export const RUN_RING = { r: 8, stroke: COPPER_METAL, strokeWidth: 4, fill: LOGO_TIN } as const;
export const SPOT_RING = { r: 6, stroke: COPPER_METAL, strokeWidth: 4, fill: PAPER } as const;
/** From a run's cost back to takings and down. */
export const PAID_BACK_LINE = { stroke: PETROL, strokeWidth: 1.5, strokeDasharray: "4 3" } as const;

/** A name set at its line, with a halo of paper. */
export const LINE_NAME = {
  fontSize: 15,
  fontWeight: 600,
  fontFamily: "var(--font-sans)",
  paintOrder: "stroke",
  stroke: PAPER,
  strokeWidth: 5,
  strokeLinejoin: "round",
} as const;

export const CURSOR = { stroke: INK_2, strokeWidth: 1 } as const;

/** Classes of a tooltip's box: sheet, a line of ink, no shadow. */
export const TOOLTIP_LOOK = "frame-drawing bg-sheet px-3 py-2 type-label text-ink";

/** Lines at 45°, so that an area is known by more than its colour. */
export const HATCHES = {
  loss: { id: "hatch-loss", ground: BAD_WASH, line: BAD, apart: 8, width: 1.1 },
  savings: { id: "hatch-savings", ground: COPPER_WASH, line: COPPER_METAL, apart: 8, width: 1.1 },
  left: { id: "hatch-left", ground: PETROL_WASH, line: PETROL, apart: 6, width: 2 },
  fees: { id: "hatch-fees", ground: SHEET, line: RULE_2, apart: 6, width: 1 },
} as const;
export type Hatch = keyof typeof HATCHES;

/** The fill of a hatched area; the page holds one `<HatchDefs />`. */
export function hatchFill(hatch: Hatch): string {
  return `url(#${HATCHES[hatch].id})`;
}
