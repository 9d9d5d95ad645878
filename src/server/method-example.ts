import example from "#src/content/examples/porch-bell.json" with { type: "json" };
import { reckoned, workingOf } from "#src/costing/working.ts";
import type { FigureId, WorkingTree } from "#src/costing/working-tree.ts";
import { Plan } from "#src/shapes/plan.ts";

/** The invented kit that the method pages reckon with: small enough to follow by hand. */
export const METHOD_EXAMPLE: Plan = Plan.parse(example);

/** The workings of some figures of the example kit's run, by the very code that reckons every kit. */
export function exampleWorkings(figures: readonly string[]): WorkingTree[] {
  const context = reckoned(METHOD_EXAMPLE);
  return figures.map((figure) => {
    const tree = workingOf(context, figure as FigureId);
    if (tree === null) throw new Error(`The example has no figure ${figure}.`);
    return tree;
  });
}
