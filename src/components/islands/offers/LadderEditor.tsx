import { useRef } from "react";
import { currencySign } from "#src/components/amount-text.ts";
import type { Form } from "#src/components/islands/forms/use-form.ts";
import { Button } from "#src/components/islands/parts/Button.tsx";
import { CautionIcon } from "#src/components/islands/parts/Icons.tsx";
import { MoneyField } from "#src/components/islands/parts/MoneyField.tsx";
import { QuietButton } from "#src/components/islands/parts/QuietButton.tsx";
import { TextField } from "#src/components/islands/parts/TextField.tsx";
import { ladderProblems } from "#src/costing/ladder-problems.ts";
import { type BoardPriceModel, BREAKS_PER_OFFER_MOST, type PriceModel } from "#src/shapes/limits.ts";

/** A rung while it is typed: the quantity as text, so that nothing typed is lost. */
export interface RungDraft {
  key: number;
  quantity: string;
  price: string;
}

/** What the editor needs of a form: an offer, or a board house's quote. */
export interface LadderFields {
  breaks: RungDraft[];
  currency: string;
  priceModel: PriceModel | BoardPriceModel;
}

export function rungDrafts(breaks: readonly { quantity: number; price: string }[]): RungDraft[] {
  if (breaks.length === 0) return [{ key: 0, quantity: "", price: "" }];
  return breaks.map(({ quantity, price }, key) => ({ key, quantity: String(quantity), price }));
}

/** Rungs as they are sent: empty ones at the end are left out, so that places stay those of the screen. */
export function rungsOf(drafts: readonly RungDraft[]): { quantity: number; price: string }[] {
  const last = drafts.findLastIndex(({ quantity, price }) => quantity.trim() !== "" || price !== "");
  return drafts.slice(0, last + 1).map(({ quantity, price }) => ({
    quantity: quantity.trim() === "" ? Number.NaN : Number(quantity.replace(/[\s\u00a0]/g, "")),
    price,
  }));
}

/** Places of rungs that are dearer than the one below: unusual, but some sellers do it. */
function dearerAt({ breaks, priceModel }: LadderFields): ReadonlySet<number> {
  const rungs = rungsOf(breaks);
  const whole = rungs.every(({ quantity, price }) => Number.isInteger(quantity) && /^\d/.test(price));
  if (!whole || priceModel === "formula") return new Set();
  const found = ladderProblems({ breaks: rungs, priceModel, minimumOrder: 1, orderMultiple: 1 });
  return new Set(found.filter(({ code }) => code === "price-rises").map(({ at }) => at));
}

/** "From", "A lot of panels", "From so many panels". */
function columnHead(lots: boolean, things: string | undefined): string {
  if (!things) return lots ? "A lot of" : "From";
  return lots ? `A lot of ${things}` : `From so many ${things}`;
}

/** Focus goes to a field of a rung once it is there. */
function useRungFocus() {
  const list = useRef<HTMLUListElement>(null);
  const focus = (place: number) =>
    requestAnimationFrame(() => {
      const row = list.current?.children.item(Math.max(0, place));
      row?.querySelector("input")?.focus();
    });
  return { list, focus };
}

/** The breaks of a ladder, one row each. Enter in the last price adds a row; every row can be removed. */
export function LadderEditor<Fields extends LadderFields>({
  form,
  things,
}: {
  form: Form<Fields>;
  /** What the quantities count, where that is not plain: "panels". */
  things?: string;
}) {
  const { breaks, currency, priceModel } = form.fields;
  const { list, focus } = useRungFocus();
  const dearer = dearerAt(form.fields);
  const set = (rungs: RungDraft[]) => form.set({ breaks: rungs } as Partial<Fields>);
  const change = (key: number, rung: Partial<RungDraft>) =>
    set(breaks.map((one) => (one.key === key ? { ...one, ...rung } : one)));

  function add() {
    if (breaks.length >= BREAKS_PER_OFFER_MOST) return;
    const key = Math.max(-1, ...breaks.map((rung) => rung.key)) + 1;
    set([...breaks, { key, quantity: "", price: "" }]);
    focus(breaks.length);
  }

  function remove(place: number) {
    const rest = breaks.filter((_, other) => other !== place);
    set(rest.length > 0 ? rest : rungDrafts([]));
    focus(place - 1);
  }

  const lots = priceModel === "lots";
  return (
    <fieldset>
      <legend className="type-table mb-2 font-semibold">{lots ? "Lots" : "Price breaks"}</legend>
      <div aria-hidden="true" className="type-label mb-1 flex gap-4 text-ink-2">
        <span className="w-52 max-tablet:w-full">{columnHead(lots, things)}</span>
        <span className="max-tablet:hidden">{lots ? "costs" : "each costs"}</span>
      </div>
      <ul ref={list} className="flex flex-col gap-3">
        {breaks.map((rung, place) => (
          <li key={rung.key} className="flex flex-wrap items-start gap-x-4 gap-y-1">
            <TextField
              label={`${lots ? "Lot of" : "From"}, ${lots ? "lot" : "break"} ${place + 1}`}
              labelHidden
              {...form.words(`breaks.${place}.quantity`)}
              inputMode="numeric"
              autoComplete="off"
              value={rung.quantity}
              onChange={(typed) => change(rung.key, { quantity: typed.currentTarget.value })}
              className="w-52 max-tablet:w-full"
            />
            <MoneyField
              label={`${lots ? "Costs" : "Price each"}, ${lots ? "lot" : "break"} ${place + 1}`}
              labelHidden
              {...form.words(`breaks.${place}.price`)}
              currency={currencySign(currency)}
              unit={lots ? "a lot" : "each"}
              places={4}
              value={rung.price}
              onMoney={(price) => change(rung.key, { price })}
              className="w-60"
            />
            <span className="pt-2">
              <QuietButton
                onClick={() => remove(place)}
                aria-label={`Remove ${lots ? "lot" : "break"} ${place + 1}`}
              >
                Remove
              </QuietButton>
            </span>
            {dearer.has(place) && (
              <p className="type-label flex basis-full gap-2">
                <CautionIcon className="mt-px size-[18px] text-caution" />
                Dearer each than the one before. Some sellers do that; it is worth a look.
              </p>
            )}
          </li>
        ))}
      </ul>
      {form.words("breaks").wrong && (
        <p className="type-label font-semibold text-bad">{form.words("breaks").wrong}</p>
      )}
      <Button
        size="small"
        className="mt-3"
        onClick={add}
        offBecause={
          breaks.length >= BREAKS_PER_OFFER_MOST ? `At most ${BREAKS_PER_OFFER_MOST} of them.` : undefined
        }
      >
        {lots ? "Add a lot" : "Add a break"}
      </Button>
    </fieldset>
  );
}
