import type { Plan } from "#src/shapes/plan.ts";
import { runResult } from "./cost-run.ts";
import { panelOfQuote } from "./panels/panel-of-quote.ts";
import { preparePlan } from "./prepare-plan.ts";
import type { PreparedPlan } from "./prepared-plan.ts";
import { type PriceContext, priceContext } from "./price/price-context.ts";
import { isPriceFigure } from "./price/price-figures.ts";
import { priceFiguresOf, priceWorking } from "./price/price-working.ts";
import { reckonRun } from "./reckon-run.ts";
import { HEADS, type HeadId, type RunResult } from "./run-result.ts";
import { createSheet, type RunSheet } from "./run-sheet.ts";
import { basketSheet } from "./working-basket.ts";
import { boardsToOrderSheet } from "./working-boards.ts";
import { editionSheet } from "./working-edition.ts";
import { crossingSheet, evenAfterSheet, firstOrSafeSheet, nextKitSheet } from "./working-even.ts";
import { headSheet, taskSheet } from "./working-head.ts";
import { type Sheet, treeOf } from "./working-lines.ts";
import { offerSheet } from "./working-offer.ts";
import { partSheet } from "./working-part.ts";
import { quotedPanelSheet, quoteSheet } from "./working-quote.ts";
import { leftOverSheet, perKitSheet, spentSheet, usedSheet } from "./working-run.ts";
import { bringsPerKitSheet, bringsSheet, earnsSheet, perHourSheet, profitSheet } from "./working-takings.ts";
import type { FigureId, WorkingTree } from "./working-tree.ts";

/** One run reckoned, as every working reads it: the sheet the figures come from, and the result. */
export interface WorkingContext {
  prepared: PreparedPlan;
  sheet: RunSheet;
  result: RunResult;
  /** The run made ready for pricing, when a figure of it is first asked for. */
  pricing: () => PriceContext;
}

/** Figures that need no more than their name. */
const PLAIN: Partial<Record<FigureId, (context: WorkingContext) => Sheet>> = {
  spent: spentSheet,
  used: usedSheet,
  "per-kit-spent": (context) => perKitSheet(context, "spent"),
  "per-kit-used": (context) => perKitSheet(context, "used"),
  brings: bringsSheet,
  "brings-per-kit": bringsPerKitSheet,
  profit: profitSheet,
  "earns-per-kit": earnsSheet,
  "earned-per-hour": perHourSheet,
  "even-after": evenAfterSheet,
  "first-even": (context) => firstOrSafeSheet(context, "first"),
  "safe-even": (context) => firstOrSafeSheet(context, "safe"),
  "next-kit": nextKitSheet,
  "boards-to-order": boardsToOrderSheet,
  "left-over": leftOverSheet,
};

/** Figures of one thing: `part:led` is the thing's kind and its id. */
const OF_A_THING: Record<string, (context: WorkingContext, id: string) => Sheet | null> = {
  head: (context, id) => (HEADS.some((head) => head === id) ? headSheet(context, id as HeadId) : null),
  part: partSheet,
  offer: offerSheet,
  basket: basketSheet,
  quote: quoteSheet,
  panel: quotedPanelSheet,
  task: taskSheet,
  edition: editionSheet,
  crossing: (context, id) =>
    /^[1-9]\d{0,3}$/.test(id) ? crossingSheet(context, Number(id), `Break-even at a run of ${id}`) : null,
};

/**
 * How a figure comes about (section 14): its steps with inputs, rule and result, enough to redo it by
 * hand, read from the sheet the figure itself was reckoned on. Lines open further figures.
 * `kits` as in `costRun`. `null`: no such figure, for instance the basket of a supplier not used.
 *
 * @example working(plan, 120, "per-kit-used")?.lines.at(-1) → { letter: "h", label: "Cost per kit", sign: "=", … }
 */
export function working(plan: Plan, kits: number, figure: FigureId): WorkingTree | null {
  return workingOf(reckoned(plan, kits), figure);
}

/** A run reckoned once, for opening several of its figures with `workingOf`. */
export function reckoned(plan: Plan, kits: number = plan.run.kits): WorkingContext {
  const prepared = preparePlan(plan, kits);
  const sheet = createSheet(prepared);
  reckonRun(prepared, kits, sheet);
  let priced: PriceContext | undefined;
  const pricing = () => {
    priced ??= priceContext(plan, kits);
    return priced;
  };
  return { prepared, sheet, result: runResult(prepared, sheet), pricing };
}

/** One figure of a run already reckoned; `null` as in `working`. */
export function workingOf(context: WorkingContext, figure: FigureId): WorkingTree | null {
  if (isPriceFigure(figure)) return priceWorking(context.pricing(), figure);
  const colon = figure.indexOf(":");
  const sheet =
    colon < 0
      ? PLAIN[figure]?.(context)
      : OF_A_THING[figure.slice(0, colon)]?.(context, figure.slice(colon + 1));
  if (!sheet) return null;
  const { currency, kits, revision } = context.result;
  return treeOf(figure, sheet, { currency, kits, revision, pricedOn: newestPrice(context) });
}

/** The newest date of a price that this run uses. */
function newestPrice({ prepared, result }: WorkingContext): string | null {
  const used = new Set(result.parts.flatMap(({ id, orders }) => orders.map(({ offer }) => `${id}:${offer}`)));
  const offers = prepared.plan.parts.flatMap(({ id, offers }) =>
    offers.filter((offer) => used.has(`${id}:${offer.id}`)).map(({ pricedOn }) => pricedOn),
  );
  const quotes = prepared.plan.boards.quotes
    .filter(({ id }) => id === result.boards.chosen)
    .map(({ pricedOn }) => pricedOn);
  return [...offers, ...quotes].reduce(
    (newest, day) => (day !== null && (newest === null || day > newest) ? day : newest),
    null,
  );
}

/** Every figure of a run that opens, in reading order: what the endpoint's full working lists. */
export function figuresOf(context: WorkingContext): FigureId[] {
  const { result, pricing } = context;
  return [
    ...(Object.keys(PLAIN) as FigureId[]),
    ...HEADS.map((id): FigureId => `head:${id}`),
    ...result.parts.flatMap(({ id, considered }): FigureId[] => [
      `part:${id}`,
      ...considered.flatMap(({ offer, extended }): FigureId[] =>
        extended === null ? [] : [`offer:${id}:${offer}`],
      ),
    ]),
    ...result.baskets.map(({ supplier }): FigureId => `basket:${supplier}`),
    ...result.boards.quotes.map(({ id }): FigureId => `quote:${id}`),
    ...result.boards.quotes
      .filter(({ id }) => panelOfQuote(context.prepared.plan, id) !== null)
      .map(({ id }): FigureId => `panel:${id}`),
    ...result.work.tasks.map(({ id }): FigureId => `task:${id}`),
    ...result.editions.flatMap(({ id }): FigureId[] => [`edition:${id}`]),
    ...priceFiguresOf(pricing()),
  ];
}
