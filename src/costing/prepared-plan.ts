import type {
  Plan,
  PlanBoardQuote,
  PlanEdition,
  PlanOffer,
  PlanPart,
  PlanSupplier,
} from "#src/shapes/plan.ts";
import type { MinorWorth } from "./conversion.ts";
import type { Ladder } from "./ladder.ts";
import type { Problem } from "./problem.ts";
import type { OfferStanding } from "./run-result.ts";
import type { SplitTable } from "./split-order.ts";
import type { WeighedOffer } from "./supplier-choice.ts";

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
  /** Per edition: what one sale keeps, in grains; null while not known. */
  keptPerSale: (bigint | null)[];
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
  /** Offers that may be used, in the order that settles ties. */
  usable: PreparedOffer[];
  /** All offers of the plan, in its order, with how they stand. */
  offers: { offer: PlanOffer; standing: OfferStanding; prepared: PreparedOffer | null }[];
  /** Largest number that may have to be bought up to `kitsMost`. */
  buyMost: number;
  bookMillionths: bigint | null;
  split: SplitTable | null;
  choice: ChoiceMemory;
}

/** What the last choice for a part tells about the next one; see `chooseOffer`. */
export interface ChoiceMemory {
  /** The last choice and the quantity it was made for. */
  best: WeighedOffer | null;
  quantity: number;
  /** By rank: the last quantity weighed, and what no quantity from there upward can be worth less than. */
  from: Float64Array;
  floor: Float64Array;
  /** The least floor among all but the winner, and the quantity from which they all hold. */
  rivalsFrom: number;
  rivalsFloor: number;
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

export interface PreparedQuote {
  quote: PlanBoardQuote;
  standing: OfferStanding;
  worth: MinorWorth | null;
  ladder: Ladder | null;
  engineering: number;
  stencil: number;
  /** Null: not known. */
  freight: number | null;
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

/** Editions in the plan's order. */
export type Editions = readonly PlanEdition[];
