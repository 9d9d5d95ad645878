import { type LadderProblem, ladderProblems } from "#src/costing/ladder-problems.ts";
import type { Plan, PlanBoardQuote, PlanOffer } from "#src/shapes/plan.ts";
import { channelFaults } from "./channel-faults.ts";
import type { FieldError } from "./problem.ts";

const LADDER_WORDS: Record<LadderProblem["code"], string> = {
  "quantity-repeats": "This quantity stands in the ladder already.",
  "break-below-minimum": "This break lies below the minimum order.",
  "not-ascending": "Quantities go up from break to break.",
  "lot-not-multiple": "A lot is a multiple of the order multiple.",
  "price-rises": "",
};

type Listed = readonly { id: string }[];

function repeated(values: readonly string[], at: (place: number) => string, message: string): FieldError[] {
  return values.flatMap((value, place) =>
    values.indexOf(value) < place ? [{ at: at(place), message }] : [],
  );
}

const sameIds = (rows: Listed, at: string) =>
  repeated(
    rows.map(({ id }) => id),
    (place) => `${at}.${place}.id`,
    "Another row has this id.",
  );

function strange(
  named: readonly string[],
  known: ReadonlySet<string>,
  at: string,
  what: string,
): FieldError[] {
  return named.flatMap((id, place) =>
    known.has(id) ? [] : [{ at: `${at}.${place}`, message: `The plan has no ${what} with this id.` }],
  );
}

function ladderFaults(ladder: PlanOffer | PlanBoardQuote, at: string): FieldError[] {
  const { minimumOrder, orderMultiple } = { minimumOrder: 1, orderMultiple: 1, ...ladder };
  const { breaks, priceModel } = ladder;
  if (priceModel === "formula") return [];
  return ladderProblems({ breaks, priceModel, minimumOrder, orderMultiple })
    .filter(({ refused }) => refused)
    .map(({ code, at: place }) => ({ at: `${at}.breaks.${place}.quantity`, message: LADDER_WORDS[code] }));
}

function partFaults(
  { quantities, offers }: Plan["parts"][number],
  at: string,
  editions: ReadonlySet<string>,
  suppliers: ReadonlySet<string>,
): FieldError[] {
  const named = quantities.map(({ edition }) => edition);
  return [
    ...named.flatMap((id, place) =>
      editions.has(id)
        ? []
        : [{ at: `${at}.quantities.${place}.edition`, message: "The plan has no edition with this id." }],
    ),
    ...repeated(named, (place) => `${at}.quantities.${place}.edition`, "This edition is named already."),
    ...offers.flatMap((offer, place) => [
      ...(suppliers.has(offer.supplier)
        ? []
        : [{ at: `${at}.offers.${place}.supplier`, message: "The plan has no supplier with this id." }]),
      ...ladderFaults(offer, `${at}.offers.${place}`),
    ]),
  ];
}

/**
 * What makes a plan impossible although each of its fields has the right shape (section 1.6): ids that
 * repeat or name nothing, ladders whose quantities repeat or lie below the minimum order, a fee that with
 * the tax takes all of a price.
 */
export function planFaults(plan: Plan): FieldError[] {
  const editions = new Set(plan.editions.map(({ id }) => id));
  const suppliers = new Set(plan.suppliers.map(({ id }) => id));
  const { tasks } = plan.work;
  return [
    ...sameIds(plan.editions, "editions"),
    ...sameIds(plan.parts, "parts"),
    ...sameIds(plan.suppliers, "suppliers"),
    ...sameIds(plan.boards.quotes, "boards.quotes"),
    ...sameIds(tasks, "work.tasks"),
    ...sameIds(plan.packing, "packing"),
    ...sameIds(plan.charges, "charges"),
    ...sameIds(plan.channels, "channels"),
    ...repeated(
      plan.rates.map(({ currency }) => currency),
      (place) => `rates.${place}.currency`,
      "This currency has a rate already.",
    ),
    ...plan.parts.flatMap((part, place) => partFaults(part, `parts.${place}`, editions, suppliers)),
    ...plan.boards.quotes.flatMap((quote, place) => ladderFaults(quote, `boards.quotes.${place}`)),
    ...tasks.flatMap((task, place) =>
      strange(task.editions ?? [], editions, `work.tasks.${place}.editions`, "edition"),
    ),
    ...plan.packing.flatMap((item, place) =>
      strange(item.editions ?? [], editions, `packing.${place}.editions`, "edition"),
    ),
    ...plan.channels.flatMap((channel, place) =>
      channelFaults(channel, editions).map(({ at, message }) => ({ at: `channels.${place}.${at}`, message })),
    ),
  ];
}
