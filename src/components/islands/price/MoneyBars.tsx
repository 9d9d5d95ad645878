import { moneyText } from "#src/components/amount-text.ts";
import { Section } from "#src/components/islands/parts/Section.tsx";
import { channelTable } from "#src/costing/price/channel-table.ts";
import { type BarPart, type MoneyBar, moneyBars, SEGMENTS, type Segment } from "./money-bars.ts";
import type { PriceProps } from "./price-props.ts";

/** A figure stands in its segment where there is room for it. */
const ROOM = 6.5;
const PHONE_ROOM = 15;

const NAMES: Record<Segment, string> = {
  tax: "tax",
  fees: "fees",
  selling: "postage, packing and the like",
  cost: "cost of the kit",
  time: "your time to sell it",
  left: "left for you",
};

const GROUNDS: Record<Segment, string> = {
  tax: "bg-tint",
  fees: "bg-sheet [background-image:repeating-linear-gradient(45deg,var(--color-rule-2)_0_1px,transparent_1px_6px)]",
  selling: "bg-sheet",
  cost: "bg-copper-wash",
  time: "bg-petrol-wash",
  left: "bg-petrol text-on-petrol",
};

/** Where the buyer's money goes, a bar for each channel. */
export function MoneyBars({ context, edition }: Pick<PriceProps, "context" | "edition">) {
  const { currency } = context.plan;
  const bars = moneyBars(channelTable(context, edition.id));
  if (bars.every(({ parts }) => parts === null)) return null;
  const shown = SEGMENTS.filter((segment) =>
    bars.some(({ parts }) => parts?.some((part) => part.segment === segment)),
  );
  return (
    <Section title="Where the buyer’s money goes" aside="one kit, all bars to one scale">
      <ul>
        {bars.map((bar) => (
          <li
            key={bar.channel}
            className="hairline-b grid items-center gap-x-4 gap-y-1 py-2.5 tablet:grid-cols-[116px_minmax(0,1fr)]"
          >
            <span className="font-semibold">{bar.name}</span>
            <Bar bar={bar} currency={currency} />
          </li>
        ))}
      </ul>
      <ul className="type-note mt-3 flex flex-wrap gap-x-6 gap-y-2">
        {shown.map((segment) => (
          <li key={segment} className="flex items-center gap-2.5">
            <span
              aria-hidden="true"
              className={`size-[18px] border-[1.5px] border-ink ${GROUNDS[segment]}`}
            />
            {NAMES[segment]}
          </li>
        ))}
      </ul>
    </Section>
  );
}

function Bar({ bar, currency }: { bar: MoneyBar; currency: string }) {
  if (bar.parts === null) return <span className="type-note text-ink-2">not known</span>;
  const words = bar.parts.map(({ segment, money }) => `${NAMES[segment]} ${moneyText(money, currency)}`);
  const lost = bar.lost === null ? "" : moneyText(bar.lost, currency);
  return (
    <div className="flex items-center gap-3">
      <div
        role="img"
        aria-label={`${bar.name}: ${words.join(", ")}${lost && `, lost ${lost}`}`}
        className="flex h-[38px] grow"
      >
        {bar.parts.map((part, place) => (
          <Part key={part.segment} part={part} first={place === 0} currency={currency} />
        ))}
      </div>
      {lost && <span className="type-label shrink-0 font-semibold text-bad">loses {lost}</span>}
    </div>
  );
}

function Part({ part, first, currency }: { part: BarPart; first: boolean; currency: string }) {
  return (
    <span
      style={{ width: `${part.width}%` }}
      className={`type-label flex items-center justify-center overflow-hidden border-[1.5px] border-ink font-semibold ${first ? "" : "-ml-[1.5px]"} ${GROUNDS[part.segment]}`}
    >
      {part.width > ROOM && (
        <span
          className={`${part.width > PHONE_ROOM ? "" : "max-tablet:hidden"} ${part.segment === "fees" ? "bg-sheet px-1" : ""}`}
        >
          {moneyText(part.money, currency)}
        </span>
      )}
    </span>
  );
}
