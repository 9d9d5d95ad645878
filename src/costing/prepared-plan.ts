import type {
  Plan,
  PlanBoardQuote,
  PlanCharge,
  PlanEdition,
  PlanOffer,
  PlanPacking,
  PlanPart,
  PlanSupplier,
} from "#src/shapes/plan.ts";
import type { ChoiceMemory } from "./choice-memory.ts";
import type { MinorWorth } from "./conversion.ts";
import type { Ladder, Price } from "./ladder.ts";
import type { PreparedPieces } from "./panels/prepare-pieces.ts";
import type { SoldKit } from "./price/sold-kit.ts";
import type { Takings } from "./price/takings.ts";
import type { Problem } from "./problem.ts";
import type { OfferStanding, QuoteStanding } from "./run-result.ts";
import type { SplitTable } from "./split-order.ts";

/** A plan with every text read once, so that a thousand run sizes can be reckoned from it. */
export interface PreparedPlan {
  plan: Plan;
  /** Run sizes up to this may be asked. */
  kitsMost: number;
  /** Suppliers in the order that settles ties: by name, then id. */
  suppliers: PreparedSupplier[];
  parts: PreparedPart[];
  quotes: PreparedQuote[];
  tasks: PreparedTask[];
  packing: PreparedPacking[];
  charges: PreparedCharge[];
  /** Own work in 10^-6 of the plan's currency an hour; null: not decided. */
  hourRate: bigint | null;
  replacements: PreparedReplacements;
  /** Per edition: one kit sold over its channels, with what it needs; and ready to be added up. */
  sold: SoldKit[];
  takings: { kept: Takings; brings: Takings; minutes: Takings };
  weights: number[];
  boardsPerKit: number[];
  /** Values of what is left over are summed in these, one for each currency and keep share. */
  buckets: { worth: MinorWorth; keepMillionths: bigint }[];
  /** Cautions and needs that do not depend on the size of the run. */
  problems: Problem[];
}

export interface PreparedSupplier {
  id: string;
  index: number;
  terms: PlanSupplier;
  /** Null: its currency has no rate. */
  worth: MinorWorth | null;
  /** Minor units of its currency; `freight` null: not known. */
  freight: number | null;
  freeFrom: number;
  handling: number;
  minimum: number;
  fee: number;
  refusesSmall: boolean;
  shutOut: boolean;
}

export interface PreparedPart {
  part: PlanPart;
  /** Pieces per kit, by index of edition. */
  perKit: number[];
  spareWhole: number;
  spareMillionths: number;
  leastSpare: number;
  /** Pieces of free stock. */
  stock: number;
  /** Offers that may be used, in the order that settles ties. */
  usable: PreparedOffer[];
  /** All offers of the plan, in its order, with how they stand. */
  offers: { offer: PlanOffer; standing: OfferStanding; prepared: PreparedOffer | null }[];
  /** Largest number that may have to be bought up to `kitsMost`. */
  buyMost: number;
  /** Book cost of a piece of its free stock; null: not known. */
  book: Price | null;
  split: SplitTable | null;
  choice: ChoiceMemory;
}

export interface PreparedOffer {
  offer: PlanOffer;
  supplier: PreparedSupplier;
  worth: MinorWorth;
  ladder: Ladder;
  /** Index into `PreparedPlan.buckets`. */
  bucket: number;
  /** Place among the part's usable offers: the earlier wins a tie. */
  rank: number;
}

/** A board house's quote: its pieces priced, as the plan states it, and whether it may be used. */
export interface PreparedQuote extends PreparedPieces {
  stated: PlanBoardQuote;
  standing: QuoteStanding;
}

export interface PreparedTask {
  id: string;
  name: string;
  /** By index of edition: whether its kits need this task. */
  applies: boolean[];
  minutesPerKit: bigint;
  setUpMinutes: bigint;
  factorSums: bigint[];
}

export interface PreparedPacking {
  item: PlanPacking;
  /** By index of edition: whether its kits have this item. */
  applies: boolean[];
  /** In grains; null: not known. */
  costPerKit: bigint | null;
}

export interface PreparedCharge {
  charge: PlanCharge;
  /** In grains. */
  amount: bigint;
}

export interface PreparedReplacements {
  shareMillionths: bigint;
  /** In grains; null: not known. */
  costEach: bigint | null;
}

/** Editions in the plan's order. */
export type Editions = readonly PlanEdition[];
