import type { PartLine, PartOrder } from "./run-result.ts";
import type { WorkingContext } from "./working.ts";
import {
  count,
  from,
  money,
  notKnown,
  number,
  type Sheet,
  type Step,
  step,
  summed,
} from "./working-lines.ts";
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

function orderSteps({ prepared, result }: WorkingContext, part: PartLine, order: PartOrder): Step[] {
  const supplier = result.baskets.find((basket) => basket.supplier === order.supplier);
  const name = supplier?.name ?? order.supplier;
  const source = from("offers", part.id);
  const places = order.extended.split(".")[1]?.length ?? 0;
  const priced =
    order.breakReached === null || isSliced(prepared, order)
      ? totalSteps(order, places)
      : [
          step(null, `Ordered from ${name}`, count(order.quantity, "pieces"), "3", { source }),
          step(
            "×",
            `Price each from ${order.breakReached.quantity}`,
            money(order.breakReached.price, order.currency, 6),
            "3",
            { source },
          ),
          step("=", `${name} charges`, money(order.extended, order.currency), "1.3", { rounds: places }),
        ];
  const converted = supplier?.rate
    ? [
        step(
          "×",
          `Rate of ${supplier.rate.dated}`,
          number(supplier.rate.perForeignUnit, `${result.currency} for one ${order.currency}`),
          "1.4",
          { source: from("offers") },
        ),
        step("=", "Converted", money(order.extendedConverted, result.currency), "1.4"),
      ]
    : [];
  return [...priced, ...converted, ...landedSteps(result.currency, order), ...boughtUpSteps(order)];

  function totalSteps(of: PartOrder, decimals: number): Step[] {
    const taken = of.lots.map((lot) => `${lot.count} of ${lot.quantity} for ${lot.price}`).join(", ");
    return [
      step(
        null,
        taken === "" ? `${of.quantity} from ${name}, each slice at its price` : `${name}: ${taken}`,
        money(of.extended, of.currency),
        "3",
        { source, rounds: decimals },
      ),
    ];
  }
}

function isSliced({ plan }: WorkingContext["prepared"], order: PartOrder): boolean {
  return plan.parts.some(({ offers }) =>
    offers.some(
      ({ id, supplier, priceModel }) =>
        id === order.offer && supplier === order.supplier && priceModel === "by-slice",
    ),
  );
}

function landedSteps(currency: string, order: PartOrder): Step[] {
  if (!order.landed.known)
    return [
      step(null, "With its share of the parcel", notKnown(order.landed.needs), "4.4", {
        opens: `basket:${order.supplier}`,
      }),
    ];
  return [
    step(null, "With its share of the parcel, by value", money(order.landed, currency), "4.4", {
      opens: `basket:${order.supplier}`,
    }),
  ];
}

function boughtUpSteps({ boughtUp, quantity, currency }: PartOrder): Step[] {
  if (boughtUp === null) return [];
  const cost = `${boughtUp.insteadOf} would cost`;
  return [
    step(null, cost, money(boughtUp.insteadOfCosts, currency), "3"),
    step("−", `${quantity} cost less by`, money(boughtUp.saves, currency), "3"),
    step(
      "=",
      `${quantity} cost; ${boughtUp.leftOver} stay on the shelf`,
      money(difference(boughtUp.insteadOfCosts, boughtUp.saves), currency),
      "3",
    ),
  ];
}

/** Two amounts with the same number of decimals, subtracted digit for digit. */
function difference(a: string, b: string): string {
  const places = a.split(".")[1]?.length ?? 0;
  const digits = (BigInt(a.replace(".", "")) - BigInt(b.replace(".", "")))
    .toString()
    .padStart(places + 1, "0");
  return places === 0 ? digits : `${digits.slice(0, -places)}.${digits.slice(-places)}`;
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

/** The other offers, as they would come alone: why this one. */
function consideredSteps({ prepared, result }: WorkingContext, part: PartLine): Step[] {
  const rivals = part.considered.filter(({ aloneLanded }) => aloneLanded !== null);
  if (rivals.length < 2) return [];
  return rivals.map((offer) => {
    const name = prepared.plan.suppliers.find(({ id }) => id === offer.supplier)?.name ?? offer.supplier;
    const chosen = offer.chosen ? ", chosen" : "";
    return step(
      null,
      `${name}: ${offer.quantity} with freight as though alone${chosen}`,
      money(offer.aloneLanded ?? "0", result.currency),
      "5",
      { source: from("offers", part.id) },
    );
  });
}

function notesOf(part: PartLine): string[] {
  const notes = ["An order's extended price is rounded once, to the supplier's minor unit, halves up."];
  if (part.state === "short") notes.push(`All offers together are short by ${part.shortBy}.`);
  if (part.considered.length > 1)
    notes.push(
      "Of several offers the one that is cheapest with its freight, as though the part came alone, is taken; on a tie the one with fewer left over, then by name.",
    );
  if (part.leftOver > 0) notes.push(`${part.leftOver} are left over.`);
  return notes;
}
