import { compareDesignators, readDesignators } from "#src/partslist/designators.ts";
import { PARTS_MOST } from "#src/shapes/limits.ts";
import { newId } from "./new-id.ts";
import { clash, noteChange } from "./note-change.ts";
import { addPart, foundPart, type PartsBatch, partForLine, samePart, type TakeStep } from "./parts-batch.ts";
import { wrongField } from "./problem.ts";
import {
  addLines,
  changeLine,
  type LineQuantityRow,
  type LineRow,
  lineExists,
  lineOf,
  removeLines,
  setLineQuantities,
} from "./store/line.ts";
import type { NewPart } from "./store/part.ts";

/** Designators as they are kept: expanded, in reading order; a piece that cannot be read is refused. */
function keptDesignators(text: string, at: string): string {
  const { designators, unclear } = readDesignators(text);
  if (unclear.length > 0)
    throw wrongField(at, `“${unclear.join(", ")}” is not a designator. Write them as R1, R2 or R4-R9.`);
  return [...new Set(designators)].sort(compareDesignators).join(", ");
}

function foundLine({ given }: PartsBatch, id: string): LineRow {
  const line = lineOf(given.db, given.kit.id, id);
  if (!line) throw wrongField("line", "This line is no longer in the list.");
  return line;
}

function quantityRows(
  { given, editions }: PartsBatch,
  lineId: string,
  quantities: Record<string, number>,
  at: string,
): LineQuantityRow[] {
  return Object.entries(quantities).map(([editionId, perKit]) => {
    if (!editions.has(editionId))
      throw wrongField(`${at}.${editionId}`, "This edition is not one of the kit’s.");
    return { workshopId: given.workshop.id, lineId, editionId, perKit };
  });
}

/** Changes a line that its person has seen as it is, and says what stood before. */
function changeSeenLine(
  batch: PartsBatch,
  step: { line: string; version: number },
  set: Partial<LineRow>,
  quantities: Record<string, number> = {},
): void {
  const { given } = batch;
  const before = foundLine(batch, step.line);
  const after = changeLine(given.db, given.kit.id, step.line, step.version, set);
  if (!after) throw clash(given, step.line, before);
  setLineQuantities(given.db, quantityRows(batch, step.line, quantities, "set.quantities"));
  batch.lines.add(step.line);
  const fields = Object.keys(set) as (keyof LineRow)[];
  const detail = Object.fromEntries(fields.map((name) => [name, [before[name], after[name]]]));
  const name = after.designators || foundPart(batch, after.partId).name;
  noteChange(given, {
    action: "line.change",
    subjectId: after.id,
    subjectName: name,
    detail: { ...detail, ...(Object.keys(quantities).length > 0 && { quantities }) },
  });
}

export const changeLineStep: TakeStep<"change-line"> = (batch, step) => {
  const { part, quantities, designators, ...set } = step.set;
  const change: Partial<LineRow> = { ...set };
  if (designators !== undefined) change.designators = keptDesignators(designators, "set.designators");
  if (part !== undefined) change.partId = foundPart(batch, part).id;
  changeSeenLine(batch, step, change, quantities);
};

export const ownPartStep: TakeStep<"own-part"> = (batch, step) => {
  const line = foundLine(batch, step.line);
  const { id, version, freeStock, stockCost, ...like } = foundPart(batch, line.partId);
  const wanted = { ...like, ...step.set };
  const same = samePart(batch, wanted);
  const part = same && same.id !== id ? same : addPart(batch, wanted as NewPart);
  changeSeenLine(batch, step, { partId: part.id });
};

export const addLineStep: TakeStep<"add-line"> = (batch, step) => {
  const { given } = batch;
  if (batch.order.length >= PARTS_MOST)
    throw wrongField("line", `A parts list takes at most ${PARTS_MOST} lines.`);
  const id = step.line ?? newId();
  if (step.line !== undefined && lineExists(given.db, id))
    throw wrongField("line", "This line is in a list already.");
  const part = partForLine(batch, step.part);
  const at = Math.min(step.at ?? batch.order.length, batch.order.length);
  const designators = keptDesignators(step.designators, "designators");
  addLines(given.db, [
    {
      id,
      workshopId: given.workshop.id,
      kitId: given.kit.id,
      partId: part.id,
      position: at,
      designators,
      mark: step.mark,
      note: step.note,
    },
  ]);
  setLineQuantities(given.db, quantityRows(batch, id, step.quantities, "quantities"));
  batch.order.splice(at, 0, id);
  batch.lines.add(id);
  noteChange(given, { action: "line.add", subjectId: id, subjectName: designators || part.name });
};

export const removeLineStep: TakeStep<"remove-line"> = (batch, step) => {
  const { given } = batch;
  const line = foundLine(batch, step.line);
  if (line.version !== step.version) throw clash(given, line.id, line);
  removeLines(given.db, given.kit.id, [line.id]);
  batch.order = batch.order.filter((id) => id !== line.id);
  batch.lines.delete(line.id);
  batch.removed.push(line.id);
  const name = line.designators || foundPart(batch, line.partId).name;
  noteChange(given, { action: "line.remove", subjectId: line.id, subjectName: name, detail: { ...line } });
};

export const moveLineStep: TakeStep<"move-line"> = (batch, step) => {
  foundLine(batch, step.line);
  const rest = batch.order.filter((id) => id !== step.line);
  rest.splice(step.to, 0, step.line);
  batch.order = rest;
};
