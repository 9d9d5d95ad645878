import { countText, moneyText, roundMoneyText } from "#src/components/amount-text.ts";
import { RunBands } from "#src/components/islands/parts/Bands.tsx";
import { QuietButton } from "#src/components/islands/parts/QuietButton.tsx";
import { Section } from "#src/components/islands/parts/Section.tsx";
import { type Column, Table } from "#src/components/islands/parts/Table.tsx";
import type { WhyShown, WorthALook } from "./worth-a-look.ts";

const WHY: Record<WhyShown, string> = {
  yours: "your run",
  "sweet-spot": "sweet spot",
  "before-a-step": "last before a step up",
  round: "a round number",
};

interface RunsProps {
  title?: string;
  aside?: string;
  rows: readonly WorthALook[];
  run: number;
  currency: string;
  /** Left out for who may only look. */
  onChoose?: (kits: number) => void;
}

/** Runs to compare, each with its figures; one press chooses. */
export function RunsWorthALook({
  title = "Runs worth a look",
  aside,
  rows,
  run,
  currency,
  onChoose,
}: RunsProps) {
  const known = (value: string | null, write: (value: string, currency: string) => string) =>
    value === null ? "not known" : write(value, currency);
  const columns: Column<WorthALook>[] = [
    {
      key: "run",
      head: "Run",
      names: true,
      cell: ({ kits }) => (
        <span className="flex items-center gap-3 text-[1.125rem] font-bold">
          <RunBands kits={kits} width={64} className="max-tablet:hidden" /> {kits}
        </span>
      ),
    },
    {
      key: "why",
      head: "Why",
      wide: true,
      cell: ({ why }) => <span className="text-ink-2">{WHY[why]}</span>,
    },
    { key: "cost", head: "Cost per kit", number: true, cell: ({ perKit }) => known(perKit, moneyText) },
    {
      key: "cash",
      head: "Cash needed",
      number: true,
      wide: true,
      cell: ({ cash }) => known(cash, roundMoneyText),
    },
    {
      key: "even",
      head: "Even after",
      number: true,
      wide: true,
      cell: ({ evenAfter }) => (evenAfter === null ? "–" : countText(evenAfter)),
    },
    {
      key: "profit",
      head: "Left if all sell",
      number: true,
      cell: ({ profit }) => known(profit, roundMoneyText),
    },
    {
      key: "choose",
      head: <span className="heard-only">Choose</span>,
      number: true,
      cell: ({ kits }) =>
        kits !== run && onChoose && <QuietButton onClick={() => onChoose(kits)}>Choose {kits}</QuietButton>,
    },
  ];
  return (
    <Section id="runs" title={title} aside={aside}>
      <Table
        caption={title}
        columns={columns}
        rows={rows}
        keyOf={({ kits }) => String(kits)}
        chosen={({ kits }) => kits === run}
      />
    </Section>
  );
}
