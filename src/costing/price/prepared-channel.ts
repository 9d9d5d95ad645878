import { grains, scaled } from "#src/costing/grains.ts";
import type { Need, NeedCode } from "#src/costing/problem.ts";
import { need } from "#src/costing/run-needs.ts";
import type { PlanChannel } from "#src/shapes/plan.ts";
import { MILLION } from "./charged.ts";
import { type Fraction, fraction, reduced } from "./fraction.ts";

/** A channel with every text read once. Money in grains, rates in millionths; missing terms read as 0. */
export interface PreparedChannel {
  channel: PlanChannel;
  weight: bigint;
  taxRate: bigint;
  taxOnTop: boolean;
  feeRate: bigint;
  feeFixed: bigint;
  postageCharged: bigint;
  postagePaid: bigint;
  packing: bigint;
  /** Per order. */
  other: Fraction;
  /** Per order, in grains of a minute. */
  minutes: bigint;
  kitsPerOrder: Fraction;
  /** What is left of the list price, in millionths. */
  ofListPrice: bigint;
  ownPrices: ReadonlyMap<string, bigint>;
  needs: ChannelNeeds;
}

/** Terms of a channel that are not known, by the line of an order they are needed for. */
export interface ChannelNeeds {
  postage: Need[];
  tax: Need[];
  fee: Need[];
  postagePaid: Need[];
  packing: Need[];
  other: Need[];
  minutes: Need[];
}

/** Reads a channel's terms. */
export function prepareChannel(channel: PlanChannel): PreparedChannel {
  const { other } = channel;
  return {
    channel,
    weight: BigInt(channel.weight),
    taxRate: scaled(channel.taxRate ?? "0", 6),
    taxOnTop: channel.taxStated === "on-top",
    feeRate: scaled(channel.feeRate ?? "0", 6),
    feeFixed: grains(channel.feeFixed ?? "0"),
    postageCharged: grains(channel.postageCharged ?? "0"),
    postagePaid: grains(channel.postagePaid ?? "0"),
    packing: grains(channel.packingCost ?? "0"),
    other: reduced(fraction(grains(other.amount ?? "0"), BigInt(other.sharedOver))),
    minutes: grains(channel.minutesPerOrder ?? "0"),
    kitsPerOrder: reduced(fraction(scaled(channel.kitsPerOrder, 6), MILLION)),
    ofListPrice: MILLION - scaled(channel.discount, 6),
    ownPrices: new Map(channel.ownPrices.map(({ edition, price }) => [edition, grains(price)])),
    needs: channelNeeds(channel),
  };
}

function channelNeeds(channel: PlanChannel): ChannelNeeds {
  const unless = (value: string | null, code: NeedCode) =>
    value === null ? [need(code, [{ channel: channel.id }])] : [];
  const tax = unless(channel.taxRate, "no-tax-rate");
  const feeNeedsTax = channel.feeOnTax === (channel.taxStated === "on-top");
  return {
    postage: unless(channel.postageCharged, "no-postage-charged"),
    tax,
    fee: [
      ...unless(channel.feeRate, "no-fee-rate"),
      ...unless(channel.feeFixed, "no-fixed-fee"),
      ...(feeNeedsTax ? tax : []),
    ],
    postagePaid: unless(channel.postagePaid, "no-postage-paid"),
    packing: unless(channel.packingCost, "no-order-packing"),
    other: unless(channel.other.amount, "no-other-cost"),
    minutes: unless(channel.minutesPerOrder, "no-order-minutes"),
  };
}

/** Whether an edition is sold in a channel. */
export function sells({ channel }: PreparedChannel, edition: string): boolean {
  return channel.editions === null || channel.editions.includes(edition);
}
