import { countText, rateText } from "#src/components/amount-text.ts";
import type { EditionResult, PartLine } from "#src/costing/run-result.ts";
import type { PlanPart } from "#src/shapes/plan.ts";

/** At most three names, and how many more. */
export function namesInWords(all: readonly string[]): string {
  if (all.length <= 3)
    return all.length < 2 ? (all[0] ?? "") : `${all.slice(0, -1).join(", ")} and ${all.at(-1)}`;
  return `${all.slice(0, 3).join(", ")} and ${all.length - 3} more`;
}

/** "6 in each kit, 120 kits: 720.", or "6 in each of 110 kits and 2 in each of 10: 680." */
function inKits(
  editions: readonly Pick<EditionResult, "id" | "kits">[],
  quantities: PlanPart["quantities"],
  need: number,
): string {
  const kitsBy = new Map<number, number>();
  for (const { id, kits } of editions) {
    const perKit = quantities.find(({ edition }) => edition === id)?.perKit ?? 0;
    if (kits > 0) kitsBy.set(perKit, (kitsBy.get(perKit) ?? 0) + kits);
  }
  const all = [...kitsBy].sort(([one], [other]) => other - one);
  const [first] = all;
  if (all.length === 1 && first)
    return `${countText(first[0])} in each kit, ${countText(first[1])} kits: ${countText(need)}.`;
  const used = all.filter(([perKit]) => perKit > 0);
  const words = used.map(
    ([perKit, kits], place) =>
      `${countText(perKit)} in each of ${countText(kits)}${place === 0 ? " kits" : ""}`,
  );
  return `${namesInWords(words)}: ${countText(need)}.`;
}

interface HowItComes {
  line: Pick<PartLine, "need" | "spare" | "fromStock" | "orders">;
  part: Pick<PlanPart, "quantities" | "spareRate">;
  editions: readonly Pick<EditionResult, "id" | "kits">[];
  orderMultiple: number;
}

/** How the number to buy comes about, a sentence for each step that changes it. */
export function howItComes({ line, part, editions, orderMultiple }: HowItComes): string {
  const { need, spare, fromStock, orders } = line;
  const hundredth = rateText(part.spareRate).replace("\u00a0%", "");
  const steps = [inKits(editions, part.quantities, need)];
  if (spare > 0)
    steps.push(
      hundredth === "0"
        ? `At least ${countText(spare)} spare.`
        : `${hundredth} in a hundred spare: ${countText(spare)}.`,
    );
  if (fromStock > 0) steps.push(`From the shelf: ${countText(fromStock)}.`);
  const [order] = orders;
  const least = orders.length === 1 && order ? (order.boughtUp?.insteadOf ?? order.quantity) : null;
  if (orderMultiple > 1)
    steps.push(
      `Sold in multiples of ${countText(orderMultiple)}${least === null ? "" : `, so ${countText(least)}`}.`,
    );
  return steps.join(" ");
}
