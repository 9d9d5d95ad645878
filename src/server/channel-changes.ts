import type { ChannelChange, ChannelEntry } from "#src/shapes/channel.ts";
import { CHANNELS_MOST } from "#src/shapes/limits.ts";
import type { PlanChannel } from "#src/shapes/plan.ts";
import { channelFaults } from "./channel-faults.ts";
import { newId } from "./new-id.ts";
import { type Changing as ChangingSomewhere, clash, noteChange } from "./note-change.ts";
import { channelFields, planChannel } from "./plan-channel.ts";
import { Problem, wrongField } from "./problem.ts";
import type { Changed } from "./run-changes.ts";
import {
  addChannel,
  type ChannelWithPrices,
  changeChannel,
  channelOf,
  channelsOf,
  placeChannel,
  removeChannel,
} from "./store/channel.ts";
import { editionsOf } from "./store/edition.ts";
import type { KitRow } from "./store/kit.ts";
import type { WorkshopRow } from "./store/membership.ts";
import { inTransaction } from "./transaction.ts";

type Changing = ChangingSomewhere & { workshop: WorkshopRow; kit: KitRow };

/** A channel with what its row needs to be changed again or put back. */
export type ChannelView = PlanChannel & { version: number; position: number };

function viewOf(found: ChannelWithPrices): ChannelView {
  const { version, position } = found.channel;
  return { ...planChannel(found), version, position };
}

function refuseImpossible({ db, kit }: Changing, channel: Omit<PlanChannel, "id">): void {
  const editions = new Set(editionsOf(db, kit.id).map(({ id }) => id));
  const errors = channelFaults(channel, editions);
  if (errors.length > 0) throw new Problem("wrong-input", { errors });
}

function refuseTakenName(all: readonly ChannelWithPrices[], name: string, own?: string): void {
  if (all.some(({ channel }) => channel.name === name && channel.id !== own))
    throw wrongField("name", `This kit has a channel called ${name} already. Give it another name.`);
}

function found({ db, kit }: Changing, id: string): ChannelWithPrices {
  const channel = channelOf(db, kit.id, id);
  if (!channel) throw new Problem("not-found");
  return channel;
}

/** Adds a way to sell, last unless a position is named. */
export function makeChannel(given: Changing, { position, ...entry }: ChannelEntry): Changed & { id: string } {
  const { db, kit, workshop } = given;
  return inTransaction(db, () => {
    const all = channelsOf(db, kit.id);
    if (all.length >= CHANNELS_MOST)
      throw wrongField("name", `A kit is sold in at most ${CHANNELS_MOST} channels.`);
    refuseTakenName(all, entry.name);
    refuseImpossible(given, entry);
    const { ownPrices, other, ...same } = entry;
    const row = {
      ...same,
      otherName: other.name,
      otherAmount: other.amount,
      otherSharedOver: other.sharedOver,
      id: newId(),
      workshopId: workshop.id,
      kitId: kit.id,
      position: position ?? (all.at(-1)?.channel.position ?? -1) + 1,
    };
    addChannel(db, row, ownPrices);
    noteChange(given, { action: "channel.add", subjectId: row.id, subjectName: row.name, detail: entry });
    return { id: row.id, version: 1 };
  });
}

/** Changes fields of a channel that its person has seen as it is. */
export function setChannel(given: Changing, id: string, { version, ...fields }: ChannelChange): Changed {
  const { db, kit } = given;
  return inTransaction(db, () => {
    const before = viewOf(found(given, id));
    const after = { ...before, ...fields };
    if (fields.name !== undefined) refuseTakenName(channelsOf(db, kit.id), fields.name, id);
    refuseImpossible(given, after);
    const owner = { id, workshopId: given.workshop.id };
    if (!changeChannel(db, owner, version, channelFields(fields), fields.ownPrices))
      throw clash(given, id, before);
    const names = Object.keys(fields) as (keyof typeof fields)[];
    const detail = Object.fromEntries(names.map((name) => [name, [before[name], after[name]]]));
    noteChange(given, { action: "channel.change", subjectId: id, subjectName: after.name, detail });
    return { version: version + 1 };
  });
}

/** Puts the channels in a new order; every one must be named once. */
export function orderChannels(given: Changing, order: readonly string[]): { channels: string[] } {
  const { db, kit } = given;
  return inTransaction(db, () => {
    const own = channelsOf(db, kit.id).map(({ channel }) => channel.id);
    if (order.length !== own.length || own.some((id) => !order.includes(id)))
      throw wrongField("channels", "Name every channel of the kit once.");
    for (const [position, id] of order.entries()) placeChannel(db, id, position);
    noteChange(given, { action: "channel.order", subjectId: kit.id, subjectName: kit.name });
    return { channels: [...order] };
  });
}

/** Removes a channel and hands it back, so that it can be put back where it was. The last one stays. */
export function dropChannel(given: Changing, id: string, version: number): ChannelView {
  const { db, kit } = given;
  return inTransaction(db, () => {
    const channel = viewOf(found(given, id));
    if (channel.version !== version) throw clash(given, id, channel);
    if (channelsOf(db, kit.id).length === 1)
      throw wrongField("channel", "A kit is sold in at least one channel. Add another one first.");
    removeChannel(db, id);
    noteChange(given, { action: "channel.remove", subjectId: id, subjectName: channel.name });
    return channel;
  });
}
