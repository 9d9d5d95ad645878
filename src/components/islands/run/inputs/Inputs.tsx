import { memo, type ReactNode } from "react";
import { rolesThatCan } from "#src/access.ts";
import { kitPath } from "#src/components/islands/kit-address.ts";
import { Pair } from "#src/components/islands/parts/Pair.tsx";
import { Section } from "#src/components/islands/parts/Section.tsx";
import { Allowances } from "./Allowances.tsx";
import { Charges } from "./Charges.tsx";
import { AllowancesNote, ChargesNote, MixNote, PackingNote, SaleNote, WorkNote } from "./InputNotes.tsx";
import type { InputProps } from "./input-props.ts";
import { MixAndPrices } from "./MixAndPrices.tsx";
import { Packing } from "./Packing.tsx";
import { SaleLines } from "./SaleLines.tsx";
import { Work } from "./Work.tsx";

interface GroupProps {
  id: string;
  title: string;
  aside?: string;
  note: ReactNode;
  children: ReactNode;
}

function Group({ id, title, aside, note, children }: GroupProps) {
  return (
    <div id={id} className="scroll-mt-40">
      <Pair note={note}>
        <Section title={title} aside={aside}>
          {children}
        </Section>
      </Pair>
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
  SaleLines,
  unlessSame(({ held }) => [held.plan.channels, held.plan.editions]),
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
  const { address, held, may } = props;
  const pricesAside = may.changePrice
    ? undefined
    : `${rolesThatCan("change-price").join(" and ")} change these; you see them`;
  return (
    <div id="inputs" className="flex scroll-mt-40 flex-col gap-11">
      <Group id="prices" title="Mix and prices" aside={pricesAside} note={<MixNote />}>
        <Mix {...props} />
      </Group>
      <Group id="sale" title="What goes off a sale" note={<SaleNote />}>
        <Sale {...props} />
      </Group>
      <Group id="work" title="Work at the table" note={<WorkNote />}>
        <Tasks {...props} />
      </Group>
      <Group
        id="packing"
        title="Packing"
        note={held.plan.editions.length > 1 && held.plan.packing.length > 0 && <PackingNote />}
      >
        <Items {...props} />
      </Group>
      <Group
        id="charges"
        title="Once-only costs"
        aside="left empty, this run bears all of it"
        note={<ChargesNote />}
      >
        <Once {...props} />
      </Group>
      <Group
        id="allowances"
        title="Spares, boards and replacements"
        note={<AllowancesNote boardsHref={held.plan.boards.needed ? kitPath(address, "/boards") : null} />}
      >
        <Spares {...props} />
      </Group>
    </div>
  );
}
