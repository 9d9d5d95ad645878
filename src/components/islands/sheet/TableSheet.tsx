import { RunBands } from "../parts/Bands.tsx";
import { Chip } from "../parts/Chip.tsx";
import { Figure } from "../parts/Figure.tsx";
import { type Column, Table } from "../parts/Table.tsx";

type Row = { run: number; cost: string; cash: string; even: string; expect: string; loss: string };

const ROWS: Row[] = [
  { run: 60, cost: "€23.66", cash: "€1\u00a0420", even: "57", expect: "€89", loss: "1 in 100" },
  { run: 100, cost: "€17.09", cash: "€1\u00a0709", even: "68", expect: "€686", loss: "3 in 100" },
  { run: 120, cost: "€14.95", cash: "€1\u00a0794", even: "72", expect: "€881", loss: "5 in 100" },
  { run: 180, cost: "€12.34", cash: "€2\u00a0221", even: "89", expect: "€688", loss: "17 in 100" },
];

const COLUMNS: Column<Row>[] = [
  {
    key: "run",
    head: "Run",
    names: true,
    cell: ({ run }) => (
      <span className="flex items-center gap-3 text-[1.0625rem] font-semibold">
        <RunBands kits={run} width={64} className="max-tablet:hidden" /> {run}
      </span>
    ),
  },
  { key: "cost", head: "Cost per kit", number: true, cell: ({ cost }) => cost },
  { key: "cash", head: "Cash needed", number: true, wide: true, cell: ({ cash }) => cash },
  { key: "even", head: "Even after", number: true, wide: true, cell: ({ even }) => even },
  { key: "expect", head: "Expect", number: true, cell: ({ expect }) => expect },
  { key: "loss", head: "Chance of a loss", number: true, cell: ({ loss }) => loss },
];

/** The table of runs from the Run page, one chosen. */
export function RunTable() {
  return (
    <Table
      caption="Runs worth a look"
      columns={COLUMNS}
      rows={ROWS}
      keyOf={(row) => String(row.run)}
      chosen={(row) => row.run === 120}
    />
  );
}

type Head = { name: string; amount: string; state?: string };
const HEADS: Head[] = [
  { name: "Parts, 23 lines", amount: "€3.79", state: "Settled" },
  { name: "Boards, 10 panels of 12", amount: "€2.25" },
  { name: "Once-only costs, shared by 120", amount: "€8.91" },
];

/** A table with a total: a line of ink above it, the double rule under its figure. */
export function TotalTable() {
  return (
    <Table
      caption="One kit of 120, built up"
      rows={HEADS}
      keyOf={(row) => row.name}
      height="dense"
      columns={[
        {
          key: "name",
          head: "Part of the cost",
          names: true,
          cell: ({ name }) => name,
          total: "Cost of one kit",
        },
        { key: "state", head: "State", cell: ({ state }) => state && <Chip kind="plain">{state}</Chip> },
        {
          key: "amount",
          head: "In one kit",
          number: true,
          result: true,
          cell: ({ name, amount }) => <Figure label={name} value={amount} onOpen={() => undefined} />,
          total: "€14.95",
        },
      ]}
    />
  );
}
