import { moneyText, rateText } from "#src/components/amount-text.ts";
import { grains, grainText } from "#src/costing/grains.ts";
import type { ChannelOrder } from "#src/costing/price/channel-table.ts";
import type { FigureId } from "#src/costing/working-tree.ts";
import type { PlanChannel } from "#src/shapes/plan.ts";
import { minutesOf, moneyOf, offText } from "./price-words.ts";

/** Which terms of a channel a row rests on; they stand in its cell while the channel is being changed. */
export type RowTerms = "price" | "postage" | "tax" | "fee" | "sending" | "other" | "minutes";

export interface ChannelRow {
  key: string;
  label: string;
  terms?: RowTerms;
  /** Sums are bold below a line; the last is the answer. */
  weight?: "sum" | "result" | "strong";
  text: (one: ChannelOrder, currency: string) => string;
  opens?: (one: ChannelOrder, edition: string) => FigureId;
  /** Whether the figure is known, for what opens. */
  known?: (one: ChannelOrder) => boolean;
}

function sendingText({ postagePaid, packing }: ChannelOrder, currency: string): string {
  if (!postagePaid.known) return offText(postagePaid, currency);
  if (!packing.known) return offText(packing, currency);
  const both = grainText(grains(postagePaid.value) + grains(packing.value));
  return offText({ known: true, value: both }, currency);
}

const plain =
  (name: "priceAsked" | "charged" | "comesIn") =>
  (one: ChannelOrder, currency: string): string =>
    moneyOf(one[name], currency);

const off =
  (name: "taxInside" | "fee" | "other" | "cost" | "timeCost") =>
  (one: ChannelOrder, currency: string): string =>
    offText(one[name], currency);

/** What a row is called: with the one rate that all share, or what the one other cost is. */
export function rowLabel({ key, label }: ChannelRow, channels: readonly PlanChannel[]): string {
  if (key === "tax") {
    const rates = new Set(channels.map(({ taxRate }) => taxRate));
    const [rate = null] = rates;
    return rates.size === 1 && rate !== null ? `${label}, ${rateText(rate)}` : label;
  }
  if (key !== "other") return label;
  const names = new Set(
    channels.flatMap(({ other }) => (/[1-9]/.test(other.amount ?? "1") ? [other.name] : [])),
  );
  const [name = ""] = names;
  return names.size === 1 && name !== "" ? name : label;
}

/** The rows of the channel table, from what is asked to what an hour earns. */
export const CHANNEL_ROWS: readonly ChannelRow[] = [
  { key: "price", label: "Price asked", terms: "price", text: plain("priceAsked") },
  {
    key: "postage",
    label: "Postage the buyer pays",
    terms: "postage",
    text: ({ postageCharged }, currency) =>
      postageCharged.known && Number(postageCharged.value) === 0 ? "–" : moneyOf(postageCharged, currency),
  },
  { key: "charged", label: "Buyer pays", weight: "sum", text: plain("charged") },
  { key: "tax", label: "Tax inside", terms: "tax", text: off("taxInside") },
  { key: "fee", label: "Fees of the channel", terms: "fee", text: off("fee") },
  { key: "sending", label: "Postage and packing", terms: "sending", text: sendingText },
  { key: "other", label: "Other costs of selling", terms: "other", text: off("other") },
  {
    key: "in",
    label: "Comes in",
    weight: "sum",
    text: plain("comesIn"),
    opens: ({ channel }, edition) => `order:${channel}:${edition}`,
    known: ({ comesIn }) => comesIn.known,
  },
  { key: "cost", label: "Cost of the kit", text: off("cost") },
  { key: "time", label: "Your time to sell it", terms: "minutes", text: off("timeCost") },
  {
    key: "left",
    label: "Left for you",
    weight: "result",
    text: ({ left }, currency) => moneyOf(left, currency),
    opens: ({ channel }, edition) => `order-left:${channel}:${edition}`,
    known: ({ left }) => left.known,
  },
  { key: "minutes", label: "Your time in all", text: ({ minutes }) => minutesOf(minutes) },
  {
    key: "hour",
    weight: "strong",
    label: "Earned in an hour",
    text: ({ perHour }, currency) =>
      perHour.known ? moneyText(perHour.value, currency) : moneyOf(perHour, currency),
    opens: ({ channel }, edition) => `order-hour:${channel}:${edition}`,
    known: ({ perHour }) => perHour.known,
  },
];
