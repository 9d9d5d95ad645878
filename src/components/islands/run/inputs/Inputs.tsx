import type { ReactNode } from "react";
import { rolesThatCan } from "#src/access.ts";
import { Section } from "#src/components/islands/parts/Section.tsx";
import { Allowances } from "./Allowances.tsx";
import { Charges } from "./Charges.tsx";
import type { InputProps } from "./input-props.ts";
import { MixAndPrices } from "./MixAndPrices.tsx";
import { Packing } from "./Packing.tsx";
import { SaleTerms } from "./SaleTerms.tsx";
import { Work } from "./Work.tsx";

function Group({
  id,
  title,
  aside,
  children,
}: {
  id: string;
  title: string;
  aside?: string;
  children: ReactNode;
}) {
  return (
    <div id={id} className="scroll-mt-40">
      <Section title={title} aside={aside}>
        {children}
      </Section>
    </div>
  );
}

/** What the figures rest on: every entry of the run, followed by the figures while one types. */
export function Inputs(props: InputProps) {
  const pricesAside = props.may.changePrice
    ? undefined
    : `${rolesThatCan("change-price").join(" and ")} change these; you see them`;
  return (
    <div id="inputs" className="flex scroll-mt-40 flex-col gap-11">
      <Group id="prices" title="Mix and prices" aside={pricesAside}>
        <MixAndPrices {...props} />
      </Group>
      <Group id="sale" title="What goes off a sale" aside={pricesAside}>
        <SaleTerms {...props} />
      </Group>
      <Group id="work" title="Work at the table">
        <Work {...props} />
      </Group>
      <Group id="packing" title="Packing">
        <Packing {...props} />
      </Group>
      <Group id="charges" title="Once-only costs" aside="left empty, this run bears all of it">
        <Charges {...props} />
      </Group>
      <Group id="allowances" title="Spares, boards and replacements">
        <Allowances {...props} />
      </Group>
    </div>
  );
}
