import type { Figure } from "./figure.ts";
import type { Problem } from "./problem.ts";

/**
 * Everything about a run of one size: plain JSON. Amounts are exact decimal text; counts are whole
 * numbers. Unless a field says otherwise money is in the plan's currency (`RunResult.currency`).
 */
export interface RunResult {
  kit: string;
  revision: string;
  currency: string;
  asOf: string;
  kits: number;
  editions: EditionResult[];
  parts: PartLine[];
  /** One order to one supplier each, in the order of the plan's suppliers; only suppliers that are used. */
  baskets: Basket[];
  boards: BoardsResult;
  work: WorkResult;
  /** The heads of section 8, always all seven, in the order they are shown. */
  heads: Head[];
  /** Value of all that is left on the shelf, at the price paid for the goods. */
  leftOver: Figure;
  /** What of it keeps: Σ value × keep share. `used = spent − kept on the shelf + stock taken`. */
  keptOnShelf: Figure;
  /** Stock taken from the shelf at its book cost. */
  stockTaken: Figure;
  spent: Figure;
  used: Figure;
  perKit: { spent: Figure; used: Figure };
  /** What the whole run keeps after tax, fees and postage, if every kit sells (section 10). */
  kept: Figure;
  /** `kept` less the time to sell, at the plan's rate; and that over the kits: the mean over the mix. */
  brings: Figure;
  bringsPerKit: Figure;
  /** `brings − used`, and that over the kits. */
  profit: Figure;
  earnsPerKit: Figure;
  /** `(kept − all costs but own work) ÷ hours of making and selling` (section 7). */
  earnedPerHour: Figure;
  /**
   * A whole number of kits: the least sold, by the mix, with no loss on this run (section 11); not known
   * with `not-even` where even all of them do not pay.
   */
  evenAfter: Figure;
  /** Orders that come as a parcel: suppliers used, and one for the boards. */
  parcels: number;
  /** Everything missing or worth knowing, worst first; figures name their own needs as well. */
  problems: Problem[];
}

export interface EditionResult {
  id: string;
  name: string;
  kits: number;
  /** Cost of all kits of the edition; over all editions these add up to the run's exactly. */
  cost: { spent: Figure; used: Figure };
  perKit: { spent: Figure; used: Figure };
  /** List price, tax included. */
  price: string | null;
  /** One kit sold, over the channels by share (section 10); `brings` is less the time to sell it. */
  kept: Figure;
  brings: Figure;
}

export type PartState =
  /** Bought, or covered from the shelf. */
  | "settled"
  /** Nothing of it is needed in this run. */
  | "not-needed"
  /** No offer with a price that may be used. */
  | "unpriced"
  /** Offers together cannot cover what is to buy. */
  | "short"
  /** The only supplier refuses an order this small. */
  | "refused";

export interface PartLine {
  id: string;
  name: string;
  designators: string;
  state: PartState;
  need: number;
  spare: number;
  required: number;
  fromStock: number;
  toBuy: number;
  /** Usually one; several where no single offer covers what is to buy; none where nothing is bought. */
  orders: PartOrder[];
  /** Pieces ordered and, after the run, left on the shelf. */
  ordered: number;
  leftOver: number;
  /** Pieces that no offer covers. */
  shortBy: number;
  /** Extended prices, converted. */
  goods: Figure;
  /** Goods and their share of freight and fees (section 4.4). */
  landed: Figure;
  /** Value of what is left, and the part of it that keeps. */
  leftOverValue: Figure;
  keptOnShelf: Figure;
  stockTaken: Figure;
  /** Cost of the part in one kit, without freight: spent view and used view. */
  perKit: { spent: Figure; used: Figure };
  /** Every offer that may be used, as it would be ordered alone; best first. */
  considered: ConsideredOffer[];
}

/** An order as its supplier prices it. */
export interface PricedOrder {
  offer: string;
  supplier: string;
  orderCode: string;
  currency: string;
  quantity: number;
  /** The price break reached: its quantity and price as stated in the offer; null for lots. */
  breakReached: { quantity: number; price: string } | null;
  /** Lots taken, for offers sold in lots. */
  lots: { quantity: number; price: string; count: number }[];
  /** In the offer's currency, rounded to its minor unit. */
  extended: string;
  /** Converted, exact. */
  extendedConverted: string;
  /** Why more is ordered than is to buy, because the next break is cheaper; null where it is not so. */
  boughtUp: BoughtUp | null;
}

export interface PartOrder extends PricedOrder {
  landed: Figure;
  pinned: boolean;
}

/** "100 cost 1.90 less than 84; 16 stay on the shelf". Amounts in the offer's currency. */
export interface BoughtUp {
  insteadOf: number;
  insteadOfCosts: string;
  saves: string;
  leftOver: number;
}

/** An offer weighed for what is to buy. `null` amounts: it cannot cover the quantity, or has no rate. */
export interface ConsideredOffer {
  offer: string;
  supplier: string;
  chosen: boolean;
  pinned: boolean;
  quantity: number | null;
  currency: string;
  extended: string | null;
  /** Extended price and the supplier's freight as though the part came alone, converted. */
  aloneLanded: string | null;
  leftOver: number | null;
  shortBy: number;
  standing: OfferStanding;
}

export type OfferStanding =
  | "usable"
  | "short"
  | "expired"
  | "no-price"
  | "no-rate"
  | "other-currency"
  | "stock-not-known"
  | "impossible-ladder"
  | "no-supplier"
  | "shut-out"
  | "minimum-not-reached"
  | "amount-too-large";

/** A formula has no price without the size of what it prices. */
export type QuoteStanding = OfferStanding | "no-size";

export interface Basket {
  supplier: string;
  name: string;
  currency: string;
  lines: { part: string; offer: string; quantity: number; extended: string; landed: Figure }[];
  /** The next four in the supplier's currency. `freight` is not known where the terms do not say it. */
  goods: string;
  smallOrderFee: string;
  freight: Figure;
  handling: string;
  total: Figure;
  /** Converted to the plan's currency, exact. */
  converted: { goods: Figure; charges: Figure; total: Figure };
  rate: { perForeignUnit: string; dated: string } | null;
  freeFreightReached: boolean;
  /** How much goods would have to rise for free freight; null where none is offered or it is reached. */
  toFreeFreight: string | null;
}

export interface BoardsResult {
  needed: boolean;
  /** Boards in the kits of the run. */
  required: number;
  /** Boards to order so that enough are good (section 6); null where the yield makes that impossible. */
  toOrder: number | null;
  yield: string;
  confidence: string;
  chosen: string | null;
  quotes: QuoteResult[];
  /** The chosen quote's, converted. */
  landed: Figure;
  perGoodBoard: Figure;
}

export interface QuoteResult {
  id: string;
  boardHouse: string;
  currency: string;
  chosen: boolean;
  standing: QuoteStanding;
  /** Boards to a piece: 1, or those of a panel. */
  boardsPerPiece: number;
  /** Single boards or panels ordered, and the boards in them. */
  pieces: number | null;
  ordered: number | null;
  /** Quantities of the next two are pieces; prices as stated, without depanelling. */
  lots: { quantity: number; price: string; count: number }[];
  breakReached: { quantity: number; price: string } | null;
  /** `ordered × yield`, exact; and boards ordered beyond those required. */
  goodExpected: string | null;
  extra: number | null;
  /** In the quote's currency; boards with their depanelling. */
  boards: string | null;
  engineering: string;
  stencil: string;
  freight: string | null;
  total: Figure;
  /** Converted. */
  landed: Figure;
  /** Landed cost over the boards required: what one board in a kit costs. */
  perBoard: Figure;
  leadTimeDays: number | null;
  /** In boards. */
  boughtUp: BoughtUp | null;
}

export interface WorkResult {
  tasks: TaskResult[];
  /** Exact minutes of the run, and hours (a quotient: minutes ÷ 60). */
  minutes: string;
  hours: string;
  /** Own time to sell every kit of the run, in no other figure of the work. */
  sellingMinutes: Figure;
  ratePerHour: string | null;
  cost: Figure;
}

export interface TaskResult {
  id: string;
  name: string;
  kits: number;
  /** Sum of the learning factors of those kits: their number where there is no learning. */
  factorSum: string;
  minutesMaking: string;
  minutesSettingUp: string;
  minutes: string;
  cost: Figure;
}

export const HEADS = ["boards", "parts", "freight", "packing", "work", "one-off", "replacements"] as const;
export type HeadId = (typeof HEADS)[number];

/** A head of the run's cost. `spent` and `used` differ under parts only. */
export interface Head {
  id: HeadId;
  spent: Figure;
  used: Figure;
  perKit: { spent: Figure; used: Figure };
  /** Share of the run's used cost, a quotient of 0 to 1; not known while the run's cost is not. */
  share: Figure;
  lines: { id: string; name: string; amount: Figure }[];
}
