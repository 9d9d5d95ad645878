import { Figure } from "#src/components/islands/parts/Figure.tsx";
import type { useOpens } from "#src/components/islands/plan/open-working.ts";
import { HEAD_ROW, TABLE } from "#src/components/table-look.ts";
import { type ChannelOrder, channelTable } from "#src/costing/price/channel-table.ts";
import type { PlanChannel } from "#src/shapes/plan.ts";
import { type ChannelActions, ChannelHead } from "./ChannelHead.tsx";
import { CHANNEL_ROWS, type ChannelRow, rowLabel } from "./channel-rows.ts";
import type { PriceProps } from "./price-props.ts";
import { TermsOf } from "./TermsOf.tsx";

export interface ChannelTableProps extends PriceProps {
  opens: ReturnType<typeof useOpens>;
  /** The channel that is being changed. */
  open: string | null;
  actionsOf: (channel: PlanChannel) => ChannelActions | null;
}

/** Every channel side by side, from what is asked to what an hour earns. */
export function ChannelTable(props: ChannelTableProps) {
  const { address, context, edition, open, actionsOf } = props;
  const { plan } = context;
  const orders = new Map(channelTable(context, edition.id).map((order) => [order.channel, order]));
  return (
    <section
      aria-label="Channels side by side"
      // Wider than the page on a phone; what scrolls must be reachable by keys.
      // biome-ignore lint/a11y/noNoninteractiveTabindex: WCAG 2.1.1 asks for it
      tabIndex={0}
      className="overflow-x-auto print:overflow-visible"
    >
      <table className={`${TABLE} table-fixed`}>
        <caption className="heard-only">One order of {edition.name} in every channel</caption>
        <colgroup>
          <col className="w-[110px] tablet:w-[210px]" />
          {plan.channels.map(({ id }) => (
            <col
              key={id}
              className={id === open ? "w-[236px]" : "w-[128px] tablet:w-auto tablet:min-w-[128px]"}
            />
          ))}
        </colgroup>
        <thead>
          <tr className={HEAD_ROW}>
            <td className="sticky left-0 z-10 bg-paper" />
            {plan.channels.map((channel) => (
              <th
                key={channel.id}
                id={`channel-${channel.id}`}
                scope="col"
                className="border-l border-rule px-3 pb-2 text-right align-bottom font-semibold"
              >
                <ChannelHead
                  {...{ address, channel }}
                  currency={plan.currency}
                  order={orders.get(channel.id) ?? null}
                  editions={plan.editions}
                  open={channel.id === open}
                  actions={actionsOf(channel)}
                />
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {CHANNEL_ROWS.map((row) => (
            <Row key={row.key} row={row} orders={orders} {...props} />
          ))}
        </tbody>
      </table>
    </section>
  );
}

const ROW_LOOK = {
  sum: "font-semibold border-b-[1.5px] border-ink",
  result: "rule-result font-semibold",
  strong: "hairline-b font-semibold",
} as const;

function Row({
  row,
  orders,
  ...props
}: ChannelTableProps & { row: ChannelRow; orders: ReadonlyMap<string, ChannelOrder> }) {
  const { context, open, address, edition } = props;
  const { plan } = context;
  const look = row.weight ? ROW_LOOK[row.weight] : "hairline-b";
  return (
    <tr className={look}>
      <th
        scope="row"
        className={`sticky left-0 z-10 bg-paper py-2 pr-2 text-left align-top ${row.weight ? "font-semibold" : "font-normal"} ${row.weight === "result" ? "type-h3" : ""}`}
      >
        {rowLabel(row, plan.channels)}
      </th>
      {plan.channels.map((channel) => {
        const order = orders.get(channel.id);
        return (
          <td key={channel.id} className="border-l border-rule px-3 py-2 text-right align-top">
            {order ? <Amount {...props} row={row} order={order} /> : <span className="text-ink-2">–</span>}
            {row.terms && open === channel.id && (
              <fieldset className="mt-2 flex flex-col gap-2 text-left font-normal">
                <legend className="heard-only">{`${row.label}, ${channel.name}`}</legend>
                <TermsOf {...{ address, channel, edition }} currency={plan.currency} terms={row.terms} />
              </fieldset>
            )}
          </td>
        );
      })}
    </tr>
  );
}

function Amount({
  row,
  order,
  context,
  edition,
  opens,
}: ChannelTableProps & { row: ChannelRow; order: ChannelOrder }) {
  const { currency } = context.plan;
  const text = row.text(order, currency);
  const opened = row.opens && (row.known?.(order) ?? true) ? opens(row.opens(order, edition.id)) : undefined;
  return (
    <Figure
      label={`${row.label}, ${order.name}`}
      value={text}
      className={row.weight === "result" ? "text-[1.1875rem]" : ""}
      {...opened}
    />
  );
}
