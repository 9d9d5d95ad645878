import { countText, moneyText } from "#src/components/amount-text.ts";
import { spanText } from "#src/components/day-text.ts";
import { Chip } from "#src/components/islands/parts/Chip.tsx";
import { Figure } from "#src/components/islands/parts/Figure.tsx";
import { QuietButton } from "#src/components/islands/parts/QuietButton.tsx";
import { RadioDot } from "#src/components/islands/parts/RadioGroup.tsx";
import { CELL, NUMBER, rowLook } from "#src/components/table-look.ts";
import { convertedEach } from "#src/costing/converted-each.ts";
import { WIDE } from "./ChoiceTable.tsx";
import { OfferBreaks } from "./OfferBreaks.tsx";
import type { OfferTableProps, ReckonedOffer } from "./OfferTable.tsx";
import { offerMark, seenText } from "./offer-words.ts";

type RowProps = OfferTableProps & { row: ReckonedOffer };

/** One offer: who, its ladder, what it comes to, and what the reckoning makes of it. */
export function OfferRow({ row, ...props }: RowProps) {
  const { offer, supplier, considered } = row;
  const { today } = props;
  const lead = offer.leadTimeDays ?? supplier?.leadTimeDays ?? null;
  const name = `${supplier?.name ?? "Nobody"} ${offer.orderCode}`.trim();
  return (
    <tr data-chosen={considered.chosen || undefined} className={rowLook("two-lines", considered.chosen)}>
      <th scope="row" className={`${CELL} font-normal`}>
        <Who row={row} name={name} {...props} />
        <span className="mt-1 flex flex-wrap items-center gap-x-4 pl-[34px] tablet:hidden">
          <State row={row} name={name} {...props} />
        </span>
      </th>
      <td className={`${CELL} ${WIDE}`}>
        <OfferBreaks offer={offer} reached={considered.quantity} />
      </td>
      <td className={`${CELL} ${NUMBER} font-semibold`}>
        {considered.quantity === null ? "" : countText(considered.quantity)}
      </td>
      <td className={`${CELL} ${NUMBER}`}>
        <Pays row={row} name={name} {...props} />
      </td>
      <td className={`${CELL} ${NUMBER} ${WIDE}`}>
        {offer.stockShown === null ? (
          <span className="text-ink-2">not shown</span>
        ) : (
          countText(offer.stockShown)
        )}
      </td>
      <td className={`${CELL} whitespace-nowrap ${WIDE}`}>{lead === null ? "not known" : spanText(lead)}</td>
      <td className={`${CELL} text-ink-2 ${WIDE}`}>{seenText(offer, today)}</td>
      <td className={`${CELL} ${WIDE}`}>
        <span className="flex flex-col items-start gap-1">
          <State row={row} name={name} {...props} />
        </span>
      </td>
    </tr>
  );
}

/** The chip, and the way to change the offer. */
function State({ row: { offer, considered }, name, today, canChange, onEdit }: RowProps & { name: string }) {
  const mark = offerMark(offer, considered, today);
  return (
    <>
      <Chip kind={mark.kind} className="align-middle">
        {mark.word}
      </Chip>
      {canChange && (
        <QuietButton onClick={() => onEdit(offer)} aria-label={`Change the offer of ${name}`}>
          Change
        </QuietButton>
      )}
    </>
  );
}

/** In the offer's currency, and below it in the run's where that is another; opens its working. */
function Pays({
  row: { offer, considered },
  name,
  reporting,
  rateOf,
  workingOf,
}: RowProps & { name: string }) {
  const { extended } = considered;
  if (extended === null) return null;
  const rate = offer.currency === reporting ? null : rateOf(offer.currency);
  return (
    <>
      <Figure
        label={`You pay ${name}`}
        value={moneyText(extended, offer.currency)}
        {...workingOf(considered)}
      />
      {rate !== null && (
        <span className="block text-ink-2 type-label">
          {moneyText(convertedEach(extended, rate, 1), reporting)}
        </span>
      )}
    </>
  );
}

function Who({
  row: { offer, supplier, considered },
  name,
  pinned,
  canChoose,
  onPin,
  supplierHref,
}: RowProps & { name: string }) {
  const words = (
    <span className="min-w-0">
      <span className={`block ${considered.chosen ? "font-semibold" : ""}`}>
        {supplier ? (
          <a className="text-ink no-underline hover:underline" href={supplierHref(supplier.id)}>
            {supplier.name}
          </a>
        ) : (
          "No supplier"
        )}
      </span>
      <span className="block wrap-anywhere text-ink-2 type-label">{offer.orderCode || "no order code"}</span>
    </span>
  );
  if (!canChoose) return words;
  return (
    <span className="flex items-center gap-3">
      <RadioDot
        name="pinned-offer"
        checked={pinned === offer.id}
        onChange={() => onPin(offer.id)}
        aria-label={`Always ${name}`}
        className={pinned === null && considered.chosen ? "border-petrol" : ""}
      />
      {words}
    </span>
  );
}
