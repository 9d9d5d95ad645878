import { useState } from "react";
import { ChoiceField } from "#src/components/islands/parts/ChoiceField.tsx";
import { Section } from "#src/components/islands/parts/Section.tsx";
import type { Scope } from "#src/costing/price/edition-sale.ts";
import { sells } from "#src/costing/price/prepared-channel.ts";
import { PRICE_ENDINGS, type PriceEnding } from "#src/costing/price/price-ending.ts";
import { AimRow } from "./AimRow.tsx";
import { AIM_NAMES, FIRST_AIMS } from "./aim-draft.ts";
import type { PriceProps } from "./price-props.ts";

const ALL = "";

/** Which price does what: the least one for each aim, to be taken with a press. */
export function AimsSection(props: PriceProps) {
  const { context, edition } = props;
  const [ending, setEnding] = useState<PriceEnding>("none");
  const [draft, setDraft] = useState(FIRST_AIMS);
  const [asked, setAsked] = useState(ALL);
  const selling = context.channels.filter((prepared) => sells(prepared, edition.id));
  const only = selling.find(({ channel }) => channel.id === asked)?.channel;
  const scope: Scope = { edition: edition.id, channel: only?.id ?? null };
  return (
    <Section
      id="aims"
      title="Which price for which aim"
      aside={context.plan.editions.length > 1 && edition.name}
    >
      <div className="mb-3 flex flex-wrap gap-x-6 gap-y-3">
        <ChoiceField
          label="Price"
          className="w-[280px] max-w-full"
          choices={[
            { value: ALL, label: "of the list, over all channels" },
            ...selling.map(({ channel }) => ({ value: channel.id, label: `in ${channel.name} alone` })),
          ]}
          value={only?.id ?? ALL}
          onChange={(change) => setAsked(change.currentTarget.value)}
        />
        <ChoiceField
          label="Prices end in"
          className="w-[160px]"
          choices={PRICE_ENDINGS.map((value) => ({ value, label: value === "none" ? "any cent" : value }))}
          value={ending}
          onChange={(change) => setEnding(change.currentTarget.value as PriceEnding)}
        />
      </div>
      <div className="rule-head type-label hidden gap-4 pb-2 font-semibold text-ink-2 tablet:grid tablet:grid-cols-[minmax(0,1fr)_190px_110px_minmax(0,1fr)_150px]">
        <span>Aim</span>
        <span>Target</span>
        <span className="text-right">Least price</span>
        <span>What it would leave</span>
        <span />
      </div>
      <ul>
        {AIM_NAMES.map((name) => (
          <AimRow key={name} {...props} {...{ name, scope, ending, draft }} onDraft={setDraft} />
        ))}
      </ul>
    </Section>
  );
}
