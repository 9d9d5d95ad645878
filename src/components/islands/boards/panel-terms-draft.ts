import type { PanelTermsView } from "#src/server/panel-terms-changes.ts";
import type { PanelTermsFields } from "#src/shapes/panel-terms.ts";

/** Panel terms as their form holds them: lengths as typed, empty where nothing is written. */
export type PanelTermsDraft = { [Field in keyof PanelTermsFields]: NonNullable<PanelTermsFields[Field]> };

/** Terms of which nothing is written down but whose they are. */
export function blankTerms(boardHouse: string): PanelTermsDraft {
  return {
    boardHouse,
    largestWidth: "",
    largestHeight: "",
    leastWidth: "",
    leastHeight: "",
    separation: "routed",
    gap: "",
    railSides: "long",
    railWidth: "",
  };
}

/** Terms that are there, as a form's first state. */
export function termsDraft({ id: _, version: __, ...terms }: PanelTermsView): PanelTermsDraft {
  return { ...terms, leastWidth: terms.leastWidth ?? "", leastHeight: terms.leastHeight ?? "" };
}

/** Terms as they are sent: scored boards have no gap, and no rails no width. */
export function termsFields(draft: PanelTermsDraft): PanelTermsFields {
  return {
    ...draft,
    leastWidth: draft.leastWidth || null,
    leastHeight: draft.leastHeight || null,
    gap: draft.separation === "v-score" ? "0" : draft.gap,
    railWidth: draft.railSides === "none" ? "0" : draft.railWidth,
  };
}
