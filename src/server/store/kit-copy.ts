import { eq } from "drizzle-orm";
import type { Db } from "#db/client.ts";
import { boardQuoteBreaks, boardQuotes, panelTerms } from "#db/schema/boards.ts";
import { editions } from "#db/schema/kits.ts";
import { lineQuantities, lines, partChoices } from "#db/schema/parts.ts";
import { charges, packingItems, runPlans, tasks } from "#db/schema/runs.ts";
import { shutOutSuppliers } from "#db/schema/supply.ts";
import { boardQuotesOf } from "./board-quote.ts";
import { addChannel, channelsOf } from "./channel.ts";
import { editionsOf } from "./edition.ts";
import { inChunks } from "./in-chunks.ts";
import { lineQuantitiesOf, linesOf } from "./line.ts";
import { panelTermsOf } from "./panel-terms.ts";
import { partChoicesOf } from "./part.ts";
import { chargesOf, packingItemsOf, runPlanOf, tasksOf } from "./run-plan.ts";

interface Copying {
  from: string;
  to: string;
  /** The new id of a copied row: always the same for the same old one. */
  idFor(old: string): string;
}

function copyList(db: Db, { from, to, idFor }: Copying): void {
  for (const row of editionsOf(db, from))
    db.insert(editions)
      .values({ ...row, id: idFor(row.id), kitId: to, version: 1 })
      .run();
  const copies = linesOf(db, from).map(({ line }) => ({
    ...line,
    id: idFor(line.id),
    kitId: to,
    version: 1,
  }));
  for (const chunk of inChunks(copies)) db.insert(lines).values(chunk).run();
  const quantities = lineQuantitiesOf(db, from).map((row) => ({
    ...row,
    lineId: idFor(row.lineId),
    editionId: idFor(row.editionId),
  }));
  for (const chunk of inChunks(quantities)) db.insert(lineQuantities).values(chunk).run();
  const choices = partChoicesOf(db, from).map((row) => ({ ...row, kitId: to, version: 1 }));
  for (const chunk of inChunks(choices)) db.insert(partChoices).values(chunk).run();
}

function copyQuotes(db: Db, { from, to, idFor }: Copying): void {
  for (const { quote, breaks } of boardQuotesOf(db, from)) {
    const copy = { ...quote, id: idFor(quote.id), kitId: to, version: 1 };
    db.insert(boardQuotes).values(copy).run();
    for (const rung of breaks)
      db.insert(boardQuoteBreaks)
        .values({ ...rung, workshopId: quote.workshopId, quoteId: copy.id })
        .run();
  }
  for (const row of panelTermsOf(db, from))
    db.insert(panelTerms)
      .values({ ...row, id: idFor(row.id), kitId: to, version: 1 })
      .run();
}

function copyRun(db: Db, { from, to, idFor }: Copying): void {
  const run = runPlanOf(db, from);
  const chosenQuoteId = run.chosenQuoteId && idFor(run.chosenQuoteId);
  db.insert(runPlans)
    .values({ ...run, kitId: to, chosenQuoteId, version: 1 })
    .run();
  const own = { kitId: to, version: 1 };
  const inEditions = (row: { editions: string[] | null }) => row.editions?.map(idFor) ?? null;
  for (const row of tasksOf(db, from))
    db.insert(tasks)
      .values({ ...row, ...own, id: idFor(row.id), editions: inEditions(row) })
      .run();
  for (const row of packingItemsOf(db, from))
    db.insert(packingItems)
      .values({ ...row, ...own, id: idFor(row.id), editions: inEditions(row) })
      .run();
  for (const row of chargesOf(db, from))
    db.insert(charges)
      .values({ ...row, ...own, id: idFor(row.id) })
      .run();
  const shutOut = db.select().from(shutOutSuppliers).where(eq(shutOutSuppliers.kitId, from)).all();
  for (const row of shutOut)
    db.insert(shutOutSuppliers)
      .values({ ...row, kitId: to })
      .run();
}

function copyChannels(db: Db, { from, to, idFor }: Copying): void {
  for (const { channel, ownPrices } of channelsOf(db, from)) {
    const editions = channel.editions?.map(idFor) ?? null;
    const prices = ownPrices.map(({ edition, price }) => ({ edition: idFor(edition), price }));
    addChannel(db, { ...channel, id: idFor(channel.id), kitId: to, editions, version: 1 }, prices);
  }
}

/**
 * Copies everything that belongs to one kit into another of the same workshop, which has nothing yet: editions,
 * lines, choices, quotes, run, channels. Parts and offers are the workshop's and are shared; revisions, imports, guests and
 * history stay with the first.
 */
export function copyKitRows(db: Db, copying: Copying): void {
  copyList(db, copying);
  copyQuotes(db, copying);
  copyRun(db, copying);
  copyChannels(db, copying);
}
