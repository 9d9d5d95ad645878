import { compressDesignators } from "#src/partslist/designators.ts";
import type { JoinOffer } from "#src/partslist/draft.ts";
import { Button } from "../parts/Button.tsx";
import { QuietButton } from "../parts/QuietButton.tsx";
import { Section } from "../parts/Section.tsx";
import { counted, rowNumbers } from "./count-words.ts";
import type { Edit } from "./use-import.ts";

interface Props {
  offers: readonly JoinOffer[];
  /** Rows that stand joined already. */
  joined: number;
  edit: (edit: Edit) => void;
}

/** Equal rows that could stand as one line: offered, never done unasked. */
export function JoinsSection({ offers, joined, edit }: Props) {
  if (offers.length === 0) return null;
  return (
    <Section
      id="joins"
      title="Rows of the same part"
      aside={joined > 0 ? `${counted(joined, "row is", "rows are")} joined` : "they can stay apart"}
      actions={
        joined > 0 ? (
          <QuietButton onClick={() => edit({ join: [] })}>Keep them all apart</QuietButton>
        ) : (
          <Button size="small" onClick={() => edit({ join: "all" })}>
            Join {counted(offers.length, "group", "groups")} of equal rows
          </Button>
        )
      }
    >
      <ul className="type-table flex flex-col gap-1">
        {offers.slice(0, 8).map(({ rows, designators, quantity }) => (
          <li key={rows[0]}>
            <b>Rows {rowNumbers(rows)}</b>{" "}
            <span className="text-ink-2">
              {compressDesignators(designators)}
              {quantity !== null && `, ${quantity} in all`}
            </span>
          </li>
        ))}
        {offers.length > 8 && <li className="text-ink-2">and {offers.length - 8} groups more</li>}
      </ul>
    </Section>
  );
}
