import { memo, type ReactNode } from "react";
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

/** A group is drawn again only when its own part of the plan changed, so that typing stays quick. */
function unlessSame(partsOf: (props: InputProps) => readonly unknown[]) {
  return (before: InputProps, after: InputProps) => {
    const [was, is] = [partsOf(before), partsOf(after)];
    return was.every((part, place) => part === is[place]);
  };
}

const Mix = memo(
  MixAndPrices,
  unlessSame(({ held, run, may }) => [held.plan.editions, run.kits, may]),
);
const Sale = memo(
  SaleTerms,
  unlessSame(({ held, may }) => [held.plan.sale, may]),
);
const Tasks = memo(
  Work,
  unlessSame(({ held, may }) => [held.plan.work, held.plan.editions, may]),
);
const Items = memo(
  Packing,
  unlessSame(({ held, may }) => [held.plan.packing, held.plan.editions, may]),
);
const Once = memo(
  Charges,
  unlessSame(({ held, may }) => [held.plan.charges, may]),
);
const Spares = memo(
  Allowances,
  unlessSame(({ held, may }) => [held.spare, held.plan.replacements, held.plan.boards, held.plan.run, may]),
);

/** What the figures rest on: every entry of the run, followed by the figures while one types. */
export function Inputs(props: InputProps) {
  const pricesAside = props.may.changePrice
    ? undefined
    : `${rolesThatCan("change-price").join(" and ")} change these; you see them`;
  return (
    <div id="inputs" className="flex scroll-mt-40 flex-col gap-11">
      <Group id="prices" title="Mix and prices" aside={pricesAside}>
        <Mix {...props} />
      </Group>
      <Group id="sale" title="What goes off a sale" aside={pricesAside}>
        <Sale {...props} />
      </Group>
      <Group id="work" title="Work at the table">
        <Tasks {...props} />
      </Group>
      <Group id="packing" title="Packing">
        <Items {...props} />
      </Group>
      <Group id="charges" title="Once-only costs" aside="left empty, this run bears all of it">
        <Once {...props} />
      </Group>
      <Group id="allowances" title="Spares, boards and replacements">
        <Spares {...props} />
      </Group>
    </div>
  );
}
