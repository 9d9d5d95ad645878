import type { KitAddress } from "#src/components/islands/kit-address.ts";
import { kitPath } from "#src/components/islands/kit-address.ts";
import type { Need, NeedCode, Place } from "#src/costing/problem.ts";
import { problemSentence } from "#src/costing/problem-words.ts";
import type { Plan } from "#src/shapes/plan.ts";
import { channelLink, needLink } from "./page-links.ts";
import type { PlanRow } from "./plan-rows.ts";

/** The way to the field that settles a need, in the words of its button. */
const WAYS: Record<NeedCode, string> = {
  "no-parts": "Go to Parts",
  "no-mix": "Give an edition a share",
  "unpriced-part": "Add a price",
  "short-part": "Find another offer",
  "order-refused": "Look at the offers",
  "no-rate": "Set the rate",
  "no-freight": "Set the freight",
  "no-board-quote": "Add a quote",
  "no-board-freight": "Set the freight",
  "no-board-yield": "Change the yield",
  "no-board-size": "Write its size",
  "no-packing-cost": "Set the cost",
  "no-hourly-rate": "Set the rate",
  "no-replacement-cost": "Set the cost",
  "no-stock-cost": "Set its book cost",
  "no-price": "Set a price",
  "no-tax-rate": "Set the tax rate",
  "no-fee-rate": "Set the fee",
  "no-fixed-fee": "Set the fee",
  "no-postage-charged": "Set the postage",
  "no-postage-paid": "Set the postage",
  "no-order-packing": "Set the cost",
  "no-other-cost": "Set the cost",
  "no-order-minutes": "Set the minutes",
  "not-sold": "Give a channel a share",
  "costs-nothing": "Check the costs",
  "no-work": "Add a task",
  "not-in-run": "Change the mix",
  "nothing-made": "Change the mix",
  "not-even": "Change the price",
  "amount-too-large": "Check the offers",
};

/** A second way on that is one press: the person says that there is none of it. */
interface NoneOfIt {
  label: string;
  row: PlanRow;
  field: string;
}

function ofChannel(label: string, field: string): (at: Place) => NoneOfIt {
  return ({ channel }) => ({ label, row: { kind: "channel", id: channel ?? "" }, field });
}

const NONE_OF_IT: Partial<Record<NeedCode, (at: Place) => NoneOfIt>> = {
  "no-hourly-rate": () => ({
    label: "Count the hours at nothing",
    row: { kind: "hour-rate" },
    field: "ratePerHour",
  }),
  "no-tax-rate": ofChannel("There is no tax in it", "taxRate"),
  "no-fee-rate": ofChannel("There is no such fee", "feeRate"),
  "no-fixed-fee": ofChannel("There is no such fee", "feeFixed"),
  "no-postage-charged": ofChannel("The buyer pays none", "postageCharged"),
  "no-postage-paid": ofChannel("You pay none", "postagePaid"),
  "no-order-packing": ofChannel("It costs nothing", "packingCost"),
  "no-order-minutes": ofChannel("It takes no time", "minutesPerOrder"),
  "no-packing-cost": ({ packing }) => ({
    label: "It costs nothing",
    row: { kind: "packing", id: packing ?? "" },
    field: "costPerKit",
  }),
  "no-replacement-cost": () => ({
    label: "It costs nothing",
    row: { kind: "run" },
    field: "replacementCost",
  }),
};

/** One thing that is missing at one place, with the ways on. */
export interface MissingThing {
  key: string;
  /** Its place: the designators of a part, the name of a channel, or nothing. */
  what: string;
  reason: string;
  detail: string;
  way: { label: string; href: string };
  noneOfIt: NoneOfIt | null;
}

function wayHref(address: KitAddress, need: Need, { part, quote, channel }: Place): string {
  if (channel) return channelLink(address, channel);
  if (need.code === "no-price") return kitPath(address, "/price#list-price");
  if (part && need.page === "offers") return kitPath(address, `/offers/${part}`);
  if (quote) return kitPath(address, "/boards");
  return needLink(address, need);
}

/** Designators of the part, or the name of the channel where there are several. */
function thingNamed({ parts, channels }: Plan, { part, channel }: Place): string {
  if (part) return parts.find(({ id }) => id === part)?.designators ?? "";
  return channels.length > 1 ? (channels.find(({ id }) => id === channel)?.name ?? "") : "";
}

/** Every missing thing behind some needs, one entry per place. */
export function missingThings(plan: Plan, needs: readonly Need[], address: KitAddress): MissingThing[] {
  return needs.flatMap((need) =>
    (need.at.length > 0 ? need.at : [{}]).map((at: Place) => {
      const words = problemSentence({ code: need.code, at, facts: {} }, plan);
      const [reason = words, ...rest] = words.split(/(?<=\.) /);
      return {
        key: `${need.code} ${JSON.stringify(at)}`,
        what: thingNamed(plan, at),
        reason,
        detail: rest.join(" "),
        way: { label: WAYS[need.code], href: wayHref(address, need, at) },
        noneOfIt: NONE_OF_IT[need.code]?.(at) ?? null,
      };
    }),
  );
}
