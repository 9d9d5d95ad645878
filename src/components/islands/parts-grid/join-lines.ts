import { compareDesignators } from "#src/partslist/designators.ts";
import type { PricedPartsList } from "#src/server/present.ts";
import type { Line, Step } from "./steps.ts";

/** Lines that say the same part in the same way, and could be one. */
export function equalLines(list: Pick<PricedPartsList, "lines">): Line[][] {
  const groups = new Map<string, Line[]>();
  for (const line of list.lines) {
    const key = `${line.part.id} ${line.mark}`;
    groups.set(key, [...(groups.get(key) ?? []), line]);
  }
  return [...groups.values()].filter((group) => group.length > 1);
}

/** The steps that make one line of several: its designators and quantities are those of all. */
export function joinLines(lines: readonly Line[]): Step[] {
  const [first, ...rest] = lines;
  if (!first || rest.length === 0) return [];
  const all = lines.flatMap(({ designators }) => (designators === "" ? [] : designators.split(", ")));
  const quantities: Record<string, number> = {};
  for (const line of lines)
    for (const [edition, perKit] of Object.entries(line.quantities))
      quantities[edition] = (quantities[edition] ?? 0) + perKit;
  const notes = [...new Set(lines.map(({ note }) => note).filter(Boolean))].join("; ");
  const designators = [...new Set(all)].sort(compareDesignators).join(", ");
  return [
    { do: "change-line", line: first.id, set: { designators, quantities, note: notes } },
    ...rest.map((line): Step => ({ do: "remove-line", line: line.id })),
  ];
}
