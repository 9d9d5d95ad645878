import type { PricedPartsList } from "#src/server/present.ts";
import { choiceOf, type Step } from "./steps.ts";

/** A field that both we and another person changed, each as it can be shown. */
export interface Overlap {
  step: Step;
  field: string;
  yours: unknown;
  theirs: unknown;
}

type Fields = Readonly<Record<string, unknown>>;

const same = (one: unknown, other: unknown) => JSON.stringify(one ?? null) === JSON.stringify(other ?? null);

/** The fields a step sets, flat: each quantity is a field of its own. */
function fieldsSet(step: Step): Fields {
  if (step.do === "change-line") {
    const { quantities, ...set } = step.set;
    const perEdition = Object.entries(quantities ?? {}).map(([id, perKit]) => [`quantity:${id}`, perKit]);
    return { ...set, ...Object.fromEntries(perEdition) };
  }
  if (step.do === "change-part" || step.do === "choose" || step.do === "own-part") return step.set;
  return {};
}

/** The row a step is about, with the same flat fields; `null` where it is gone. */
function rowOf(list: PricedPartsList, step: Step): Fields | null {
  if (step.do === "choose") return choiceOf(list, step.part);
  if (step.do === "change-part") {
    const found = list.lines.find(({ part }) => part.id === step.part);
    return found ? { ...found.part } : null;
  }
  const line = list.lines.find(({ id }) => id === step.line);
  if (!line) return null;
  if (step.do === "own-part") return { ...line.part };
  const perEdition = list.editions.map(({ id }) => [`quantity:${id}`, line.quantities[id] ?? 0]);
  return { ...line, part: line.part.id, ...Object.fromEntries(perEdition) };
}

/** Which fields of an edit another person changed too, to something else, since we saw the list. */
export function overlaps(before: PricedPartsList, now: PricedPartsList, steps: readonly Step[]): Overlap[] {
  return steps.flatMap((step) => {
    const [saw, stands] = [rowOf(before, step), rowOf(now, step)];
    if (saw === null || stands === null) return [];
    return Object.entries(fieldsSet(step))
      .filter(([field, yours]) => !same(stands[field], saw[field]) && !same(stands[field], yours))
      .map(([field, yours]) => ({ step, field, yours, theirs: stands[field] }));
  });
}

/** Whether everything an edit set still stands as it was set, so that taking it back takes back nothing else. */
export function stillOurs(list: PricedPartsList, steps: readonly Step[]): boolean {
  return steps.every((step) => {
    if (step.do === "remove-line") return !list.lines.some(({ id }) => id === step.line);
    if (step.do === "move-line" || step.do === "own-part") return true;
    const row = rowOf(list, step);
    if (step.do === "add-line") return row !== null;
    const set = Object.entries(fieldsSet(step));
    return row !== null && set.every(([field, value]) => field === "part" || same(row[field], value));
  });
}
