import type { Need } from "./problem.ts";

/**
 * Run sizes 1 … `to`, column by column: `columns.used[n - 1]` belongs to a run of n. `null` where the
 * figure is not known at that size; `needs` says why. Decimal text in the plan's currency, exact.
 * Step-downs and sweet spots are those of `without` where something is missing.
 */
export interface SweepResult {
  currency: string;
  to: number;
  columns: SweepColumns;
  /** The same columns leaving out what is missing; null when nothing is. Show it with its label only. */
  without: SweepColumns | null;
  needs: Need[];
  stepDowns: StepDown[];
  sweetSpots: SweetSpot[];
  breakEven: BreakEven;
}

export interface SweepColumns {
  spent: (string | null)[];
  used: (string | null)[];
  perKitSpent: (string | null)[];
  perKitUsed: (string | null)[];
  /** What a run of n brings if all sell: kept after tax, fees and postage, less the time to sell. */
  brings: (string | null)[];
  profit: (string | null)[];
  leftOver: (string | null)[];
  /** Cost of one kit more, `C(n + 1) − C(n)`, in both views. */
  nextKitSpent: (string | null)[];
  nextKitUsed: (string | null)[];
  parcels: number[];
  /** A run of n is made: the least number sold with no loss; null where even all n do not pay for it. */
  soldToPay: (number | null)[];
}

/** What is different between a run of n − 1 and a run of n. */
export type Change =
  | { what: "break"; part: string; offer: string; from: number; to: number }
  | { what: "offer"; part: string; from: string | null; to: string | null }
  /** One pack more or fewer of a part sold in multiples or lots: pieces ordered before and after. */
  | { what: "pack"; part: string; offer: string; from: number; to: number }
  | { what: "lots"; part: string; offer: string; from: number; to: number }
  | { what: "split"; part: string }
  | { what: "parcel-more"; supplier: string }
  | { what: "parcel-less"; supplier: string }
  | { what: "free-freight"; supplier: string; reached: boolean }
  | { what: "minimum-order"; supplier: string; reached: boolean }
  | { what: "board-break"; quote: string; from: number; to: number }
  | { what: "board-lots"; quote: string; from: number; to: number }
  | { what: "board-quote"; from: string | null; to: string | null };

/** Used cost per kit falls by at least 0.5 % from n − 1 to n, and something changed (section 9). */
export interface StepDown {
  kits: number;
  perKit: string;
  fellBy: string;
  changes: Change[];
}

/** A record low of used cost per kit that no run up to a tenth larger beats (section 9). */
export interface SweetSpot {
  kits: number;
  perKit: string;
  nextKit: string;
  /** What the next kit sets off. */
  changes: Change[];
}

/** Profit passes zero between n − 1 and n (section 11). */
export interface Crossing {
  kits: number;
  /** `up`: from loss to no loss. */
  way: "up" | "down";
  profitBefore: string;
  profit: string;
  changes: Change[];
}

export interface BreakEven {
  /** False while profit is not known even for a run of one; nothing below then holds. */
  known: boolean;
  crossings: Crossing[];
  /** First run with no loss, and the run from which no larger one up to `upTo` loses; null: none. */
  first: number | null;
  safe: number | null;
  /** The end of the sweep, or the last size before profit is not known. */
  upTo: number;
  /** Margin of safety of the planned run against `safe`, `(planned − safe) ÷ planned`; null without one. */
  marginOfSafety: string | null;
}
