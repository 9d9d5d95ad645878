import { countText, shareText } from "#src/components/amount-text.ts";
import { Figure } from "#src/components/islands/parts/Figure.tsx";
import type { Column } from "#src/components/islands/parts/Table.tsx";
import type { useOpens } from "#src/components/islands/plan/open-working.ts";
import type { EvenRow } from "./even-rows.ts";
import { countOf } from "./price-words.ts";

/** Id of the row of the whole run, whose figures open. */
export const MIX = "by the mix";

function kitsWords({ known, upTo }: EvenRow, value: number | null): string {
  if (!known) return "not known";
  return value === null ? `none up to ${countText(upTo)}` : countText(value);
}

/** The columns of break-even: the first run that pays, the safe one, and how many of the run must sell. */
export function evenColumns(opens: ReturnType<typeof useOpens>): Column<EvenRow>[] {
  const run = (label: string, row: EvenRow, which: "first" | "safe") => (
    <Figure
      label={label}
      value={kitsWords(row, row[which])}
      {...(row.id === MIX && row[which] !== null ? opens(`${which}-even`) : undefined)}
    />
  );
  return [
    { key: "name", head: "Sold", names: true, cell: ({ name }) => name },
    { key: "kits", head: "Made", number: true, wide: true, cell: (row) => countText(row.kits) },
    {
      key: "first",
      head: "Pays first at",
      number: true,
      cell: (row) => run("Pays first at a run of", row, "first"),
    },
    { key: "safe", head: "Safe from", number: true, cell: (row) => run("Safe from", row, "safe") },
    {
      key: "margin",
      head: "Margin of safety",
      number: true,
      wide: true,
      cell: ({ marginOfSafety }) => (marginOfSafety === null ? "–" : shareText(marginOfSafety)),
    },
    { key: "sold", head: "Even after", number: true, cell: (row) => <EvenAfter row={row} opens={opens} /> },
  ];
}

function EvenAfter({ row, opens }: { row: EvenRow; opens: ReturnType<typeof useOpens> }) {
  if (!row.evenAfter.known) return countOf(row.evenAfter);
  const opened = row.id === MIX ? opens("even-after") : undefined;
  return <Figure label="Even after" value={`${countOf(row.evenAfter)} sold`} {...opened} />;
}
