import { type RefObject, useEffect, useRef } from "react";
import { countText, shareText } from "#src/components/amount-text.ts";
import { Button } from "#src/components/islands/parts/Button.tsx";
import { QuietButton } from "#src/components/islands/parts/QuietButton.tsx";
import { EditionsEntry } from "#src/components/islands/run/inputs/EditionsEntry.tsx";
import { NumberEntry } from "#src/components/islands/run/inputs/fields.tsx";
import { NameEntry } from "#src/components/islands/run/inputs/NameEntry.tsx";
import type { ChannelOrder } from "#src/costing/price/channel-table.ts";
import type { PlanChannel, PlanEdition } from "#src/shapes/plan.ts";
import { type ChannelEntryPlace, channelEntry } from "./channel-entry.ts";

export interface ChannelActions {
  onOpen: () => void;
  onClose: () => void;
  onCopy: () => void;
  onRemove: (() => void) | null;
  /** Null at that end of the row. */
  onLeft: (() => void) | null;
  onRight: (() => void) | null;
}

interface ChannelHeadProps extends ChannelEntryPlace {
  channel: PlanChannel;
  /** Null: the edition in view is not sold here. */
  order: ChannelOrder | null;
  editions: readonly PlanEdition[];
  open: boolean;
  actions: ChannelActions | null;
}

/** Name and share of a channel; while it is changed, as fields, with the ways to copy, move and remove it. */
export function ChannelHead({ order, editions, open, actions, ...place }: ChannelHeadProps) {
  const { channel } = place;
  const box = useFocusKept(open);
  const sold = order?.share.known ? `${shareText(order.share.value)} of kits` : "not sold here";
  return (
    <div ref={box} className="flex flex-col items-stretch gap-2">
      {open && actions ? (
        <div className="flex flex-col gap-2 text-left">
          <NameEntry value={channel.name} off={false} entry={channelEntry(place, "name")} />
          <NumberEntry
            label="Share"
            row
            whole
            off={false}
            most={1_000_000}
            unit="parts"
            value={channel.weight}
            entry={channelEntry(place, "weight")}
          />
          {editions.length > 1 && (
            <EditionsEntry
              value={channel.editions}
              editions={editions}
              off={false}
              entry={channelEntry(place, "editions")}
            />
          )}
          <OpenActions name={channel.name} actions={actions} />
        </div>
      ) : (
        <>
          <span className="type-note font-semibold text-ink">{channel.name}</span>
          <span className="type-label font-normal text-ink-2">
            {sold}
            {order && order.kitsPerOrder !== "1" && `, an order of ${kitsWords(order.kitsPerOrder)}`}
          </span>
          {actions && (
            <QuietButton
              className="self-end font-normal"
              aria-label={`Change ${channel.name}`}
              onClick={actions.onOpen}
              data-screen-only
              data-change
            >
              Change
            </QuietButton>
          )}
        </>
      )}
    </div>
  );
}

/** The button that opens a column goes when it is pressed, and so do its fields: the focus stays with the column. */
function useFocusKept(open: boolean): RefObject<HTMLDivElement | null> {
  const box = useRef<HTMLDivElement>(null);
  const was = useRef(false);
  useEffect(() => {
    if (was.current === open) return;
    was.current = open;
    const lost = document.activeElement === document.body;
    if (open || lost) box.current?.querySelector<HTMLElement>(open ? "input" : "[data-change]")?.focus();
  }, [open]);
  return box;
}

function kitsWords(kits: string): string {
  return `${/^\d+$/.test(kits) ? countText(kits) : kits} kits`;
}

function OpenActions({ name, actions }: { name: string; actions: ChannelActions }) {
  const { onClose, onCopy, onRemove, onLeft, onRight } = actions;
  return (
    <div className="flex flex-wrap items-center justify-end gap-x-3 gap-y-1">
      {onLeft && (
        <QuietButton aria-label={`Move ${name} to the left`} onClick={onLeft}>
          To the left
        </QuietButton>
      )}
      {onRight && (
        <QuietButton aria-label={`Move ${name} to the right`} onClick={onRight}>
          To the right
        </QuietButton>
      )}
      <QuietButton aria-label={`Copy ${name}`} onClick={onCopy}>
        Copy
      </QuietButton>
      {onRemove && (
        <QuietButton aria-label={`Remove ${name}`} onClick={onRemove}>
          Remove
        </QuietButton>
      )}
      <Button size="small" aria-label={`${name} is done`} onClick={onClose}>
        Done
      </Button>
    </div>
  );
}
