import { countText } from "#src/components/amount-text.ts";
import { problemSentence } from "#src/costing/problem-words.ts";
import type { PartLine } from "#src/costing/run-result.ts";
import type { KitSupply } from "./kit-supply.ts";
import { isOldPrice, seenText, stockShort } from "./offer-words.ts";

/** Something to settle about a kit's offers, with the page on which it is settled. */
export interface OfferMatter {
  key: string;
  kind: "bad" | "caution" | "waiting";
  sentence: string;
  /** What leads on, and where. */
  way: string;
  href: string;
}

const BAD_FIRST = { bad: 0, caution: 1, waiting: 2 } as const;

/** A supplier that is left out was left out on purpose; a smaller matter than what follows from it. */
const SAID_ELSEWHERE: ReadonlySet<string> = new Set(["supplier-shut-out", "no-rate"]);

/** The reckoning's own problems that are settled by offers, suppliers or rates, each once. */
function problems({ run, plan, partHref, supplierHref }: KitSupply, suppliersHref: string): OfferMatter[] {
  const found = run.problems.filter(({ at, code }) => !SAID_ELSEWHERE.has(code) && (at.part || at.supplier));
  const missing = [
    ...new Set(run.problems.filter(({ code }) => code === "no-rate").map(({ at }) => at.currency)),
  ];
  return [
    ...missing.map(
      (currency): OfferMatter => ({
        key: `rate ${currency}`,
        kind: "bad",
        sentence: `There is no rate for ${currency}.`,
        way: "Set the rate",
        href: `${suppliersHref}#rates`,
      }),
    ),
    ...found.map((problem): OfferMatter => {
      const { part, supplier } = problem.at;
      const serious = NEEDS.has(problem.code);
      return {
        key: `${problem.code} ${JSON.stringify(problem.at)}`,
        kind: serious ? "bad" : "caution",
        sentence: problemSentence(problem, plan),
        way: part ? "Look at the offers" : "Look at the terms",
        href: part ? partHref(part) : supplierHref(supplier ?? ""),
      };
    }),
  ];
}

/** Figures wait for these. */
const NEEDS: ReadonlySet<string> = new Set([
  "unpriced-part",
  "short-part",
  "order-refused",
  "no-freight",
  "no-stock-cost",
  "amount-too-large",
  "pinned-offer-unusable",
]);

/** What is worth a look about an offer that is about to be ordered from. */
function ordered({ offers, nameOf, partHref }: KitSupply, line: PartLine, today: string): OfferMatter[] {
  return line.orders.flatMap((order) => {
    const offer = offers.find(({ id }) => id === order.offer);
    if (!offer) return [];
    const from = nameOf(order.supplier);
    const matters: OfferMatter[] = [];
    const say = (what: string, sentence: string, way: string) =>
      matters.push({ key: `${what} ${offer.id}`, kind: "caution", sentence, way, href: partHref(line.id) });
    const lacks = stockShort(offer, order.quantity);
    if (lacks > 0)
      say(
        "stock",
        `${line.name}: ${from} shows ${countText(lacks)} fewer than are ordered.`,
        "Look at the offers",
      );
    if (isOldPrice(offer, today))
      say(
        "old",
        `${line.name}: the price of ${from} is ${seenText(offer, today)}.`,
        "Ask again, or write its day",
      );
    return matters;
  });
}

/** Lines that one supplier alone can deliver now. */
export function singleSourced({ run }: KitSupply): PartLine[] {
  return run.parts.filter(({ state, considered }) => {
    const usable = considered.filter(({ standing }) => standing === "usable");
    return state === "settled" && new Set(usable.map(({ supplier }) => supplier)).size === 1;
  });
}

/** Everything to settle about a kit's offers, the worst first. */
export function offerMatters(supply: KitSupply, today: string, suppliersHref: string): OfferMatter[] {
  const all = [
    ...problems(supply, suppliersHref),
    ...supply.run.parts.flatMap((line) => ordered(supply, line, today)),
  ];
  return all.sort((a, b) => BAD_FIRST[a.kind] - BAD_FIRST[b.kind]);
}
