import { moneyText } from "#src/components/amount-text.ts";
import { Figure } from "#src/components/islands/parts/Figure.tsx";
import { Section } from "#src/components/islands/parts/Section.tsx";
import type { useOpens } from "#src/components/islands/plan/open-working.ts";
import type { Figure as CostFigure } from "#src/costing/figure.ts";
import type { PriceYields } from "#src/costing/price/price-yields.ts";
import type { FigureId } from "#src/costing/working-tree.ts";
import type { PriceProps } from "./price-props.ts";
import { countOf, minutesOf, moneyOf, shareOf } from "./price-words.ts";

interface Yield {
  label: string;
  figure: CostFigure;
  text: string;
  opens?: FigureId;
}

function yieldsOf(yields: PriceYields, edition: string, currency: string): Yield[] {
  const money = (label: string, figure: CostFigure, opens?: FigureId): Yield => ({
    label,
    figure,
    text: moneyOf(figure, currency),
    opens,
  });
  return [
    money("Left of a kit", yields.left, `kit-left:${edition}`),
    {
      label: "Margin, of the price without tax",
      figure: yields.margin,
      text: shareOf(yields.margin),
      opens: `kit-margin:${edition}`,
    },
    {
      label: "Mark-up, on the cost",
      figure: yields.markUp,
      text: shareOf(yields.markUp),
      opens: `kit-mark-up:${edition}`,
    },
    money("Left of the next kit", yields.nextKit, `kit-next:${edition}`),
    money("Profit of the run", yields.profit, "profit"),
    money("Earned in an hour", yields.perHour, `kit-hour:${edition}`),
    { label: "Time for a kit, made and sold", figure: yields.minutes, text: minutesOf(yields.minutes) },
    {
      label: "Even after, by the mix",
      figure: yields.evenAfter,
      text: yields.evenAfter.known ? `${countOf(yields.evenAfter)} sold` : countOf(yields.evenAfter),
      opens: "even-after",
    },
  ];
}

interface YieldsSectionProps extends Pick<PriceProps, "context" | "edition"> {
  yields: PriceYields;
  opens: ReturnType<typeof useOpens>;
}

/** The reverse: what the chosen price does. */
export function YieldsSection({ context, edition, yields, opens }: YieldsSectionProps) {
  const { currency } = context.plan;
  if (yields.price === null) return null;
  return (
    <Section
      title={`What ${moneyText(yields.price, currency)} does`}
      aside={context.plan.editions.length > 1 ? `${edition.name}, over all channels` : "over all channels"}
    >
      <dl className="grid gap-x-12 tablet:grid-cols-2">
        {yieldsOf(yields, edition.id, currency).map(({ label, figure, text, opens: opened }) => (
          <div key={label} className="hairline-b flex min-h-10 items-center justify-between gap-4 py-1.5">
            <dt>{label}</dt>
            <dd className="text-right font-semibold">
              <Figure label={label} value={text} {...(figure.known && opened ? opens(opened) : undefined)} />
            </dd>
          </div>
        ))}
      </dl>
    </Section>
  );
}
