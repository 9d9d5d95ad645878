import { dayWords } from "#src/costing/day-words.ts";
import { divideUp } from "#src/costing/whole.ts";
import { count, from, money, number, type Sheet, type Step, step } from "#src/costing/working-lines.ts";
import type { FigureId } from "#src/costing/working-tree.ts";
import { type BoardsWanted, costPieces, type PieceCost } from "./cost-pieces.ts";
import { orderPieces, type PieceOrder } from "./order-pieces.ts";
import type { PreparedPieces } from "./prepare-pieces.ts";
import { goodsSteps } from "./working-goods.ts";

/**
 * How the cost of a good board by one quote comes about (section 6), singly or panelled. `null` where `costPieces`
 * has no cost. Money is in the quote's currency, the last lines in `currency`, the plan's. `panel`: the figure that
 * shows how many boards a panel holds.
 *
 * @example 113 boards in panels of 12 at 25.00 → 10 panels, 120 boards, 262.00, with charges 301.00, a board 3.01
 */
export function piecesSheet(
  prepared: PreparedPieces,
  wanted: BoardsWanted,
  currency: string,
  panel: FigureId | null = null,
): Sheet | null {
  const { quote } = prepared;
  const cost = costPieces(prepared, wanted);
  const order = orderPieces(prepared, wanted.toOrder);
  if (cost === null || order === null) return null;
  return {
    title: `${quote.boardHouse}, ${quote.boardsPerPiece === 1 ? "single boards" : `panels of ${quote.boardsPerPiece}`}`,
    steps: [
      ...countSteps(prepared, order, wanted.toOrder, panel),
      ...goodsSteps(prepared, order, cost, wanted.toOrder),
      ...chargeSteps(prepared, cost),
      ...perBoardSteps(prepared, cost, wanted.required, currency),
    ],
    notes: [
      "An order line is rounded once, to the house's minor unit, halves up.",
      ...(/[1-9]/.test(quote.depanelling)
        ? ["Depanelling is charged for every board of a panel, with the panel."]
        : []),
      ...(order.pieces > divideUp(wanted.toOrder, quote.boardsPerPiece)
        ? ["More are ordered than needed, because that costs less."]
        : []),
    ],
    basis: `In ${quote.currency}, without VAT`,
  };
}

function countSteps(
  { quote }: PreparedPieces,
  { pieces, boards }: PieceOrder,
  toOrder: number,
  panel: FigureId | null,
): Step[] {
  const source = from("boards", quote.id);
  const needed = step("−", "Boards to order", count(toOrder, "boards"), "6", { opens: "boards-to-order" });
  const over = step("=", "Boards over", count(boards - toOrder, "boards"), "6");
  if (quote.boardsPerPiece === 1)
    return [step(null, "Boards ordered", count(boards, "boards"), "3"), needed, over];
  return [
    step(null, "Panels ordered", count(pieces, "panels"), "3"),
    step("×", "Boards to a panel", count(quote.boardsPerPiece, "boards"), "6", {
      source,
      opens: panel,
    }),
    step("=", "Boards in them", count(boards, "boards"), "6"),
    needed,
    over,
  ];
}

function chargeSteps({ quote }: PreparedPieces, cost: PieceCost): Step[] {
  const source = from("boards", quote.id);
  const charges = [
    ["Engineering", cost.engineering],
    ["Stencil", cost.stencil],
    ["Freight", cost.freight ?? "0"],
  ] as const;
  const charged = charges.filter(([, amount]) => /[1-9]/.test(amount));
  return [
    ...charged.map(([name, amount]) => step("+", name, money(amount, quote.currency), "6", { source })),
    step(
      "=",
      cost.freight === null ? "All but the freight" : "In all",
      money(cost.total, quote.currency),
      "6",
    ),
  ];
}

function perBoardSteps(
  { quote, worth }: PreparedPieces,
  cost: PieceCost,
  required: number,
  currency: string,
): Step[] {
  const rate = worth?.rate;
  const rated = rate
    ? [
        step(
          "×",
          `Rate of ${dayWords(rate.dated)}`,
          number(rate.perForeignUnit, `${currency} for one ${quote.currency}`),
          "1.4",
          {
            source: from("offers"),
          },
        ),
        step("=", "Converted", money(cost.landed, currency), "1.4"),
      ]
    : [];
  return [
    ...rated,
    step("÷", "Boards in the kits", count(required, "boards"), "6"),
    step("=", "One good board", money(cost.perGoodBoard, currency), "6", { result: true }),
  ];
}
