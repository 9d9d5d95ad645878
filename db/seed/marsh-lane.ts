import type { SeedPerson, SeedSupplier } from "./seed-data.ts";

/** Marsh Lane Workshop, its people and suppliers: invented for the demonstration, like every price in it. */
export const WORKSHOP = {
  name: "Marsh Lane Workshop",
  currency: "EUR",
  ratePerHour: "12",
};

export const PEOPLE: readonly SeedPerson[] = [
  { key: "ines", name: "Ines Varga", email: "ines@example.org", role: "owner" },
  { key: "milo", name: "Milo Denk", email: "milo@example.org", role: "designer" },
  { key: "tom", name: "Tom Aldis", email: "tom@example.org", role: "seller" },
  {
    key: "ruth",
    name: "Ruth Ojala",
    email: "ruth@example.org",
    role: "co-builder",
    asked: ["Dew Lantern", "Tide Clock"],
  },
];

/** Terms that make the choice of suppliers less than obvious: a cheap part can cost a parcel. */
export const SUPPLIERS: readonly SeedSupplier[] = [
  {
    name: "Ebbing",
    currency: "EUR",
    freight: "flat",
    freightAmount: "5.90",
    freeFreightFrom: "75",
    leadTimeDays: 3,
    note: "Invented supplier. Resistors and small parts, in bags of 100.",
  },
  {
    name: "Tamsin",
    currency: "EUR",
    freight: "flat",
    freightAmount: "6.90",
    freeFreightFrom: "150",
    leadTimeDays: 4,
    note: "Invented supplier. Capacitors, switches, terminals.",
  },
  {
    name: "Lumenhof",
    currency: "EUR",
    freight: "flat",
    freightAmount: "4.90",
    minimumOrderValue: "20",
    smallOrder: "fee",
    smallOrderFee: "5",
    leadTimeDays: 3,
    note: "Invented supplier. Light-emitting diodes and light sensors.",
  },
  {
    name: "Nordhafen",
    currency: "USD",
    freight: "flat",
    freightAmount: "8.50",
    freeFreightFrom: "120",
    handlingFee: "1.50",
    leadTimeDays: 6,
    note: "Invented supplier. Chips, sockets, transistors; prices in US dollars.",
  },
  {
    name: "Ashgrove",
    currency: "EUR",
    freight: "flat",
    freightAmount: "7.20",
    leadTimeDays: 10,
    note: "Invented supplier. Cuts discs and boxes to order.",
  },
];

export const RATES = [{ currency: "USD", perForeignUnit: "0.92", daysOld: 6 }] as const;
