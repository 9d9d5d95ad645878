import { countText, moneyText, rateText } from "#src/components/amount-text.ts";
import type { PlanChannel } from "#src/shapes/plan.ts";
import type { PlanRow } from "./plan-rows.ts";

const MONEY = [
  "price",
  "ratePerHour",
  "feeFixed",
  "postageCharged",
  "postagePaid",
  "replacementCost",
  "amount",
  "costPerKit",
  "packingCost",
];
const RATES = [
  "taxRate",
  "feeRate",
  "spareRate",
  "boardYield",
  "boardConfidence",
  "learningSlope",
  "replacementShare",
  "discount",
];

/** What a field of the plan is called in a sentence. */
const NAMES: Record<string, string> = {
  kits: "run",
  sweepTo: "largest run",
  spareRate: "spare parts",
  boardYield: "board yield",
  boardConfidence: "confidence of enough boards",
  chosenQuoteId: "board quote",
  learningSlope: "learning",
  kitsMadeBefore: "kits made before",
  replacementShare: "share of replacements",
  replacementCost: "cost of a replacement",
  taxRate: "tax rate",
  feeRate: "fee",
  feeFixed: "fixed fee",
  postageCharged: "postage the buyer pays",
  postagePaid: "postage you pay",
  price: "price",
  weight: "share",
  ratePerHour: "rate for an hour",
  minutesPerKit: "minutes a kit",
  setUpMinutes: "minutes to set up",
  costPerKit: "cost a kit",
  amount: "amount",
  spreadOver: "kits it is spread over",
  editions: "editions",
  name: "name",
  discount: "discount",
  ownPrices: "own prices",
  taxStated: "how the tax is stated",
  feeOnPostage: "fee on postage",
  feeOnTax: "fee on tax",
  packingCost: "packing of an order",
  other: "other cost",
  minutesPerOrder: "minutes an order",
  kitsPerOrder: "kits in an order",
};

/** A value of a field as it is written in a sentence. */
export function fieldValue(field: string, value: unknown, currency: string): string {
  if (value === null || value === undefined) return "not set";
  if (MONEY.includes(field)) return moneyText(String(value), currency);
  if (RATES.includes(field)) return rateText(String(value));
  if (typeof value === "number") return countText(value);
  if (typeof value === "boolean") return value ? "yes" : "no";
  if (field === "taxStated") return value === "inside" ? "inside the price" : "on top of the price";
  if (field === "ownPrices") return ownPricesWords(value as PlanChannel["ownPrices"], currency);
  if (field === "other") return otherWords(value as PlanChannel["other"], currency);
  if (Array.isArray(value)) return value.length === 1 ? "one edition" : `${value.length} editions`;
  return String(value);
}

function ownPricesWords(prices: PlanChannel["ownPrices"], currency: string): string {
  return prices.length === 0
    ? "those of the list"
    : prices.map(({ price }) => moneyText(price, currency)).join(", ");
}

function otherWords({ name, amount, sharedOver }: PlanChannel["other"], currency: string): string {
  const cost = amount === null ? "not set" : moneyText(amount, currency);
  const shared = sharedOver === 1 ? "" : ` for ${countText(sharedOver)} orders`;
  return `${name === "" ? "" : `${name}, `}${cost}${shared}`;
}

/** "Run", "Price of Full kit": a field with the thing it belongs to. */
export function fieldName(row: PlanRow, field: string, thing?: string): string {
  const name = NAMES[field] ?? field;
  const capital = name.charAt(0).toUpperCase() + name.slice(1);
  return thing && "id" in row ? `${capital} of ${thing}` : capital;
}

/** "Run changed from 100 to 120." */
export function changeWords(
  named: string,
  field: string,
  from: unknown,
  to: unknown,
  currency: string,
): string {
  return `${named} changed from ${fieldValue(field, from, currency)} to ${fieldValue(field, to, currency)}.`;
}
