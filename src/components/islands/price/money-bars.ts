import type { Figure } from "#src/costing/figure.ts";
import type { ChannelOrder } from "#src/costing/price/channel-table.ts";
import { perKit } from "./per-kit.ts";

/** Where the buyer's money goes, in the order in which it is drawn. */
export const SEGMENTS = ["tax", "fees", "selling", "cost", "time", "left"] as const;
export type Segment = (typeof SEGMENTS)[number];

export interface BarPart {
  segment: Segment;
  /** Of one kit, exact decimal text. */
  money: string;
  /** In hundredths of the longest bar. */
  width: number;
}

export interface MoneyBar {
  channel: string;
  name: string;
  /** Null: something of it is not known. */
  parts: BarPart[] | null;
  /** What one kit loses, exact; null where it leaves something. */
  lost: string | null;
}

/** Figures of one order as one amount of one kit; null where one of them is not known. */
function ofOneKit(figures: readonly Figure[], kits: string): string | null {
  const amounts = figures.flatMap((figure) => (figure.known ? [figure.value] : []));
  return amounts.length < figures.length ? null : perKit(amounts, kits);
}

function shares(order: ChannelOrder): [Segment, string | null][] {
  const { taxInside, fee, postagePaid, packing, other, cost, timeCost, left, kitsPerOrder } = order;
  const of = (...figures: Figure[]) => ofOneKit(figures, kitsPerOrder);
  return [
    ["tax", of(taxInside)],
    ["fees", of(fee)],
    ["selling", of(postagePaid, packing, other)],
    ["cost", of(cost)],
    ["time", of(timeCost)],
    ["left", of(left)],
  ];
}

/** Pixels only: nothing is drawn of what is lost. */
function drawn(money: string | null): number {
  return Math.max(0, Number(money ?? "0"));
}

/** What becomes of one kit's money in every channel, all to one scale. */
export function moneyBars(orders: readonly ChannelOrder[]): MoneyBar[] {
  const rows = orders.map((order) => ({ order, all: shares(order) }));
  const longest = Math.max(
    0.01,
    ...rows.map(({ all }) => all.reduce((sum, [, money]) => sum + drawn(money), 0)),
  );
  return rows.map(({ order: { channel, name }, all }) => {
    const parts = all.flatMap(([segment, money]): BarPart[] =>
      money === null || drawn(money) === 0 ? [] : [{ segment, money, width: (drawn(money) / longest) * 100 }],
    );
    const left = all.at(-1)?.[1] ?? null;
    return {
      channel,
      name,
      parts: all.some(([, money]) => money === null) ? null : parts,
      lost: left?.startsWith("-") ? left.slice(1) : null,
    };
  });
}
