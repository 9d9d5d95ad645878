import { z } from "zod";
import { CurrencyCode, Day } from "./decimal-text.ts";

/**
 * What `POST /api/costing` answers, for the description of the API. Amounts are exact decimal text that may be
 * negative; codes are open lists. A later version may add fields, never take one away.
 */

const Exact = z
  .string()
  .regex(/^-?\d+(\.\d+)?$/)
  .describe("Exact decimal text, not rounded.");
const Id = z.string();
const Count = z.int();
const AnyOf = z.string().describe("A code; new ones may come.");

const named = Id.optional();
/** What something is about: ids of the plan that was sent. */
const Place = z.object({
  part: named,
  offer: named,
  supplier: named,
  quote: named,
  edition: named,
  packing: named,
  channel: named,
  currency: named,
});

/** Why a figure is not known: the code, what it is about, and the page of the kit that settles it. */
const Need = z.object({
  code: AnyOf,
  at: z.array(Place),
  page: z.string(),
});

/** Known exactly, or not known with every reason; `without` leaves out what is missing. */
export const FigureReply = z.union([
  z.object({ known: z.literal(true), value: Exact }),
  z.object({ known: z.literal(false), needs: z.array(Need), without: Exact.nullable() }),
]);

const BothViews = z
  .object({ spent: FigureReply, used: FigureReply })
  .describe("What is paid for the run, and what of it the kits use up.");

const Lot = z.object({ quantity: Count, price: Exact, count: Count });
const Break = z.object({ quantity: Count, price: Exact });

const Edition = z.object({
  id: Id,
  name: z.string(),
  kits: Count,
  cost: BothViews,
  perKit: BothViews,
  price: Exact.nullable().describe("List price, tax included."),
  kept: FigureReply,
  brings: FigureReply,
});

const Order = z.object({
  offer: Id,
  supplier: Id,
  orderCode: z.string(),
  currency: CurrencyCode,
  quantity: Count,
  breakReached: Break.nullable(),
  lots: z.array(Lot),
  extended: Exact.describe("In the offer's currency, rounded to its minor unit."),
  landed: FigureReply,
  pinned: z.boolean(),
});

const Part = z.object({
  id: Id,
  name: z.string(),
  designators: z.string(),
  state: AnyOf,
  need: Count,
  spare: Count,
  required: Count,
  fromStock: Count,
  toBuy: Count,
  orders: z.array(Order),
  ordered: Count,
  leftOver: Count,
  shortBy: Count,
  goods: FigureReply,
  landed: FigureReply,
  perKit: BothViews,
});

const Basket = z.object({
  supplier: Id,
  name: z.string(),
  currency: CurrencyCode,
  lines: z.array(z.object({ part: Id, offer: Id, quantity: Count, extended: Exact, landed: FigureReply })),
  goods: Exact.describe("In the supplier's currency, as are the next four."),
  smallOrderFee: Exact,
  freight: FigureReply,
  handling: Exact,
  total: FigureReply,
  converted: z.object({ goods: FigureReply, charges: FigureReply, total: FigureReply }),
});

const Boards = z.object({
  needed: z.boolean(),
  required: Count,
  toOrder: Count.nullable(),
  chosen: Id.nullable(),
  landed: FigureReply,
  perGoodBoard: FigureReply,
});

const Work = z.object({
  minutes: Exact,
  hours: Exact,
  sellingMinutes: FigureReply,
  ratePerHour: Exact.nullable(),
  cost: FigureReply,
});

const Head = z.object({
  id: AnyOf,
  ...BothViews.shape,
  perKit: BothViews,
  share: FigureReply,
  lines: z.array(z.object({ id: Id, name: z.string(), amount: FigureReply })),
});

const Run = z.object({
  kit: z.string(),
  revision: z.string(),
  currency: CurrencyCode,
  asOf: Day,
  kits: Count,
  editions: z.array(Edition),
  parts: z.array(Part),
  baskets: z.array(Basket),
  boards: Boards,
  work: Work,
  heads: z.array(Head),
  leftOver: FigureReply,
  ...BothViews.shape,
  perKit: BothViews,
  kept: FigureReply.describe("After tax, fees and postage."),
  brings: FigureReply.describe("The same less the time to sell."),
  bringsPerKit: FigureReply,
  profit: FigureReply,
  earnsPerKit: FigureReply,
  earnedPerHour: FigureReply,
  evenAfter: FigureReply.describe("A whole number of kits: the least sold with no loss on this run."),
  parcels: Count,
  problems: z.array(z.object({ code: AnyOf, at: Place })),
});

const Column = z.array(Exact.nullable()).describe("The entry at n − 1 belongs to a run of n.");

const Sweep = z.object({
  currency: CurrencyCode,
  to: Count,
  columns: z.object({
    spent: Column,
    used: Column,
    perKitSpent: Column,
    perKitUsed: Column,
    brings: Column.describe("Kept after tax, fees and postage, less the time to sell."),
    profit: Column,
    leftOver: Column,
    nextKitSpent: Column,
    nextKitUsed: Column,
    parcels: z.array(Count),
    soldToPay: z.array(Count.nullable()),
  }),
  needs: z.array(Need),
  sweetSpots: z.array(z.object({ kits: Count, perKit: Exact, nextKit: Exact })),
  breakEven: z.object({ known: z.boolean(), first: Count.nullable(), safe: Count.nullable(), upTo: Count }),
});

const WorkingAmount = z.object({
  kind: AnyOf,
  value: z.string().optional(),
  currency: CurrencyCode.optional(),
  unit: z.string().optional(),
  needs: z.array(Need).optional(),
});

const WorkingLine = z.object({
  letter: z.string().nullable(),
  label: z.string(),
  sign: z.enum(["+", "−", "×", "÷", "="]).nullable(),
  amount: WorkingAmount.nullable(),
  subs: z.array(z.object({ label: z.string(), amount: WorkingAmount, opens: z.string().nullable() })),
  opens: z.string().nullable().describe("The figure whose working this amount is the result of."),
  rule: z.string(),
  result: z.boolean(),
  rounds: Count.nullable(),
});

/** Reads downward: a line without sign begins a sum, the others carry it on, `=` closes it. */
const Working = z.object({
  figure: z.string(),
  title: z.string(),
  basis: z.string(),
  kits: Count,
  lines: z.array(WorkingLine),
  notes: z.array(z.string()),
  revision: z.string(),
  pricedOn: Day.nullable(),
});

export const ReckoningReply = z.object({
  run: Run,
  sweep: Sweep.nullable().describe("Every run size, where it was asked for."),
  workings: z.array(Working),
});
export type ReckoningReply = z.infer<typeof ReckoningReply>;
