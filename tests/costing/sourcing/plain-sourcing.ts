import type { BasketTerms } from "#src/costing/sourcing/basket-terms.ts";
import type { SourcingInput, SourcingLimits } from "#src/costing/sourcing/sourcing-input.ts";

/**
 * The method read a second time, as plainly as possible: every choice of ways tried, every basket's bill worked out
 * anew in whole numbers of any size.
 */
export interface PlainPlan {
  /** Per part the way, −1 where it is not bought. */
  ways: number[];
  unbought: number;
  freightUnknown: number;
  total: bigint;
  left: bigint;
  used: number[];
}

/** Halves away from zero; nothing here is negative. */
function rounded(amount: bigint, millionths: number): bigint {
  return (2n * amount * BigInt(millionths) + 1_000_000n) / 2_000_000n;
}

function banded(bands: readonly { from: number; amount: number }[], measure: number): number {
  const reached = bands.filter(({ from }, index) => index === 0 || from <= measure);
  return reached.at(-1)?.amount ?? 0;
}

interface PlainBill {
  total: bigint;
  freightUnknown: boolean;
  refused: boolean;
}

/** One basket's bill, sections 4.1 to 4.3, in minor units. */
export function plainBill(terms: BasketTerms, goods: number, weight: number | null): PlainBill {
  const small = goods < terms.minimum;
  let freight: number | null = null;
  if (terms.freeFrom !== null && goods >= terms.freeFrom) freight = 0;
  else if (terms.freight.model === "none") freight = 0;
  else if (terms.freight.model === "flat") freight = terms.freight.amount;
  else if (terms.freight.model === "by-goods") freight = banded(terms.freight.bands, goods);
  else if (terms.freight.model === "by-weight" && weight !== null)
    freight = banded(terms.freight.bands, weight);
  let total = BigInt(goods + (freight ?? 0) + terms.handling);
  if (small && terms.belowMinimum.term === "fee") total += BigInt(terms.belowMinimum.fee);
  const { customs } = terms;
  if (customs !== null) {
    const value = BigInt(goods) + (customs.withFreight ? BigInt(freight ?? 0) : 0n);
    const duty = value > BigInt(customs.dutyOver) ? rounded(value, customs.dutyMillionths) : 0n;
    const tax = rounded(value + duty, customs.taxMillionths);
    total += duty + BigInt(customs.broker) + (customs.taxReclaimed ? 0n : tax);
  }
  return {
    total,
    freightUnknown: freight === null,
    refused: small && terms.belowMinimum.term === "refused",
  };
}

/** A choice of ways as a plan; null where a basket is refused. */
export function plainPlan({ suppliers, parts }: SourcingInput, ways: readonly number[]): PlainPlan | null {
  const orders = parts.flatMap(({ ways: own }, part) => own[ways[part] ?? -1]?.orders ?? []);
  const found: PlainPlan = {
    ways: [...ways],
    unbought: parts.filter(({ toBuy }, part) => toBuy > 0 && ways[part] === -1).length,
    freightUnknown: 0,
    total: 0n,
    left: orders.reduce((sum, { leftWorth }) => sum + leftWorth, 0n),
    used: [],
  };
  for (const [index, { terms, worth }] of suppliers.entries()) {
    const own = orders.filter(({ supplier }) => supplier === index);
    if (own.length === 0) continue;
    const goods = own.reduce((sum, { cost }) => sum + cost, 0);
    const weight = own.some((order) => order.weight === null)
      ? null
      : own.reduce((sum, order) => sum + (order.weight ?? 0), 0);
    const bill = plainBill(terms, goods, weight);
    if (bill.refused) return null;
    found.freightUnknown += bill.freightUnknown ? 1 : 0;
    found.total += bill.total * worth.grains;
    found.used.push(index);
  }
  return found;
}

/** Below 0 when `a` is better. */
export function comparePlain(a: PlainPlan, b: PlainPlan): number {
  const order = (one: bigint, other: bigint) => (one < other ? -1 : one > other ? 1 : 0);
  const lists = (one: readonly number[], other: readonly number[]) => {
    for (const [at, value] of one.entries()) if (value !== other[at]) return value - (other[at] ?? 0);
    return 0;
  };
  const last = (ways: readonly number[]) => ways.map((way) => (way < 0 ? 1e9 : way));
  return (
    a.unbought - b.unbought ||
    a.freightUnknown - b.freightUnknown ||
    order(a.total, b.total) ||
    a.used.length - b.used.length ||
    order(a.left, b.left) ||
    lists(a.used, b.used) ||
    lists(last(a.ways), last(b.ways))
  );
}

/** The best of all choices; null where none keeps to the limits. */
export function plainBest(input: SourcingInput, limits: SourcingLimits = {}): PlainPlan | null {
  const {
    without = [],
    latestDays = null,
    leastParcels = 0,
    mostParcels = Number.POSITIVE_INFINITY,
  } = limits;
  let best: PlainPlan | null = null;
  const walk = (ways: number[]): void => {
    const part = input.parts[ways.length];
    if (part === undefined) {
      const plan = plainPlan(input, ways);
      if (plan === null || plan.used.length < leastParcels || plan.used.length > mostParcels) return;
      if (best === null || comparePlain(plan, best) < 0) best = plan;
      return;
    }
    walk([...ways, -1]);
    if (part.toBuy === 0) return;
    for (const [way, { orders }] of part.ways.entries()) {
      const open = orders.every(
        ({ supplier, leadDays }) =>
          !without.includes(supplier) &&
          (latestDays === null || (leadDays !== null && leadDays <= latestDays)),
      );
      if (open) walk([...ways, way]);
    }
  };
  walk([]);
  return best;
}
