import type { Need, NeedCode, Place, SourcePage } from "#src/costing/problem.ts";
import type { Plan } from "#src/shapes/plan.ts";

/** How a missing thing is called in short ("needs 2 prices"), and in a sentence for one place. */
interface Words {
  one: string;
  many: string;
  /** What is missing there, as a sentence that names the thing. */
  reason: (name: string) => string;
  /** What settles it. */
  way: string;
}

const WORDS: Record<NeedCode, Words> = {
  "no-mix": {
    one: "a mix",
    many: "a mix",
    reason: () => "No edition has a share of the run.",
    way: "Give an edition a share",
  },
  "unpriced-part": {
    one: "1 price",
    many: "prices",
    reason: (name) => `${name} has no price that can be used.`,
    way: "Give it a price",
  },
  "short-part": {
    one: "1 part",
    many: "parts",
    reason: (name) => `${name} cannot be bought in this quantity.`,
    way: "Find another offer",
  },
  "order-refused": {
    one: "1 larger order",
    many: "larger orders",
    reason: (name) => `${name} refuses an order this small.`,
    way: "Look at the offers",
  },
  "no-rate": {
    one: "1 currency rate",
    many: "currency rates",
    reason: (name) => `There is no rate for ${name}.`,
    way: "Set the rate",
  },
  "no-freight": {
    one: "1 freight",
    many: "freights",
    reason: (name) => `The freight of ${name} is not known.`,
    way: "Set the freight",
  },
  "no-board-quote": {
    one: "a board quote",
    many: "board quotes",
    reason: () => "No board quote covers this run.",
    way: "Add a quote",
  },
  "no-board-freight": {
    one: "board freight",
    many: "board freight",
    reason: (name) => `The freight of the boards from ${name} is not known.`,
    way: "Set the freight",
  },
  "no-board-yield": {
    one: "a yield",
    many: "a yield",
    reason: () => "With this yield and confidence no number of boards is enough.",
    way: "Change yield or confidence",
  },
  "no-packing-cost": {
    one: "1 packing cost",
    many: "packing costs",
    reason: (name) => `${name} has no cost.`,
    way: "Set the cost",
  },
  "no-hourly-rate": {
    one: "an hour’s rate",
    many: "an hour’s rate",
    reason: () => "What an hour of your own work costs is not set; 0 is a rate too.",
    way: "Set the rate",
  },
  "no-replacement-cost": {
    one: "a replacement cost",
    many: "a replacement cost",
    reason: () => "What a replacement costs is not set.",
    way: "Set the cost",
  },
  "no-stock-cost": {
    one: "1 book cost",
    many: "book costs",
    reason: (name) => `${name} is taken from the shelf, and what it cost is not known.`,
    way: "Set its book cost",
  },
  "no-price": {
    one: "1 price",
    many: "prices",
    reason: (name) => `${name} has no price.`,
    way: "Set a price",
  },
  "no-tax-rate": {
    one: "a tax rate",
    many: "a tax rate",
    reason: () => "The tax rate inside the price is not set.",
    way: "Set the tax rate",
  },
  "no-fee-rate": {
    one: "a fee rate",
    many: "a fee rate",
    reason: () => "The fee on a sale is not set; 0 is a fee too.",
    way: "Set the fee",
  },
  "no-fixed-fee": {
    one: "a fixed fee",
    many: "a fixed fee",
    reason: () => "The fixed fee of a sale is not set; 0 is a fee too.",
    way: "Set the fee",
  },
  "no-postage-charged": {
    one: "postage",
    many: "postage",
    reason: () => "What the buyer pays for postage is not set.",
    way: "Set the postage",
  },
  "no-postage-paid": {
    one: "postage",
    many: "postage",
    reason: () => "What you pay for postage is not set.",
    way: "Set the postage",
  },
  "no-work": {
    one: "work",
    many: "work",
    reason: () => "No work is planned, so there is nothing to share the money over.",
    way: "Add a task",
  },
  "not-in-run": {
    one: "a share of the run",
    many: "shares of the run",
    reason: (name) => `${name} is not made in this run.`,
    way: "Change the mix",
  },
  "nothing-made": {
    one: "a kit",
    many: "kits",
    reason: () => "Nothing is made in this run.",
    way: "Change the mix",
  },
  "not-even": {
    one: "a higher price",
    many: "a higher price",
    reason: () => "Even if all are sold, the takings do not cover the cost.",
    way: "Look at price and cost",
  },
  "amount-too-large": {
    one: "smaller figures",
    many: "smaller figures",
    reason: (name) => `The figures of ${name} are too large to be reckoned exactly.`,
    way: "Check the quantities and prices",
  },
};

/** Needs that read better as a state than as "needs …". */
const STATES: Partial<Record<NeedCode, string>> = {
  "not-even": "never",
  "no-price": "not set",
  "nothing-made": "none made",
  "not-in-run": "none made",
};

/** What a figure waits for, in a few words: "needs 2 prices", "not set". */
export function needInShort(needs: readonly Need[]): string {
  const [first] = needs;
  if (!first) return "not known";
  const state = needs.length === 1 ? STATES[first.code] : undefined;
  if (state) return state;
  const many = first.at.length > 1;
  const { one, many: several } = WORDS[first.code];
  const what = !many || several === one ? one : `${first.at.length} ${several}`;
  return `needs ${what}${needs.length > 1 ? ", and more" : ""}`;
}

function nameOf(plan: Plan, place: Place): string {
  const part = plan.parts.find(({ id }) => id === place.part);
  const named =
    (part && (part.designators ? `${part.name} (${part.designators})` : part.name)) ??
    plan.suppliers.find(({ id }) => id === place.supplier)?.name ??
    plan.boards.quotes.find(({ id }) => id === place.quote)?.boardHouse ??
    plan.packing.find(({ id }) => id === place.packing)?.name ??
    plan.editions.find(({ id }) => id === place.edition)?.name;
  return named ?? place.currency ?? plan.kit;
}

/** One thing that is missing at one place, with the way to its field. */
export interface MissingThing {
  key: string;
  code: NeedCode;
  name: string;
  reason: string;
  way: string;
  page: SourcePage;
}

/** Every missing thing of a figure, one entry per place. */
export function missingThings(plan: Plan, needs: readonly Need[]): MissingThing[] {
  return needs.flatMap(({ code, at, page }) =>
    (at.length > 0 ? at : [{}]).map((place) => {
      const name = nameOf(plan, place);
      const { reason, way } = WORDS[code];
      return { key: `${code} ${JSON.stringify(place)}`, code, name, reason: reason(name), way, page };
    }),
  );
}
