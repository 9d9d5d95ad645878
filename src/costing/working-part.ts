import type { ConsideredOffer, OfferStanding, PartLine } from "./run-result.ts";
import type { WorkingContext } from "./working.ts";
import { count, from, money, type Sheet, type Step, step, summed, words } from "./working-lines.ts";
import { CHOICE_RULE, orderSteps } from "./working-order.ts";
import { percent } from "./working-run.ts";

/** How a part's purchase comes about: need, spare, stock, order, price, freight (sections 2 to 4). */
export function partSheet(context: WorkingContext, id: string): Sheet | null {
  const index = context.result.parts.findIndex((part) => part.id === id);
  const part = context.result.parts[index];
  if (part === undefined) return null;
  const { result } = context;
  const bought = part.orders.flatMap((order) => orderSteps(context, part, order));
  return {
    title: `${part.name}, for a run of ${result.kits}`,
    steps: [
      ...needSteps(context, part),
      ...bought,
      ...(part.orders.length > 1 ? splitTotal(context, part) : []),
      ...consideredSteps(context, part),
      step(null, "Parts for the run, without freight", money(part.goods, result.currency), "8", {
        opens: null,
      }),
      step("÷", "Kits in the run", count(result.kits, "kits"), "8", { source: from("run") }),
      step("=", "In one kit", money(part.perKit.spent, result.currency), "8", { result: true }),
    ],
    notes: notesOf(part),
  };
}

function needSteps({ prepared, result }: WorkingContext, part: PartLine): Step[] {
  const stated = prepared.plan.parts.find(({ id }) => id === part.id);
  const perKit = prepared.parts.find((one) => one.part.id === part.id)?.perKit ?? [];
  const lines = result.editions.flatMap((edition, index) => {
    const pieces = perKit[index] ?? 0;
    const label = `${edition.name}, ${edition.kits} kits with ${pieces} each`;
    return pieces === 0 || edition.kits === 0
      ? []
      : [step("+", label, count(edition.kits * pieces, "pieces"), "2", { source: from("parts", part.id) })];
  });
  const needed =
    lines.length === 0
      ? [step(null, "Needed", count(0, "pieces"), "2")]
      : [...summed(lines), step("=", "Needed", count(part.need, "pieces"), "2")];
  const spare = `Spare, ${percent(stated?.spareRate ?? "0")} of ${part.need} rounded up, at least ${stated?.leastSpare ?? 0}`;
  return [
    ...needed,
    step("+", spare, count(part.spare, "pieces"), "2", { source: from("parts", part.id) }),
    step("−", "From the shelf", count(part.fromStock, "pieces"), "2", { source: from("parts", part.id) }),
    step("=", "To buy", count(part.toBuy, "pieces"), "2"),
  ];
}

function splitTotal({ result }: WorkingContext, part: PartLine): Step[] {
  const lines = part.orders.map((order) =>
    step(
      "+",
      `${order.quantity} of ${order.orderCode || order.supplier}`,
      money(order.extendedConverted, result.currency),
      "3",
    ),
  );
  return [...summed(lines), step("=", "All orders of the part", money(part.goods, result.currency), "3")];
}

/** The other offers, as they would come alone, or why they are not taken. */
function consideredSteps({ prepared, result }: WorkingContext, part: PartLine): Step[] {
  if (part.considered.length < 2) return [];
  return part.considered.map((offer) => {
    const name = prepared.plan.suppliers.find(({ id }) => id === offer.supplier)?.name ?? offer.supplier;
    const source = from("offers", part.id);
    if (offer.aloneLanded === null) return step(null, name, words(whyNot(offer)), "5", { source });
    const label = `${name}: ${offer.quantity} with freight as though alone${offer.chosen ? ", chosen" : ""}`;
    const opens = `offer:${part.id}:${offer.offer}` as const;
    return step(null, label, money(offer.aloneLanded, result.currency), "5", { source, opens });
  });
}

const WHY_NOT: Record<OfferStanding, string> = {
  usable: "freight not known",
  short: "short",
  expired: "old price",
  "no-price": "no price",
  "no-rate": "no rate",
  "other-currency": "other currency",
  "stock-not-known": "stock not known",
  "impossible-ladder": "breaks do not fit",
  "no-supplier": "no supplier",
  "shut-out": "left out",
  "minimum-not-reached": "below its minimum",
  "amount-too-large": "too large",
};

function whyNot({ standing, shortBy }: ConsideredOffer): string {
  return shortBy > 0 ? `${shortBy} short` : WHY_NOT[standing];
}

function notesOf(part: PartLine): string[] {
  const notes = ["An order's extended price is rounded once, to the supplier's minor unit, halves up."];
  if (part.state === "short") notes.push(`All offers together are short by ${part.shortBy}.`);
  if (part.considered.length > 1) notes.push(CHOICE_RULE);
  if (part.leftOver > 0) notes.push(`${part.leftOver} are left over.`);
  return notes;
}
