import { type Sheet, treeOf } from "#src/costing/working-lines.ts";
import type { FigureId, WorkingTree } from "#src/costing/working-tree.ts";
import type { Aim } from "./aims.ts";
import type { Scope } from "./edition-sale.ts";
import type { PreparedChannel } from "./prepared-channel.ts";
import { sells } from "./prepared-channel.ts";
import type { PriceContext } from "./price-context.ts";
import type { PriceEnding } from "./price-ending.ts";
import { CHANNEL_FIGURES, EDITION_FIGURES, type PriceFigureId } from "./price-figures.ts";
import { aimSheet } from "./working-aim.ts";
import {
  kitBringsSheet,
  kitKeptSheet,
  kitLeftSheet,
  kitMarginSheet,
  kitMarkUpSheet,
  kitNextSheet,
} from "./working-kit.ts";
import { kitHourSheet } from "./working-kit-hour.ts";
import { orderSheet } from "./working-order.ts";
import { orderHourSheet, orderLeftSheet } from "./working-order-left.ts";

type OfChannel = (context: PriceContext, prepared: PreparedChannel, edition: string) => Sheet | null;
type OfEdition = (context: PriceContext, edition: string) => Sheet;

const OF_CHANNEL: Record<(typeof CHANNEL_FIGURES)[number], OfChannel> = {
  order: orderSheet,
  "order-left": orderLeftSheet,
  "order-hour": orderHourSheet,
};

const OF_EDITION: Record<(typeof EDITION_FIGURES)[number], OfEdition> = {
  "kit-kept": kitKeptSheet,
  "kit-brings": kitBringsSheet,
  "kit-left": kitLeftSheet,
  "kit-hour": kitHourSheet,
  "kit-margin": kitMarginSheet,
  "kit-mark-up": kitMarkUpSheet,
  "kit-next": kitNextSheet,
};

/**
 * How a figure of pricing comes about (section 14), read from what the figure itself was reckoned with.
 * Null: no such figure, as of a channel that does not sell the edition.
 *
 * @example priceWorking(context, "order:site:full")?.lines.at(-1)?.label === "Comes in"
 */
export function priceWorking(context: PriceContext, figure: PriceFigureId): WorkingTree | null {
  const sheet = sheetOf(context, figure);
  return sheet === null ? null : paper(context, figure, sheet);
}

/** How the least price for an aim comes about; null where there is none. */
export function aimWorking(
  context: PriceContext,
  scope: Scope,
  aim: Aim,
  ending: PriceEnding = "none",
): WorkingTree | null {
  const sheet = aimSheet(context, scope, aim, ending);
  return sheet === null ? null : paper(context, `aim:${aim.aim}`, sheet);
}

/** Every figure of pricing that opens, in reading order. */
export function priceFiguresOf({ channels, plan }: PriceContext): PriceFigureId[] {
  return plan.editions.flatMap(({ id }) => [
    ...channels
      .filter((prepared) => sells(prepared, id))
      .flatMap(({ channel }) => CHANNEL_FIGURES.map((name): PriceFigureId => `${name}:${channel.id}:${id}`)),
    ...EDITION_FIGURES.map((name): PriceFigureId => `${name}:${id}`),
  ]);
}

function sheetOf(context: PriceContext, figure: PriceFigureId): Sheet | null {
  const colon = figure.indexOf(":");
  const [name, ids] = [figure.slice(0, colon), figure.slice(colon + 1)];
  const { editions } = context.plan;
  if (name in OF_EDITION) {
    const known = editions.some(({ id }) => id === ids);
    return known ? OF_EDITION[name as keyof typeof OF_EDITION](context, ids) : null;
  }
  if (!(name in OF_CHANNEL)) return null;
  for (const prepared of context.channels) {
    const edition = editions.find(({ id }) => `${prepared.channel.id}:${id}` === ids);
    if (edition) return OF_CHANNEL[name as keyof typeof OF_CHANNEL](context, prepared, edition.id);
  }
  return null;
}

function paper({ cost, plan }: PriceContext, figure: FigureId, sheet: Sheet): WorkingTree {
  const { currency, revision } = plan;
  return treeOf(figure, sheet, { currency, kits: cost.kits, revision, pricedOn: null });
}
