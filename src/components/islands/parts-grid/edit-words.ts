import { CLASS_WORDS, MARK_WORDS } from "#src/components/part-words.ts";
import { compressDesignators } from "#src/partslist/designators.ts";
import type { PricedPartsList } from "#src/server/present.ts";
import type { LineMark, PartClass } from "#src/shapes/limits.ts";
import type { Overlap } from "./overlaps.ts";
import type { Step } from "./steps.ts";

/** What a line is called in a sentence: its designators, or its part. */
export function lineName(line: { designators: string; part: { name: string } }): string {
  return line.designators === "" ? line.part.name : compressDesignators(line.designators.split(", "));
}

/** What a step is about, in a sentence. */
function subjectOf(list: PricedPartsList, step: Step): string {
  const line =
    "line" in step
      ? list.lines.find(({ id }) => id === step.line)
      : list.lines.find(({ part }) => part.id === step.part);
  return line ? lineName(line) : "a line";
}

const FIELD_WORDS: Readonly<Record<string, string>> = {
  designators: "the designators",
  mark: "the mark",
  note: "the note",
  part: "the part",
  name: "the name",
  spec: "the description",
  value: "the value",
  unit: "the unit",
  package: "body and holes",
  drawer: "the drawer",
  class: "the kind",
  pinnedOfferId: "the offer",
};

/** A value as it can be read aloud. */
function valueWords(field: string, value: unknown): string {
  if (value === null || value === undefined || value === "") return "nothing";
  if (field === "mark") return MARK_WORDS[value as LineMark] ?? String(value);
  if (field === "class") return CLASS_WORDS[value as PartClass]?.one ?? String(value);
  if (field === "pinnedOfferId") return "an offer";
  return String(value);
}

/** An overlap as the conflict box says it. Value and unit are told by the name and are not told again. */
export function overlapWords(
  list: PricedPartsList,
  overlaps: readonly Overlap[],
): { what: string; yours: string; theirs: string } {
  const told = overlaps.filter(({ field }) => field !== "value" && field !== "unit");
  const [first] = told.length > 0 ? told : overlaps;
  if (!first) return { what: "a line", yours: "", theirs: "" };
  const field = first.field.startsWith("quantity:")
    ? "the quantity"
    : (FIELD_WORDS[first.field] ?? first.field);
  const more = told.length > 1 ? ` and ${told.length - 1} more` : "";
  return {
    what: `${field} of ${subjectOf(list, first.step)}${more}`,
    yours: valueWords(first.field, first.yours),
    theirs: valueWords(first.field, first.theirs),
  };
}
