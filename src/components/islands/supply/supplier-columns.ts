import { moneyText } from "#src/components/amount-text.ts";
import type { CellColumn, CellEntry } from "#src/components/islands/cells/cell-column.ts";
import { type Entry, readAmount, readWhole } from "#src/components/islands/cells/entries.ts";
import { currencyDecimals } from "#src/costing/currencies.ts";
import type { SupplierView } from "#src/server/supplier-changes.ts";
import type { SupplierFields } from "#src/shapes/supplier.ts";

type Column = CellColumn<SupplierView, SupplierFields>;

/** An entry for one field, as the change it makes. */
function entryFor<T>(read: Entry<T>, change: (value: T | null) => Partial<SupplierFields>) {
  return (read.ok ? { ok: true, change: change(read.value) } : read) as CellEntry<SupplierFields>;
}

function placesOf({ currency }: SupplierView): number {
  return currencyDecimals(currency) ?? 2;
}

function amountColumn(key: "freeFreightFrom" | "minimumOrderValue", head: string, empty: string): Column {
  return {
    key,
    head,
    width: 128,
    number: true,
    fields: [key],
    text: (row) => row[key] ?? "",
    shown: (row) => (row[key] === null ? empty : moneyText(row[key], row.currency)),
    read: (entry, row) => entryFor(readAmount(entry, placesOf(row)), (value) => ({ [key]: value })),
  };
}

/** "none", an amount, or nothing where nobody knows it: freight that is not known never counts as none. */
const freight: Column = {
  key: "freight",
  head: "Freight",
  width: 112,
  number: true,
  fields: ["freightTerm", "freightAmount"],
  text: ({ freightTerm, freightAmount }) =>
    freightTerm === "none" ? "none" : freightTerm === "flat" ? (freightAmount ?? "") : "",
  shown: ({ freightTerm, freightAmount, currency }) => {
    if (freightTerm === "none") return "none";
    return freightAmount === null ? "not known" : moneyText(freightAmount, currency);
  },
  read(entry, row) {
    if (/^(none|free)$/i.test(entry))
      return { ok: true, change: { freightTerm: "none", freightAmount: null } };
    const read = readAmount(entry, placesOf(row));
    if (!read.ok)
      return {
        ok: false,
        sentence: "Write an amount such as 4.90, “none”, or leave it empty while nobody knows.",
      };
    const freightTerm = read.value === null ? "not-known" : "flat";
    return { ok: true, change: { freightTerm, freightAmount: read.value } };
  },
};

/** What happens to an order below the minimum: taken, refused, or charged a fee. */
const smallOrder: Column = {
  key: "smallOrder",
  head: "Below it",
  width: 116,
  grows: true,
  fields: ["smallOrderTerm", "smallOrderFee"],
  text: ({ smallOrderTerm, smallOrderFee }) =>
    smallOrderTerm === "fee" ? (smallOrderFee ?? "") : smallOrderTerm === "refused" ? "refused" : "taken",
  shown: ({ smallOrderTerm, smallOrderFee, currency }) =>
    smallOrderTerm === "fee" && smallOrderFee !== null
      ? `${moneyText(smallOrderFee, currency)} fee`
      : smallOrderTerm === "refused"
        ? "refused"
        : "taken",
  read(entry, row) {
    if (/^(taken|none|)$/i.test(entry))
      return { ok: true, change: { smallOrderTerm: "none", smallOrderFee: null } };
    if (/^refused$/i.test(entry))
      return { ok: true, change: { smallOrderTerm: "refused", smallOrderFee: null } };
    const read = readAmount(entry.replace(/\s*fee$/i, ""), placesOf(row));
    return read.ok && read.value !== null
      ? { ok: true, change: { smallOrderTerm: "fee", smallOrderFee: read.value } }
      : { ok: false, sentence: "Write the fee, such as 3.00, or “refused”, or “taken”." };
  },
};

/** The columns of the grid of suppliers; `base` is the address of their pages. */
export function supplierColumns(base: string): Column[] {
  return [
    {
      key: "name",
      head: "Supplier",
      width: 190,
      held: true,
      fields: ["name"],
      text: ({ name }) => name,
      read: (entry) => ({ ok: true, change: { name: entry } }),
    },
    // Beside the name, because it leads to the supplier and must be in reach on a phone.
    {
      key: "offers",
      head: "Offers",
      width: 96,
      number: true,
      text: ({ offers }) => String(offers),
      shown: ({ offers }) => (offers === 1 ? "1 offer" : `${offers} offers`),
      href: ({ id }) => `${base}/${id}`,
    },
    {
      key: "currency",
      head: "Currency",
      width: 96,
      fields: ["currency"],
      text: ({ currency }) => currency,
      read: (entry) => ({ ok: true, change: { currency: entry.toUpperCase() } }),
    },
    freight,
    amountColumn("freeFreightFrom", "Free from", "never free"),
    {
      key: "handlingFee",
      head: "Handling",
      width: 104,
      number: true,
      fields: ["handlingFee"],
      text: ({ handlingFee }) => handlingFee,
      shown: ({ handlingFee, currency }) =>
        /[1-9]/.test(handlingFee) ? moneyText(handlingFee, currency) : "none",
      read: (entry, row) =>
        entryFor(readAmount(entry.replace(/^none$/i, ""), placesOf(row)), (value) => ({
          handlingFee: value ?? "0",
        })),
    },
    amountColumn("minimumOrderValue", "Minimum order", "none"),
    smallOrder,
    {
      key: "leadTimeDays",
      head: "Days to here",
      width: 104,
      number: true,
      fields: ["leadTimeDays"],
      text: ({ leadTimeDays }) => (leadTimeDays === null ? "" : String(leadTimeDays)),
      shown: ({ leadTimeDays }) => (leadTimeDays === null ? "not known" : String(leadTimeDays)),
      read: (entry) => entryFor(readWhole(entry, 0), (leadTimeDays) => ({ leadTimeDays })),
    },
  ];
}
