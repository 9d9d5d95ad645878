import { compareDesignators, readDesignators } from "#src/partslist/designators.ts";
import { PARTS_MOST } from "#src/shapes/limits.ts";
import type { PartEntry, PartFields } from "#src/shapes/part.ts";
import type { PartsChange } from "#src/shapes/parts-change.ts";
import { newId } from "./new-id.ts";
import { type Changing as ChangingSomewhere, clash, noteChange } from "./note-change.ts";
import { wrongField } from "./problem.ts";
import type { KitRow } from "./store/kit.ts";
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
import type { WorkshopRow } from "./store/membership.ts";
import { offerOf } from "./store/offer.ts";
import {
  addParts,
  changePart,
  changePartChoice,
  type NewPart,
  type PartRow,
  partChoiceOf,
  partOf,
  samePart,
} from "./store/part.ts";

export type ChangingParts = ChangingSomewhere & { workshop: WorkshopRow; kit: KitRow };

/** What a change to a parts list carries from step to step. */
export interface PartsBatch {
  given: ChangingParts;
  /** Ids of the kit's editions. */
  editions: ReadonlySet<string>;
  /** Line ids in the order of the list, as the steps so far leave it. */
  order: string[];
  lines: Set<string>;
  parts: Set<string>;
  removed: string[];
}

type Step<Do extends PartsChange["do"]> = (batch: PartsBatch, step: Extract<PartsChange, { do: Do }>) => void;

const BLANK_PART = {
  spec: "",
  value: null,
  unit: null,
  tolerance: null,
  power: null,
  voltage: null,
  package: "",
  holeSpacing: null,
  manufacturer: "",
  manufacturerPartNumber: "",
  datasheet: "",
  drawer: "",
  note: "",
  freeStock: 0,
  stockCost: null,
} as const;

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

function foundPart({ given }: PartsBatch, id: string): PartRow {
  const part = partOf(given.db, given.workshop.id, id);
  if (!part) throw wrongField("part", "This part is not in the workshop.");
  return part;
}

function quantityRows(
  { given, editions }: PartsBatch,
  lineId: string,
  quantities: Record<string, number>,
): LineQuantityRow[] {
  return Object.entries(quantities).map(([editionId, perKit]) => {
    if (!editions.has(editionId))
      throw wrongField(`quantities.${editionId}`, "This edition is not one of the kit’s.");
    return { workshopId: given.workshop.id, lineId, editionId, perKit };
  });
}

function addPart({ given }: PartsBatch, entry: PartEntry | NewPart): PartRow {
  const row = { ...BLANK_PART, ...entry, id: newId(), workshopId: given.workshop.id, createdAt: given.now };
  addParts(given.db, [{ ...row, version: 1 }]);
  const part = partOf(given.db, given.workshop.id, row.id) as PartRow;
  noteChange(given, { action: "part.add", subjectId: part.id, subjectName: part.name });
  return part;
}

/** The part of a new line: one of the workshop's, by id or because it reads the same, or a new one. */
function partForLine(batch: PartsBatch, part: string | PartEntry): PartRow {
  if (typeof part === "string") return foundPart(batch, part);
  const same = samePart(batch.given.db, batch.given.workshop.id, { ...BLANK_PART, ...part });
  return same ?? addPart(batch, part);
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
  setLineQuantities(given.db, quantityRows(batch, step.line, quantities));
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

const changeLineStep: Step<"change-line"> = (batch, step) => {
  const { part, quantities, designators, ...set } = step.set;
  const change: Partial<LineRow> = { ...set };
  if (designators !== undefined) change.designators = keptDesignators(designators, "set.designators");
  if (part !== undefined) change.partId = foundPart(batch, part).id;
  changeSeenLine(batch, step, change, quantities);
};

/** Changes a part in every kit that uses it. Also the work of the part's own address. */
export function changeSeenPart(
  given: ChangingSomewhere & { workshop: WorkshopRow },
  before: PartRow,
  version: number,
  set: PartFields,
): PartRow {
  const after = changePart(given.db, given.workshop.id, before.id, version, set);
  if (!after) throw clash(given, before.id, before);
  const fields = Object.keys(set) as (keyof PartRow)[];
  const detail = Object.fromEntries(fields.map((name) => [name, [before[name], after[name]]]));
  noteChange(given, { action: "part.change", subjectId: after.id, subjectName: after.name, detail });
  return after;
}

const changePartStep: Step<"change-part"> = (batch, step) => {
  changeSeenPart(batch.given, foundPart(batch, step.part), step.version, step.set);
  batch.parts.add(step.part);
};

const ownPartStep: Step<"own-part"> = (batch, step) => {
  const line = foundLine(batch, step.line);
  const { id, version, freeStock, stockCost, ...like } = foundPart(batch, line.partId);
  const part = addPart(batch, { ...like, ...step.set } as NewPart);
  changeSeenLine(batch, step, { partId: part.id });
};

/** Sets how the kit buys a part; an offer that is pinned must be one for this part. */
export function choosePart(
  given: ChangingParts,
  partId: string,
  { version, set }: Pick<Extract<PartsChange, { do: "choose" }>, "version" | "set">,
): { version: number } {
  const { db, workshop, kit } = given;
  const part = partOf(db, workshop.id, partId);
  if (!part) throw wrongField("part", "This part is not in the workshop.");
  if (set.pinnedOfferId) {
    const found = offerOf(db, workshop.id, set.pinnedOfferId);
    if (found?.offer.partId !== partId)
      throw wrongField("set.pinnedOfferId", "This offer is not one for this part.");
  }
  const key = { workshopId: workshop.id, kitId: kit.id, partId };
  const after = changePartChoice(db, key, version, set);
  if (!after) throw clash(given, partId, partChoiceOf(db, kit.id, partId) ?? { version: 0 });
  noteChange(given, {
    action: "part.choose",
    subjectId: partId,
    subjectName: part.name,
    detail: { ...set },
  });
  return { version: after.version };
}

const chooseStep: Step<"choose"> = (batch, step) => {
  choosePart(batch.given, step.part, step);
  batch.parts.add(step.part);
};

const addLineStep: Step<"add-line"> = (batch, step) => {
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
  setLineQuantities(given.db, quantityRows(batch, id, step.quantities));
  batch.order.splice(at, 0, id);
  batch.lines.add(id);
  noteChange(given, { action: "line.add", subjectId: id, subjectName: designators || part.name });
};

const removeLineStep: Step<"remove-line"> = (batch, step) => {
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

const moveLineStep: Step<"move-line"> = (batch, step) => {
  foundLine(batch, step.line);
  const rest = batch.order.filter((id) => id !== step.line);
  rest.splice(step.to, 0, step.line);
  batch.order = rest;
};

const STEPS: { [Do in PartsChange["do"]]: Step<Do> } = {
  "change-line": changeLineStep,
  "change-part": changePartStep,
  "own-part": ownPartStep,
  choose: chooseStep,
  "add-line": addLineStep,
  "remove-line": removeLineStep,
  "move-line": moveLineStep,
};

/** Takes one step. @throws Problem with paths inside the step. */
export function takeStep(batch: PartsBatch, step: PartsChange): void {
  (STEPS[step.do] as Step<PartsChange["do"]>)(batch, step as never);
}
