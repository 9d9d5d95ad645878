import type { ActivityEntry } from "#src/server/store/activity.ts";

/** The activity log in sentences: who did what to which thing. */

const VERBS: Record<string, string> = {
  add: "added",
  change: "changed",
  choose: "chose how to buy",
  close: "closed",
  copy: "copied",
  end: "ended",
  join: "joined lines of",
  kits: "changed the kits of",
  leave: "left",
  make: "made",
  order: "reordered",
  price: "set the price of",
  remove: "removed",
  reopen: "opened again",
  role: "changed the role of",
  send: "invited a",
  set: "set",
  take: "brought in",
  "take-back": "took back",
  withdraw: "withdrew the invitation of a",
};

const NOUNS: Record<string, string> = {
  boards: "the boards of",
  charge: "the charge",
  edition: "the edition",
  import: "the list",
  invitation: "",
  kit: "the kit",
  line: "the line",
  offer: "an offer for",
  packing: "the packing item",
  part: "the part",
  person: "",
  quote: "the quote of",
  rate: "the rate of",
  revision: "the revision of",
  run: "the run of",
  sale: "the sale terms of",
  supplier: "the supplier",
  task: "the task",
  workshop: "the settings of",
};

/** "Tom changed the price of Dew Lantern." People by first name. */
export function newsSentence({ by, action, subjectName }: ActivityEntry): string {
  const [noun = "", verb = ""] = action.split(".");
  const who = by?.split(" ")[0] ?? "Somebody";
  const words = [who, VERBS[verb] ?? verb, NOUNS[noun] ?? noun, subjectName];
  return `${words.filter(Boolean).join(" ")}.`;
}
