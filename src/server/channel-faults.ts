import { leavesNothing } from "#src/costing/price/leaves-nothing.ts";
import type { PlanChannel } from "#src/shapes/plan.ts";
import type { FieldError } from "./problem.ts";

const NOTHING_LEFT =
  "Fee and tax together take all of the price. Write a lower fee, or one that is not taken on tax.";

/** What makes a channel impossible although each of its fields has the right shape (section 1.6). */
export function channelFaults(channel: Omit<PlanChannel, "id">, editions: ReadonlySet<string>): FieldError[] {
  const priced = channel.ownPrices.map(({ edition }) => edition);
  const strange = (named: readonly string[], at: (place: number) => string) =>
    named.flatMap((id, place) =>
      editions.has(id) ? [] : [{ at: at(place), message: "Name an edition of this kit." }],
    );
  return [
    ...strange(channel.editions ?? [], (place) => `editions.${place}`),
    ...strange(priced, (place) => `ownPrices.${place}.edition`),
    ...priced.flatMap((id, place) =>
      priced.indexOf(id) < place
        ? [{ at: `ownPrices.${place}.edition`, message: "This edition is named already." }]
        : [],
    ),
    ...(leavesNothing(channel) ? [{ at: "feeRate", message: NOTHING_LEFT }] : []),
  ];
}
