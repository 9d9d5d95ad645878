import { kitsWith } from "./kit-costs.ts";
import type { PreparedPart, PreparedPlan } from "./prepared-plan.ts";
import type { SoldKit } from "./price/sold-kit.ts";
import type { Need, NeedCode, Place, SourcePage } from "./problem.ts";
import { MISSING, REFUSED, type RunSheet, SETTLED, SHORT, TOO_LARGE } from "./run-sheet.ts";

/** The page on which each need is settled. */
const PAGE_OF: Record<NeedCode, SourcePage> = {
  "no-parts": "parts",
  "no-mix": "run",
  "unpriced-part": "offers",
  "short-part": "offers",
  "order-refused": "offers",
  "no-rate": "offers",
  "no-freight": "offers",
  "no-board-quote": "boards",
  "no-board-freight": "boards",
  "no-board-yield": "boards",
  "no-board-size": "boards",
  "no-packing-cost": "run",
  "no-hourly-rate": "run",
  "no-replacement-cost": "run",
  "no-stock-cost": "parts",
  "no-price": "price",
  "no-tax-rate": "price",
  "no-fee-rate": "price",
  "no-fixed-fee": "price",
  "no-postage-charged": "price",
  "no-postage-paid": "price",
  "no-order-packing": "price",
  "no-other-cost": "price",
  "no-order-minutes": "price",
  "not-sold": "price",
  "costs-nothing": "run",
  "no-work": "run",
  "not-in-run": "run",
  "nothing-made": "run",
  "not-even": "price",
  "amount-too-large": "offers",
};

/** A need with one place or several. */
export function need(code: NeedCode, at: Place[]): Need {
  return { code, at, page: PAGE_OF[code] };
}

/** Joins lists of needs: one entry a code, places in order of first mention, each once. */
export function joinNeeds(...lists: readonly (readonly Need[])[]): Need[] {
  const joined = new Map<NeedCode, { page: SourcePage; at: Map<string, Place> }>();
  for (const { code, at, page } of lists.flat()) {
    const known = joined.get(code) ?? { page, at: new Map<string, Place>() };
    joined.set(code, known);
    for (const place of at) {
      const text = JSON.stringify(place);
      if (!known.at.has(text)) known.at.set(text, place);
    }
  }
  return [...joined].map(([code, { page, at }]) => ({ code, at: [...at.values()], page }));
}

/** Why a run's figures are not known, by the bits of `MISSING` they depend on. */
export function needsOf(prepared: PreparedPlan, sheet: RunSheet, bits: number): Need[] {
  const missing = sheet.missing & bits;
  if (missing === 0) return [];
  const { plan } = prepared;
  const found: Need[] = missing & MISSING.parts ? [need("no-parts", [{}])] : [];
  if (missing & MISSING.mix)
    found.push(
      need(
        "no-mix",
        plan.editions.map(({ id }) => ({ edition: id })),
      ),
    );
  if (missing & MISSING.goods) {
    found.push(...prepared.parts.flatMap((_, index) => partNeeds(prepared, sheet, index)));
  }
  if (missing & MISSING.freight) found.push(...freightNeeds(prepared, sheet));
  if (missing & (MISSING.boards | MISSING.boardFreight) && !(missing & MISSING.parts))
    found.push(...boardNeeds(prepared, sheet, missing));
  if (missing & MISSING.packing) found.push(...packingNeeds(prepared, sheet));
  if (missing & MISSING.rate) found.push(need("no-hourly-rate", [{}]));
  if (missing & MISSING.replacement) found.push(need("no-replacement-cost", [{}]));
  if (missing & MISSING.stock) found.push(...stockNeeds(prepared, sheet));
  if (missing & MISSING.sale) found.push(...soldNeeds(prepared, sheet, "brings"));
  return joinNeeds(found);
}

/** Why one part's cost is not known; empty when it is. */
export function partNeeds(prepared: PreparedPlan, sheet: RunSheet, index: number): Need[] {
  const state = sheet.state[index] as number;
  if (state <= SETTLED) return [];
  const part = prepared.parts[index] as PreparedPart;
  const at = { part: part.part.id };
  if (state === SHORT) return [need("short-part", [at])];
  if (state === REFUSED)
    return [need("order-refused", [{ ...at, supplier: part.usable[0]?.supplier.id ?? "" }])];
  if (state === TOO_LARGE) return [need("amount-too-large", [at])];
  const withoutRate = part.offers.filter(({ standing }) => standing === "no-rate");
  const priced = part.offers.filter(({ standing }) => standing !== "no-price");
  if (withoutRate.length > 0 && withoutRate.length === priced.length) {
    return [
      need(
        "no-rate",
        withoutRate.map(({ offer }) => ({ currency: offer.currency })),
      ),
    ];
  }
  return [need("unpriced-part", [at])];
}

function freightNeeds(prepared: PreparedPlan, sheet: RunSheet): Need[] {
  return prepared.suppliers
    .filter(({ index, freight, freeFrom }) => {
      const goods = sheet.goods[index] as number;
      return (sheet.orders[index] as number) > 0 && freight === null && goods < freeFrom;
    })
    .map(({ id }) => need("no-freight", [{ supplier: id }]));
}

function boardNeeds(prepared: PreparedPlan, sheet: RunSheet, missing: number): Need[] {
  if (missing & MISSING.boardFreight)
    return [need("no-board-freight", [{ quote: sheet.boards?.quote.quote.id ?? "" }])];
  if (sheet.boardsToOrder === null) return [need("no-board-yield", [{}])];
  const { chosenQuote } = prepared.plan.boards;
  const asked = prepared.quotes.filter(({ quote }) => chosenQuote === null || quote.id === chosenQuote);
  const withoutRate = asked.filter(({ standing }) => standing === "no-rate");
  if (withoutRate.length > 0 && withoutRate.length === asked.length) {
    return [
      need(
        "no-rate",
        withoutRate.map(({ quote }) => ({ currency: quote.currency })),
      ),
    ];
  }
  if (asked.some(({ standing }) => standing === "usable")) return [need("amount-too-large", [{}])];
  const withoutSize = asked.filter(({ standing }) => standing === "no-size");
  if (withoutSize.length > 0 && withoutSize.length === asked.length)
    return [
      need(
        "no-board-size",
        withoutSize.map(({ quote }) => ({ quote: quote.id })),
      ),
    ];
  return [need("no-board-quote", chosenQuote === null ? [{}] : [{ quote: chosenQuote }])];
}

function packingNeeds({ packing }: PreparedPlan, sheet: RunSheet): Need[] {
  return packing
    .filter(({ costPerKit, applies }) => costPerKit === null && kitsWith(applies, sheet.kitsOf) > 0)
    .map(({ item }) => need("no-packing-cost", [{ packing: item.id }]));
}

function stockNeeds(prepared: PreparedPlan, sheet: RunSheet): Need[] {
  return prepared.parts
    .filter((part, index) => part.book === null && (sheet.fromStock[index] as number) > 0)
    .map(({ part }) => need("no-stock-cost", [{ part: part.id }]));
}

/** What the sales of a run need, over the editions that are made: for what they keep, bring or take. */
export function soldNeeds({ sold }: PreparedPlan, sheet: RunSheet, figure: keyof SoldKit["needs"]): Need[] {
  return joinNeeds(...sold.map(({ needs }, index) => ((sheet.kitsOf[index] ?? 0) > 0 ? needs[figure] : [])));
}
