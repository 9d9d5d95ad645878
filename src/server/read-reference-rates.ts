import { XMLParser } from "fast-xml-parser";

/** Units of each currency for one euro, as published for one day. */
export interface ReferenceRates {
  /** ISO 8601. */
  day: string;
  rates: { currency: string; perEuro: string }[];
  /** Entries that are no rate, as written, so that nothing is dropped in silence. */
  unread: string[];
}

export type ReadRates = { ok: true; newest: ReferenceRates } | { ok: false; code: "rates-file-unreadable" };

/** Entities are left alone: a file from outside must not make the reader expand them. */
const parser = new XMLParser({
  ignoreAttributes: false,
  attributeNamePrefix: "",
  removeNSPrefix: true,
  parseAttributeValue: false,
  processEntities: false,
  isArray: (name) => name === "Cube",
});

interface Cube {
  time?: string;
  currency?: string;
  rate?: string;
  Cube?: Cube[];
}

const RATE = /^\d{1,9}(?:\.\d{1,10})?$/;

function cubes(node: unknown): Cube[] {
  const inner = (node as { Cube?: unknown } | null)?.Cube;
  return Array.isArray(inner) ? inner : [];
}

function isDay(text: string | undefined): text is string {
  if (text === undefined || !/^\d{4}-\d{2}-\d{2}$/.test(text)) return false;
  const parsed = new Date(`${text}T00:00:00Z`);
  return !Number.isNaN(parsed.getTime()) && parsed.toISOString().startsWith(text);
}

function isRate({ currency, rate }: Cube): boolean {
  return /^[A-Z]{3}$/.test(currency ?? "") && RATE.test(rate ?? "") && /[1-9]/.test(rate ?? "");
}

function ratesOf(day: Cube): ReferenceRates {
  const entries = cubes(day);
  return {
    day: day.time ?? "",
    rates: entries.filter(isRate).map(({ currency = "", rate = "" }) => ({ currency, perEuro: rate })),
    unread: entries.filter((one) => !isRate(one)).map((one) => `${one.currency ?? "?"} ${one.rate ?? "?"}`),
  };
}

/** The days of the file; none where it is no such file, or breaks off. */
function daysOf(text: string): Cube[] {
  if (!/<\/(?:[\w-]+:)?Envelope>\s*$/.test(text)) return [];
  try {
    const { Envelope } = parser.parse(text) as { Envelope?: unknown };
    return cubes(Envelope)
      .flatMap(cubes)
      .filter(({ time }) => isDay(time));
  } catch {
    return [];
  }
}

/**
 * Reads the euro reference rates of the European Central Bank from its published XML: an envelope with a `Cube` a
 * day, each with a `Cube` a currency and its rate, units for one euro. Of several days the newest is read. An entry
 * without three capital letters and a rate above 0 is handed back as unread.
 */
export function readReferenceRates(text: string): ReadRates {
  const days = daysOf(text).map(ratesOf);
  const newest = days.reduce<ReferenceRates | null>(
    (latest, next) => (latest === null || next.day > latest.day ? next : latest),
    null,
  );
  return newest === null || newest.rates.length === 0
    ? { ok: false, code: "rates-file-unreadable" }
    : { ok: true, newest };
}
