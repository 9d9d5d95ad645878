import { dayWords } from "./day-words.ts";
import type { PartLine, PartOrder } from "./run-result.ts";
import type { WorkingContext } from "./working.ts";
import { count, from, money, notKnown, number, type Step, step } from "./working-lines.ts";

/** One order of a part: price, conversion, its share of the parcel, and what buying up saved (section 3). */
export function orderSteps({ prepared, result }: WorkingContext, part: PartLine, order: PartOrder): Step[] {
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
          `Rate of ${dayWords(supplier.rate.dated)}`,
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
