import type { EditionChange, EditionEntry } from "#src/shapes/edition.ts";
import { EDITIONS_MOST } from "#src/shapes/limits.ts";
import { newId } from "./new-id.ts";
import { type Changing as ChangingSomewhere, clash, noteChange } from "./note-change.ts";
import { Problem, wrongField } from "./problem.ts";
import { changeChannel, channelsOf } from "./store/channel.ts";
import {
  addEdition,
  changeEdition,
  type EditionRow,
  editionOf,
  editionsOf,
  placeEdition,
  removeEdition,
} from "./store/edition.ts";
import type { KitRow } from "./store/kit.ts";
import { lineQuantitiesOf, setLineQuantities } from "./store/line.ts";
import { packingList, taskList } from "./store/plan-list.ts";
import { packingItemsOf, tasksOf } from "./store/run-plan.ts";
import { inTransaction } from "./transaction.ts";

type Changing = ChangingSomewhere & { kit: KitRow };

function refuseTakenName(editions: EditionRow[], name: string | undefined, own?: string): void {
  if (editions.some((edition) => edition.name === name && edition.id !== own))
    throw wrongField("name", `This kit has an edition called ${name} already. Give it another name.`);
}

function copyQuantities({ db, kit }: Changing, from: string, to: string): void {
  const rows = lineQuantitiesOf(db, kit.id).filter((row) => row.editionId === from);
  setLineQuantities(
    db,
    rows.map((row) => ({ ...row, editionId: to })),
  );
}

/** Adds an edition, last in the list, with the quantities of another or with none. */
export function makeEdition(given: Changing, { like, ...fields }: EditionEntry): EditionRow {
  const { db, kit, workshop } = given;
  return inTransaction(db, () => {
    const editions = editionsOf(db, kit.id);
    if (editions.length >= EDITIONS_MOST)
      throw wrongField("name", `A kit has at most ${EDITIONS_MOST} editions.`);
    refuseTakenName(editions, fields.name);
    if (like !== null && !editions.some(({ id }) => id === like))
      throw wrongField("like", "This edition is not one of the kit’s.");
    const position = (editions.at(-1)?.position ?? -1) + 1;
    const edition = addEdition(db, {
      ...fields,
      id: newId(),
      workshopId: workshop.id,
      kitId: kit.id,
      position,
    });
    if (like !== null) copyQuantities(given, like, edition.id);
    noteChange(given, { action: "edition.add", subjectId: edition.id, subjectName: edition.name });
    return edition;
  });
}

/** Changes an edition's name, share of the run or boards. */
export function setEditionFields(
  given: Changing,
  id: string,
  { version, ...fields }: EditionChange,
): EditionRow {
  const { db, kit } = given;
  return inTransaction(db, () => {
    const before = editionOf(db, kit.id, id);
    if (!before) throw new Problem("not-found");
    refuseTakenName(editionsOf(db, kit.id), fields.name, id);
    const after = changeEdition(db, kit.id, id, version, fields);
    if (!after) throw clash(given, id, before);
    const names = Object.keys(fields) as (keyof typeof fields)[];
    const detail = Object.fromEntries(names.map((name) => [name, [before[name], after[name]]]));
    noteChange(given, { action: "edition.change", subjectId: id, subjectName: after.name, detail });
    return after;
  });
}

/** Puts the editions in a new order; every edition must be named once. */
export function orderEditions(given: Changing, order: string[]): EditionRow[] {
  const { db, kit } = given;
  return inTransaction(db, () => {
    const own = editionsOf(db, kit.id).map(({ id }) => id);
    if (order.length !== own.length || own.some((id) => !order.includes(id)))
      throw wrongField("editions", "Name every edition of the kit once.");
    for (const [position, id] of order.entries()) placeEdition(db, id, position);
    noteChange(given, { action: "edition.order", subjectId: kit.id, subjectName: kit.name });
    return editionsOf(db, kit.id);
  });
}

/** What goes with an edition. */
export interface EditionLoss {
  /** Lines that have a quantity in it, and how many of them are in no other edition. */
  lines: number;
  onlyHere: number;
  /** Names of work, packing and channels that were for this edition alone, and are for none then. */
  forNothing: string[];
}

type ForEditions = { id: string; version: number; name: string; editions: string[] | null };

function withoutEdition(row: ForEditions, id: string): string[] {
  return (row.editions ?? []).filter((edition) => edition !== id);
}

export function editionLoss(given: Pick<Changing, "db" | "kit">, id: string): EditionLoss {
  const rows = lineQuantitiesOf(given.db, given.kit.id);
  const here = rows.filter((row) => row.editionId === id).map((row) => row.lineId);
  const elsewhere = new Set(rows.filter((row) => row.editionId !== id).map((row) => row.lineId));
  const named = [
    ...tasksOf(given.db, given.kit.id),
    ...packingItemsOf(given.db, given.kit.id),
    ...channelsOf(given.db, given.kit.id).map(({ channel }) => channel),
  ];
  return {
    lines: here.length,
    onlyHere: here.filter((line) => !elsewhere.has(line)).length,
    forNothing: named
      .filter((row) => row.editions?.includes(id) && withoutEdition(row, id).length === 0)
      .map((row) => row.name),
  };
}

/** Work, packing and channels that name the edition name it no longer. */
function unnameEdition({ db, kit }: Changing, id: string): void {
  for (const row of tasksOf(db, kit.id))
    if (row.editions?.includes(id))
      taskList.change(db, row.id, row.version, { editions: withoutEdition(row, id) });
  for (const row of packingItemsOf(db, kit.id))
    if (row.editions?.includes(id))
      packingList.change(db, row.id, row.version, { editions: withoutEdition(row, id) });
  for (const { channel } of channelsOf(db, kit.id))
    if (channel.editions?.includes(id))
      changeChannel(db, channel, channel.version, { editions: withoutEdition(channel, id) });
}

/** Removes an edition with its quantities and says what was lost. The last one stays. */
export function dropEdition(given: Changing, id: string, version: number): EditionLoss {
  const { db, kit } = given;
  return inTransaction(db, () => {
    const edition = editionOf(db, kit.id, id);
    if (!edition) throw new Problem("not-found");
    if (edition.version !== version) throw clash(given, id, edition);
    if (editionsOf(db, kit.id).length === 1)
      throw wrongField("edition", "A kit is sold in at least one edition. Add another one first.");
    const loss = editionLoss(given, id);
    unnameEdition(given, id);
    removeEdition(db, kit.id, id);
    noteChange(given, {
      action: "edition.remove",
      subjectId: id,
      subjectName: edition.name,
      detail: { ...loss },
    });
    return loss;
  });
}
