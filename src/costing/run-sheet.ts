import type { PieceOrder } from "./panels/order-pieces.ts";
import type { PreparedOffer, PreparedPlan, PreparedQuote } from "./prepared-plan.ts";
import type { SplitPart } from "./split-order.ts";
import { emptySum, type WholeSum } from "./whole-sum.ts";

/** States of a part in a run, as small numbers; `PART_STATES` names them. */
export const NOT_NEEDED = 0;
export const SETTLED = 1;
export const UNPRICED = 2;
export const SHORT = 3;
export const REFUSED = 4;
export const TOO_LARGE = 5;

/** What is missing in a run, as bits; a figure is known when none of the bits it depends on is set. */
export const MISSING = {
  mix: 1,
  goods: 2,
  freight: 4,
  boards: 8,
  boardFreight: 16,
  packing: 32,
  rate: 64,
  replacement: 128,
  stock: 256,
  sale: 512,
  parts: 1024,
} as const;

export const SPENT_NEEDS =
  MISSING.parts |
  MISSING.mix |
  MISSING.goods |
  MISSING.freight |
  MISSING.boards |
  MISSING.boardFreight |
  MISSING.packing |
  MISSING.rate |
  MISSING.replacement;
export const USED_NEEDS = SPENT_NEEDS | MISSING.stock;
export const BRINGS_NEEDS = MISSING.mix | MISSING.sale;

/** The boards of a run: what is ordered of the chosen quote. */
export interface BoardChoice {
  quote: PreparedQuote;
  order: PieceOrder;
  /** Boards, engineering and stencil, in minor units of the quote's currency. */
  charged: number;
}

/**
 * One run reckoned: the working sheet that `reckonRun` fills and everything else reads. It is made
 * once and filled anew for each run size, which is what makes a sweep fast. Money by head is in
 * grains of the plan's currency and leaves out what `missing` says is missing.
 */
export interface RunSheet {
  kits: number;
  kitsOf: number[];
  need: Float64Array;
  required: Float64Array;
  fromStock: Float64Array;
  toBuy: Float64Array;
  state: Uint8Array;
  /** The single order of each part; quantity 0 where there is none, or a split. */
  chosen: (PreparedOffer | null)[];
  quantity: Float64Array;
  cost: Float64Array;
  tier: Int32Array;
  splits: Map<number, SplitPart[]>;
  /** By index of supplier, in minor units of its currency; orders counts lines. */
  goods: Float64Array;
  orders: Int32Array;
  /** Suppliers that turned the basket down, with the goods it held. */
  barred: Map<number, number>;
  boardsRequired: number;
  boardsToOrder: number | null;
  boards: BoardChoice | null;
  parcels: number;
  missing: number;
  money: RunMoney;
  /** Sums behind `money`, kept here so that nothing is made anew for each size. */
  left: WholeSum[];
  stock: WholeSum;
  leftQuotients: bigint;
  keptQuotients: bigint;
}

export interface RunMoney {
  boards: bigint;
  parts: bigint;
  freight: bigint;
  packing: bigint;
  work: bigint;
  oneOff: bigint;
  replacements: bigint;
  /** Value of what is left over, what of it keeps, and stock taken at book cost. */
  leftOver: bigint;
  keptOnShelf: bigint;
  stockTaken: bigint;
  spent: bigint;
  used: bigint;
  brings: bigint;
  minutes: bigint;
}

/** An empty sheet with room for the parts and suppliers of a plan. */
export function createSheet(prepared: PreparedPlan): RunSheet {
  const parts = prepared.parts.length;
  return {
    kits: 0,
    kitsOf: [],
    need: new Float64Array(parts),
    required: new Float64Array(parts),
    fromStock: new Float64Array(parts),
    toBuy: new Float64Array(parts),
    state: new Uint8Array(parts),
    chosen: new Array(parts).fill(null),
    quantity: new Float64Array(parts),
    cost: new Float64Array(parts),
    tier: new Int32Array(parts),
    splits: new Map(),
    goods: new Float64Array(prepared.suppliers.length),
    orders: new Int32Array(prepared.suppliers.length),
    barred: new Map(),
    boardsRequired: 0,
    boardsToOrder: 0,
    boards: null,
    parcels: 0,
    missing: 0,
    money: emptyMoney(),
    left: prepared.buckets.map(emptySum),
    stock: emptySum(),
    leftQuotients: 0n,
    keptQuotients: 0n,
  };
}

function emptyMoney(): RunMoney {
  return {
    boards: 0n,
    parts: 0n,
    freight: 0n,
    packing: 0n,
    work: 0n,
    oneOff: 0n,
    replacements: 0n,
    leftOver: 0n,
    keptOnShelf: 0n,
    stockTaken: 0n,
    spent: 0n,
    used: 0n,
    brings: 0n,
    minutes: 0n,
  };
}
