import { moneyText, unitPriceText } from "#src/components/amount-text.ts";
import type { CellColumn, CellEntry } from "#src/components/islands/cells/cell-column.ts";
import { type Entry, readAmount, readDay, readWhole } from "#src/components/islands/cells/entries.ts";
import { shortDayWords } from "#src/costing/day-words.ts";
import type { KitOffers } from "#src/server/kit-offers.ts";
import type { OfferView } from "#src/server/offer-changes.ts";
import type { OfferFields } from "#src/shapes/offer.ts";

type Column = CellColumn<OfferView, OfferFields>;
type Breaks = OfferView["breaks"];

function entryFor<T>(
  read: Entry<T>,
  change: (value: T | null) => Partial<OfferFields>,
): CellEntry<OfferFields> {
  return read.ok ? { ok: true, change: change(read.value) } : read;
}

/** Break quantities that get a column each: those most offers have, at most so many. */
const BREAK_COLUMNS = 8;

/** The quantities at which the kit's offers break, in ascending order; the rarest are left to the form. */
export function breakQuantities(offers: readonly Pick<OfferView, "breaks" | "priceModel">[]): number[] {
  const seen = new Map<number, number>();
  for (const { breaks } of offers)
    for (const { quantity } of breaks) seen.set(quantity, (seen.get(quantity) ?? 0) + 1);
  const common = [...seen].sort((a, b) => b[1] - a[1] || a[0] - b[0]).slice(0, BREAK_COLUMNS);
  return common.map(([quantity]) => quantity).sort((a, b) => a - b);
}

function withBreak(breaks: Breaks, quantity: number, price: string | null): Breaks {
  const others = breaks.filter((rung) => rung.quantity !== quantity);
  const rungs = price === null ? others : [...others, { quantity, price }];
  return rungs.sort((a, b) => a.quantity - b.quantity);
}

function breakColumn(quantity: number): Column {
  const priceAt = ({ breaks }: OfferView) => breaks.find((rung) => rung.quantity === quantity)?.price ?? "";
  return {
    key: `break-${quantity}`,
    head: `${quantity}+`,
    width: 92,
    number: true,
    fields: ["breaks"],
    text: priceAt,
    shown: (row) => {
      const price = priceAt(row);
      if (price === "") return "";
      return row.priceModel === "lots" ? moneyText(price, row.currency) : unitPriceText(price, row.currency);
    },
    read: (entry, row) =>
      entryFor(readAmount(entry, 6, "0.062"), (price) => ({
        breaks: withBreak(row.breaks, quantity, price),
      })),
  };
}

/** Breaks that have no column of their own, written out so that none is hidden. */
function otherBreaks(columns: readonly number[]): Column {
  return {
    key: "other-breaks",
    head: "Other breaks",
    width: 150,
    text: ({ breaks, currency }) =>
      breaks
        .filter(({ quantity }) => !columns.includes(quantity))
        .map(({ quantity, price }) => `${quantity}+ ${unitPriceText(price, currency)}`)
        .join(", "),
  };
}

function numberColumn(
  key: "minimumOrder" | "orderMultiple" | "stockShown" | "leadTimeDays",
  head: string,
  empty: number | null,
): Column {
  return {
    key,
    head,
    width: 100,
    number: true,
    fields: [key],
    text: (row) => (row[key] === null ? "" : String(row[key])),
    read: (entry) => entryFor(readWhole(entry, empty === 1 ? 1 : 0), (value) => ({ [key]: value ?? empty })),
  };
}

function dayColumn(key: "pricedOn" | "validUntil", head: string): Column {
  return {
    key,
    head,
    width: 116,
    fields: [key],
    text: (row) => row[key] ?? "",
    shown: (row) => (row[key] === null ? "" : shortDayWords(row[key])),
    read: (entry) => entryFor(readDay(entry), (day) => ({ [key]: day })),
  };
}

/** The columns of a grid of offers. `partHref` leads to a part's own page, where there is one. */
export function offerColumns(
  { parts, suppliers, offers }: KitOffers,
  partHref?: (part: string) => string,
): Column[] {
  const partOf = new Map(parts.map((part) => [part.id, part]));
  const nameOf = new Map(suppliers.map(({ id, name }) => [id, name]));
  const quantities = breakQuantities(offers);
  return [
    {
      key: "part",
      head: "Part",
      width: 190,
      held: true,
      text: ({ partId }) => partOf.get(partId)?.name ?? "",
      href: partHref && (({ partId }) => partHref(partId)),
    },
    {
      key: "supplier",
      head: "Supplier",
      width: 124,
      fields: ["supplierId"],
      choices: suppliers.map(({ name }) => name),
      text: ({ supplierId }) => nameOf.get(supplierId) ?? "",
      read(entry) {
        const supplier = suppliers.find(({ name }) => name.toLowerCase() === entry.toLowerCase());
        return supplier
          ? { ok: true, change: { supplierId: supplier.id, currency: supplier.currency } }
          : { ok: false, sentence: "No supplier is called that. Add it on the page of suppliers first." };
      },
    },
    {
      key: "orderCode",
      head: "Order code",
      width: 130,
      fields: ["orderCode"],
      text: ({ orderCode }) => orderCode,
      read: (entry) => ({ ok: true, change: { orderCode: entry } }),
    },
    {
      key: "currency",
      head: "Currency",
      width: 92,
      fields: ["currency"],
      text: ({ currency }) => currency,
      read: (entry) => ({ ok: true, change: { currency: entry.toUpperCase() } }),
    },
    numberColumn("minimumOrder", "Minimum", 1),
    numberColumn("orderMultiple", "Multiple", 1),
    ...quantities.map(breakColumn),
    otherBreaks(quantities),
    numberColumn("stockShown", "In stock", null),
    numberColumn("leadTimeDays", "Lead days", null),
    dayColumn("pricedOn", "Price seen"),
    dayColumn("validUntil", "Valid until"),
  ];
}
