import type { Plan, PlanPart } from "#src/shapes/plan.ts";
import { byNameAndId } from "./by-name.ts";
import { emptyMemory } from "./choice-memory.ts";
import { type MinorWorth, minorWorth } from "./conversion.ts";
import { currencyDecimals } from "./currencies.ts";
import { grains, scaled } from "./grains.ts";
import { priceOf } from "./ladder.ts";
import { factorSums } from "./learning.ts";
import { minorReaching, toMinor } from "./money.ts";
import { spareOf } from "./need.ts";
import { prepareOffers } from "./prepare-offers.ts";
import { prepareQuote } from "./prepare-quote.ts";
import type { PreparedPart, PreparedPlan, PreparedSupplier, PreparedTask } from "./prepared-plan.ts";
import { kitsSold } from "./price/run-sold.ts";
import { saleContext } from "./price/sale-context.ts";
import type { SoldKit } from "./price/sold-kit.ts";
import { takingsOf } from "./price/takings.ts";
import type { Problem } from "./problem.ts";

/** Where worths and buckets of a plan are looked up while it is prepared. */
export interface Preparing {
  plan: Plan;
  kitsMost: number;
  worthOf: (currency: string) => MinorWorth | null;
  bucketOf: (worth: MinorWorth, keepShare: string) => number;
  suppliers: Map<string, PreparedSupplier>;
  problems: Problem[];
}

/**
 * Reads a plan once for run sizes up to `kitsMost`. Nothing is decided here that depends on the size
 * of the run; offers that may never be used are set aside with the reason.
 */
export function preparePlan(plan: Plan, kitsMost: number): PreparedPlan {
  const worths = new Map<string, MinorWorth | null>();
  const buckets: PreparedPlan["buckets"] = [];
  const problems: Problem[] = unlistedCurrencies(plan);
  const worthOf = (currency: string) => {
    const known = worths.get(currency);
    if (known !== undefined) return known;
    const worth = minorWorth(plan, currency);
    worths.set(currency, worth);
    return worth;
  };
  const places = new Map<string, number>();
  const bucketOf = (worth: MinorWorth, keepShare: string) => {
    const key = `${worth.currency} ${keepShare}`;
    const known = places.get(key);
    if (known !== undefined) return known;
    places.set(key, buckets.length);
    return buckets.push({ worth, keepMillionths: scaled(keepShare, 6) }) - 1;
  };
  const suppliers = plan.suppliers
    .toSorted(byNameAndId)
    .map((terms, index) => prepareSupplier(plan, terms, index, worthOf));
  const preparing: Preparing = {
    plan,
    kitsMost,
    worthOf,
    bucketOf,
    suppliers: new Map(suppliers.map((supplier) => [supplier.id, supplier])),
    problems,
  };
  return {
    plan,
    kitsMost,
    suppliers,
    parts: plan.parts.map((part) => preparePart(part, preparing)),
    quotes: plan.boards.quotes.map((quote) => prepareQuote(quote, preparing)),
    tasks: prepareTasks(plan, kitsMost),
    ...prepareKitCosts(plan),
    ...prepareTakings(plan),
    weights: plan.editions.map(({ weight }) => weight),
    boardsPerKit: plan.editions.map(({ boardsPerKit }) => boardsPerKit),
    buckets,
    problems,
  };
}

function prepareSupplier(
  plan: Plan,
  terms: Plan["suppliers"][number],
  index: number,
  worthOf: Preparing["worthOf"],
): PreparedSupplier {
  const minor = (amount: string) => Number(toMinor(amount, terms.currency));
  const reaching = (threshold: string) => Number(minorReaching(threshold, terms.currency));
  const { freight, belowMinimum } = terms;
  return {
    id: terms.id,
    index,
    terms,
    worth: worthOf(terms.currency),
    freight: freight.model === "not-known" ? null : freight.model === "none" ? 0 : minor(freight.amount),
    freeFrom: terms.freeFreightFrom === null ? Number.POSITIVE_INFINITY : reaching(terms.freeFreightFrom),
    handling: minor(terms.handlingFee),
    minimum: terms.minimumOrderValue === null ? 0 : reaching(terms.minimumOrderValue),
    fee: belowMinimum.term === "fee" ? minor(belowMinimum.fee) : 0,
    refusesSmall: belowMinimum.term === "refused",
    shutOut: plan.shutOutSuppliers.includes(terms.id),
  };
}

function preparePart(part: PlanPart, preparing: Preparing): PreparedPart {
  const { editions } = preparing.plan;
  const perKit = editions.map(({ id }) =>
    part.quantities.reduce((sum, { edition, perKit: pieces }) => sum + (edition === id ? pieces : 0), 0),
  );
  const rate = Number(scaled(part.spareRate, 6));
  const spare = {
    spareWhole: Math.trunc(rate / 1_000_000),
    spareMillionths: rate % 1_000_000,
    leastSpare: part.leastSpare,
  };
  const needMost = preparing.kitsMost * Math.max(0, ...perKit);
  const buyMost = needMost === 0 ? 0 : needMost + spareOf(needMost, spare);
  const { quantity: stock, bookCost } = part.freeStock;
  const { offers, usable } = prepareOffers(part, buyMost, preparing);
  return {
    part,
    perKit,
    ...spare,
    stock,
    usable,
    offers,
    buyMost,
    book: bookCost === null ? null : priceOf(bookCost),
    split: null,
    choice: emptyMemory(usable.length),
  };
}

function prepareTasks(plan: Plan, kitsMost: number): PreparedTask[] {
  const { work } = plan;
  const sums = work.tasks.length === 0 ? [] : factorSums(work.learningSlope, work.kitsMadeBefore, kitsMost);
  return work.tasks.map((task) => ({
    id: task.id,
    name: task.name,
    applies: appliesTo(plan, task.editions),
    minutesPerKit: grains(task.minutesPerKit),
    setUpMinutes: grains(task.setUpMinutes),
    factorSums: sums,
  }));
}

function prepareKitCosts(plan: Plan) {
  const { work, replacements } = plan;
  const grainsOf = (amount: string | null) => (amount === null ? null : grains(amount));
  return {
    packing: plan.packing.map((item) => ({
      item,
      applies: appliesTo(plan, item.editions),
      costPerKit: grainsOf(item.costPerKit),
    })),
    charges: plan.charges.map((charge) => ({ charge, amount: grains(charge.amount) })),
    hourRate: work.ratePerHour === null ? null : scaled(work.ratePerHour, 6),
    replacements: {
      shareMillionths: scaled(replacements.share, 6),
      costEach: grainsOf(replacements.costEach),
    },
  };
}

/** What one kit of each edition keeps, brings and takes to sell, over the channels. */
function prepareTakings(plan: Plan) {
  const sold = kitsSold(saleContext(plan));
  const of = (figure: "kept" | "brings" | "minutes") =>
    takingsOf(sold.map((kit: SoldKit) => (kit.needs[figure].length > 0 ? null : kit[figure])));
  return { sold, takings: { kept: of("kept"), brings: of("brings"), minutes: of("minutes") } };
}

/** By index of edition: whether it is among `editions`; null: all are. */
function appliesTo(plan: Plan, editions: readonly string[] | null): boolean[] {
  return plan.editions.map(({ id }) => editions === null || editions.includes(id));
}

function unlistedCurrencies(plan: Plan): Problem[] {
  const used = [plan, ...plan.suppliers, ...plan.boards.quotes].map(({ currency }) => currency);
  return [...new Set(used)]
    .filter((currency) => currencyDecimals(currency) === null)
    .map((currency) => ({ code: "currency-not-listed", at: { currency }, facts: {} }));
}
