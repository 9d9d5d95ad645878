/**
 * A way to sell: own site, marketplace, club table, a shop that buys to sell on (section 10). Plain JSON;
 * amounts are decimal text in the plan's currency, rates as decimals ("0.029" is 2.9 %); `null` is "not
 * known", which is never the same as zero.
 */
export interface Channel {
  id: string;
  name: string;
  /** Share of the kits sold, as a weight: a whole number up to 1 000 000. */
  weight: number;
  /** Editions sold here; null: every one. */
  editions: string[] | null;
  /** Off the list price, as a rate; negative where it is dearer here. Below 1. */
  discount: string;
  /** A price of its own here, which takes the place of the list price less discount. */
  ownPrices: OwnPrice[];
  taxRate: string | null;
  /** `inside`: the buyer pays the price as it stands; `on-top`: the price is stated without tax. */
  taxStated: "inside" | "on-top";
  /** Below 1. */
  feeRate: string | null;
  feeFixed: string | null;
  /** Whether the fee is also taken on the postage the buyer pays. */
  feeOnPostage: boolean;
  /** Whether the fee is also taken on the tax the buyer pays. */
  feeOnTax: boolean;
  /** Per order, stated as the price is: with its tax, or without. */
  postageCharged: string | null;
  postagePaid: string | null;
  /** Box, label, tape of one order. */
  packingCost: string | null;
  /** What else selling costs: `amount` once for so many orders, such as the hire of a stall. */
  other: { name: string; amount: string | null; sharedOver: number };
  /** Own time to sell and send one order, beyond making the kits. */
  minutesPerOrder: string | null;
  /** Kits in one order, on average: 1 or more, up to 6 decimals. */
  kitsPerOrder: string;
}

/** What a channel asks for an edition, whatever the list says; stated as its prices are. */
export interface OwnPrice {
  edition: string;
  price: string;
}
