import { chanceOfEnough } from "./chance-of-enough.ts";
import { need } from "./run-needs.ts";
import type { WorkingContext } from "./working.ts";
import { count, from, notKnown, rate, type Sheet, type Step, step, summed } from "./working-lines.ts";

/** How many boards to order for the yield (section 6). */
export function boardsToOrderSheet({ prepared, result }: WorkingContext): Sheet {
  const { boards } = result;
  const { plan } = prepared;
  const lines = result.editions.flatMap((edition, index) => {
    const perKit = plan.editions[index]?.boardsPerKit ?? 0;
    const label = `${edition.name}, ${edition.kits} kits with ${perKit} each`;
    return edition.kits * perKit === 0
      ? []
      : [step("+", label, count(edition.kits * perKit, "boards"), "2", { source: from("run") })];
  });
  const answer =
    boards.toOrder === null ? notKnown([need("no-board-yield", [{}])]) : count(boards.toOrder, "boards");
  return {
    title: `Boards to order for a run of ${result.kits}`,
    steps: [
      ...summed(lines),
      step(lines.length === 0 ? null : "=", "Boards in the kits", count(boards.required, "boards"), "2"),
      ...(boards.toOrder === null || boards.toOrder === 0
        ? []
        : chances(boards.required, boards.toOrder, boards.yield, boards.confidence)),
      step(null, "Boards to order", answer, "6", { result: true }),
    ],
    notes: [
      "The fewest boards of which, by the binomial distribution, enough are good with at least the confidence asked for.",
    ],
    basis: "In boards",
  };
}

function chances(required: number, toOrder: number, yieldShare: string, confidence: string): Step[] {
  const source = from("boards");
  const chance = (boards: number) =>
    step(
      null,
      `Chance that ${boards} hold ${required} good ones`,
      rate(chanceOfEnough(required, boards, yieldShare)),
      "6",
    );
  return [
    step(null, "Yield: share of boards that are good", rate(yieldShare), "6", { source }),
    step(null, "Confidence asked for", rate(confidence), "6", { source }),
    ...(toOrder > required ? [chance(toOrder - 1)] : []),
    chance(toOrder),
  ];
}
