import { from, number, rate, type Sheet, type Step, step, summed } from "#src/costing/working-lines.ts";
import { asItLies, type Block, lengthOf } from "./arrangement.ts";
import type { PanelClaim } from "./fit-panels.ts";
import type { Panel } from "./lay-out-panel.ts";
import { millimetres, sizeWords } from "./micrometres.ts";
import { margins } from "./panel-frame.ts";

type Axis = "width" | "height";

const SIDES: Record<Axis, { name: string; along: keyof Pick<Block, "columns" | "rows"> }> = {
  width: { name: "long side", along: "columns" },
  height: { name: "short side", along: "rows" },
};

/**
 * How a panel comes to its size and its count (section 6): both sides summed up, boards counted, areas shared out.
 *
 * @example 4 × 3 boards of 58 × 42 mm → "4 boards of 58 mm" 232, "3 gaps of 2 mm" 6, "Panel, long side" 238 mm, …
 */
export function panelSheet(
  panel: Panel,
  fitted: { claim: PanelClaim; most: number; mostByArea: number },
): Sheet {
  const { arrangement, outer, areas, measures } = panel;
  const square = (value: string) => number(value, "cm²");
  return {
    title: `A panel of ${arrangement.count} boards, ${sizeWords(outer)}`,
    steps: [
      ...sideSteps(panel, "width"),
      ...sideSteps(panel, "height"),
      ...countSteps(panel),
      step(null, "Boards", square(areas.boards), "6"),
      step("+", "Rails", square(areas.rails), "6"),
      step("+", measures.routed ? "Gaps and what is left between" : "Left between", square(areas.gaps), "6"),
      step("=", "The panel", square(areas.panel), "6"),
      step(null, "Boards", square(areas.boards), "6"),
      step("÷", "The panel", square(areas.panel), "6"),
      step("=", "Share of the panel that is board", rate(areas.used), "6", { result: true, rounds: 4 }),
    ],
    notes: notesOf(panel, fitted),
    basis: "In millimetres and square centimetres",
  };
}

/** Boards, gaps and rails along one side, and what the house's largest panel has there. */
function sideSteps({ arrangement, outer, measures }: Panel, axis: Axis): Step[] {
  const { name, along } = SIDES[axis];
  const { first, second, lies } = arrangement;
  const source = from("boards");
  const mm = (whole: number) => number(millimetres(whole), "mm");
  const cutHere = second !== null && lies === (axis === "width" ? "beside" : "below");
  const taller = second !== null && !cutHere ? longer(first, second, axis) : first;
  const blocks = cutHere ? [first, second] : [taller];
  const counts = blocks.map((block) => block[along]);
  const gaps = counts.reduce((sum, count) => sum + count, 0) - 1;
  const boards = blocks.map((block) => {
    const side = asItLies(measures.board, block.turned)[axis];
    return step("+", `${boardsOf(block[along])} of ${millimetres(side)} mm`, mm(block[along] * side), "6", {
      source,
    });
  });
  const margin = margins(measures)[axis === "width" ? "x" : "y"];
  const between = `${gaps} ${gaps === 1 ? "gap" : "gaps"} of ${millimetres(measures.gap)} mm`;
  return [
    ...summed(boards),
    ...(gaps * measures.gap > 0 ? [step("+", between, mm(gaps * measures.gap), "6", { source })] : []),
    ...(margin > 0 ? [step("+", marginWords(margin, measures.gap), mm(2 * margin), "6", { source })] : []),
    step("=", `Panel, ${name}`, mm(outer[axis]), "6"),
    step(null, `Largest panel, ${name}`, mm(measures.largest[axis]), "6", { source }),
  ];

  function longer(one: Block, other: Block, side: Axis): Block {
    const reach = (block: Block) =>
      lengthOf(block[along], asItLies(measures.board, block.turned)[side], measures.gap);
    return reach(other) > reach(one) ? other : one;
  }
}

function boardsOf(count: number): string {
  return count === 1 ? "1 board" : `${count} boards`;
}

function marginWords(margin: number, gap: number): string {
  const rails = `2 rails of ${millimetres(margin - gap)} mm`;
  return gap === 0 ? rails : `${rails}, each with a gap`;
}

function countSteps({ arrangement: { first, second, count } }: Panel): Step[] {
  const boards = (value: number) => number(value.toString(), "boards");
  const grid = ({ columns, rows, turned }: Block) =>
    `${columns} × ${rows} boards ${turned ? "turned by a quarter" : "as drawn"}`;
  const blocks = [first, ...(second ? [second] : [])];
  return [
    ...summed(blocks.map((block) => step("+", grid(block), boards(block.columns * block.rows), "6"))),
    step("=", "Boards to a panel", boards(count), "6", { result: true }),
  ];
}

function notesOf(
  { arrangement, measures }: Panel,
  fitted: { claim: PanelClaim; most: number; mostByArea: number },
) {
  const { claim, most, mostByArea } = fitted;
  const notes = [
    "The panel is cut to what its boards need; rails stay on the same sides as on the largest panel.",
  ];
  if (arrangement.count < most) notes.push(`The largest panel would hold ${most}.`);
  else if (!measures.routed)
    notes.push("Scores run from edge to edge, so no other layout than a grid can be made.");
  else if (claim === "proven") notes.push("No other layout of these boards holds more.");
  else
    notes.push(
      measures.round
        ? "The most of all square grids; round boards in a honeycomb were not tried."
        : `The most of all grids and layouts in two blocks; ${mostByArea} at most could fit in any other way.`,
    );
  if (measures.round) notes.push("A round board counts as the area of its ellipse, π ÷ 4 × width × height.");
  return notes;
}
