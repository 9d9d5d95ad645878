import { countText, moneyText, shareText } from "#src/components/amount-text.ts";
import { Figure } from "#src/components/islands/parts/Figure.tsx";
import { MarginNote } from "#src/components/islands/parts/Pair.tsx";
import type { useOpens } from "#src/components/islands/plan/open-working.ts";
import { type ChannelOrder, channelTable } from "#src/costing/price/channel-table.ts";
import type { PriceContext } from "#src/costing/price/price-context.ts";
import type { PriceYields } from "#src/costing/price/price-yields.ts";
import type { PlanEdition } from "#src/shapes/plan.ts";
import { perKit } from "./per-kit.ts";
import { listed, minutesOf } from "./price-words.ts";

interface NoteProps {
  context: PriceContext;
  edition: PlanEdition;
  yields: PriceYields;
}

/** All channels together, by their shares of the edition. */
export function TogetherNote({
  context,
  edition,
  yields,
  opens,
}: NoteProps & { opens: ReturnType<typeof useOpens> }) {
  const { left, perHour, minutes } = yields;
  if (!left.known) return null;
  const { currency } = context.plan;
  const orders = channelTable(context, edition.id);
  const hundredths = orders.flatMap(({ share }) => (share.known ? [inHundred(share.value)] : []));
  return (
    <MarginNote title="All channels together">
      <p>
        {hundredths.length > 1 && `${listed(hundredths)} in a hundred, so one kit `}
        {hundredths.length > 1 ? "leaves " : "One kit leaves "}
        <Figure
          label="Left of a kit"
          value={moneyText(left.value, currency)}
          {...opens(`kit-left:${edition.id}`)}
        />
        {hundredths.length > 1 && " on average"}
        {perHour.known && (
          <>
            , or{" "}
            <b>
              <Figure
                label="Earned in an hour"
                value={moneyText(perHour.value, currency)}
                {...opens(`kit-hour:${edition.id}`)}
              />{" "}
              an hour
            </b>{" "}
            at {minutesOf(minutes)} a kit
          </>
        )}
        .
      </p>
    </MarginNote>
  );
}

/** "0.55" is "55". */
function inHundred(share: string): string {
  return shareText(share).replace(/\D+$/, "");
}

/** Making and selling, apart. */
export function TimeNote({ context, edition }: Omit<NoteProps, "yields">) {
  const made = context.cost.editions.find(({ id }) => id === edition.id);
  const { ratePerHour } = context.plan.work;
  if (!made || made.kits === 0 || made.minutes === "0") return null;
  const each = perKit([made.minutes], made.kits.toString());
  return (
    <MarginNote title="Time">
      <p>
        {minutesOf({ known: true, value: each })} to make one kit, with its part of setting up; the rest to
        sell and send it. Time to sell is a cost at your rate
        {ratePerHour !== null && ` of ${moneyText(ratePerHour, context.plan.currency)} an hour`}, as time to
        make is.
      </p>
    </MarginNote>
  );
}

/** Channels whose prices are stated without tax: shops that buy to sell on. */
export function WholesaleNote({ context, edition }: Omit<NoteProps, "yields">) {
  const { currency } = context.plan;
  const shops = channelTable(context, edition.id).filter(({ taxStated }) => taxStated === "on-top");
  if (shops.length === 0) return null;
  return shops.map((shop) => (
    <MarginNote key={shop.channel} title={shop.name}>
      <p>
        {paid(shop, currency)}
        {edition.price !== null && ` and sells at ${moneyText(edition.price, currency)}`}.{" "}
        {leaves(shop, currency)}
      </p>
    </MarginNote>
  ));
}

function paid({ priceAsked }: ChannelOrder, currency: string): string {
  return priceAsked.known
    ? `The shop pays ${moneyText(priceAsked.value, currency)} without tax`
    : "What the shop pays is not known yet";
}

function leaves({ left, minutes, kitsPerOrder }: ChannelOrder, currency: string): string {
  if (!left.known || !minutes.known) return "";
  const each = (value: string) => perKit([value], kitsPerOrder);
  const several = kitsPerOrder === "1" ? "" : `, ${countText(kitsPerOrder)} kits in an order`;
  return `It leaves ${moneyText(each(left.value), currency)} a kit and asks ${minutesOf({ known: true, value: each(minutes.value) })}${several}.`;
}

/** What figures for tax and duty are, and what else the law asks of who sells kits. */
export function CautionNote() {
  return (
    <MarginNote title="Tax, and what the law asks">
      <p>
        The rates are what you write. Figures for tax and duty are estimates: ask the local authority or a
        professional.
      </p>
      <p>
        What is asked of who sells kits (conformity, radio, waste, customs) differs from country to country.{" "}
        <a href="/methods/price">How a price is reckoned</a>
      </p>
    </MarginNote>
  );
}
