import { groupBy } from "#db/group-by.ts";
import type { Where } from "./note-change.ts";
import { type OfferView, offerView } from "./offer-changes.ts";
import type { KitRow } from "./store/kit.ts";
import { type LineRow, linesOf } from "./store/line.ts";
import { offersForKit } from "./store/offer.ts";
import { type PartRow, partChoicesOf } from "./store/part.ts";
import { type SupplierView, suppliers } from "./supplier-changes.ts";

/** A part that a kit buys, as its list calls it. A part on several lines is bought once. */
export interface OfferPart extends Pick<PartRow, "id" | "name" | "spec" | "class" | "value"> {
  /** Places in the list, counted from 1. */
  lines: number[];
  /** "R1, R2" of all its lines. */
  designators: string;
  /** Version of the kit's choice for the part; 0 while nothing is chosen. */
  choiceVersion: number;
}

/** Everything that says where a kit's parts can be had. */
export interface KitOffers {
  parts: OfferPart[];
  offers: OfferView[];
  suppliers: SupplierView[];
}

const BOUGHT: readonly LineRow["mark"][] = ["in-kit", "option"];

/** The parts a kit buys, in the order of its list, with every offer for them. */
export function kitOffers({ db, workshop, kit }: Where & { kit: KitRow }): KitOffers {
  const numbered = linesOf(db, kit.id).map((row, place) => ({ ...row, number: place + 1 }));
  const bought = numbered.filter(({ line }) => BOUGHT.includes(line.mark));
  const versions = new Map(partChoicesOf(db, kit.id).map(({ partId, version }) => [partId, version]));
  const parts = [...groupBy(bought, ({ part }) => part.id).values()].map((rows): OfferPart => {
    const { id, name, spec, class: partClass, value } = (rows[0] as (typeof rows)[number]).part;
    const designators = rows.map(({ line }) => line.designators).filter(Boolean);
    return {
      ...{ id, name, spec, class: partClass, value },
      lines: rows.map(({ number }) => number),
      designators: designators.join(", "),
      choiceVersion: versions.get(id) ?? 0,
    };
  });
  const kept = new Set(parts.map(({ id }) => id));
  const offers = offersForKit(db, kit.id).filter(({ offer }) => kept.has(offer.partId));
  return { parts, offers: offers.map(offerView), suppliers: suppliers({ db, workshop }) };
}
