import { countText, moneyText } from "#src/components/amount-text.ts";
import { spanText } from "#src/components/day-text.ts";
import { type ChoiceHead, ChoiceTable, WIDE } from "#src/components/islands/offers/ChoiceTable.tsx";
import { Chip } from "#src/components/islands/parts/Chip.tsx";
import { Figure } from "#src/components/islands/parts/Figure.tsx";
import { QuietButton } from "#src/components/islands/parts/QuietButton.tsx";
import { RadioDot } from "#src/components/islands/parts/RadioGroup.tsx";
import { useOpens } from "#src/components/islands/plan/open-working.ts";
import { CELL, NUMBER, rowLook } from "#src/components/table-look.ts";
import { needWords } from "#src/costing/problem-words.ts";
import type { QuoteResult } from "#src/costing/run-result.ts";
import type { BoardQuoteView } from "#src/server/board-changes.ts";
import { boardWords, orderWords, quoteMark, quoteName } from "./board-words.ts";

/** A quote with what the reckoning makes of it at this run. */
export interface QuoteRow {
  quote: BoardQuoteView;
  result: QuoteResult;
}

export interface QuoteTableProps {
  rows: readonly QuoteRow[];
  /** The chosen quote; null: the cheapest at the run. */
  chosen: string | null;
  reporting: string;
  today: string;
  canChoose: boolean;
  canChange: boolean;
  onChoose: (quote: string | null) => void;
  onEdit: (quote: BoardQuoteView) => void;
}

const HEADS: readonly ChoiceHead[] = [
  { head: "Board house" },
  { head: "You order", wide: true },
  { head: "Boards", number: true, wide: true },
  { head: "Landed", number: true },
  { head: "Each", number: true },
  { head: "Made and sent", wide: true },
  { head: "Board", wide: true },
];

/** Board houses side by side for this run. */
export function QuoteTable(props: QuoteTableProps) {
  const { rows, chosen, canChoose, onChoose } = props;
  const cheapest = {
    name: "quote",
    id: "quote-none",
    checked: chosen === null,
    onChoose: () => onChoose(null),
  };
  return (
    <ChoiceTable caption="Quotes of board houses" heads={HEADS} cheapest={canChoose ? cheapest : undefined}>
      {rows.map((row) => (
        <Row key={row.quote.id} row={row} {...props} />
      ))}
    </ChoiceTable>
  );
}

function Row({
  row: { quote, result },
  chosen,
  reporting,
  today,
  canChoose,
  canChange,
  onChoose,
  onEdit,
}: QuoteTableProps & { row: QuoteRow }) {
  const opens = useOpens();
  const name = quoteName(result);
  const mark = quoteMark(quote, result, today);
  const state = (
    <>
      <Chip kind={mark.kind} className="align-middle">
        {mark.word}
      </Chip>
      {canChange && (
        <QuietButton onClick={() => onEdit(quote)} aria-label={`Change the quote of ${name}`}>
          Change
        </QuietButton>
      )}
    </>
  );
  return (
    <tr data-chosen={result.chosen || undefined} className={rowLook("two-lines", result.chosen)}>
      <th scope="row" className={`${CELL} ${result.chosen ? "font-semibold" : "font-normal"}`}>
        <span className="flex items-center gap-3 tablet:whitespace-nowrap">
          {canChoose && (
            <RadioDot
              name="quote"
              checked={chosen === quote.id}
              onChange={() => onChoose(quote.id)}
              aria-label={`Always ${name}`}
            />
          )}
          <span>
            {quote.boardHouse}
            {result.boardsPerPiece > 1 && (
              <span className="type-label block font-normal">{`panels of ${countText(result.boardsPerPiece)}`}</span>
            )}
          </span>
        </span>
        <span className="mt-1 flex flex-wrap items-center gap-x-4 pl-[34px] tablet:hidden">{state}</span>
      </th>
      <td className={`${CELL} ${WIDE}`}>{orderWords(result)}</td>
      <td className={`${CELL} ${NUMBER} ${WIDE}`}>
        {result.ordered === null ? "" : countText(result.ordered)}
      </td>
      <td className={`${CELL} ${NUMBER}`}>
        {result.landed.known ? (
          <Figure
            label={`${name}, landed`}
            value={moneyText(result.landed.value, reporting)}
            {...opens(`quote:${quote.id}`)}
          />
        ) : (
          <span className="whitespace-normal text-ink-2">{needWords(result.landed.needs)}</span>
        )}
      </td>
      <td className={`${CELL} ${NUMBER} font-semibold`}>
        {result.perBoard.known ? moneyText(result.perBoard.value, reporting) : ""}
      </td>
      <td className={`${CELL} ${WIDE}`}>
        {quote.leadTimeDays === null ? "not known" : spanText(quote.leadTimeDays)}
      </td>
      <td className={`${CELL} type-label text-ink-2 ${WIDE}`}>{boardWords(quote)}</td>
      <td className={`${CELL} ${WIDE}`}>
        <span className="flex flex-col items-start gap-1">{state}</span>
      </td>
    </tr>
  );
}
