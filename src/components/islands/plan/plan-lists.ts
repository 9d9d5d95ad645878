import { CallFailed, call } from "#src/components/islands/call.ts";
import { type KitAddress, kitApi, kitKeys } from "#src/components/islands/kit-address.ts";
import { showToast } from "#src/components/islands/parts/toasts.ts";
import { queryClient } from "#src/components/islands/query-client.ts";
import type { KitPlan } from "#src/server/kit-plan.ts";
import { noteEdit } from "./edit-log.ts";
import type { Fields } from "./plan-rows.ts";
import { heldPlan, holdPlan, settledRow } from "./save-edits.ts";
import { saving } from "./saving.ts";

/** The lists of a plan that people add to: work, packing, once-only charges, channels. */
export type ListKind = "task" | "packing" | "charge" | "channel";

const LISTS: Record<ListKind, { path: string; of: (plan: KitPlan["plan"]) => readonly { id: string }[] }> = {
  task: { path: "/tasks", of: (plan) => plan.work.tasks },
  packing: { path: "/packing", of: (plan) => plan.packing },
  charge: { path: "/charges", of: (plan) => plan.charges },
  channel: { path: "/channels", of: (plan) => plan.channels },
};

function withList(held: KitPlan, kind: ListKind, rows: readonly { id: string }[]): KitPlan {
  const { plan } = held;
  if (kind === "task")
    return { ...held, plan: { ...plan, work: { ...plan.work, tasks: rows as typeof plan.work.tasks } } };
  if (kind === "channel") return { ...held, plan: { ...plan, channels: rows as typeof plan.channels } };
  if (kind === "packing") return { ...held, plan: { ...plan, packing: rows as typeof plan.packing } };
  return { ...held, plan: { ...plan, charges: rows as typeof plan.charges } };
}

function refused(address: KitAddress, error: unknown): void {
  if (!(error instanceof CallFailed)) throw error;
  const { title, detail, errors } = error.problem;
  showToast({ kind: "fault", text: `Not saved. ${title} ${errors?.[0]?.message ?? detail}` });
  void queryClient.invalidateQueries({ queryKey: kitKeys.plan(address.kit) });
}

async function insert(
  address: KitAddress,
  kind: ListKind,
  fields: Fields,
  place: number,
): Promise<string | undefined> {
  try {
    const path = kitApi(address, LISTS[kind].path);
    const { id, version } = (await call<never>("POST", path, fields as never)) as {
      id: string;
      version: number;
    };
    const { position: _, ...shown } = fields;
    holdPlan(address, (held) => {
      const rows = [...LISTS[kind].of(held.plan)];
      rows.splice(place, 0, { id, ...shown });
      const versions = { ...held.versions, rows: { ...held.versions.rows, [id]: version } };
      return withList({ ...held, versions }, kind, rows);
    });
    saving.change((now) => ({ ...now, savedAt: Date.now() }));
    return id;
  } catch (error) {
    refused(address, error);
    return undefined;
  }
}

/** Adds a row at the end of a list; resolves to its id, or to nothing where the server refused it. */
export async function addRow(
  address: KitAddress,
  kind: ListKind,
  fields: Fields & { name: string },
): Promise<string | undefined> {
  const before = heldPlan(address);
  if (!before) return undefined;
  const id = await insert(address, kind, fields, LISTS[kind].of(before.plan).length);
  if (id === undefined) return undefined;
  noteEdit({
    before,
    from: null,
    at: Date.now(),
    field: `add ${id}`,
    nameFrom: () => `${fields.name} added.`,
    undo: () => void dropRow(address, kind, id),
  });
  return id;
}

type Dropped = Fields & { position: number };

async function dropRow(address: KitAddress, kind: ListKind, id: string): Promise<Dropped | undefined> {
  await settledRow(address, { kind, id });
  const before = heldPlan(address);
  if (!before) return undefined;
  holdPlan(address, (held) =>
    withList(
      held,
      kind,
      LISTS[kind].of(held.plan).filter((row) => row.id !== id),
    ),
  );
  try {
    const path = kitApi(address, `${LISTS[kind].path}/${id}?version=${before.versions.rows[id] ?? 1}`);
    const row = (await call<never>("DELETE", path)) as Dropped;
    saving.change((now) => ({ ...now, savedAt: Date.now() }));
    return row;
  } catch (error) {
    refused(address, error);
    return undefined;
  }
}

/** Removes a row; undoing puts it back where it was. */
export async function removeRow(
  address: KitAddress,
  kind: ListKind,
  id: string,
  name: string,
): Promise<void> {
  const before = heldPlan(address);
  if (!before) return;
  const rows = LISTS[kind].of(before.plan);
  const place = rows.findIndex((row) => row.id === id);
  const shown = rows[place];
  const gone = await dropRow(address, kind, id);
  if (!gone || !shown) return;
  const { id: _, ...fields } = shown;
  noteEdit({
    before,
    from: null,
    at: Date.now(),
    field: `remove ${id}`,
    nameFrom: () => `${name} removed.`,
    undo: () => void insert(address, kind, { ...fields, position: gone.position }, place),
  });
}

/** Puts the channels in another order: on this screen at once; the server's order where it is refused. */
export async function orderChannels(address: KitAddress, order: readonly string[]): Promise<void> {
  const before = heldPlan(address);
  if (!before) return;
  const rows = order.flatMap((id) => before.plan.channels.filter((channel) => channel.id === id));
  holdPlan(address, (held) => withList(held, "channel", rows));
  try {
    await call<never>("PUT", kitApi(address, "/channels"), { channels: order } as never);
    saving.change((now) => ({ ...now, savedAt: Date.now() }));
  } catch (error) {
    refused(address, error);
  }
}
