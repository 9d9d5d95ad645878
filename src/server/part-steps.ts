import type { PartFields } from "#src/shapes/part.ts";
import type { PartsChange } from "#src/shapes/parts-change.ts";
import { type Changing as ChangingSomewhere, clash, noteChange } from "./note-change.ts";
import { type ChangingParts, foundPart, type TakeStep } from "./parts-batch.ts";
import { wrongField } from "./problem.ts";
import type { WorkshopRow } from "./store/membership.ts";
import { offerOf } from "./store/offer.ts";
import { changePart, changePartChoice, type PartRow, partChoiceOf, partOf } from "./store/part.ts";

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

export const changePartStep: TakeStep<"change-part"> = (batch, step) => {
  changeSeenPart(batch.given, foundPart(batch, step.part), step.version, step.set);
  batch.parts.add(step.part);
  batch.known = null;
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

export const chooseStep: TakeStep<"choose"> = (batch, step) => {
  choosePart(batch.given, step.part, step);
  batch.parts.add(step.part);
};
