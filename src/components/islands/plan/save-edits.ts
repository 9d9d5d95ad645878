import { CallFailed, call } from "#src/components/islands/call.ts";
import { type KitAddress, kitApi, kitKeys } from "#src/components/islands/kit-address.ts";
import { showToast } from "#src/components/islands/parts/toasts.ts";
import { queryClient } from "#src/components/islands/query-client.ts";
import type { KitPlan } from "#src/server/kit-plan.ts";
import { lostConnection, RETRY_MS } from "./connection.ts";
import { keepEdits, keptEdits } from "./kept-edits.ts";
import { watchLeaving } from "./leaving.ts";
import { arrived, merged, type PendingEdit, withEdit, withPending } from "./pending-edits.ts";
import {
  addressOf,
  type Fields,
  fieldsNow,
  holderOf,
  type PlanRow,
  versionOf,
  withFields,
  withVersion,
} from "./plan-rows.ts";
import { type Clash, countUnsaved, saving } from "./saving.ts";
import { sweepAhead } from "./sweep-of.ts";

/** An edit is sent when nothing was typed for so long; holding a key makes one request, not twenty. */
const QUIET_MS = 400;

/** Edits of one version holder, sent one after the other. */
interface Line {
  address: KitAddress;
  holder: string;
  waiting: PendingEdit[];
  sent: PendingEdit | null;
  /** The request that is under way, or the last one. */
  flight: Promise<void>;
  timer: ReturnType<typeof setTimeout> | undefined;
}

const lines = new Map<string, Line>();

function lineOf(address: KitAddress, holder: string): Line {
  const key = `${address.kit} ${holder}`;
  const found = lines.get(key);
  if (found) return found;
  const line: Line = {
    address,
    holder,
    waiting: [],
    sent: null,
    flight: Promise.resolve(),
    timer: undefined,
  };
  lines.set(key, line);
  return line;
}

/** The plan in the cache; edits are only made where one is shown. */
export function heldPlan({ kit }: KitAddress): KitPlan | undefined {
  return queryClient.getQueryData<KitPlan>(kitKeys.plan(kit));
}

export function holdPlan({ kit }: KitAddress, how: (held: KitPlan) => KitPlan): void {
  queryClient.setQueryData<KitPlan>(kitKeys.plan(kit), (held) => held && how(held));
}

/** Edits that are not known to have arrived, of one line or of all, in the order they were made. */
function unsaved(own: Iterable<Line> = lines.values()): PendingEdit[] {
  return [...own].flatMap(({ sent, waiting }) => (sent ? [sent, ...waiting] : waiting));
}

/** A plan from the server with this page's unsaved edits on top. */
export function overlaid({ kit }: KitAddress, fresh: KitPlan): KitPlan {
  const own = [...lines.values()].filter((line) => line.address.kit === kit);
  return withPending(fresh, unsaved(own));
}

function countWaiting(): void {
  countUnsaved("plan", unsaved().length);
}

/** Changes fields of a row on this screen at once, and on the server soon. */
export function editRow(address: KitAddress, row: PlanRow, fields: Fields): void {
  const held = heldPlan(address);
  if (!held) return;
  void queryClient.cancelQueries({ queryKey: kitKeys.plan(address.kit) });
  const base = fieldsNow(held, row, Object.keys(fields));
  const edited = withFields(held, row, fields);
  sweepAhead(edited.plan);
  holdPlan(address, () => edited);
  const line = lineOf(address, holderOf(row));
  line.waiting = withEdit(line.waiting, { row, fields, base });
  countWaiting();
  clearTimeout(line.timer);
  line.timer = setTimeout(() => sendNext(line), QUIET_MS);
}

/** Sends the next edit of a line, and when it has arrived the one after; nothing while one is under way. */
function sendNext(line: Line): void {
  const held = heldPlan(line.address);
  const next = line.waiting[0];
  if (line.sent || !next || !held) return;
  line.sent = next;
  line.waiting = line.waiting.slice(1);
  line.flight = send(line, next, held);
}

async function send(line: Line, next: PendingEdit, held: KitPlan): Promise<void> {
  const { of, path } = addressOf(next.row);
  const base = of === "kit" ? kitApi(line.address) : `/api/workshops/${line.address.workshop}`;
  const body = { ...next.fields, version: next.seen ?? versionOf(held.versions, line.holder) };
  try {
    const reply = (await call<never>("PATCH", base + path, body as never)) as { version: number };
    holdPlan(line.address, (now) => ({
      ...now,
      versions: withVersion(now.versions, line.holder, reply.version),
    }));
    line.sent = null;
    saving.change((now) => ({ ...now, savedAt: Date.now(), lostAt: null }));
  } catch (error) {
    line.sent = null;
    if (!(error instanceof CallFailed)) throw error;
    failed(line, next, error);
  } finally {
    countWaiting();
  }
  if (line.waiting.length > 0 && saving.now().lostAt === null) sendNext(line);
}

/** Waits until a row has no edit left to send, so that its version is the server's. */
export async function settledRow(address: KitAddress, row: PlanRow): Promise<void> {
  const line = lineOf(address, holderOf(row));
  clearTimeout(line.timer);
  sendNext(line);
  while (line.sent) await line.flight;
}

/** The version that is held for a line's row; a line without a plan has none. */
function versionHeld({ address, holder }: Line): number {
  const held = heldPlan(address);
  return held ? versionOf(held.versions, holder) : 0;
}

function failed(line: Line, edit: PendingEdit, { problem }: CallFailed): void {
  if (problem.code === "no-connection") {
    line.waiting = line.waiting.reduce(withEdit, [edit]);
    lostConnection();
    line.timer = setTimeout(sendAll, RETRY_MS);
  } else if (problem.code === "changed-meanwhile") meetOther(line, edit, problem.current as Fields);
  else {
    const detail = problem.errors?.[0]?.message ?? problem.detail;
    showToast({ kind: "fault", text: `Not saved. ${problem.title} ${detail}` });
    void queryClient.invalidateQueries({ queryKey: kitKeys.plan(line.address.kit) });
  }
}

/** Somebody was quicker. What only we changed is sent again; what both changed is for the person to choose. */
function meetOther(line: Line, edit: PendingEdit, current: Fields): void {
  const { ours, both } = merged(edit, current);
  const seen = edit.seen ?? versionHeld(line);
  holdPlan(line.address, (now) => ({
    ...now,
    versions: withVersion(now.versions, line.holder, current.version as number),
  }));
  const { row, base } = edit;
  if (Object.keys(ours).length > 0)
    line.waiting = line.waiting.reduce(withEdit, [{ row, base, fields: ours }]);
  const from = { by: current.changedBy as string | null, at: current.changedAt as number | null };
  const clashes = both.map(
    (clash): Clash => ({ row: edit.row, ...clash, base: base[clash.field], seen, ...from }),
  );
  saving.change((now) => ({ ...now, clashes: [...now.clashes, ...clashes] }));
  if (both.length === 0) void queryClient.invalidateQueries({ queryKey: kitKeys.plan(line.address.kit) });
}

/** Ends a clash: our value is sent over theirs, or theirs is shown. */
export function settleClash(address: KitAddress, clash: Clash, keep: "yours" | "theirs"): void {
  saving.change((now) => ({ ...now, clashes: now.clashes.filter((one) => one !== clash) }));
  if (keep === "yours") editRow(address, clash.row, { [clash.field]: clash.yours });
  else holdPlan(address, (held) => withFields(held, clash.row, { [clash.field]: clash.theirs }));
  void queryClient.invalidateQueries({ queryKey: kitKeys.plan(address.kit) });
}

/** Sends everything that waits, now: the page is being left, or the connection came back. */
export function sendAll(): void {
  saving.change((now) => ({ ...now, lostAt: null }));
  for (const line of lines.values()) {
    clearTimeout(line.timer);
    sendNext(line);
  }
}

/** Sends without delay; what is known to be without connection is left for the next try. */
function flush(): void {
  if (saving.now().lostAt === null) sendAll();
}

/** Ours of a clash that nobody has settled, as it was sent: sent again it meets theirs again. */
function unsettled({ row, field, yours, base, seen }: Clash): PendingEdit {
  return { row, fields: { [field]: yours }, base: { [field]: base }, seen };
}

/** Puts by the edits of a kit, each with the version its request named or would name. */
function keep(address: KitAddress): void {
  const versions = heldPlan(address)?.versions;
  if (!versions) return;
  const waiting = unsaved().map((edit) => ({ seen: versionOf(versions, holderOf(edit.row)), ...edit }));
  keepEdits("plan", address.kit, [...saving.now().clashes.map(unsettled), ...waiting]);
}

/** Takes up what the page before had not heard of when it was left, once the plan is there. */
export function takeUpEdits(address: KitAddress): void {
  const fresh = heldPlan(address);
  if (!fresh) return;
  for (const edit of keptEdits<PendingEdit>("plan", address.kit)) {
    if (arrived(fresh, edit)) continue;
    holdPlan(address, (held) => withFields(held, edit.row, edit.fields));
    const line = lineOf(address, holderOf(edit.row));
    // Not joined: each meets the answer to the one before it.
    line.waiting = [...line.waiting, edit];
  }
  countWaiting();
  sendAll();
}

/** Sends what waits when the page is left or the connection comes back. Called once by the island that edits. */
export function watchPage(address: KitAddress): () => void {
  const stop = watchLeaving({
    flush,
    holds: () => unsaved().length > 0,
    atRisk: () =>
      saving.now().clashes.length > 0 || [...lines.values()].some(({ waiting }) => waiting.length > 0),
    keep: () => keep(address),
  });
  addEventListener("online", sendAll);
  return () => {
    stop();
    removeEventListener("online", sendAll);
  };
}
