import { moneyText } from "#src/components/amount-text.ts";
import { Figure } from "#src/components/islands/parts/Figure.tsx";
import { Question } from "#src/components/islands/parts/Question.tsx";
import type { useOpens } from "#src/components/islands/plan/open-working.ts";
import type { PriceYields } from "#src/costing/price/price-yields.ts";
import { needsInShort } from "#src/costing/problem-words.ts";
import type { PlanEdition } from "#src/shapes/plan.ts";

const QUESTION = "What should we ask for a kit?";

interface PriceAnswerProps {
  edition: PlanEdition;
  /** Named where there is more than one. */
  named: boolean;
  yields: PriceYields;
  currency: string;
  opens: ReturnType<typeof useOpens>;
  /** Whether prices for aims can be told. */
  solved: boolean;
}

/** The question, and what the chosen price leaves. */
export function PriceAnswer({ edition, named, yields, currency, opens, solved }: PriceAnswerProps) {
  const { brings, left, price } = yields;
  const forIt = named ? ` for ${edition.name}` : "";
  if (price === null)
    return (
      <Question question={QUESTION}>
        <b>No list price is set{forIt}.</b> {solved && "Below stands which price would do what."}
      </Question>
    );
  const ask = `Ask ${moneyText(price, currency)} with tax${forIt}.`;
  if (!brings.known || !left.known)
    return (
      <Question question={QUESTION}>
        <b>{ask}</b> What that leaves is not known: it {needsInShort(left.known ? [] : left.needs)}.
      </Question>
    );
  const lost = left.value.startsWith("-");
  const amount = moneyText(lost ? left.value.slice(1) : left.value, currency);
  return (
    <Question question={QUESTION}>
      <b>{ask}</b> Over all channels a kit then brings in{" "}
      <Figure
        label="A kit brings in"
        value={moneyText(brings.value, currency)}
        {...opens(`kit-brings:${edition.id}`)}
      />{" "}
      and {lost ? "loses" : "leaves"}{" "}
      <b>
        <Figure
          label={lost ? "A kit loses" : "A kit leaves"}
          value={amount}
          {...opens(`kit-left:${edition.id}`)}
        />
      </b>
      .
    </Question>
  );
}
