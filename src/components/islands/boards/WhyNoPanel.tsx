import { panelsAt } from "#src/costing/panels/panel-of-quote.ts";
import { panelSentence } from "#src/costing/panels/panel-problem-words.ts";
import type { Plan } from "#src/shapes/plan.ts";

export interface WhyNoPanelProps {
  plan: Plan;
  house: string;
}

/** Why no panel can be made, such as a board that was made larger since. */
export function WhyNoPanel({ plan, house }: WhyNoPanelProps) {
  const fitted = panelsAt(plan, house);
  if (fitted === null || fitted.ok) return null;
  return (
    <ul className="py-2">
      {fitted.problems.map((problem) => (
        <li key={problem.code + problem.field}>{panelSentence(problem)}</li>
      ))}
    </ul>
  );
}
