import type { PriceFigureId } from "./price/price-figures.ts";
import type { Need, SourcePage } from "./problem.ts";
import type { HeadId } from "./run-result.ts";

/** Every figure that opens to its working. */
export type FigureId =
  | "spent"
  | "used"
  | "per-kit-spent"
  | "per-kit-used"
  | "brings"
  | "brings-per-kit"
  | "profit"
  | "earns-per-kit"
  | "earned-per-hour"
  | "even-after"
  | "first-even"
  | "safe-even"
  | "next-kit"
  | "boards-to-order"
  | "left-over"
  | `head:${HeadId}`
  | `part:${string}`
  | `offer:${string}:${string}`
  | `basket:${string}`
  | `quote:${string}`
  | `panel:${string}`
  | `task:${string}`
  | `edition:${string}`
  | `crossing:${number}`
  | PriceFigureId;

export type WorkingAmount =
  /** Exact decimal text; shown to the minor unit, or to `places` where a unit price needs more. */
  | { kind: "money"; value: string; currency: string; places?: number }
  | { kind: "count"; value: string; unit: string }
  /** A rate or share as a decimal: "0.029" is 2.9 %. */
  | { kind: "rate"; value: string }
  | { kind: "number"; value: string; unit: string }
  | { kind: "words"; value: string }
  | { kind: "not-known"; needs: Need[] };

export interface WorkingSub {
  label: string;
  amount: WorkingAmount;
  source: WorkingSource | null;
  opens: FigureId | null;
}

export interface WorkingSource {
  page: SourcePage;
  /** Id of the part, supplier, quote or edition on that page. */
  id: string | null;
}

/**
 * One line of squared paper. Read downward: a line without sign starts a sum, + − × ÷ carry it on,
 * and = closes it with its result. `rounds` says that the result was rounded to so many places.
 */
export interface WorkingLine {
  letter: string | null;
  label: string;
  sign: "+" | "−" | "×" | "÷" | "=" | null;
  amount: WorkingAmount | null;
  subs: WorkingSub[];
  source: WorkingSource | null;
  /** The figure that opens when this amount is pressed. */
  opens: FigureId | null;
  /** Section of the method this step follows. */
  rule: string;
  result: boolean;
  /** The amount of this line was rounded to so many places, halves away from zero; null: exact or to the last place carried. */
  rounds: number | null;
}

export interface WorkingTree {
  figure: FigureId;
  title: string;
  /** "In EUR, without VAT". */
  basis: string;
  kits: number;
  lines: WorkingLine[];
  /** Rounding and rules, once each, in words. */
  notes: string[];
  /** Revision and price date of the plan, for the foot. */
  revision: string;
  pricedOn: string | null;
}
