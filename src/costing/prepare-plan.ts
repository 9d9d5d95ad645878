import type { Plan, PlanPart } from "#src/shapes/plan.ts";
import { byNameAndId } from "./by-name.ts";
import { type MinorWorth, minorWorth } from "./conversion.ts";
import { currencyDecimals } from "./currencies.ts";
import { grains, scaled } from "./grains.ts";
import { saleOf } from "./kept-per-sale.ts";
import { factorSums } from "./learning.ts";
import { minorReaching, toMinor } from "./money.ts";
import { spareOf } from "./need.ts";
import { prepareOffers } from "./prepare-offers.ts";
import { prepareQuote } from "./prepare-quote.ts";
import type {
  ChoiceMemory,
  PreparedPart,
  PreparedPlan,
  PreparedSupplier,
  PreparedTask,
} from "./prepared-plan.ts";
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
    keptPerSale: plan.editions.map((edition) => saleOf(plan, edition).kept),
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
  const spare = { spareWhole: Math.trunc(rate / 1_000_000), spareMillionths: rate % 1_000_000 };
  const needMost = preparing.kitsMost * Math.max(0, ...perKit);
  const buyMost = needMost === 0 ? 0 : needMost + spareOf(needMost, spare, part.leastSpare);
  const { bookCost } = part.freeStock;
  const { offers, usable } = prepareOffers(part, buyMost, preparing);
  const book = bookCost === null ? null : scaled(bookCost, 6);
  return {
    part,
    perKit,
    ...spare,
    usable,
    offers,
    buyMost,
    bookMillionths: book,
    split: null,
    choice: emptyMemory(usable.length),
  };
}

function emptyMemory(offers: number): ChoiceMemory {
  const never = Number.POSITIVE_INFINITY;
  const from = new Float64Array(offers).fill(never);
  return {
    best: null,
    quantity: 0,
    from,
    floor: new Float64Array(offers),
    rivalsFrom: never,
    rivalsFloor: 0,
  };
}

function prepareTasks(plan: Plan, kitsMost: number): PreparedTask[] {
  const { work, editions } = plan;
  const sums = work.tasks.length === 0 ? [] : factorSums(work.learningSlope, work.kitsMadeBefore, kitsMost);
  return work.tasks.map((task) => ({
    id: task.id,
    name: task.name,
    applies: editions.map(({ id }) => task.editions === null || task.editions.includes(id)),
    minutesPerKit: grains(task.minutesPerKit),
    setUpMinutes: grains(task.setUpMinutes),
    factorSums: sums,
  }));
}

function unlistedCurrencies(plan: Plan): Problem[] {
  const used = [plan, ...plan.suppliers, ...plan.boards.quotes].map(({ currency }) => currency);
  return [...new Set(used)]
    .filter((currency) => currencyDecimals(currency) === null)
    .map((currency) => ({ code: "currency-not-listed", at: { currency }, facts: {} }));
}
