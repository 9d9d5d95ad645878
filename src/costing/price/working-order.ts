import { scaledText } from "#src/costing/grains.ts";
import { minorDecimals } from "#src/costing/money.ts";
import type { Need } from "#src/costing/problem.ts";
import {
  from,
  money,
  notKnown,
  number,
  rate,
  type Sheet,
  type Step,
  step,
} from "#src/costing/working-lines.ts";
import type { WorkingAmount } from "#src/costing/working-tree.ts";
import { type ChannelOrder, channelTable } from "./channel-table.ts";
import { MILLION } from "./charged.ts";
import { type Order, orderOf } from "./order.ts";
import type { PreparedChannel } from "./prepared-channel.ts";
import type { PriceContext } from "./price-context.ts";
import { priceNow } from "./sold-kit.ts";

/** An amount, or what it needs. */
export function unlessNeeds(needs: Need[], amount: WorkingAmount): WorkingAmount {
  return needs.length > 0 ? notKnown(needs) : amount;
}

/** Kits in one order as a step, where it is not one. */
export function kitsStep(sign: "×" | "÷", { kitsPerOrder, channel }: PreparedChannel): Step[] {
  if (kitsPerOrder.top === kitsPerOrder.bottom) return [];
  const source = from("price", channel.id);
  return [step(sign, "Kits in an order", number(channel.kitsPerOrder, "kits"), "10", { source })];
}

/** What the steps of one order are written from. */
interface OrderPage {
  context: PriceContext;
  prepared: PreparedChannel;
  edition: string;
  line: ChannelOrder;
  order: Order;
  cash: (amount: Parameters<typeof money>[0]) => WorkingAmount;
  rounds: number;
  source: ReturnType<typeof from>;
  pays: string;
}

/** What comes in from one order of an edition in a channel (section 10). */
export function orderSheet(context: PriceContext, prepared: PreparedChannel, edition: string): Sheet | null {
  const { channel } = prepared;
  const line = channelTable(context, edition).find((one) => one.channel === channel.id);
  if (line === undefined) return null;
  const { currency } = context.plan;
  const asked = priceNow(context, { edition, channel: channel.id }) ?? 0n;
  const page: OrderPage = {
    context,
    prepared,
    edition,
    line,
    order: orderOf(prepared, asked, context.unit),
    cash: (amount) => money(amount, currency),
    rounds: minorDecimals(currency),
    source: from("price", channel.id),
    pays: prepared.taxOnTop ? "The buyer pays, without tax" : "The buyer pays",
  };
  return {
    title: `What comes in from one order: ${channel.name}`,
    steps: [askedSteps, chargedSteps, taxSteps, feeBaseSteps, feeSteps, otherSteps, keptSteps].flatMap(
      (steps) => steps(page),
    ),
    notes: ["Tax and fee are each rounded once, to the minor unit, halves up, as they are charged."],
    basis: `In ${currency}`,
  };
}

/** How a price that follows the list comes about; nothing to say of one that stands as it is. */
function askedSteps({ context, prepared, edition, line, cash, rounds, source }: OrderPage): Step[] {
  const { ofListPrice, taxOnTop, ownPrices } = prepared;
  if (ownPrices.has(edition) || (ofListPrice === MILLION && !taxOnTop)) return [];
  const listPrice = priceNow(context, { edition, channel: null });
  const list = listPrice === null ? cash(line.priceAsked) : cash(listPrice);
  const left = rate(scaledText(ofListPrice, 6));
  return [
    step(null, "List price", list, "10", { source: from("price", edition) }),
    step("×", "What the discount leaves", left, "10", { source }),
    ...(taxOnTop ? [step("÷" as const, "One and the tax rate", onePlusTax(prepared), "10", { source })] : []),
    step("=", "Price asked", cash(line.priceAsked), "1.3", { rounds }),
  ];
}

function chargedSteps({ prepared, line, cash, source, pays }: OrderPage): Step[] {
  return [
    step(null, "Price asked", cash(line.priceAsked), "10", { source }),
    ...kitsStep("×", prepared),
    step("+", "Postage charged", cash(line.postageCharged), "10", { source }),
    step("=", pays, cash(line.charged), "10"),
  ];
}

function taxSteps({ prepared, line, cash, rounds, pays }: OrderPage): Step[] {
  if (prepared.taxOnTop) return [];
  return [
    step(null, pays, cash(line.charged), "10"),
    ...taxOf(prepared),
    step("=", "Tax inside", cash(line.taxInside), "1.3", { rounds }),
  ];
}

/** `× t ÷ (1 + t)`, or `× t` where the tax comes on top. */
function taxOf(prepared: PreparedChannel): Step[] {
  const { taxRate, taxOnTop, channel, needs } = prepared;
  const shown = unlessNeeds(needs.tax, rate(scaledText(taxRate, 6)));
  const times = step("×", "Tax rate", shown, "10", { source: from("price", channel.id) });
  return taxOnTop ? [times] : [times, step("÷", "One and the tax rate", onePlusTax(prepared), "10")];
}

/** One and the tax rate, or what it needs. */
export function onePlusTax({ taxRate, needs }: PreparedChannel): WorkingAmount {
  return unlessNeeds(needs.tax, rate(scaledText(MILLION + taxRate, 6)));
}

/** The tax that goes off or onto what the fee is taken on. */
function feeBaseSteps({ prepared, line, order, cash, rounds, pays }: OrderPage): Step[] {
  const { channel, taxOnTop } = prepared;
  if (channel.feeOnTax !== taxOnTop) return [];
  const [sum, name] = channel.feeOnPostage ? [line.charged, pays] : [line.goods, "Goods of the order"];
  const base = channel.feeOnPostage ? order.charged : order.goods;
  const moved = order.feeBase - base;
  const taxed = line.fee.known ? [] : line.fee.needs;
  const tax = unlessNeeds(taxed, cash(moved < 0n ? -moved : moved));
  return [
    step(null, name, cash(sum), "10"),
    ...taxOf(prepared),
    step("=", "Tax that belongs to it", tax, "1.3", { rounds }),
    step(null, name, cash(sum), "10"),
    step(taxOnTop ? "+" : "−", "Tax that belongs to it", tax, "10"),
    step("=", "The fee is taken on", unlessNeeds(taxed, cash(order.feeBase)), "10"),
  ];
}

function feeSteps({ prepared, line, order, cash, rounds, source }: OrderPage): Step[] {
  const { feeRate, channel } = prepared;
  const needs = line.fee.known ? [] : line.fee.needs;
  const share = channel.feeRate === null ? notKnown(needs) : rate(scaledText(feeRate, 6));
  const fixed = channel.feeFixed === null ? notKnown(needs) : cash(channel.feeFixed);
  return [
    step(null, "The fee is taken on", unlessNeeds(needs, cash(order.feeBase)), "10"),
    step("×", "Fee rate", share, "10", { source }),
    step("+", "Fee per order", fixed, "10", { source }),
    step("=", "Fee", cash(line.fee), "1.3", { rounds }),
  ];
}

/** A cost that several orders share. */
function otherSteps({ prepared, line, cash, source }: OrderPage): Step[] {
  const { name, amount, sharedOver } = prepared.channel.other;
  if (sharedOver === 1 || amount === "0") return [];
  const orders = number(sharedOver.toString(), "orders");
  return [
    step(null, name, amount === null ? cash(line.other) : cash(amount), "10", { source }),
    step("÷", "Orders that share it", orders, "10", { source }),
    step("=", `${name}, of one order`, cash(line.other), "10"),
  ];
}

function keptSteps({ prepared, line, cash, source, pays }: OrderPage): Step[] {
  const off = (label: string, amount: ChannelOrder["other"]) =>
    amount.known && amount.value === "0" ? [] : [step("−" as const, label, cash(amount), "10", { source })];
  return [
    step(null, pays, cash(line.charged), "10"),
    ...(prepared.taxOnTop ? [] : [step("−" as const, "Tax inside", cash(line.taxInside), "10")]),
    step("−", "Fee", cash(line.fee), "10"),
    ...off("Postage paid", line.postagePaid),
    ...off("Packing of the order", line.packing),
    ...off(prepared.channel.other.name, line.other),
    step("=", "Comes in", cash(line.comesIn), "10", { result: true }),
  ];
}
