import { countText, moneyText } from "#src/components/amount-text.ts";
import type { PartLine } from "#src/costing/run-result.ts";

/** An answer: what decides it in bold, then the rest. */
export interface Answer {
  deciding: string;
  rest: string;
}

function pieces(count: number): string {
  return count === 1 ? "1 is" : `${countText(count)} are`;
}

/** Who supplies a part and how many are bought, in one or two sentences. */
export function offerAnswer(line: PartLine, nameOf: (supplier: string) => string): Answer {
  const [order, ...others] = line.orders;
  if (line.state === "not-needed") return { deciding: "None are needed in this run.", rest: "" };
  if (line.state === "unpriced")
    return {
      deciding: "Not known yet.",
      rest: `Nobody’s price can be used for ${countText(line.toBuy)} of them.`,
    };
  if (line.state === "refused")
    return {
      deciding: "Not known yet.",
      rest: "The order would be too small for its supplier, who refuses it.",
    };
  if (line.state === "short")
    return {
      deciding: `${countText(line.shortBy)} short.`,
      rest: `${countText(line.toBuy)} are needed, and the stock shown covers ${countText(line.toBuy - line.shortBy)}.`,
    };
  if (!order)
    return { deciding: `All ${countText(line.required)} come from the shelf.`, rest: "Nothing is bought." };
  const parts = line.orders.map(
    ({ quantity, supplier, extended, currency }) =>
      `${countText(quantity)} from ${nameOf(supplier)} for ${moneyText(extended, currency)}`,
  );
  if (others.length > 0)
    return { deciding: `Buy ${parts.join(" and ")}.`, rest: "No single offer covers them all." };
  const left = line.leftOver > 0 ? `${pieces(line.leftOver)} left for the next run.` : "None are left over.";
  const { boughtUp } = order;
  if (!boughtUp) return { deciding: `Buy ${parts[0]}.`, rest: left };
  const saves = moneyText(boughtUp.saves, order.currency);
  return {
    deciding: `Buy ${parts[0]}.`,
    rest: `That is ${saves} less than the ${countText(boughtUp.insteadOf)} you would need to buy, and leaves ${countText(line.leftOver)} for the next run.`,
  };
}
