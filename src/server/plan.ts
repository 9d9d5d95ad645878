import type { Db } from "#db/client.ts";
import { groupBy } from "#db/group-by.ts";
import type { Plan, PlanBoardQuote, PlanOffer, PlanPart, PlanSupplier } from "#src/shapes/plan.ts";
import { revisionLetter } from "#src/shapes/revision-letter.ts";
import { kitBoard } from "./kit-board.ts";
import { coreTerms } from "./panel-faults.ts";
import { planChannel } from "./plan-channel.ts";
import { boardQuotesOf, type QuoteWithBreaks } from "./store/board-quote.ts";
import { channelsOf } from "./store/channel.ts";
import { type CurrencyRateRow, currencyRatesOf } from "./store/currency-rate.ts";
import { editionsOf } from "./store/edition.ts";
import type { KitRow } from "./store/kit.ts";
import { type LineQuantityRow, type LineRow, lineQuantitiesOf, linesOf } from "./store/line.ts";
import type { WorkshopRow } from "./store/membership.ts";
import { type OfferWithBreaks, offersForKit } from "./store/offer.ts";
import { panelTermsOf } from "./store/panel-terms.ts";
import { type PartChoiceRow, type PartRow, partChoicesOf, partsUsedElsewhere } from "./store/part.ts";
import { chargesOf, packingItemsOf, type RunPlanRow, runPlanOf, tasksOf } from "./store/run-plan.ts";
import { type SupplierRow, shutOutOf, suppliersOf } from "./store/supplier.ts";

/** Lines that are bought: an option counts where an edition has a quantity of it. */
const BOUGHT: readonly LineRow["mark"][] = ["in-kit", "option"];

function planOffer({ offer, breaks }: OfferWithBreaks): PlanOffer {
  return {
    id: offer.id,
    supplier: offer.supplierId,
    orderCode: offer.orderCode,
    currency: offer.currency,
    priceModel: offer.priceModel,
    breaks,
    minimumOrder: offer.minimumOrder,
    orderMultiple: offer.orderMultiple,
    stockShown: offer.stockShown,
    leadTimeDays: offer.leadTimeDays,
    pricedOn: offer.pricedOn,
    validUntil: offer.validUntil,
  };
}

function freight(row: SupplierRow): PlanSupplier["freight"] {
  if (row.freightTerm === "none") return { model: "none" };
  if (row.freightTerm === "flat" && row.freightAmount !== null)
    return { model: "flat", amount: row.freightAmount };
  return { model: "not-known" };
}

function belowMinimum(row: SupplierRow): PlanSupplier["belowMinimum"] {
  if (row.smallOrderTerm === "fee" && row.smallOrderFee !== null)
    return { term: "fee", fee: row.smallOrderFee };
  return row.smallOrderTerm === "refused" ? { term: "refused" } : { term: "none" };
}

function planSupplier(row: SupplierRow): PlanSupplier {
  return {
    id: row.id,
    name: row.name,
    currency: row.currency,
    freight: freight(row),
    freeFreightFrom: row.freeFreightFrom,
    handlingFee: row.handlingFee,
    minimumOrderValue: row.minimumOrderValue,
    belowMinimum: belowMinimum(row),
    leadTimeDays: row.leadTimeDays,
  };
}

function sizeOf(width: string | null, height: string | null): PlanBoardQuote["pieceSize"] {
  return width === null || height === null ? null : { width, height };
}

function formulaOf({
  priceModel,
  setUp,
  areaRate,
  areaUnit,
  perBoard,
}: QuoteWithBreaks["quote"]): PlanBoardQuote["formula"] {
  if (priceModel !== "formula") return null;
  if (setUp === null || areaRate === null || areaUnit === null || perBoard === null) return null;
  return { setUp, areaRate, areaUnit, perBoard };
}

function planQuote({ quote, breaks }: QuoteWithBreaks): PlanBoardQuote {
  return {
    id: quote.id,
    boardHouse: quote.boardHouse,
    currency: quote.currency,
    boardsPerPanel: quote.boardsPerPanel,
    pieceSize:
      quote.boardsPerPanel === null
        ? sizeOf(quote.width, quote.height)
        : sizeOf(quote.panelWidth, quote.panelHeight),
    priceModel: quote.priceModel,
    breaks,
    formula: formulaOf(quote),
    depanelling: quote.depanelling,
    engineeringCharge: quote.engineeringCharge,
    stencilCharge: quote.stencilCharge,
    freight: quote.freight,
    leadTimeDays: quote.leadTimeDays,
    pricedOn: quote.pricedOn,
    validUntil: quote.validUntil,
  };
}

/** A part with everything that says how this kit uses and buys it. */
interface PartUse {
  part: PartRow;
  lines: LineRow[];
  choice: PartChoiceRow | undefined;
  offers: OfferWithBreaks[];
  usedElsewhere: boolean;
}

function quantities(use: PartUse, perLine: Map<string, LineQuantityRow[]>): PlanPart["quantities"] {
  const perEdition = new Map<string, number>();
  for (const line of use.lines)
    for (const row of perLine.get(line.id) ?? [])
      perEdition.set(row.editionId, (perEdition.get(row.editionId) ?? 0) + row.perKit);
  return [...perEdition].map(([edition, perKit]) => ({ edition, perKit }));
}

function planPart(use: PartUse, run: RunPlanRow, perLine: Map<string, LineQuantityRow[]>): PlanPart {
  const { part, choice } = use;
  return {
    id: part.id,
    name: part.name,
    designators: use.lines
      .map((line) => line.designators)
      .filter(Boolean)
      .join(", "),
    quantities: quantities(use, perLine),
    spareRate: choice?.spareRate ?? run.spareRate,
    leastSpare: choice?.leastSpare ?? 0,
    freeStock: { quantity: part.freeStock, bookCost: part.stockCost },
    // What is left over is worth nothing unless another kit of the workshop can use it up.
    keepShare: choice?.keepShare ?? (use.usedElsewhere ? "1" : "0"),
    onlyFromStock: choice?.onlyFromStock ?? false,
    pinnedOffer: choice?.pinnedOfferId ?? null,
    offers: use.offers.map(planOffer),
  };
}

/** The kit's list as the plan has it: how many lines there are, and the parts that are bought. */
function planList(db: Db, workshopId: string, kitId: string, run: RunPlanRow): Pick<Plan, "lines" | "parts"> {
  const perLine = groupBy(lineQuantitiesOf(db, kitId), (row) => row.lineId);
  const choices = new Map(partChoicesOf(db, kitId).map((row) => [row.partId, row]));
  const offers = groupBy(offersForKit(db, kitId), ({ offer }) => offer.partId);
  const elsewhere = partsUsedElsewhere(db, workshopId, kitId);
  const lines = linesOf(db, kitId);
  const bought = lines.filter(({ line }) => BOUGHT.includes(line.mark));
  const parts = [...groupBy(bought, ({ part }) => part.id).values()].map((group) => {
    const part = (group[0] as { part: PartRow }).part;
    const use = {
      part,
      lines: group.map(({ line }) => line),
      choice: choices.get(part.id),
      offers: offers.get(part.id) ?? [],
      usedElsewhere: elsewhere.has(part.id),
    };
    return planPart(use, run, perLine);
  });
  return { lines: lines.length, parts };
}

/** The rate of each currency that holds on a day: the newest that is not later. */
function ratesOn(day: string, rows: readonly CurrencyRateRow[]): Plan["rates"] {
  const holding = groupBy(
    rows.filter(({ dated }) => dated <= day),
    ({ currency }) => currency,
  );
  return [...holding.values()].flatMap(([newest]) => {
    if (newest === undefined) return [];
    const { currency, perForeignUnit, dated } = newest;
    return [{ currency, perForeignUnit, dated }];
  });
}

/**
 * Gathers all that the reckoning needs for one kit, as it stands. Reads only; the arithmetic is the costing
 * core's. `asOf` is the day on which offers must be valid, ISO 8601.
 */
export function planOf(db: Db, workshop: WorkshopRow, kit: KitRow, asOf: string): Plan {
  const run = runPlanOf(db, kit.id);
  return {
    format: "tinpenny-plan/2",
    kit: kit.name,
    revision: revisionLetter(kit.revision),
    currency: workshop.currency,
    rates: ratesOn(asOf, currencyRatesOf(db, workshop.id)),
    asOf,
    run: { kits: run.kits, sweepTo: run.sweepTo },
    editions: editionsOf(db, kit.id).map(({ id, name, weight, boardsPerKit, price }) => ({
      id,
      name,
      weight,
      boardsPerKit,
      price,
    })),
    ...planList(db, workshop.id, kit.id, run),
    suppliers: suppliersOf(db, workshop.id).map(planSupplier),
    shutOutSuppliers: shutOutOf(db, kit.id),
    boards: {
      needed: kit.boardNeeded,
      size: kitBoard(kit),
      panelTerms: panelTermsOf(db, kit.id).map((row) => ({ boardHouse: row.boardHouse, ...coreTerms(row) })),
      yield: run.boardYield,
      confidence: run.boardConfidence,
      quotes: boardQuotesOf(db, kit.id).map(planQuote),
      chosenQuote: run.chosenQuoteId,
    },
    work: {
      ratePerHour: workshop.ratePerHour,
      learningSlope: run.learningSlope,
      kitsMadeBefore: run.kitsMadeBefore,
      tasks: tasksOf(db, kit.id).map(({ id, name, editions, minutesPerKit, setUpMinutes }) => ({
        id,
        name,
        editions,
        minutesPerKit,
        setUpMinutes,
      })),
    },
    packing: packingItemsOf(db, kit.id).map(({ id, name, editions, costPerKit }) => ({
      id,
      name,
      editions,
      costPerKit,
    })),
    charges: chargesOf(db, kit.id).map(({ id, name, amount, spreadOver }) => ({
      id,
      name,
      amount,
      spreadOver,
    })),
    replacements: { share: run.replacementShare, costEach: run.replacementCost },
    channels: channelsOf(db, kit.id).map(planChannel),
  };
}
