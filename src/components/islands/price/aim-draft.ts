import { fromPercent } from "#src/components/percent.ts";
import type { Aim, AimName } from "#src/costing/price/aims.ts";

/** What a person asks of a price, as typed: rates in hundredths, money as text. */
export interface AimDraft {
  margin: string;
  "mark-up": string;
  profit: string;
  /** Of the profit, what is taxed away; empty: it is meant before tax. */
  taxed: string;
  hour: string;
}

/** Where the questions begin; they are asked, not kept. */
export const FIRST_AIMS: AimDraft = {
  margin: "30",
  "mark-up": "50",
  profit: "500.00",
  taxed: "",
  hour: "20.00",
};

/** In the order of section 10. */
export const AIM_NAMES: readonly AimName[] = ["next-kit", "run-even", "margin", "mark-up", "profit", "hour"];

/** An aim that can be reckoned; null while its target is empty. */
export function aimOf(name: AimName, draft: AimDraft): Aim | null {
  switch (name) {
    case "next-kit":
    case "run-even":
      return { aim: name };
    case "margin":
    case "mark-up":
      return draft[name] === "" ? null : { aim: name, rate: fromPercent(draft[name]) };
    case "profit":
      return draft.profit === ""
        ? null
        : { aim: name, amount: draft.profit, taxRate: draft.taxed === "" ? null : fromPercent(draft.taxed) };
    case "hour":
      return draft.hour === "" ? null : { aim: name, rate: draft.hour };
  }
}
