import { boardQuoteBreaks, boardQuotes, panelTerms } from "#db/schema/boards.ts";
import { channelPrices, channels } from "#db/schema/channels.ts";
import { kitGuests } from "#db/schema/guests.ts";
import { editions, kits } from "#db/schema/kits.ts";
import { lineQuantities, lines, partChoices, parts } from "#db/schema/parts.ts";
import { users } from "#db/schema/people.ts";
import { charges, packingItems, runPlans, tasks } from "#db/schema/runs.ts";
import { currencyRates, offerBreaks, offers, suppliers } from "#db/schema/supply.ts";
import { memberships, workshops } from "#db/schema/workshops.ts";
import type { Db } from "../client.ts";
import { MARKS } from "./board-marks.ts";
import { KITS } from "./kits.ts";
import { PEOPLE, RATES, SUPPLIERS, WORKSHOP } from "./marsh-lane.ts";
import { loadNews } from "./news.ts";
import { PARTS } from "./parts.ts";
import type {
  SeedChannel,
  SeedKit,
  SeedOffer,
  SeedPanels,
  SeedPart,
  SeedQuote,
  SeedSupplier,
} from "./seed-data.ts";
import { seedId, WORKSHOP_ID } from "./seed-id.ts";

const DAY = 24 * 60 * 60 * 1000;
function dayFrom(now: number, days: number): string {
  return new Date(now + days * DAY).toISOString().slice(0, 10);
}

function ladder(text: string): { quantity: number; price: string }[] {
  return text
    .split(" ")
    .filter(Boolean)
    .map((rung) => {
      const [quantity = "", price = ""] = rung.split(":");
      return { quantity: Number(quantity), price };
    });
}

/** Password hash of each of the demonstration's people, by key. */
export type PasswordHashes = Record<string, string>;

function loadPeople(db: Db, hashes: PasswordHashes, now: number): void {
  for (const { key, name, email, role } of PEOPLE) {
    const id = seedId("user", key);
    const passwordHash = hashes[key] ?? null;
    db.insert(users).values({ id, email, name, passwordHash, emailConfirmedAt: now, createdAt: now }).run();
    db.insert(memberships).values({ workshopId: WORKSHOP_ID, userId: id, role, createdAt: now }).run();
  }
}

function loadGuests(db: Db): void {
  for (const { key, asked = [] } of PEOPLE)
    for (const kit of asked)
      db.insert(kitGuests)
        .values({ workshopId: WORKSHOP_ID, kitId: seedId("kit", kit), userId: seedId("user", key) })
        .run();
}

function loadSupplier(db: Db, supplier: SeedSupplier): void {
  db.insert(suppliers)
    .values({
      id: seedId("supplier", supplier.name),
      workshopId: WORKSHOP_ID,
      name: supplier.name,
      currency: supplier.currency,
      freightTerm: supplier.freight,
      freightAmount: supplier.freightAmount ?? null,
      freeFreightFrom: supplier.freeFreightFrom ?? null,
      handlingFee: supplier.handlingFee ?? "0",
      minimumOrderValue: supplier.minimumOrderValue ?? null,
      smallOrderTerm: supplier.smallOrder ?? "none",
      smallOrderFee: supplier.smallOrderFee ?? null,
      leadTimeDays: supplier.leadTimeDays,
      note: supplier.note,
    })
    .run();
}

function currencyOf(supplierName: string): string {
  const supplier = SUPPLIERS.find(({ name }) => name === supplierName);
  if (!supplier) throw new Error(`The demonstration names a supplier it does not have: ${supplierName}`);
  return supplier.currency;
}

function loadOffer(db: Db, part: string, offer: SeedOffer, now: number): void {
  const id = seedId("offer", part, offer.supplier, offer.code);
  db.insert(offers)
    .values({
      id,
      workshopId: WORKSHOP_ID,
      partId: seedId("part", part),
      supplierId: seedId("supplier", offer.supplier),
      orderCode: offer.code,
      currency: currencyOf(offer.supplier),
      priceModel: offer.model ?? "whole-order",
      minimumOrder: offer.minimum ?? 1,
      orderMultiple: offer.multiple ?? 1,
      stockShown: offer.stock ?? null,
      leadTimeDays: offer.leadTimeDays ?? null,
      pricedOn: dayFrom(now, -offer.age),
      validUntil: offer.validFor === undefined ? null : dayFrom(now, offer.validFor),
      note: "",
    })
    .run();
  for (const rung of ladder(offer.breaks))
    db.insert(offerBreaks)
      .values({ workshopId: WORKSHOP_ID, offerId: id, ...rung })
      .run();
}

function loadPart(db: Db, part: SeedPart, now: number): void {
  db.insert(parts)
    .values({
      id: seedId("part", part.key),
      workshopId: WORKSHOP_ID,
      class: part.class,
      name: part.name,
      spec: part.spec,
      value: part.value ?? null,
      unit: part.unit ?? null,
      tolerance: part.tolerance ?? null,
      power: part.power ?? null,
      voltage: part.voltage ?? null,
      package: part.package,
      holeSpacing: part.holeSpacing ?? null,
      manufacturer: "",
      manufacturerPartNumber: "",
      datasheet: "",
      drawer: part.drawer,
      note: "",
      freeStock: part.freeStock ?? 0,
      stockCost: part.stockCost ?? null,
      createdAt: now,
    })
    .run();
  for (const offer of part.offers) loadOffer(db, part.key, offer, now);
}

function offerId(part: string, code: string): string {
  const offer = PARTS.find(({ key }) => key === part)?.offers.find((one) => one.code === code);
  if (!offer) throw new Error(`The demonstration fixes an offer it does not have: ${code}`);
  return seedId("offer", part, offer.supplier, code);
}

/** Rows of one kit hang on these two ids. */
interface Owner {
  workshopId: string;
  kitId: string;
}

function loadLines(db: Db, kit: SeedKit, owner: Owner): void {
  for (const [position, line] of kit.lines.entries()) {
    const id = seedId("line", kit.name, line.part);
    const partId = seedId("part", line.part);
    db.insert(lines)
      .values({
        id,
        ...owner,
        partId,
        position,
        designators: line.designators,
        mark: line.mark ?? "in-kit",
        note: line.note ?? "",
      })
      .run();
    for (const [index, perKit] of line.perKit.entries()) {
      const editionId = seedId("edition", kit.name, kit.editions[index]?.name ?? "");
      db.insert(lineQuantities).values({ workshopId: WORKSHOP_ID, lineId: id, editionId, perKit }).run();
    }
    if (line.pinned || line.onlyFromStock)
      db.insert(partChoices)
        .values({
          ...owner,
          partId,
          pinnedOfferId: line.pinned ? offerId(line.part, line.pinned) : null,
          onlyFromStock: line.onlyFromStock ?? false,
        })
        .run();
  }
}

/** Names a quote among others of its house. */
function quoteId(kit: SeedKit, { boardHouse, panel }: SeedQuote): string {
  return panel
    ? seedId("quote", kit.name, boardHouse, String(panel.boards))
    : seedId("quote", kit.name, boardHouse);
}

/** "250 × 200" as its two sides. */
function sides(size: string): [width: string, height: string] {
  const [width = "", height = ""] = size.split(" × ");
  return [width, height];
}

function loadPanels(db: Db, kit: SeedKit, panels: SeedPanels, owner: Owner): void {
  const { largest, least, ...terms } = panels;
  const [largestWidth, largestHeight] = sides(largest);
  const [leastWidth, leastHeight] = least ? sides(least) : [null, null];
  db.insert(panelTerms)
    .values({
      id: seedId("panels", kit.name, panels.boardHouse),
      ...owner,
      ...terms,
      largestWidth,
      largestHeight,
      leastWidth,
      leastHeight,
    })
    .run();
}

function loadQuote(db: Db, kit: SeedKit, quote: SeedQuote, owner: Owner, now: number): void {
  const id = quoteId(kit, quote);
  const [panelWidth, panelHeight] = quote.panel ? sides(quote.panel.size) : [null, null];
  db.insert(boardQuotes)
    .values({
      id,
      ...owner,
      boardHouse: quote.boardHouse,
      currency: quote.currency,
      width: kit.board?.width ?? null,
      height: kit.board?.height ?? null,
      boardsPerPanel: quote.panel?.boards ?? null,
      panelWidth,
      panelHeight,
      depanelling: quote.panel?.depanelling ?? "0",
      ...quote.formula,
      layers: quote.layers,
      finish: quote.finish,
      colour: quote.colour,
      priceModel: quote.model,
      engineeringCharge: quote.engineeringCharge ?? "0",
      stencilCharge: quote.stencilCharge ?? "0",
      freight: quote.freight,
      leadTimeDays: quote.leadTimeDays,
      pricedOn: dayFrom(now, -quote.age),
      validUntil: null,
      note: quote.note ?? "",
    })
    .run();
  for (const rung of ladder(quote.breaks))
    db.insert(boardQuoteBreaks)
      .values({ workshopId: WORKSHOP_ID, quoteId: id, ...rung })
      .run();
}

function editionIds(kit: SeedKit, names: readonly string[] | undefined): string[] | null {
  return names ? names.map((name) => seedId("edition", kit.name, name)) : null;
}

function loadWork(db: Db, kit: SeedKit, owner: Owner): void {
  for (const [position, { editions: only, ...task }] of kit.tasks.entries())
    db.insert(tasks)
      .values({
        id: seedId("task", kit.name, task.name),
        ...owner,
        position,
        ...task,
        editions: editionIds(kit, only),
      })
      .run();
  for (const [position, { editions: only, ...item }] of kit.packing.entries())
    db.insert(packingItems)
      .values({
        id: seedId("packing", kit.name, item.name),
        ...owner,
        position,
        ...item,
        editions: editionIds(kit, only),
      })
      .run();
  for (const [position, charge] of kit.charges.entries())
    db.insert(charges)
      .values({
        id: seedId("charge", kit.name, charge.name),
        ...owner,
        position,
        name: charge.name,
        amount: charge.amount,
        spreadOver: charge.spreadOver ?? null,
      })
      .run();
}

function loadChannel(db: Db, kit: SeedKit, channel: SeedChannel, position: number, owner: Owner): void {
  const { editions: only, ownPrices = {}, other, ...terms } = channel;
  const id = seedId("channel", kit.name, channel.name);
  db.insert(channels)
    .values({
      id,
      ...owner,
      position,
      discount: "0",
      taxStated: "inside",
      feeOnPostage: true,
      feeOnTax: true,
      kitsPerOrder: "1",
      ...terms,
      editions: editionIds(kit, only),
      otherName: other?.name ?? "",
      otherAmount: other?.amount ?? "0",
      otherSharedOver: other?.sharedOver ?? 1,
    })
    .run();
  for (const [edition, price] of Object.entries(ownPrices))
    db.insert(channelPrices)
      .values({
        workshopId: WORKSHOP_ID,
        channelId: id,
        editionId: seedId("edition", kit.name, edition),
        price,
      })
      .run();
}

function loadKit(db: Db, kit: SeedKit, now: number): void {
  const kitId = seedId("kit", kit.name);
  const owner = { workshopId: WORKSHOP_ID, kitId };
  db.insert(kits)
    .values({
      id: kitId,
      workshopId: WORKSHOP_ID,
      name: kit.name,
      summary: kit.summary,
      revision: kit.revision,
      boardShape: kit.board?.shape ?? "rectangle",
      boardWidth: kit.board?.width ?? null,
      boardHeight: kit.board?.height ?? null,
      boardMarks: MARKS[kit.name] ?? null,
      createdAt: now + KITS.indexOf(kit),
    })
    .run();
  for (const [position, edition] of kit.editions.entries())
    db.insert(editions)
      .values({ id: seedId("edition", kit.name, edition.name), ...owner, position, ...edition })
      .run();
  loadLines(db, kit, owner);
  for (const quote of kit.quotes) loadQuote(db, kit, quote, owner, now);
  for (const panels of kit.panels ?? []) loadPanels(db, kit, panels, owner);
  const chosen = kit.quotes.find((quote) => quote.chosen);
  const chosenQuoteId = chosen ? quoteId(kit, chosen) : null;
  db.insert(runPlans)
    .values({ ...owner, ...kit.run, chosenQuoteId })
    .run();
  loadWork(db, kit, owner);
  for (const [position, channel] of kit.channels.entries()) loadChannel(db, kit, channel, position, owner);
}

/**
 * Loads the demonstration into a database without people: Marsh Lane Workshop with its five kits, all of it
 * invented. Prices are dated back from `now` (milliseconds), so that it looks the same on any day.
 */
export function loadDemonstration(db: Db, hashes: PasswordHashes, now: number): void {
  db.insert(workshops)
    .values({ id: WORKSHOP_ID, ...WORKSHOP, createdAt: now })
    .run();
  loadPeople(db, hashes, now);
  for (const supplier of SUPPLIERS) loadSupplier(db, supplier);
  for (const { currency, perForeignUnit, daysOld } of RATES)
    db.insert(currencyRates)
      .values({
        workshopId: WORKSHOP_ID,
        currency,
        perForeignUnit,
        dated: dayFrom(now, -daysOld),
        setAt: now,
      })
      .run();
  for (const part of PARTS) loadPart(db, part, now);
  for (const kit of KITS) loadKit(db, kit, now);
  loadGuests(db);
  loadNews(db, now);
}
