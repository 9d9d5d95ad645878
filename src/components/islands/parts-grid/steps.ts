import type { LineView, PricedPartsList, PricedPartView } from "#src/server/present.ts";
import type { PartsChange } from "#src/shapes/parts-change.ts";

type WithoutVersion<S> = S extends { version: number } ? Omit<S, "version"> : S;
type WithLine<S> = S extends { do: "add-line" } ? S & { line: string } : S;

/** One step of an edit, before it is known which version the server has. A line that is added brings its id. */
export type Step = WithLine<WithoutVersion<PartsChange>>;

export type Line = LineView<PricedPartView>;
type Choice = PricedPartsList["choices"][number];

/** How a kit buys a part while nothing has been chosen. */
export const NO_CHOICE = {
  version: 0,
  pinnedOfferId: null,
  onlyFromStock: false,
  spareRate: null,
  leastSpare: 0,
  keepShare: null,
} as const;

const BLANK_PART: Omit<PricedPartView, "id" | "class" | "name"> = {
  version: 1,
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
  alsoIn: [],
};

/** A part that the server has not made yet is known by the line it was made for. */
export function partToBe(line: string): string {
  return `new:${line}`;
}

export function choiceOf(list: PricedPartsList, part: string): Choice {
  return list.choices.find(({ partId }) => partId === part) ?? { ...NO_CHOICE, partId: part };
}

function partIn(list: PricedPartsList, id: string): PricedPartView | undefined {
  return list.lines.find(({ part }) => part.id === id)?.part;
}

function withLine(list: PricedPartsList, id: string, how: (line: Line) => Line): PricedPartsList {
  return { ...list, lines: list.lines.map((line) => (line.id === id ? how(line) : line)) };
}

/** Quantities with some of them changed; nought is not kept, as the edition is then without the line. */
function withQuantities(before: Line["quantities"], set: Line["quantities"]): Line["quantities"] {
  return Object.fromEntries(Object.entries({ ...before, ...set }).filter(([, perKit]) => perKit > 0));
}

function newLine(list: PricedPartsList, step: Extract<Step, { do: "add-line" }>): Line {
  const { line: id, designators, mark, note, quantities } = step;
  const known = typeof step.part === "string" ? partIn(list, step.part) : undefined;
  const blank = { ...BLANK_PART, id: partToBe(id), class: "other" as const, name: "" };
  const part =
    known ?? (typeof step.part === "string" ? { ...blank, id: step.part } : { ...blank, ...step.part });
  return { id, version: 1, designators, mark, note, quantities: withQuantities({}, quantities), part };
}

/** The list as it reads after a step, before the server has answered. */
export function applyStep(list: PricedPartsList, step: Step): PricedPartsList {
  switch (step.do) {
    case "change-line":
      return withLine(list, step.line, (line) => {
        const { part, quantities, ...set } = step.set;
        const taken = part === undefined ? line.part : (partIn(list, part) ?? line.part);
        return {
          ...line,
          ...set,
          part: taken,
          quantities: quantities ? withQuantities(line.quantities, quantities) : line.quantities,
        };
      });
    case "change-part":
      return {
        ...list,
        lines: list.lines.map((line) =>
          line.part.id === step.part ? { ...line, part: { ...line.part, ...step.set } } : line,
        ),
      };
    case "own-part":
      return withLine(list, step.line, (line) => ({
        ...line,
        part: { ...line.part, freeStock: 0, stockCost: null, alsoIn: [], ...step.set, id: partToBe(line.id) },
      }));
    case "choose": {
      const others = list.choices.filter(({ partId }) => partId !== step.part);
      return { ...list, choices: [...others, { ...choiceOf(list, step.part), ...step.set }] };
    }
    case "add-line": {
      const lines = [...list.lines];
      lines.splice(step.at ?? lines.length, 0, newLine(list, step));
      return { ...list, lines };
    }
    case "remove-line":
      return { ...list, lines: list.lines.filter(({ id }) => id !== step.line) };
    case "move-line": {
      const line = list.lines.find(({ id }) => id === step.line);
      if (!line) return list;
      const lines = list.lines.filter((one) => one !== line);
      lines.splice(step.to, 0, line);
      return { ...list, lines };
    }
  }
}

export function applySteps(list: PricedPartsList, steps: readonly Step[]): PricedPartsList {
  return steps.reduce(applyStep, list);
}

function pick<T extends object, K extends keyof T>(from: T, names: K[]): Pick<T, K> {
  return Object.fromEntries(names.map((name) => [name, from[name]])) as Pick<T, K>;
}

function inverseOfLineChange(line: Line, step: Extract<Step, { do: "change-line" }>): Step {
  const { part, quantities, ...set } = step.set;
  const before: typeof step.set = pick(line, Object.keys(set) as (keyof typeof set)[]);
  if (part !== undefined) before.part = line.part.id;
  if (quantities)
    before.quantities = Object.fromEntries(
      Object.keys(quantities).map((edition) => [edition, line.quantities[edition] ?? 0]),
    );
  return { do: "change-line", line: line.id, set: before };
}

/** The step that takes a step back, given the list as it stood before; `null` where there is nothing to take back. */
export function inverseStep(list: PricedPartsList, step: Step): Step | null {
  if (step.do === "add-line") return { do: "remove-line", line: step.line };
  if (step.do === "choose") {
    const names = Object.keys(step.set) as (keyof typeof step.set)[];
    return { do: "choose", part: step.part, set: pick(choiceOf(list, step.part), names) };
  }
  if (step.do === "change-part") {
    const part = partIn(list, step.part);
    const names = Object.keys(step.set) as (keyof typeof step.set)[];
    return part ? { do: "change-part", part: part.id, set: pick(part, names) } : null;
  }
  const at = list.lines.findIndex(({ id }) => id === step.line);
  const line = list.lines[at];
  if (!line) return null;
  if (step.do === "change-line") return inverseOfLineChange(line, step);
  if (step.do === "own-part") return { do: "change-line", line: line.id, set: { part: line.part.id } };
  if (step.do === "move-line") return { do: "move-line", line: line.id, to: at };
  const { designators, mark, note, quantities } = line;
  return { do: "add-line", line: line.id, at, designators, mark, note, quantities, part: line.part.id };
}

/** The steps that take several back, in the order in which they must be taken. */
export function inverseSteps(list: PricedPartsList, steps: readonly Step[]): Step[] {
  const back: Step[] = [];
  let now = list;
  for (const step of steps) {
    const inverse = inverseStep(now, step);
    if (inverse) back.unshift(inverse);
    now = applyStep(now, step);
  }
  return back;
}

/** Steps that change the same row are joined, so that each row is changed once; later fields win. */
export function joinSteps(steps: readonly Step[]): Step[] {
  const joined: Step[] = [];
  for (const step of steps) {
    const before = joined.findIndex((one) => sameRow(one, step));
    const one = joined[before];
    if (one?.do === "change-line" && step.do === "change-line") {
      const quantities =
        one.set.quantities || step.set.quantities
          ? { quantities: { ...one.set.quantities, ...step.set.quantities } }
          : {};
      joined[before] = { ...one, set: { ...one.set, ...step.set, ...quantities } };
    } else if (one?.do === "change-part" && step.do === "change-part")
      joined[before] = { ...one, set: { ...one.set, ...step.set } };
    else if (one?.do === "own-part" && step.do === "own-part")
      joined[before] = { ...one, set: { ...one.set, ...step.set } };
    else if (one?.do === "choose" && step.do === "choose")
      joined[before] = { ...one, set: { ...one.set, ...step.set } };
    else joined.push(step);
  }
  return joined;
}

function sameRow(one: Step, other: Step): boolean {
  if (one.do !== other.do) return false;
  if (one.do === "change-line" || one.do === "own-part") return one.line === (other as typeof one).line;
  if (one.do === "change-part" || one.do === "choose") return one.part === (other as typeof one).part;
  return false;
}

/** Parts that were still to be made when the step was taken are named by what the server made of them. */
function settledPart(list: PricedPartsList, part: string): string {
  if (!part.startsWith("new:")) return part;
  const line = list.lines.find(({ id }) => partToBe(id) === part);
  return line?.part.id ?? part;
}

function settled(list: PricedPartsList, step: Step): Step {
  if (step.do === "change-part" || step.do === "choose")
    return { ...step, part: settledPart(list, step.part) };
  if (step.do === "change-line" && step.set.part !== undefined)
    return { ...step, set: { ...step.set, part: settledPart(list, step.set.part) } };
  if (step.do === "add-line" && typeof step.part === "string")
    return { ...step, part: settledPart(list, step.part) };
  return step;
}

/** Steps as they are sent: each names the version that the list as the server has it gives its row. */
export function withVersions(list: PricedPartsList, steps: readonly Step[]): PartsChange[] {
  const moved = new Map<string, number>();
  const next = (key: string, now: number) => {
    const version = now + (moved.get(key) ?? 0);
    moved.set(key, (moved.get(key) ?? 0) + 1);
    return version;
  };
  return steps.map((open) => {
    const step = settled(list, open);
    if (step.do === "change-part")
      return { ...step, version: next(step.part, partIn(list, step.part)?.version ?? 1) };
    if (step.do === "choose")
      return { ...step, version: next(`choice ${step.part}`, choiceOf(list, step.part).version) };
    if (step.do === "add-line" || step.do === "move-line") return step;
    const version = list.lines.find(({ id }) => id === step.line)?.version ?? 1;
    return { ...step, version: next(step.line, version) } as PartsChange;
  });
}
