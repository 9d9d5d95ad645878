import { useEffect, useState } from "react";
import { countText } from "#src/components/amount-text.ts";
import { Button } from "#src/components/islands/parts/Button.tsx";
import { Section } from "#src/components/islands/parts/Section.tsx";
import type { useOpens } from "#src/components/islands/plan/open-working.ts";
import { addRow, orderChannels, removeRow } from "#src/components/islands/plan/plan-lists.ts";
import { CHANNELS_MOST } from "#src/shapes/limits.ts";
import type { PlanChannel } from "#src/shapes/plan.ts";
import type { ChannelActions } from "./ChannelHead.tsx";
import { ChannelTable } from "./ChannelTable.tsx";
import { freeName, newChannel } from "./channel-entry.ts";
import type { PriceProps } from "./price-props.ts";

/** The channel that is being changed; an address that ends in one's name opens it. */
function useNamedChannel(mayChange: boolean) {
  const [open, setOpen] = useState<string | null>(null);
  useEffect(() => {
    const read = () => {
      const named = /^#channel-([\w-]+)$/.exec(location.hash)?.[1];
      if (named !== undefined && mayChange) setOpen(named);
    };
    read();
    addEventListener("hashchange", read);
    return () => removeEventListener("hashchange", read);
  }, [mayChange]);
  return [open, setOpen] as const;
}

/** The channels, and the ways to add, copy, move and remove one. */
export function ChannelsSection(props: PriceProps & { opens: ReturnType<typeof useOpens> }) {
  const { address, context, mayChange } = props;
  const { channels, run, editions } = context.plan;
  const [open, setOpen] = useNamedChannel(mayChange);
  const full = channels.length >= CHANNELS_MOST;
  async function add(fields: Omit<PlanChannel, "id">) {
    const id = await addRow(address, "channel", fields);
    if (id !== undefined) setOpen(id);
  }
  async function remove({ id, name }: PlanChannel) {
    await removeRow(address, "channel", id, name);
    document.querySelector<HTMLElement>("#channels button")?.focus();
  }
  function move(place: number, by: -1 | 1) {
    const order = channels.map(({ id }) => id);
    const [moved = ""] = order.splice(place, 1);
    order.splice(place + by, 0, moved);
    void orderChannels(address, order);
  }
  function actionsOf(channel: PlanChannel): ChannelActions | null {
    if (!mayChange) return null;
    const { id, ...fields } = channel;
    const place = channels.indexOf(channel);
    return {
      onOpen: () => setOpen(id),
      onClose: () => setOpen(null),
      onCopy: () => void add({ ...fields, weight: 0, name: freeName(`Copy of ${channel.name}`, channels) }),
      onRemove: channels.length > 1 ? () => void remove(channel) : null,
      onLeft: place > 0 ? () => move(place, -1) : null,
      onRight: place < channels.length - 1 ? () => move(place, 1) : null,
    };
  }
  const of = editions.length > 1 ? props.edition.name : "one kit";
  return (
    <Section
      id="channels"
      title="Channel by channel"
      aside={`${of} in a run of ${countText(run.kits)}`}
      actions={
        mayChange && (
          <Button
            size="small"
            offBecause={full ? `A kit is sold in at most ${CHANNELS_MOST} channels.` : undefined}
            onClick={() => void add(newChannel(freeName("New channel", channels)))}
          >
            Add a channel
          </Button>
        )
      }
    >
      <ChannelTable {...props} open={open} actionsOf={actionsOf} />
    </Section>
  );
}
