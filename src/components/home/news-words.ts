import { moneyText } from "#src/components/amount-text.ts";
import type { NewsEntry } from "#src/server/news.ts";

/** What a sentence is made of: how many things of a kind somebody did something to, and the last of them. */
interface Told {
  name: string;
  kit: string;
  /** Whether it was done in a kit at all. */
  inKit: boolean;
  count: number;
  detail: Record<string, unknown>;
  currency: string;
}
type Phrase = (told: Told) => string;

/** A phrase for one thing by its name, and another for several by their number. */
function each(one: Phrase, many: Phrase): Phrase {
  return (told) => (told.count === 1 ? one(told) : many(told));
}

const NOUNS: Readonly<Record<string, [one: string, many: string]>> = {
  task: ["the task", "tasks"],
  packing: ["the packing item", "packing items"],
  charge: ["the charge", "charges"],
  quote: ["the board quote of", "board quotes"],
  "panel-terms": ["the panels of", "board houses' panels"],
  edition: ["the edition", "editions"],
  channel: ["the channel", "channels"],
};

const VERBS = {
  add: ["added", "to"],
  change: ["changed", "of"],
  remove: ["removed", "from"],
} as const;

/** Adding to, changing in and removing from a kit reads the same for all that belongs to one. */
function belongings(): [string, Phrase][] {
  return Object.entries(NOUNS).flatMap(([noun, [one, many]]) =>
    Object.entries(VERBS).map(([verb, [did, where]]): [string, Phrase] => [
      `${noun}.${verb}`,
      each(
        ({ name, kit }) => `${did} ${one} ${name} ${where} ${kit}`,
        ({ count, kit }) => `${did} ${count} ${many} ${where} ${kit}`,
      ),
    ]),
  );
}

/** The new value of a field that was changed; `undefined` where it was not. */
function newValue({ detail }: Told, field: string): unknown {
  const change = detail[field];
  return Array.isArray(change) ? change[1] : undefined;
}

function editionChanged(told: Told): string {
  const price = newValue(told, "price");
  if (price === null) return `took the price off ${told.name} of ${told.kit}`;
  if (price !== undefined)
    return `set the price of ${told.kit}, ${told.name}, to ${moneyText(String(price), told.currency)}`;
  return `changed the edition ${told.name} of ${told.kit}`;
}

function runChanged(told: Told): string {
  const kits = newValue(told, "kits");
  return kits === undefined ? `changed the run plan of ${told.kit}` : `set the run of ${told.kit} to ${kits}`;
}

const PHRASES: Readonly<Record<string, Phrase>> = {
  ...Object.fromEntries(belongings()),
  "edition.change": editionChanged,
  "edition.order": ({ kit }) => `put the editions of ${kit} in another order`,
  "channel.order": ({ kit }) => `put the channels of ${kit} in another order`,
  "run.change": runChanged,
  "line.add": each(
    ({ name, kit }) => `added ${name} to ${kit}`,
    ({ count, kit }) => `added ${count} lines to ${kit}`,
  ),
  "line.change": each(
    ({ name, kit }) => `changed ${name} in ${kit}`,
    ({ count, kit }) => `changed lines of ${kit}, ${count} times`,
  ),
  "line.remove": each(
    ({ name, kit }) => `removed ${name} from ${kit}`,
    ({ count, kit }) => `removed ${count} lines from ${kit}`,
  ),
  "list.take": ({ name, kit, inKit }) =>
    inKit ? `brought in ${name} for ${kit}` : `brought in the price list ${name}`,
  "list.take-back": ({ name }) => `took back ${name}`,
  "part.add": each(
    ({ name }) => `added the part ${name}`,
    ({ count }) => `added ${count} parts`,
  ),
  "part.change": each(
    ({ name }) => `changed the part ${name}`,
    ({ count }) => `changed parts, ${count} times`,
  ),
  "part.choose": ({ name, kit }) => `chose how ${name} is bought for ${kit}`,
  "offer.add": each(
    ({ name }) => `added an offer for ${name}`,
    ({ count }) => `added ${count} offers`,
  ),
  "offer.change": each(
    ({ name }) => `changed an offer for ${name}`,
    ({ count }) => `changed offers, ${count} times`,
  ),
  "offer.remove": each(
    ({ name }) => `removed an offer for ${name}`,
    ({ count }) => `removed ${count} offers`,
  ),
  "revision.end": ({ kit, detail }) => `ended rev ${detail.revision} of ${kit}`,
  "kit.add": ({ name }) => `began ${name}`,
  "kit.change": ({ name }) => `changed the name or board of ${name}`,
  "kit.close": ({ name }) => `closed ${name}`,
  "kit.open": ({ name }) => `opened ${name} again`,
  "kit.copy": ({ name, detail }) => `copied ${detail.like} as ${name}`,
  "kit.remove": ({ name }) => `removed ${name}`,
  "supplier.add": ({ name }) => `added the supplier ${name}`,
  "supplier.change": ({ name }) => `changed the terms of ${name}`,
  "supplier.remove": ({ name }) => `removed the supplier ${name}`,
  "supplier.shut-out": ({ name, kit }) => `left ${name} out of ${kit}`,
  "supplier.let-in": ({ name, kit }) => `let ${name} back into ${kit}`,
  "rate.set": ({ name }) => `set the rate of ${name}`,
  "rate.remove": ({ name }) => `removed the rate of ${name}`,
  "rate.take": () => "brought in currency rates",
  "workshop.begin": () => "began the workshop",
  "workshop.change": () => "changed the settings",
  "workshop.hour-rate": () => "changed the rate per hour",
  "person.join": () => "joined the workshop",
  "person.leave": () => "left the workshop",
  "person.remove": ({ name }) => `took ${name} out of the workshop`,
  "person.role": ({ name }) => `changed the role of ${name}`,
  "person.kits": ({ name }) => `changed the kits of ${name}`,
  "invitation.send": () => "invited somebody",
  "invitation.withdraw": () => "withdrew an invitation",
};

/** "Tom set the price of Dew Lantern, Full kit, to €34.00." People by first name; `null` where there are no words. */
export function newsSentence(entry: NewsEntry, kitName: string | undefined, currency: string): string | null {
  const { by, action, subjectName, kitId, detail, count } = entry;
  const told = { name: subjectName, kit: kitName ?? "a kit", inKit: kitId !== null, count, detail, currency };
  const did = PHRASES[action]?.(told);
  return did === undefined ? null : `${by?.split(" ")[0] ?? "Somebody"} ${did}.`;
}
