import { and, asc, eq } from "drizzle-orm";
import type { Db } from "#db/client.ts";
import { groupBy } from "#db/group-by.ts";
import { channelPrices, channels } from "#db/schema/channels.ts";

export type ChannelRow = typeof channels.$inferSelect;
export type NewChannel = typeof channels.$inferInsert;
export type ChannelFields = Partial<Omit<NewChannel, "id" | "workshopId" | "kitId" | "version">>;

/** What a channel asks for an edition of its own. */
export interface OwnPrice {
  edition: string;
  price: string;
}

export interface ChannelWithPrices {
  channel: ChannelRow;
  ownPrices: OwnPrice[];
}

/** The channels of a kit in their order, each with its own prices by edition. */
export function channelsOf(db: Db, kitId: string): ChannelWithPrices[] {
  const rows = db.select().from(channels).where(eq(channels.kitId, kitId)).orderBy(asc(channels.position));
  const prices = db
    .select({
      channel: channelPrices.channelId,
      edition: channelPrices.editionId,
      price: channelPrices.price,
    })
    .from(channelPrices)
    .innerJoin(channels, eq(channels.id, channelPrices.channelId))
    .where(eq(channels.kitId, kitId))
    .orderBy(asc(channelPrices.editionId))
    .all();
  const own = groupBy(prices, ({ channel }) => channel);
  return rows.all().map((channel) => ({
    channel,
    ownPrices: (own.get(channel.id) ?? []).map(({ edition, price }) => ({ edition, price })),
  }));
}

/** A channel of this kit; one of another kit is not found. */
export function channelOf(db: Db, kitId: string, id: string): ChannelWithPrices | undefined {
  return channelsOf(db, kitId).find(({ channel }) => channel.id === id);
}

export function addChannel(db: Db, row: NewChannel, ownPrices: readonly OwnPrice[]): void {
  db.insert(channels).values(row).run();
  setOwnPrices(db, row, ownPrices);
}

/** Changes a channel that still has the version `seen`; false where it has moved on or is gone. */
export function changeChannel(
  db: Db,
  { id, workshopId }: Pick<ChannelRow, "id" | "workshopId">,
  seen: number,
  fields: ChannelFields,
  ownPrices?: readonly OwnPrice[],
): boolean {
  const done = db
    .update(channels)
    .set({ ...fields, version: seen + 1 })
    .where(and(eq(channels.id, id), eq(channels.version, seen)))
    .run();
  if (done.changes === 0) return false;
  if (ownPrices) setOwnPrices(db, { id, workshopId }, ownPrices);
  return true;
}

function setOwnPrices(
  db: Db,
  { id, workshopId }: Pick<ChannelRow, "id" | "workshopId">,
  ownPrices: readonly OwnPrice[],
): void {
  db.delete(channelPrices).where(eq(channelPrices.channelId, id)).run();
  for (const { edition, price } of ownPrices)
    db.insert(channelPrices).values({ workshopId, channelId: id, editionId: edition, price }).run();
}

/** Puts a channel at another place of the list; order is not an edit, so the version stays. */
export function placeChannel(db: Db, id: string, position: number): void {
  db.update(channels).set({ position }).where(eq(channels.id, id)).run();
}

export function removeChannel(db: Db, id: string): void {
  db.delete(channels).where(eq(channels.id, id)).run();
}
