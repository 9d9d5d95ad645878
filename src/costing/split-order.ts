import { convertMinor, type MinorWorth } from "./conversion.ts";
import { GRAIN_PLACES } from "./grains.ts";
import { cheapestOrder, type Order } from "./ladder.ts";
import type { PreparedOffer, PreparedPart, PreparedSupplier } from "./prepared-plan.ts";
import { freightFor } from "./supplier-choice.ts";
import { divideBigHalfAway, ORDER_MOST } from "./whole.ts";

/** One order of a split: how many of the pieces wanted it covers, and the order itself. */
export interface SplitPart {
  offer: PreparedOffer;
  covers: number;
  order: Order;
}

/** Where offers have too little stock: the cheapest way to cover any number with several of them. */
export interface SplitTable {
  top: number;
  /** Most pieces all offers together can cover. */
  coverable: number;
  split: (quantity: number) => SplitPart[] | null;
}

/** Best ways to cover 0, 1, 2 … pieces: value, pieces held, and how many the last taker covers. */
interface Ways {
  value: Float64Array;
  held: Float64Array;
  covers: Int32Array;
}

interface Group {
  supplier: PreparedSupplier;
  offers: PreparedOffer[];
  /** One stage for each offer of the supplier, in order. */
  stages: Ways[];
}

/**
 * The cheapest split over offers for every number up to `top` (section 3). A split's value is Σ over
 * suppliers of goods + freight of those goods as though the part came alone, once a supplier; ties
 * go to fewer pieces held, then to earlier suppliers. Exact dynamic programme: first over the offers
 * of one supplier, then over suppliers; steps grow with the square of the quantity, and it is built
 * only where a single offer's stock does not reach. Values are compared in minor units where all offers
 * share a currency, otherwise in 10^-8 of the plan's.
 *
 * @example 100 pieces, stock 70 at 0.10 and 60 at 0.12: 70 from the first and 30 from the second
 */
export function splitTable(part: PreparedPart, top: number, barred: ReadonlySet<number>): SplitTable {
  const offers = part.usable.filter((offer) => !barred.has(offer.supplier.index));
  const groups = groupBySupplier(offers).map((group) => ({ ...group, stages: stagesOf(group.offers, top) }));
  const oneCurrency = new Set(offers.map(({ worth }) => worth)).size <= 1;
  const stages: Ways[] = [];
  for (const group of groups) {
    const own = group.stages.at(-1) as Ways;
    const value = (covered: number) => aloneValue(group.supplier, own.value[covered] ?? 0, oneCurrency);
    stages.push(
      combine(
        stages.at(-1) ?? nothing(top),
        top,
        (covered) => value(covered),
        (covered) => own.held[covered] ?? 0,
      ),
    );
  }
  return {
    top,
    coverable: coverableOf(part, barred),
    split: (quantity) => unwindSplit(groups, stages, quantity),
  };
}

function groupBySupplier(offers: readonly PreparedOffer[]): Omit<Group, "stages">[] {
  const groups = new Map<number, Omit<Group, "stages">>();
  for (const offer of offers) {
    const group = groups.get(offer.supplier.index) ?? { supplier: offer.supplier, offers: [] };
    group.offers.push(offer);
    groups.set(offer.supplier.index, group);
  }
  return [...groups.values()];
}

function stagesOf(offers: readonly PreparedOffer[], top: number): Ways[] {
  const stages: Ways[] = [];
  for (const offer of offers) {
    const orders: (Order | null)[] = [];
    for (let covered = 0; covered <= Math.min(top, mostOf(offer)); covered += 1) {
      orders.push(cheapestOrder(offer.ladder, covered));
    }
    const cost = (covered: number) => {
      const found = orders[covered]?.cost ?? Number.POSITIVE_INFINITY;
      return found > ORDER_MOST ? Number.POSITIVE_INFINITY : found;
    };
    stages.push(
      combine(stages.at(-1) ?? nothing(top), top, cost, (covered) => orders[covered]?.quantity ?? 0),
    );
  }
  return stages;
}

/** Adds one more taker: for every number the best of what it may cover, after the best for the rest. */
function combine(
  before: Ways,
  top: number,
  worthOf: (covered: number) => number,
  heldOf: (covered: number) => number,
): Ways {
  const after: Ways = {
    value: before.value.slice(),
    held: before.held.slice(),
    covers: new Int32Array(top + 1),
  };
  for (let covered = 1; covered <= top; covered += 1) {
    const [value, held] = [worthOf(covered), heldOf(covered)];
    if (value === Number.POSITIVE_INFINITY) continue;
    for (let total = covered; total <= top; total += 1) {
      const sum = value + (before.value[total - covered] as number);
      const best = after.value[total] as number;
      if (sum > best) continue;
      const pieces = held + (before.held[total - covered] as number);
      if (sum === best && pieces >= (after.held[total] as number)) continue;
      after.value[total] = sum;
      after.held[total] = pieces;
      after.covers[total] = covered;
    }
  }
  return after;
}

function nothing(top: number): Ways {
  const value = new Float64Array(top + 1).fill(Number.POSITIVE_INFINITY);
  value[0] = 0;
  return { value, held: new Float64Array(top + 1), covers: new Int32Array(top + 1) };
}

function aloneValue(supplier: PreparedSupplier, goods: number, oneCurrency: boolean): number {
  if (goods === Number.POSITIVE_INFINITY) return goods;
  const minor = goods + (freightFor(supplier, goods) ?? 0);
  return oneCurrency
    ? minor
    : Number(
        divideBigHalfAway(convertMinor(minor, supplier.worth as MinorWorth), 10n ** BigInt(GRAIN_PLACES - 8)),
      );
}

/**
 * Pieces that all offers of a part cover together.
 *
 * @example stock 8400 and 640 in hundreds → 9000
 */
export function coverableOf(
  part: PreparedPart,
  barred: ReadonlyMap<number, number> | ReadonlySet<number>,
): number {
  const open = part.usable.filter(({ supplier }) => !barred.has(supplier.index));
  return open.reduce((sum, offer) => sum + mostOf(offer), 0);
}

/**
 * Most pieces one offer covers: the last multiple within its stock, 0 where that is below its minimum.
 *
 * @example stock 640 in hundreds → 600
 */
export function mostOf({ ladder }: PreparedOffer): number {
  if (ladder.cap === Number.POSITIVE_INFINITY) return ladder.cap;
  const most = ladder.cap - (ladder.cap % ladder.multiple);
  return cheapestOrder(ladder, most) === null ? 0 : most;
}

function unwindSplit(
  groups: readonly Group[],
  stages: readonly Ways[],
  quantity: number,
): SplitPart[] | null {
  const last = stages.at(-1);
  if (last === undefined || last.value[quantity] === Number.POSITIVE_INFINITY) return null;
  const parts: SplitPart[] = [];
  let rest = quantity;
  for (let index = groups.length - 1; index >= 0; index -= 1) {
    const covers = stages[index]?.covers[rest] ?? 0;
    if (covers > 0) parts.unshift(...unwindGroup(groups[index] as Group, covers));
    rest -= covers;
  }
  return parts;
}

function unwindGroup(group: Group, quantity: number): SplitPart[] {
  const parts: SplitPart[] = [];
  let rest = quantity;
  for (let index = group.offers.length - 1; index >= 0; index -= 1) {
    const offer = group.offers[index] as PreparedOffer;
    const covers = group.stages[index]?.covers[rest] ?? 0;
    const order = covers > 0 ? cheapestOrder(offer.ladder, covers) : null;
    if (order) parts.unshift({ offer, covers, order });
    rest -= covers;
  }
  return parts;
}
