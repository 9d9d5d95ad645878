import { moneyText, rateText } from "#src/components/amount-text.ts";
import { Button } from "#src/components/islands/parts/Button.tsx";
import { Figure } from "#src/components/islands/parts/Figure.tsx";
import { useOpensAim } from "#src/components/islands/plan/open-working.ts";
import { take } from "#src/components/islands/run/inputs/entry.ts";
import type { Aim, AimName } from "#src/costing/price/aims.ts";
import type { Scope } from "#src/costing/price/edition-sale.ts";
import type { PriceEnding } from "#src/costing/price/price-ending.ts";
import { type AimPrice, priceForAim } from "#src/costing/price/price-for-aim.ts";
import { yieldsAt } from "#src/costing/price/price-yields.ts";
import { aimSentence, needWords } from "#src/costing/problem-words.ts";
import { AimTarget } from "./AimTarget.tsx";
import { type AimDraft, aimOf } from "./aim-draft.ts";
import type { PriceProps } from "./price-props.ts";
import { countOf, moneyOf, shareOf } from "./price-words.ts";
import { withOwnPrice } from "./with-own-price.ts";

const LABELS: Record<AimName, [name: string, means: string]> = {
  "next-kit": ["No loss on the next kit", "covers what one kit more costs"],
  "run-even": ["Break-even of this run", "every kit sells, and nothing is lost"],
  margin: ["A margin", "left ÷ price without tax"],
  "mark-up": ["A mark-up", "left ÷ cost of the kit"],
  profit: ["A profit of the run", "before tax, or after it where a rate is written"],
  hour: ["Pay for an hour", "for making and selling"],
};

export interface AimRowProps extends PriceProps {
  name: AimName;
  scope: Scope;
  ending: PriceEnding;
  draft: AimDraft;
  onDraft: (draft: AimDraft) => void;
}

/** One aim: its target, the least price that reaches it, what that would leave, and the way to take it. */
export function AimRow(props: AimRowProps) {
  const { name, context, scope, ending, draft, onDraft, mayChange } = props;
  const { currency } = context.plan;
  const aim = aimOf(name, draft);
  const found = aim === null ? null : priceForAim(context, scope, aim, ending);
  const [label, means] = LABELS[name];
  return (
    <li className="hairline-b grid items-center gap-x-4 gap-y-2 py-2.5 tablet:grid-cols-[minmax(0,1fr)_190px_110px_minmax(0,1fr)_150px]">
      <span>
        <span className="block font-semibold">{label}</span>
        <span className="type-label block text-ink-2">{means}</span>
      </span>
      <div className="empty:max-tablet:hidden">
        <AimTarget {...{ name, draft, currency, onDraft }} />
      </div>
      {aim && found?.found ? (
        <Found {...props} aim={aim} price={found.price} mayChange={mayChange} />
      ) : (
        <span className="type-note text-ink-2 tablet:col-span-3">{whyNot(props, found)}</span>
      )}
    </li>
  );
}

function whyNot({ edition }: AimRowProps, found: AimPrice | null): string {
  if (found === null) return "Write what it is to be.";
  if (found.found) return "";
  if (found.problem === null) return `Not known: ${needWords(found.needs)}.`;
  const { most } = found.problem;
  return aimSentence(found.problem, edition.name, most === undefined ? "" : rateText(most));
}

function Found(props: AimRowProps & { aim: Aim; price: string }) {
  const { address, context, edition, scope, ending, aim, price, mayChange, name } = props;
  const { currency, channels } = context.plan;
  const opens = useOpensAim();
  const [label] = LABELS[name];
  const { left, margin, evenAfter } = yieldsAt(context, scope, price);
  const only = channels.find(({ id }) => id === scope.channel);
  function onTake() {
    const place = { address, currency };
    if (only) {
      const row = { kind: "channel", id: only.id } as const;
      const prices = withOwnPrice(only.ownPrices, edition.id, price);
      take({ ...place, row, field: "ownPrices", thing: only.name }, prices);
    } else {
      take({ ...place, row: { kind: "price", id: edition.id }, field: "price", thing: edition.name }, price);
    }
  }
  return (
    <>
      <span className="tablet:text-right">
        <Figure
          label={`Least price for ${label.charAt(0).toLowerCase()}${label.slice(1)}`}
          value={moneyText(price, currency)}
          className="text-[1.1875rem] font-semibold"
          {...opens({ scope, aim, ending })}
        />
      </span>
      <span className="type-label text-ink-2">
        {moneyOf(left, currency)} a kit, margin {shareOf(margin)},{" "}
        {evenAfter.known ? `even after ${countOf(evenAfter)}` : countOf(evenAfter)}
      </span>
      <span className="tablet:text-right">
        {mayChange && (
          <Button size="row" aria-label={`Take ${moneyText(price, currency)}`} onClick={onTake}>
            Take this price
          </Button>
        )}
      </span>
    </>
  );
}
