import { countText } from "#src/components/amount-text.ts";
import type { Change } from "#src/costing/sweep-result.ts";
import type { Plan } from "#src/shapes/plan.ts";

function partName(plan: Plan, id: string): string {
  const part = plan.parts.find((one) => one.id === id);
  return part ? part.designators.split(",")[0]?.trim() || part.name : "a part";
}

const supplierName = (plan: Plan, id: string) =>
  plan.suppliers.find((one) => one.id === id)?.name ?? "a supplier";

const houseName = (plan: Plan, id: string | null) =>
  plan.boards.quotes.find((one) => one.id === id)?.boardHouse ?? "another board house";

function offerSupplier(plan: Plan, id: string | null): string | null {
  const offer = plan.parts.flatMap(({ offers }) => offers).find((one) => one.id === id);
  return offer ? supplierName(plan, offer.supplier) : null;
}

/** What changed between two run sizes, as a clause: "it takes 60 boards instead of 30". */
export function changeClause(plan: Plan, change: Change): string {
  switch (change.what) {
    case "board-lots":
      return `it takes ${countText(change.to)} boards instead of ${countText(change.from)}`;
    case "board-break":
      return change.to > change.from
        ? `boards reach the price from ${countText(change.to)}`
        : `boards fall back to the price from ${countText(change.to)}`;
    case "board-quote":
      return `boards come from ${houseName(plan, change.to)}`;
    case "break":
      return change.to > change.from
        ? `${partName(plan, change.part)} reaches the price from ${countText(change.to)}`
        : `${partName(plan, change.part)} falls back to the price from ${countText(change.to)}`;
    case "offer": {
      const supplier = offerSupplier(plan, change.to);
      return supplier
        ? `${partName(plan, change.part)} comes from ${supplier}`
        : `${partName(plan, change.part)} has no offer`;
    }
    case "pack":
    case "lots":
      return change.to > change.from
        ? `it takes ${countText(change.to)} of ${partName(plan, change.part)} instead of ${countText(change.from)}`
        : `${countText(change.to)} of ${partName(plan, change.part)} are enough`;
    case "split":
      return `${partName(plan, change.part)} comes from two offers`;
    case "parcel-more":
      return `one parcel more, from ${supplierName(plan, change.supplier)}`;
    case "parcel-less":
      return `one parcel less: nothing from ${supplierName(plan, change.supplier)}`;
    case "free-freight":
      return change.reached
        ? `freight from ${supplierName(plan, change.supplier)} becomes free`
        : `freight from ${supplierName(plan, change.supplier)} is charged again`;
    case "minimum-order":
      return change.reached
        ? `the order to ${supplierName(plan, change.supplier)} reaches its minimum`
        : `the order to ${supplierName(plan, change.supplier)} falls below its minimum`;
  }
}

/** The telling changes as one sentence without its full stop; nothing where nothing is told. */
export function changesInWords(plan: Plan, changes: readonly Change[], most = 2): string {
  const clauses = changes.slice(0, most).map((change) => changeClause(plan, change));
  const more = changes.length - clauses.length;
  const joined = clauses.length > 1 ? `${clauses.slice(0, -1).join(", ")} and ${clauses.at(-1)}` : clauses[0];
  return joined === undefined ? "" : more > 0 ? `${clauses.join(", ")}, and ${more} more` : joined;
}

/** With a capital and a full stop. */
export function asSentence(clause: string): string {
  return clause === "" ? "" : `${clause.charAt(0).toUpperCase()}${clause.slice(1)}.`;
}
