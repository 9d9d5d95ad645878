import { count, from, type Step, step, summed } from "#src/costing/working-lines.ts";
import type { WorkingAmount } from "#src/costing/working-tree.ts";
import type { EditionSale } from "./edition-sale.ts";
import { type Fraction, nearest, times } from "./fraction.ts";
import type { PreparedChannel } from "./prepared-channel.ts";

/** One channel's amount per kit, with the steps that lead to it. */
export interface OfChannel {
  start: Step[];
  perKit: Fraction;
  label: string;
}

/**
 * Steps of a mean over the channels of an edition by share: each `amount × weight ÷ all weights`, then
 * their sum, to be closed with its result.
 */
export function overChannels(
  { lines }: EditionSale,
  amount: (value: bigint) => WorkingAmount,
  of: (prepared: PreparedChannel) => OfChannel,
): Step[] {
  const total = lines.reduce((sum, { prepared }) => sum + prepared.weight, 0n);
  const parts = lines.map(({ prepared, share }) => {
    const { start, perKit, label } = of(prepared);
    const { channel } = prepared;
    const shown = amount(nearest(times(share, perKit)));
    const steps = [
      ...start,
      step("×", `Share of ${channel.name}`, count(channel.weight, "shares"), "10", {
        source: from("price", channel.id),
      }),
      step("÷", "All shares", count(total.toString(), "shares"), "10"),
      step("=", label, shown, "10"),
    ];
    return { steps, part: step("+", label, shown, "10") };
  });
  return [...parts.flatMap(({ steps }) => steps), ...summed(parts.map(({ part }) => part))];
}
