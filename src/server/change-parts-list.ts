import type { PartsChange } from "#src/shapes/parts-change.ts";
import type { ChangingParts, PartsBatch } from "./parts-batch.ts";
import { partsListOf } from "./parts-list.ts";
import { takeStep } from "./parts-steps.ts";
import { type ChoiceView, type LineView, type PricedPartView, pricedPartsList } from "./present.ts";
import { type FieldError, Problem } from "./problem.ts";
import { editionsOf } from "./store/edition.ts";
import { linesOf, placeLine } from "./store/line.ts";
import { inTransaction } from "./transaction.ts";

/** What a change left: the lines it touched as they now read, and where that is new, the order of all lines. */
export interface PartsChanged {
  lines: LineView<PricedPartView>[];
  choices: ChoiceView[];
  removed: string[];
  /** Ids of every line; `null` where no line was added, removed or moved. */
  order: string[] | null;
}

/** One step that found something else than its person had seen. */
export interface PartsClash {
  /** Place of the step in the change. */
  change: number;
  current: unknown;
}

function failedSteps(
  batch: PartsBatch,
  steps: PartsChange[],
): { errors: FieldError[]; clashes: PartsClash[] } {
  const errors: FieldError[] = [];
  const clashes: PartsClash[] = [];
  for (const [place, step] of steps.entries())
    try {
      takeStep(batch, step);
    } catch (error) {
      if (!(error instanceof Problem)) throw error;
      if (error.code === "changed-meanwhile") clashes.push({ change: place, current: error.details.current });
      for (const { at, message } of error.details.errors ?? [])
        errors.push({ at: `changes.${place}.${at}`, message });
    }
  return { errors, clashes };
}

/** Writes the places of the lines where they are new. */
function settleOrder({ given, order }: PartsBatch): void {
  const stored = new Map(linesOf(given.db, given.kit.id).map(({ line }) => [line.id, line.position]));
  for (const [place, id] of order.entries()) if (stored.get(id) !== place) placeLine(given.db, id, place);
}

function begun(given: ChangingParts): PartsBatch {
  return {
    given,
    editions: new Set(editionsOf(given.db, given.kit.id).map(({ id }) => id)),
    order: linesOf(given.db, given.kit.id).map(({ line }) => line.id),
    lines: new Set(),
    parts: new Set(),
    removed: [],
    known: null,
  };
}

/**
 * Changes a parts list in one transaction: every step is taken, or none. All steps that cannot be taken are
 * named, each by its path (422); steps that saw an older version come back with what stands there now (409).
 */
export function changePartsList(given: ChangingParts, steps: PartsChange[]): PartsChanged {
  return inTransaction(given.db, () => {
    const batch = begun(given);
    const before = [...batch.order];
    const { errors, clashes } = failedSteps(batch, steps);
    if (errors.length > 0) throw new Problem("wrong-input", { errors });
    if (clashes.length > 0) throw new Problem("changed-meanwhile", { current: { clashes } });
    const reordered = batch.order.length !== before.length || batch.order.some((id, at) => id !== before[at]);
    settleOrder(batch);
    const list = pricedPartsList(partsListOf(given.db, given.kit));
    return {
      lines: list.lines.filter((line) => batch.lines.has(line.id) || batch.parts.has(line.part.id)),
      choices: list.choices.filter((choice) => batch.parts.has(choice.partId)),
      removed: batch.removed,
      order: reordered ? batch.order : null,
    };
  });
}
