import type { Db } from "#db/client.ts";
import type { KitChange, KitEntry } from "#src/shapes/kit.ts";
import { OWN_SITE } from "#src/shapes/limits.ts";
import { newId } from "./new-id.ts";
import { type Changing as ChangingSomewhere, clash, noteChange } from "./note-change.ts";
import { wrongField } from "./problem.ts";
import { addChannel } from "./store/channel.ts";
import { addEdition } from "./store/edition.ts";
import { addKit, changeKit, type KitRow, kitNamed, removeKit } from "./store/kit.ts";
import { copyKitRows } from "./store/kit-copy.ts";
import type { WorkshopRow } from "./store/membership.ts";
import { addRunPlan } from "./store/run-plan.ts";
import { inTransaction } from "./transaction.ts";

type Changing = ChangingSomewhere & { workshop: WorkshopRow };
type ChangingKit = Changing & { kit: KitRow };

/** Where every run begins; each value stands on the run page, to be changed there. */
const FIRST_RUN = {
  kits: 50,
  sweepTo: 500,
  spareRate: "0",
  boardYield: "1",
  boardConfidence: "0.95",
  learningSlope: "1",
  kitsMadeBefore: 0,
  replacementShare: "0",
} as const;

/** The first way to sell: what it takes of a sale is for the workshop to say. */
const FIRST_CHANNEL = {
  name: OWN_SITE,
  position: 0,
  weight: 1,
  editions: null,
  discount: "0",
  taxStated: "inside",
  feeOnPostage: true,
  feeOnTax: true,
  otherName: "",
  otherAmount: "0",
  otherSharedOver: 1,
  kitsPerOrder: "1",
} as const;

function refuseTakenName(db: Db, workshopId: string, name: string, own?: string): void {
  const other = kitNamed(db, workshopId, name);
  if (other && other.id !== own)
    throw wrongField("name", `This workshop has a kit called ${name} already. Give it another name.`);
}

/** Begins a kit: with one edition, one channel, a run to start from, and no lines. */
export function makeKit(given: Changing, entry: KitEntry): KitRow {
  const { db, workshop, now } = given;
  return inTransaction(db, () => {
    refuseTakenName(db, workshop.id, entry.name);
    const kit = addKit(db, { ...entry, id: newId(), workshopId: workshop.id, createdAt: now });
    addRunPlan(db, { ...FIRST_RUN, kitId: kit.id, workshopId: workshop.id });
    const edition = { name: "Full kit", weight: 1, boardsPerKit: kit.boardNeeded ? 1 : 0, position: 0 };
    addChannel(db, { ...FIRST_CHANNEL, id: newId(), workshopId: workshop.id, kitId: kit.id }, []);
    addEdition(db, { ...edition, id: newId(), workshopId: workshop.id, kitId: kit.id });
    noteChange({ ...given, kit }, { action: "kit.add", subjectId: kit.id, subjectName: kit.name });
    return kit;
  });
}

/** Whether the board's shape or size changes, so that what is drawn on it is no longer so. */
function isAnotherBoard(before: KitRow, fields: Omit<KitChange, "version" | "closed">): boolean {
  const sides = ["boardShape", "boardWidth", "boardHeight"] as const;
  return sides.some((side) => fields[side] !== undefined && fields[side] !== before[side]);
}

/** Changes a kit's name, summary or board, closes it or opens it again. */
export function setKit(given: ChangingKit, { version, closed, ...fields }: KitChange): KitRow {
  const { db, workshop, kit: before, now } = given;
  return inTransaction(db, () => {
    if (fields.name !== undefined) refuseTakenName(db, workshop.id, fields.name, before.id);
    const closedAt = closed === undefined ? {} : { closedAt: closed ? now : null };
    const plain = isAnotherBoard(before, fields) ? { boardMarks: null } : {};
    const after = changeKit(db, workshop.id, before.id, version, { ...fields, ...closedAt, ...plain });
    if (!after) throw clash(given, before.id, before);
    const names = Object.keys(fields) as (keyof KitRow)[];
    const detail = Object.fromEntries(names.map((name) => [name, [before[name], after[name]]]));
    const action = closed === undefined ? "kit.change" : closed ? "kit.close" : "kit.open";
    noteChange(given, { action, subjectId: after.id, subjectName: after.name, detail });
    return after;
  });
}

/** Makes a kit like another under a new name; the parts and offers are the same, as they are the workshop's. */
export function copyKit(given: ChangingKit, name: string): KitRow {
  const { db, workshop, kit: like, now } = given;
  return inTransaction(db, () => {
    refuseTakenName(db, workshop.id, name);
    const copy = { ...like, id: newId(), name, revision: 1, createdAt: now, closedAt: null, version: 1 };
    const kit = addKit(db, copy);
    const ids = new Map<string, string>();
    const idFor = (old: string) => ids.get(old) ?? (ids.set(old, newId()).get(old) as string);
    copyKitRows(db, { from: like.id, to: kit.id, idFor });
    noteChange(
      { ...given, kit },
      { action: "kit.copy", subjectId: kit.id, subjectName: kit.name, detail: { like: like.name } },
    );
    return kit;
  });
}

/** Removes a kit for good, with its list, run and quotes. */
export function dropKit(given: ChangingKit, version: number): void {
  const { db, workshop, kit } = given;
  inTransaction(db, () => {
    if (kit.version !== version) throw clash(given, kit.id, kit);
    noteChange(given, { action: "kit.remove", subjectId: kit.id, subjectName: kit.name });
    removeKit(db, workshop.id, kit.id);
  });
}
