import type { CellColumn, PastedRow } from "#src/components/islands/cells/cell-column.ts";
import { readDesignators } from "#src/partslist/designators.ts";
import type { KitOffers, OfferPart } from "#src/server/kit-offers.ts";
import type { OfferView } from "#src/server/offer-changes.ts";
import type { OfferFields } from "#src/shapes/offer.ts";
import { blankOffer } from "./OfferForm.tsx";

type Column = CellColumn<OfferView, OfferFields>;
export type NewOffer = OfferFields & { partId: string };

/** What keeps a pasted offer from being added: its row in the block, counted from 1, and its cell. */
export interface NewOfferFault {
  row: number;
  column: string;
  entry: string;
  sentence: string;
}

export interface NewOffers {
  add: NewOffer[];
  faults: NewOfferFault[];
}

/** An offer of which nothing is known: the row below the last one of a sheet. */
export function nextOffer(): OfferView {
  return { ...blankOffer(undefined, ""), id: "next", version: 0, partId: "" };
}

const same = (one: string, other: string) => one.trim().toLowerCase() === other.trim().toLowerCase();

/** Parts that an entry may mean: by name, by a designator, or by an order code that stands already. */
function partsCalled(entry: string, { parts, offers }: KitOffers): OfferPart[] {
  const named = parts.filter(({ name }) => same(name, entry));
  if (named.length > 0) return named;
  const { designators } = readDesignators(entry);
  const wanted = designators.map((one) => one.toUpperCase());
  const designated = parts.filter((part) =>
    readDesignators(part.designators).designators.some((one) => wanted.includes(one.toUpperCase())),
  );
  if (designated.length > 0) return designated;
  const coded = new Set(offers.filter(({ orderCode }) => same(orderCode, entry)).map(({ partId }) => partId));
  return parts.filter(({ id }) => coded.has(id));
}

function readPart(entry: string, supply: KitOffers): { partId: string } | { sentence: string } {
  if (entry === "") return { sentence: "Write the part: its name, a designator or an order code." };
  const [part, ...others] = partsCalled(entry, supply);
  if (!part) return { sentence: "No part of this kit is called that. Write its name or a designator." };
  if (others.length > 0) return { sentence: "More than one part is called that. Write a designator." };
  return { partId: part.id };
}

/**
 * Reads pasted rows as new offers, seen today unless a day is given. Part and supplier must be named; each
 * entry that cannot be taken is a fault of its row and column.
 */
export function readNewOffers(
  rows: readonly PastedRow[],
  supply: KitOffers,
  columns: readonly Column[],
  today: string,
): NewOffers {
  const faults: NewOfferFault[] = [];
  const add = rows.map((cells, place): NewOffer => {
    const fault = (column: string, sentence: string) =>
      faults.push({ row: place + 1, column, entry: cells[column] ?? "", sentence });
    const part = readPart(cells.part ?? "", supply);
    if ("sentence" in part) fault("part", part.sentence);
    if (!cells.supplier) fault("supplier", "Write the supplier.");
    let offer: NewOffer = {
      ...blankOffer(undefined, today),
      partId: "partId" in part ? part.partId : "",
    };
    for (const { key, read } of columns) {
      const entry = cells[key];
      if (!read || !entry) continue;
      const taken = read(entry, { ...offer, id: "", version: 0 });
      if (taken.ok) offer = { ...offer, ...taken.change };
      else fault(key, taken.sentence);
    }
    return offer;
  });
  return { add, faults };
}

/** A refusal of the server, `add.2.orderCode`, as a fault of its row and column. */
export function refusedOffer(
  { at, message }: { at: string; message: string },
  rows: readonly PastedRow[],
  columns: readonly Column[],
): NewOfferFault {
  const [, place = "0", field = ""] = at.split(".");
  const column = columns.find(({ fields }) => fields?.includes(field))?.key ?? "part";
  return { row: Number(place) + 1, column, entry: rows[Number(place)]?.[column] ?? "", sentence: message };
}
