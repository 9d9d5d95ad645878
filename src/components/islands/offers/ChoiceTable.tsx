import type { ReactNode } from "react";
import { RadioDot } from "#src/components/islands/parts/RadioGroup.tsx";
import { CELL, HEAD_CELL, HEAD_ROW, NUMBER, rowLook, TABLE } from "#src/components/table-look.ts";

/** Dropped on a phone. */
export const WIDE = "max-tablet:hidden";

export interface ChoiceHead {
  head: string;
  number?: boolean;
  /** Dropped on a phone. */
  wide?: boolean;
}

interface ChoiceTableProps {
  caption: string;
  heads: readonly ChoiceHead[];
  /** The choice to leave it to the reckoning; left out where this person may only look. */
  cheapest?: { name: string; id: string; checked: boolean; onChoose: () => void };
  children: ReactNode;
}

/** Offers or quotes side by side with the choice among them; the last column holds each one's state. */
export function ChoiceTable({ caption, heads, cheapest, children }: ChoiceTableProps) {
  return (
    <table className={TABLE}>
      <caption className="heard-only">{caption}</caption>
      <thead>
        <tr className={HEAD_ROW}>
          {heads.map(({ head, number, wide }) => (
            <th
              key={head}
              scope="col"
              className={`${HEAD_CELL} whitespace-nowrap ${number ? NUMBER : ""} ${wide ? WIDE : ""}`}
            >
              {head}
            </th>
          ))}
          <th scope="col" className={`${HEAD_CELL} ${WIDE}`}>
            <span className="heard-only">State</span>
          </th>
        </tr>
      </thead>
      <tbody>
        {cheapest && (
          <tr className={rowLook("ordinary")}>
            <td colSpan={heads.length + 1} className={CELL}>
              <label htmlFor={cheapest.id} className="inline-flex min-h-10 items-center gap-3">
                <RadioDot
                  id={cheapest.id}
                  name={cheapest.name}
                  checked={cheapest.checked}
                  onChange={cheapest.onChoose}
                />
                The cheapest, worked out for every run
              </label>
            </td>
          </tr>
        )}
        {children}
      </tbody>
    </table>
  );
}
