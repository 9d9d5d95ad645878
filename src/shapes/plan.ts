import { z } from "zod";
import {
  Amount,
  ConversionRate,
  CurrencyCode,
  Day,
  Millimetres,
  Rate,
  RateBelowOne,
  Share,
  Side,
  SignedRateBelowOne,
} from "./decimal-text.ts";
import * as limits from "./limits.ts";

/**
 * Everything the reckoning needs for one kit, and nothing else: the input of the costing core, of
 * `POST /api/costing`, and the file a run page gives away. Amounts are decimal text; `null` means
 * "not known", which is never the same as zero. Section numbers are those of the method pages.
 */

const Id = z.string().min(1).max(64);
const Name = z.string().min(1).max(limits.NAME_LENGTH);
const Count = z.int().min(0).max(limits.QUANTITY_MOST);
const Minutes = Amount;

/** One rung of a price ladder. `price` is per piece for whole-order and by-slice, per lot for lots. */
export const PriceBreak = z.strictObject({ quantity: Count.min(1), price: Amount });
export type PriceBreak = z.infer<typeof PriceBreak>;

/** One supplier's price for one part (section 3). `breaks: []` is an offer whose price is not known yet. */
export const PlanOffer = z.strictObject({
  id: Id,
  supplier: Id,
  orderCode: z.string().max(limits.NAME_LENGTH),
  currency: CurrencyCode,
  priceModel: z.enum(limits.PRICE_MODELS),
  breaks: z.array(PriceBreak).max(limits.BREAKS_PER_OFFER_MOST),
  minimumOrder: Count.min(1),
  orderMultiple: Count.min(1),
  stockShown: Count.nullable(),
  leadTimeDays: z.int().min(0).max(3650).nullable(),
  pricedOn: Day.nullable(),
  validUntil: Day.nullable(),
});
export type PlanOffer = z.infer<typeof PlanOffer>;

export const PlanPart = z.strictObject({
  id: Id,
  name: Name,
  /** Reference designators and list line, for naming the part in workings; may be empty. */
  designators: z.string().max(limits.TEXT_LENGTH),
  quantities: z.array(z.strictObject({ edition: Id, perKit: Count.max(limits.QUANTITY_PER_KIT_MOST) })),
  spareRate: Rate,
  leastSpare: Count,
  /** What lies on the shelf and is not promised elsewhere; `bookCost` per piece in reporting currency. */
  freeStock: z.strictObject({ quantity: Count, bookCost: Amount.nullable() }),
  /** Share of the value of what is left over that keeps (section 8). */
  keepShare: Share,
  onlyFromStock: z.boolean(),
  pinnedOffer: Id.nullable(),
  offers: z.array(PlanOffer).max(limits.OFFERS_PER_PART_MOST),
});
export type PlanPart = z.infer<typeof PlanPart>;

/** A supplier's terms (section 4), in its own currency. */
export const PlanSupplier = z.strictObject({
  id: Id,
  name: Name,
  currency: CurrencyCode,
  freight: z.discriminatedUnion("model", [
    z.strictObject({ model: z.literal("none") }),
    z.strictObject({ model: z.literal("flat"), amount: Amount }),
    z.strictObject({ model: z.literal("not-known") }),
  ]),
  freeFreightFrom: Amount.nullable(),
  handlingFee: Amount,
  minimumOrderValue: Amount.nullable(),
  belowMinimum: z.discriminatedUnion("term", [
    z.strictObject({ term: z.literal("none") }),
    z.strictObject({ term: z.literal("fee"), fee: Amount }),
    z.strictObject({ term: z.literal("refused") }),
  ]),
  leadTimeDays: z.int().min(0).max(3650).nullable(),
});
export type PlanSupplier = z.infer<typeof PlanSupplier>;

const Size = z.strictObject({ width: Side, height: Side });

/** A board house's formula (section 6): once, a rate for the area of all it makes, and a sum for every board. */
export const PlanBoardFormula = z.strictObject({
  setUp: Amount,
  areaRate: Amount,
  areaUnit: z.enum(limits.AREA_UNITS),
  perBoard: Amount,
});
export type PlanBoardFormula = z.infer<typeof PlanBoardFormula>;

/**
 * A board house's quote (section 6) for single boards or for panels, its pieces. Quantities are pieces: lots may be
 * combined; breaks are for each piece at the break reached.
 */
export const PlanBoardQuote = z.strictObject({
  id: Id,
  boardHouse: Name,
  currency: CurrencyCode,
  /** `null`: boards come singly. */
  boardsPerPanel: z.int().min(2).max(limits.BOARDS_PER_PANEL_MOST).nullable(),
  /** Outer size of a piece in millimetres, as quoted; a formula needs it. */
  pieceSize: Size.nullable(),
  priceModel: z.enum(limits.BOARD_PRICE_MODELS),
  breaks: z.array(PriceBreak).max(limits.BREAKS_PER_OFFER_MOST),
  /** `null` unless the price model is a formula that is known. */
  formula: PlanBoardFormula.nullable(),
  /** For breaking a board out of its panel, for each board delivered. */
  depanelling: Amount,
  engineeringCharge: Amount,
  stencilCharge: Amount,
  freight: Amount.nullable(),
  leadTimeDays: z.int().min(0).max(3650).nullable(),
  pricedOn: Day.nullable(),
  validUntil: Day.nullable(),
});
export type PlanBoardQuote = z.infer<typeof PlanBoardQuote>;

/** What a board house makes panels like (section 6), in millimetres; all its quotes share it. */
export const PlanPanelTerms = z.strictObject({
  boardHouse: Name,
  /** Outer sizes, rails included, either way round; `least` null: none stated. */
  largest: Size,
  least: Size.nullable(),
  separation: z.enum(limits.SEPARATIONS),
  gap: Millimetres,
  rails: z.strictObject({ sides: z.enum(limits.RAIL_SIDES), width: Millimetres }),
});
export type PlanPanelTerms = z.infer<typeof PlanPanelTerms>;

export const PlanEdition = z.strictObject({
  id: Id,
  name: Name,
  /** Share of the run, as a weight; the run is split by largest remainder, ties to the earlier edition. */
  weight: z.int().min(0).max(1_000_000),
  boardsPerKit: z.int().min(0).max(100),
  /** What the buyer pays, tax included; `null` while not decided. */
  price: Amount.nullable(),
});
export type PlanEdition = z.infer<typeof PlanEdition>;

export const PlanTask = z.strictObject({
  id: Id,
  name: Name,
  /** `null`: every edition. */
  editions: z.array(Id).nullable(),
  minutesPerKit: Minutes,
  setUpMinutes: Minutes,
});
export type PlanTask = z.infer<typeof PlanTask>;

export const PlanCharge = z.strictObject({
  id: Id,
  name: Name,
  amount: Amount,
  /** Spread over so many kits in all, of which this run bears its share; `null`: this run bears it all. */
  spreadOver: Count.min(1).nullable(),
});
export type PlanCharge = z.infer<typeof PlanCharge>;

export const PlanPacking = z.strictObject({
  id: Id,
  name: Name,
  editions: z.array(Id).nullable(),
  costPerKit: Amount.nullable(),
});
export type PlanPacking = z.infer<typeof PlanPacking>;

/** Kits in one order, on average. */
const KitsPerOrder = Amount.regex(/^0*[1-9]/, "An order has at least one kit.");

/**
 * A way to sell: own site, marketplace, club table, a shop that buys to sell on (section 10). What is
 * `null` leaves what the channel brings not known.
 */
export const PlanChannel = z.strictObject({
  id: Id,
  name: Name,
  /** Share of the kits sold, as a weight. */
  weight: z.int().min(0).max(1_000_000),
  /** Editions sold here; `null`: every one. */
  editions: z.array(Id).max(limits.EDITIONS_MOST).nullable(),
  /** Off the list price, as a rate; negative where it is dearer here. */
  discount: SignedRateBelowOne,
  /** A price of its own here, which takes the place of the list price less discount; stated as its prices are. */
  ownPrices: z.array(z.strictObject({ edition: Id, price: Amount })).max(limits.EDITIONS_MOST),
  taxRate: Rate.nullable(),
  /** `inside`: the buyer pays the price as it stands; `on-top`: the price is stated without tax. */
  taxStated: z.enum(limits.TAX_STATED),
  feeRate: RateBelowOne.nullable(),
  feeFixed: Amount.nullable(),
  /** Whether the fee is also taken on the postage the buyer pays, and on the tax. */
  feeOnPostage: z.boolean(),
  feeOnTax: z.boolean(),
  /** Per order, stated as the price is: with its tax, or without. */
  postageCharged: Amount.nullable(),
  postagePaid: Amount.nullable(),
  /** Box, label, tape of one order. */
  packingCost: Amount.nullable(),
  /** What else selling costs: `amount` once for so many orders, such as the hire of a stall. */
  other: z.strictObject({
    name: z.string().max(limits.NAME_LENGTH),
    amount: Amount.nullable(),
    sharedOver: Count.min(1),
  }),
  /** Own time to sell and send one order, beyond making the kits. */
  minutesPerOrder: Minutes.nullable(),
  kitsPerOrder: KitsPerOrder,
});
export type PlanChannel = z.infer<typeof PlanChannel>;

export const Plan = z.strictObject({
  format: z.literal("tinpenny-plan/2"),
  kit: Name,
  /** Revision letter and the newest price date, for the foot of a working; may be empty. */
  revision: z.string().max(20),
  currency: CurrencyCode,
  rates: z
    .array(z.strictObject({ currency: CurrencyCode, perForeignUnit: ConversionRate, dated: Day }))
    .max(200),
  /** The day on which offers must be valid, so that the same plan always gives the same figures. */
  asOf: Day,
  run: z.strictObject({
    kits: z.int().min(limits.RUN_LEAST).max(limits.RUN_MOST),
    sweepTo: z.int().min(limits.RUN_LEAST).max(limits.RUN_MOST),
  }),
  editions: z.array(PlanEdition).min(1).max(limits.EDITIONS_MOST),
  /** Lines of the parts list, those that are not bought as well; 0: the list is not begun, and nothing is known. */
  lines: Count,
  parts: z.array(PlanPart).max(limits.PARTS_MOST),
  suppliers: z.array(PlanSupplier).max(limits.SUPPLIERS_MOST),
  shutOutSuppliers: z.array(Id).max(limits.SUPPLIERS_MOST),
  boards: z.strictObject({
    /** False for a kit without a board of its own. */
    needed: z.boolean(),
    /** The board's size in millimetres, as it lies on panels; `null`: not stated. */
    size: Size.extend({ shape: z.enum(limits.BOARD_SHAPES) }).nullable(),
    panelTerms: z.array(PlanPanelTerms).max(limits.BOARD_QUOTES_MOST),
    yield: Share,
    confidence: RateBelowOne,
    quotes: z.array(PlanBoardQuote).max(limits.BOARD_QUOTES_MOST),
    /** `null`: the cheapest at this run size. */
    chosenQuote: Id.nullable(),
  }),
  work: z.strictObject({
    /** `null`: not decided; "0" counts the hours at nothing. */
    ratePerHour: Amount.nullable(),
    /** Crawford's unit curve: time of a doubled unit as a share of the single's; "1" for no learning. */
    learningSlope: Share,
    kitsMadeBefore: Count,
    tasks: z.array(PlanTask).max(100),
  }),
  packing: z.array(PlanPacking).max(100),
  charges: z.array(PlanCharge).max(100),
  replacements: z.strictObject({ share: Share, costEach: Amount.nullable() }),
  channels: z.array(PlanChannel).min(1).max(limits.CHANNELS_MOST),
});
export type Plan = z.infer<typeof Plan>;
