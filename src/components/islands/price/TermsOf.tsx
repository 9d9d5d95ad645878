import type { PlanEdition } from "#src/shapes/plan.ts";
import type { ChannelEntryPlace } from "./channel-entry.ts";
import type { RowTerms } from "./channel-rows.ts";
import { FeeTerms, TaxTerms } from "./FeeTerms.tsx";
import { PriceTerms } from "./PriceTerms.tsx";
import { OtherTerms, PostageTerms, SendingTerms, TimeTerms } from "./SellingTerms.tsx";

/** The entries a row of the channel table rests on, for the channel that is being changed. */
export function TermsOf({
  terms,
  edition,
  ...place
}: ChannelEntryPlace & { terms: RowTerms; edition: PlanEdition }) {
  switch (terms) {
    case "price":
      return <PriceTerms {...place} edition={edition} />;
    case "postage":
      return <PostageTerms {...place} />;
    case "tax":
      return <TaxTerms {...place} />;
    case "fee":
      return <FeeTerms {...place} />;
    case "sending":
      return <SendingTerms {...place} />;
    case "other":
      return <OtherTerms {...place} />;
    case "minutes":
      return <TimeTerms {...place} />;
  }
}
