import { CallFailed, call } from "#src/components/islands/call.ts";
import { type KitAddress, kitApi, kitKeys } from "#src/components/islands/kit-address.ts";
import { showToast } from "#src/components/islands/parts/toasts.ts";
import { lostConnection, RETRY_MS } from "#src/components/islands/plan/connection.ts";
import { keepEdit } from "#src/components/islands/plan/edit-log.ts";
import { keepEdits, keptEdits } from "#src/components/islands/plan/kept-edits.ts";
import { watchLeaving } from "#src/components/islands/plan/leaving.ts";
import { moduleStore } from "#src/components/islands/plan/module-store.ts";
import { countUnsaved, saving } from "#src/components/islands/plan/saving.ts";
import { queryClient } from "#src/components/islands/query-client.ts";
import type { PATCH as CHOOSE } from "#src/pages/api/workshops/[workshop]/kits/[kit]/choices/[part].ts";
import type { GET, PATCH } from "#src/pages/api/workshops/[workshop]/kits/[kit]/lines/index.ts";
import type { PartsChanged } from "#src/server/change-parts-list.ts";
import type { PartsList, PricedPartsList } from "#src/server/present.ts";
import { type Overlap, overlaps, stillOurs } from "./overlaps.ts";
import { applySteps, choiceOf, inverseSteps, joinSteps, type Step, withVersions } from "./steps.ts";

/** One edit as the person made it: a word for it, the steps there and the steps back. */
interface Edit {
  name: string;
  steps: Step[];
  back: Step[];
  /** How the list read before, to tell what another person changed. */
  before: PricedPartsList;
  /** Taken by undo or redo, which keep the stacks themselves. */
  travels: boolean;
}

/** An edit that met another person's change of the same cell. */
export interface ListClash {
  edit: Edit;
  overlaps: Overlap[];
  by: string | null;
  at: number | null;
}

export interface EditorState {
  undo: readonly Edit[];
  redo: readonly Edit[];
  clash: ListClash | null;
}
export const NOTHING_EDITED: EditorState = { undo: [], redo: [], clash: null };

/** The stacks of undo and redo, and what two people changed at once: for the buttons and boxes of the page. */
export const editorState = moduleStore<EditorState>(NOTHING_EDITED);

const STACK_MOST = 200;

let confirmed: PricedPartsList | null = null;
let waiting: Edit[] = [];
/** An edit that met another person's change and is not settled, as it was made. */
let met: Edit | null = null;
let sending = false;

/** The list as this screen shows it: what the server has, with unsent edits on top. */
export function shownList({ kit }: KitAddress): PricedPartsList | undefined {
  return queryClient.getQueryData<PricedPartsList>(kitKeys.lines(kit));
}

function show({ kit }: KitAddress): void {
  if (!confirmed) return;
  const shown = waiting.reduce((list, { steps }) => applySteps(list, steps), confirmed);
  queryClient.setQueryData(kitKeys.lines(kit), shown);
}

/** Reads the list from the server and lays unsent edits over it. */
export async function fetchList(address: KitAddress): Promise<PartsList> {
  const fresh = (await call<typeof GET>("GET", kitApi(address, "/lines"))) as PartsList;
  return overlaid(fresh);
}

/** A list fresh from the server, as this screen shows it. */
export function overlaid(fresh: PartsList): PartsList {
  if (!fresh.money) return fresh;
  confirmed = fresh;
  return waiting.reduce((list, { steps }) => applySteps(list, steps), fresh);
}

function push(stack: readonly Edit[], edit: Edit): Edit[] {
  return [...stack, edit].slice(-STACK_MOST);
}

/** Makes an edit: on this screen at once, on the server in its turn. */
export function editList(address: KitAddress, name: string, steps: readonly Step[]): void {
  const before = shownList(address);
  if (!before || steps.length === 0) return;
  const joined = joinSteps(steps);
  enqueue(address, { name, steps: joined, back: inverseSteps(before, joined), before, travels: false });
}

function enqueue(address: KitAddress, edit: Edit): void {
  void queryClient.cancelQueries({ queryKey: kitKeys.lines(address.kit) });
  waiting.push(edit);
  countUnsaved("lines", waiting.length);
  if (!edit.travels) editorState.change((now) => ({ ...now, undo: push(now.undo, edit), redo: [] }));
  show(address);
  void sendNext(address);
}

/** Takes the newest edit of a stack back, unless another person has changed the same since. */
function travel(address: KitAddress, from: "undo" | "redo"): void {
  const to = from === "undo" ? "redo" : "undo";
  const edit = editorState.now()[from].at(-1);
  const list = shownList(address);
  if (!edit || !list) return;
  if (!stillOurs(list, edit.steps)) {
    editorState.change((now) => ({ ...now, [from]: now[from].slice(0, -1) }));
    showToast({ kind: "caution", text: `Somebody changed this since. “${edit.name}” is not taken back.` });
    return;
  }
  const back: Edit = {
    ...edit,
    steps: edit.back,
    back: inverseSteps(list, edit.back),
    before: list,
    travels: true,
  };
  editorState.change((now) => ({ ...now, [from]: now[from].slice(0, -1), [to]: push(now[to], back) }));
  enqueue(address, back);
}

export const undoList = (address: KitAddress) => travel(address, "undo");
export const redoList = (address: KitAddress) => travel(address, "redo");

async function sendNext(address: KitAddress): Promise<void> {
  const edit = waiting[0];
  if (sending || !edit || !confirmed) return;
  sending = true;
  try {
    confirmed = await saved(address, confirmed, edit.steps);
    waiting = waiting.slice(1);
    countUnsaved("lines", waiting.length);
    saving.change((now) => ({ ...now, savedAt: Date.now(), lostAt: null }));
    show(address);
    void queryClient.invalidateQueries({ queryKey: kitKeys.plan(address.kit) });
  } catch (error) {
    if (!(error instanceof CallFailed)) throw error;
    await failed(address, edit, error);
  } finally {
    sending = false;
  }
  if (waiting.length > 0 && saving.now().lostAt === null) void sendNext(address);
}

/** Sends steps and gives back the list as the server then has it. A single choice has an address of its own, which more roles may use. */
async function saved(
  address: KitAddress,
  list: PricedPartsList,
  steps: readonly Step[],
): Promise<PricedPartsList> {
  const changes = withVersions(list, steps);
  const [only] = changes;
  if (changes.length > 1 || only?.do !== "choose") {
    const reply = await call<typeof PATCH>("PATCH", kitApi(address, "/lines"), { changes });
    return merged(list, reply);
  }
  const { part, version, set } = only;
  const path = kitApi(address, `/choices/${part}`);
  const reply = await call<typeof CHOOSE>("PATCH", path, { version, set });
  const chosen = { ...choiceOf(list, part), ...set, version: reply.version };
  return { ...list, choices: [...list.choices.filter(({ partId }) => partId !== part), chosen] };
}

/** The list with what the server says of the lines it changed. */
function merged(list: PricedPartsList, reply: PartsChanged): PricedPartsList {
  const changed = new Map(reply.lines.map((line) => [line.id, line]));
  const known = new Map(list.lines.map((line) => [line.id, line]));
  const order = reply.order ?? list.lines.map(({ id }) => id);
  const choices = reply.choices;
  return {
    ...list,
    lines: order.flatMap((id) => changed.get(id) ?? known.get(id) ?? []),
    choices: [
      ...list.choices.filter((one) => !choices.some(({ partId }) => partId === one.partId)),
      ...choices,
    ],
  };
}

/** Forgets an edit that was not taken: it cannot be undone, and the strip no longer tells of it. */
function drop(edit: Edit): void {
  keepEdit();
  waiting = waiting.filter((one) => one !== edit);
  countUnsaved("lines", waiting.length);
  const without = (stack: readonly Edit[]) => stack.filter((one) => one !== edit);
  editorState.change((now) => ({ ...now, undo: without(now.undo), redo: without(now.redo) }));
}

async function failed(address: KitAddress, edit: Edit, { problem }: CallFailed): Promise<void> {
  if (problem.code === "no-connection") {
    lostConnection();
    setTimeout(() => resume(address), RETRY_MS);
    return;
  }
  drop(edit);
  met = problem.code === "changed-meanwhile" ? edit : null;
  const fresh = await call<typeof GET>("GET", kitApi(address, "/lines")).catch(() => null);
  if (fresh?.money) confirmed = fresh as PricedPartsList;
  show(address);
  if (problem.code === "changed-meanwhile" && confirmed) return meetOther(address, edit, problem.current);
  const words = problem.errors?.map(({ message }) => message) ?? [problem.detail];
  showToast({ kind: "fault", text: `Not saved. ${[...new Set(words)].slice(0, 3).join(" ")}` });
}

/** Who changed a row last, as the clash of one step says it. */
function otherPerson(current: unknown): { by: string | null; at: number | null } {
  const clashes = (current as { clashes?: { current: Record<string, unknown> }[] })?.clashes ?? [];
  const row = clashes[0]?.current ?? {};
  return { by: (row.changedBy as string | null) ?? null, at: (row.changedAt as number | null) ?? null };
}

/** Somebody was quicker. What only we changed is sent again; what both changed is for the person to choose. */
function meetOther(address: KitAddress, edit: Edit, current: unknown): void {
  if (!confirmed) return;
  const both = overlaps(edit.before, confirmed, edit.steps);
  const again = { ...edit, before: confirmed, back: inverseSteps(confirmed, edit.steps) };
  met = both.length === 0 ? null : edit;
  if (both.length === 0) enqueue(address, again);
  else
    editorState.change((now) => ({
      ...now,
      clash: { edit: again, overlaps: both, ...otherPerson(current) },
    }));
}

/** Ends a clash: our edit is sent over theirs, or theirs stays and the rest of ours is sent. */
export function settleListClash(address: KitAddress, keep: "yours" | "theirs"): void {
  const { clash } = editorState.now();
  if (!clash) return;
  editorState.change((now) => ({ ...now, clash: null }));
  met = null;
  const theirs = new Set(clash.overlaps.map(({ step }) => step));
  const steps = keep === "yours" ? clash.edit.steps : clash.edit.steps.filter((step) => !theirs.has(step));
  editList(address, clash.edit.name, steps);
}

/** Sends what waits: the connection is back. */
export function resume(address: KitAddress): void {
  if (waiting.length === 0) return;
  saving.change((now) => ({ ...now, lostAt: null }));
  void sendNext(address);
}

/** Takes up what the page before had not heard of when it was left, once the list is there. */
export function takeUpList(address: KitAddress): void {
  const kept = keptEdits<Edit>("lines", address.kit);
  const steps = joinSteps(kept.flatMap((edit) => edit.steps));
  const [first] = kept;
  if (!first || !confirmed || stillOurs(confirmed, steps)) return;
  meetOther(address, { ...first, steps, travels: false }, undefined);
}

/** Sees to edits the server has not when the page is left. Called once by the island that edits. */
export function watchList(address: KitAddress): () => void {
  const online = () => resume(address);
  const stops = [
    watchLeaving({
      flush: () => void sendNext(address),
      holds: () => waiting.length > 0,
      atRisk: () =>
        waiting.length > 1 || (waiting.length > 0 && !sending) || editorState.now().clash !== null,
      keep: () => keepEdits("lines", address.kit, met ? [met, ...waiting] : waiting),
    }),
    saving.watch(() => saving.now().lostAt === null && void sendNext(address)),
  ];
  addEventListener("online", online);
  return () => {
    for (const stop of stops) stop();
    removeEventListener("online", online);
  };
}
